import { Column, Entity, ForeignKey, PrimaryColumn } from 'typeorm';

@Entity('crews')
@ForeignKey('Company', ['companyId'], ['id'], { name: 'crews_company_id_fkey' })
export class Crew {
  @PrimaryColumn('uuid', { name: 'company_id' })
  companyId: string;

  @PrimaryColumn('uuid')
  id: string;

  @Column('text')
  name: string;
}
