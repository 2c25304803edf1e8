import { Column, Entity, PrimaryColumn } from 'typeorm';

@Entity('crews')
export class Crew {
  @PrimaryColumn('uuid', { name: 'company_id' })
  companyId: string;

  @PrimaryColumn('uuid')
  id: string;

  @Column('text')
  name: string;
}
