import type { Language, Role } from '@rimeward/contracts';
import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';

@Entity('users')
@Index('users_by_email', ['companyId', 'email'], { unique: true })
@Index('users_email', ['email'])
@ForeignKey('Company', ['companyId'], ['id'], { name: 'users_company_id_fkey' })
@ForeignKey('Crew', ['companyId', 'crewId'], ['companyId', 'id'], { name: 'users_company_id_crew_id_fkey' })
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
