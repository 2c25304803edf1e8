import { Entity, PrimaryColumn } from 'typeorm';

@Entity('visit_assignments')
export class VisitAssignment {
  @PrimaryColumn('uuid', { name: 'company_id' })
  companyId: string;

  @PrimaryColumn('uuid', { name: 'visit_id' })
  visitId: string;

  @PrimaryColumn('uuid', { name: 'user_id' })
  userId: string;
}
