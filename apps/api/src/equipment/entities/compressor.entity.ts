import { Column, Entity, ForeignKey, PrimaryColumn } from 'typeorm';

@Entity('compressors')
@ForeignKey('Company', ['companyId'], ['id'], { name: 'compressors_company_id_fkey' })
export class Compressor {
  @PrimaryColumn('uuid', { name: 'company_id' })
  companyId: string;

  @PrimaryColumn('uuid')
  id: string;

  @Column('text')
  name: string;

  @Column('double precision', { name: 'free_air_cfm' })
  freeAirCfm: number;

  @Column('double precision', { name: 'max_pressure_psi' })
  maxPressurePsi: number;

  @Column('integer')
  stages: 1 | 2;

  @Column('boolean')
  aftercooler: boolean;
}
