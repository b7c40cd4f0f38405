import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';

import type { PartRecord } from '../../shared/contracts/part';
import type { Part, PartKind } from '../../shared/model/part';
import { Person } from '../teams/person-entity';
import { Team } from '../teams/team-entity';

/** A part of the team's library. */
@Entity({ name: 'part' })
@Index('part_list_idx', ['teamId', 'name', 'id'])
export class PartRow {
  @PrimaryColumn({ type: 'uuid', primaryKeyConstraintName: 'part_pkey' })
  id: string;

  @Column({ name: 'team_id', type: 'uuid' })
  teamId: string;

  @ManyToOne(() => Team, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'team_id', foreignKeyConstraintName: 'part_team_fkey' })
  team: Relation<Team>;

  /** Name and kind stand in the document too; columns of their own to search by. */
  @Column({ type: 'text' })
  name: string;

  @Column({ type: 'text' })
  kind: PartKind;

  @Column({ type: 'integer' })
  revision: number;

  /** As parsed: SI, every default filled in. */
  @Column({ type: 'jsonb' })
  document: Part;

  @Column({ type: 'jsonb' })
  provenance: PartRecord['provenance'];

  @Index('part_approved_by_idx')
  @Column({ name: 'approved_by', type: 'uuid', nullable: true })
  approvedById: string | null;

  @ManyToOne(() => Person, { nullable: true })
  @JoinColumn({ name: 'approved_by', foreignKeyConstraintName: 'part_approved_by_fkey' })
  approvedBy: Relation<Person> | null;

  @Column({ name: 'created_at', type: 'timestamptz', precision: 3 })
  createdAt: Date;
}
