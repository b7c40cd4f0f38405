import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn, Unique, type Relation } from 'typeorm';

import { Person } from '../teams/person-entity';

/** A bearer token for programs, kept only as its SHA-256. */
@Entity({ name: 'api_token' })
@Unique('api_token_hash_key', ['hash'])
export class ApiToken {
  @PrimaryColumn({ type: 'uuid', primaryKeyConstraintName: 'api_token_pkey' })
  id: string;

  @Index('api_token_person_idx')
  @Column({ name: 'person_id', type: 'uuid' })
  personId: string;

  @ManyToOne(() => Person, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'person_id', foreignKeyConstraintName: 'api_token_person_fkey' })
  person: Relation<Person>;

  @Column({ type: 'text' })
  name: string;

  @Column({ type: 'text' })
  hash: string;

  @Column({ name: 'created_at', type: 'timestamptz', precision: 3 })
  createdAt: Date;

  @Column({ name: 'expires_at', type: 'timestamptz', precision: 3 })
  expiresAt: Date;

  @Column({ name: 'last_used_at', type: 'timestamptz', precision: 3, nullable: true })
  lastUsedAt: Date | null;

  @Column({ name: 'revoked_at', type: 'timestamptz', precision: 3, nullable: true })
  revokedAt: Date | null;
}
