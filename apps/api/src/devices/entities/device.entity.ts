import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';

@Entity('devices')
@Index('devices_id', ['id'])
@ForeignKey('User', ['companyId', 'userId'], ['companyId', 'id'], { name: 'devices_company_id_user_id_fkey' })
export class Device {
  @PrimaryColumn('uuid', { name: 'company_id' })
  companyId: string;

  @PrimaryColumn('uuid')
  id: string;

  @Column('uuid', { name: 'user_id' })
  userId: string;

  @Column('text')
  name: string;

  @Column('text')
  platform: string;

  /** SHA-256 of the ingest secret, which is 256 random bits. */
  @Column('bytea', { name: 'secret_hash' })
  secretHash: Buffer;

  @Column('timestamptz', { name: 'enrolled_at' })
  enrolledAt: Date;

  @Column('timestamptz', { name: 'revoked_at', nullable: true })
  revokedAt: Date | null;
}
