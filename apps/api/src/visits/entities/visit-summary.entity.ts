import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';

@Entity('visit_summaries')
@Index('visit_summaries_by_system', ['companyId', 'systemId', 'date'])
@ForeignKey('System', ['companyId', 'systemId'], ['companyId', 'id'], {
  name: 'visit_summaries_company_id_system_id_fkey',
})
export class VisitSummary {
  @PrimaryColumn('uuid', { name: 'company_id' })
  companyId: string;

  @PrimaryColumn('uuid')
  id: string;

  @Column('uuid', { name: 'system_id' })
  systemId: string;

  @Column('date')
  date: string;

  @Column('jsonb')
  technicians: string[];

  @Column('jsonb')
  notes: string[];

  @Column('jsonb', { name: 'parts_taken_out' })
  partsTakenOut: string[];
}
