import { Check, Entity, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';

import type { Role } from '../../shared/contracts/session';
import { Person } from './person-entity';

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
