import { Column, Entity, PrimaryColumn } from 'typeorm';

@Entity('visit_summaries')
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
