import { Column, Entity, ForeignKey, PrimaryColumn } from 'typeorm';

@Entity('customers')
@ForeignKey('Company', ['companyId'], ['id'], { name: 'customers_company_id_fkey' })
export class Customer {
  @PrimaryColumn('uuid', { name: 'company_id' })
  companyId: string;

  @PrimaryColumn('uuid')
  id: string;

  @Column('text')
  name: string;

  @Column('text', { nullable: true })
  phone: string | null;

  @Column('text', { nullable: true })
  email: string | null;
}
