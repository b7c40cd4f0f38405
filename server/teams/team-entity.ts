import { Column, Entity, PrimaryColumn } from 'typeorm';

@Entity({ name: 'team' })
export class Team {
  @PrimaryColumn({ type: 'uuid', primaryKeyConstraintName: 'team_pkey' })
  id: string;

  @Column({ type: 'text' })
  name: string;

  @Column({ name: 'created_at', type: 'timestamptz', precision: 3 })
  createdAt: Date;
}
