import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';

@Entity('visits')
@Index('visits_by_date', ['companyId', 'date'])
@ForeignKey('Site', ['companyId', 'siteId'], ['companyId', 'id'], { name: 'visits_company_id_site_id_fkey' })
@ForeignKey('System', ['companyId', 'systemId'], ['companyId', 'id'], {
  name: 'visits_company_id_system_id_fkey',
})
@ForeignKey('Crew', ['companyId', 'crewId'], ['companyId', 'id'], { name: 'visits_company_id_crew_id_fkey' })
export class Visit {
  @PrimaryColumn('uuid', { name: 'company_id' })
  companyId: string;

  @PrimaryColumn('uuid')
  id: string;

  @Column('uuid', { name: 'site_id' })
  siteId: string;

  @Column('uuid', { name: 'system_id' })
  systemId: string;

  @Column('date')
  date: string;

  @Column('integer')
  sequence: number;

  @Column('text')
  purpose: 'winterize' | 'return-visit' | 'spring';

  @Column('text', { nullable: true })
  note: string | null;

  @Column('uuid', { name: 'crew_id', nullable: true })
  crewId: string | null;
}
