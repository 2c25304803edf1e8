import { Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';

@Entity('visit_assignments')
@Index('visit_assignments_by_user', ['companyId', 'userId'])
@ForeignKey('Visit', ['companyId', 'visitId'], ['companyId', 'id'], {
  name: 'visit_assignments_company_id_visit_id_fkey',
})
@ForeignKey('User', ['companyId', 'userId'], ['companyId', 'id'], {
  name: 'visit_assignments_company_id_user_id_fkey',
})
export class VisitAssignment {
  @PrimaryColumn('uuid', { name: 'company_id' })
  companyId: string;

  @PrimaryColumn('uuid', { name: 'visit_id' })
  visitId: string;

  @PrimaryColumn('uuid', { name: 'user_id' })
  userId: string;
}
