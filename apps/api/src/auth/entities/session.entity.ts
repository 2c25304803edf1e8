import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';

@Entity('sessions')
@Index('sessions_id', ['id'])
@ForeignKey('User', ['companyId', 'userId'], ['companyId', 'id'], {
  name: 'sessions_company_id_user_id_fkey',
})
export class Session {
  @PrimaryColumn('uuid', { name: 'company_id' })
  companyId: string;

  @PrimaryColumn('uuid')
  id: string;

  @Column('uuid', { name: 'user_id' })
  userId: string;

  /** Counts renewals. The cookie of this generation is valid, and the one before it until this one is first used. */
  @Column('integer')
  generation: number;

  @Column('boolean', { name: 'generation_used' })
  generationUsed: boolean;

  @Column('timestamptz', { name: 'rotated_at' })
  rotatedAt: Date;

  @Column('timestamptz', { name: 'created_at' })
  createdAt: Date;

  @Column('timestamptz', { name: 'last_used_at' })
  lastUsedAt: Date;

  @Column('timestamptz', { name: 'idle_until' })
  idleUntil: Date;

  @Column('timestamptz', { name: 'expires_at' })
  expiresAt: Date;

  @Column('timestamptz', { name: 'ended_at', nullable: true })
  endedAt: Date | null;

  @Column('text', { name: 'ended_because', nullable: true })
  endedBecause: string | null;
}
