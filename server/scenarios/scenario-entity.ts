import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';

import type { Check } from '../../shared/model/check';
import type { Verdict } from '../../shared/model/result';
import type { Scenario } from '../../shared/model/scenario';
import { Person } from '../teams/person-entity';
import { Team } from '../teams/team-entity';

/** A draft, with what the engine last said of it. */
@Entity({ name: 'scenario' })
@Index('scenario_list_idx', ['teamId', 'updatedAt', 'id'])
@Index('scenario_to_compute_idx', ['updatedAt'], { where: 'verdict IS NULL' })
export class ScenarioRow {
  @PrimaryColumn({ type: 'uuid', primaryKeyConstraintName: 'scenario_pkey' })
  id: string;

  @Column({ name: 'team_id', type: 'uuid' })
  teamId: string;

  @ManyToOne(() => Team, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'team_id', foreignKeyConstraintName: 'scenario_team_fkey' })
  team: Relation<Team>;

  /** Also in the document; a column of its own to search by. */
  @Column({ type: 'text' })
  name: string;

  /** Rises with every save. */
  @Column({ type: 'integer' })
  version: number;

  /** As parsed: SI, every default filled in. */
  @Column({ type: 'jsonb' })
  document: Scenario;

  /** SHA-256 of the document that it was created with, to know a repeated request. */
  @Column({ name: 'created_hash', type: 'text' })
  createdHash: string;

  /** Null until this version has been computed. */
  @Column({ type: 'jsonb', nullable: true })
  verdict: Verdict | null;

  @Column({ type: 'jsonb', nullable: true })
  closest: Check | null;

  @Column({ name: 'engine_version', type: 'text', nullable: true })
  engineVersion: string | null;

  @Column({ name: 'created_at', type: 'timestamptz', precision: 3 })
  createdAt: Date;

  @Column({ name: 'updated_at', type: 'timestamptz', precision: 3 })
  updatedAt: Date;

  @Index('scenario_updated_by_idx')
  @Column({ name: 'updated_by', type: 'uuid' })
  updatedById: string;

  @ManyToOne(() => Person)
  @JoinColumn({ name: 'updated_by', foreignKeyConstraintName: 'scenario_updated_by_fkey' })
  updatedBy: Relation<Person>;
}
