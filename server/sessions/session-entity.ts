import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';

import { Person } from '../teams/person-entity';

export type SessionEnd = 'signed-out' | 'replaced' | 'idle' | 'token-reused';

/** One signed-in browser: the family of all refresh tokens that grew from one sign-in. */
@Entity({ name: 'session' })
export class SessionRow {
  @PrimaryColumn({ type: 'uuid', primaryKeyConstraintName: 'session_pkey' })
  id: string;

  @Index('session_person_idx')
  @Column({ name: 'person_id', type: 'uuid' })
  personId: string;

  @ManyToOne(() => Person, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'person_id', foreignKeyConstraintName: 'session_person_fkey' })
  person: Relation<Person>;

  @Column({ name: 'created_at', type: 'timestamptz', precision: 3 })
  createdAt: Date;

  /** Kept to the minute, which is enough for the idle limit. */
  @Column({ name: 'last_seen_at', type: 'timestamptz', precision: 3 })
  lastSeenAt: Date;

  @Column({ name: 'expires_at', type: 'timestamptz', precision: 3 })
  expiresAt: Date;

  @Column({ name: 'ended_at', type: 'timestamptz', precision: 3, nullable: true })
  endedAt: Date | null;

  @Column({ name: 'ended_because', type: 'text', nullable: true })
  endedBecause: SessionEnd | null;
}
