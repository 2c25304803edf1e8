import { Column, Entity, ForeignKey, PrimaryColumn } from 'typeorm';

@Entity('hoses')
@ForeignKey('Company', ['companyId'], ['id'], { name: 'hoses_company_id_fkey' })
export class Hose {
  @PrimaryColumn('uuid', { name: 'company_id' })
  companyId: string;

  @PrimaryColumn('uuid')
  id: string;

  @Column('text')
  name: string;

  @Column('double precision', { name: 'inside_diameter_in' })
  insideDiameterIn: number;

  @Column('double precision', { name: 'length_ft' })
  lengthFt: number;

  @Column('integer')
  couplings: number;
}
