import type { CompanySettings } from '@rimeward/contracts';
import { Column, CreateDateColumn, Entity, PrimaryColumn } from 'typeorm';

@Entity('companies')
export class Company {
  @PrimaryColumn('uuid')
  id: string;

  @Column('text')
  name: string;

  @Column('jsonb')
  settings: CompanySettings;

  @CreateDateColumn({ name: 'created_at', type: 'timestamptz' })
  createdAt: Date;
}
