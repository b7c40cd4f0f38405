import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn, Unique, type Relation } from 'typeorm';

import { SessionRow } from './session-entity';

/** A refresh token, kept only as its SHA-256. */
@Entity({ name: 'refresh_token' })
@Unique('refresh_token_hash_key', ['hash'])
export class RefreshToken {
  @PrimaryColumn({ type: 'uuid', primaryKeyConstraintName: 'refresh_token_pkey' })
  id: string;

  @Index('refresh_token_session_idx')
  @Column({ name: 'session_id', type: 'uuid' })
  sessionId: string;

  @ManyToOne(() => SessionRow, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'session_id', foreignKeyConstraintName: 'refresh_token_session_fkey' })
  session: Relation<SessionRow>;

  @Column({ type: 'text' })
  hash: string;

  @Column({ name: 'created_at', type: 'timestamptz', precision: 3 })
  createdAt: Date;

  /** When its successor was handed out; null for the newest of the session. */
  @Column({ name: 'replaced_at', type: 'timestamptz', precision: 3, nullable: true })
  replacedAt: Date | null;
}
