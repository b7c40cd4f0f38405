import { Check, Column, Entity, Index, JoinColumn, ManyToOne, OneToMany, PrimaryColumn, Unique, type Relation } from 'typeorm';

import type { Role } from '../../shared/contracts/session';
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

/** One role that a person holds; one person may hold several. */
@Entity({ name: 'role_grant' })
@Check('role_grant_role_check', `"role" IN ('designer', 'librarian', 'test-engineer', 'reviewer', 'admin')`)
export class RoleGrant {
  @PrimaryColumn({ name: 'person_id', type: 'uuid', primaryKeyConstraintName: 'role_grant_pkey' })
  personId: string;

  @ManyToOne(() => Person, (person) => person.grants, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'person_id', foreignKeyConstraintName: 'role_grant_person_fkey' })
  person: Relation<Person>;

  @PrimaryColumn({ type: 'text', primaryKeyConstraintName: 'role_grant_pkey' })
  role: Role;
}
