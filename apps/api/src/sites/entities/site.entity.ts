import { Column, Entity, ForeignKey, PrimaryColumn } from 'typeorm';

@Entity('sites')
@ForeignKey('Customer', ['companyId', 'customerId'], ['companyId', 'id'], {
  name: 'sites_company_id_customer_id_fkey',
})
export class Site {
  @PrimaryColumn('uuid', { name: 'company_id' })
  companyId: string;

  @PrimaryColumn('uuid')
  id: string;

  @Column('uuid', { name: 'customer_id' })
  customerId: string;

  @Column('text')
  name: string;

  @Column('text')
  address: string;

  @Column('text')
  town: string;

  @Column('double precision', { nullable: true })
  latitude: number | null;

  @Column('double precision', { nullable: true })
  longitude: number | null;

  @Column('double precision', { name: 'elevation_ft', nullable: true })
  elevationFt: number | null;

  @Column('text', { name: 'access_notes', nullable: true })
  accessNotes: string | null;

  @Column('text', { name: 'gate_code', nullable: true })
  gateCode: string | null;
}
