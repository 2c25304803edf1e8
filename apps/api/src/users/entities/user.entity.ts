import type { Language, Role } from '@rimeward/contracts';
import { Column, Entity, PrimaryColumn } from 'typeorm';

@Entity('users')
export class User {
  @PrimaryColumn('uuid', { name: 'company_id' })
  companyId: string;

  @PrimaryColumn('uuid')
  id: string;

  @Column('text')
  email: string;

  @Column('text')
  name: string;

  @Column('text')
  role: Role;

  @Column('text')
  language: Language;

  @Column('text', { name: 'password_hash' })
  passwordHash: string;

  @Column('boolean', { name: 'blow_out_signed_off', default: false })
  blowOutSignedOff: boolean;

  @Column('uuid', { name: 'crew_id', nullable: true })
  crewId: string | null;

  @Column('timestamptz', { name: 'disabled_at', nullable: true })
  disabledAt: Date | null;
}
