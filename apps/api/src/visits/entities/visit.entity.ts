import { Column, Entity, PrimaryColumn } from 'typeorm';

@Entity('visits')
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
