import { Column, Entity, PrimaryColumn } from 'typeorm';

@Entity('compressors')
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
