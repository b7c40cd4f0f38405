import { Column, Entity, Index, JoinColumn, ManyToOne, OneToMany, PrimaryColumn, Unique, type Relation } from 'typeorm';

import { RoleGrant } from './role-grant-entity';
import { Team } from './team-entity';

/** Someone who can sign in. */
@Entity({ name: 'person' })
@Unique('person_email_key', ['email'])
export class Person {
  @PrimaryColumn({ type: 'uuid', primaryKeyConstraintName: 'person_pkey' })
  id: string;

  @Index('person_team_idx')
  @Column({ name: 'team_id', type: 'uuid' })
  teamId: string;

  @ManyToOne(() => Team, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'team_id', foreignKeyConstraintName: 'person_team_fkey' })
  team: Relation<Team>;

  @Column({ type: 'text' })
  name: string;

  /** In lower case. */
  @Column({ type: 'text' })
  email: string;

  @Column({ name: 'password_hash', type: 'text' })
  passwordHash: string;

  /** A deactivated person keeps their name on what they did, and cannot come in. */
  @Column({ type: 'boolean', default: true })
  active: boolean;

  @Column({ name: 'created_at', type: 'timestamptz', precision: 3 })
  createdAt: Date;

  @OneToMany(() => RoleGrant, (grant) => grant.person)
  grants: Relation<RoleGrant[]>;
}
