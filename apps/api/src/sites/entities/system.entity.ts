import type { System as SystemDescription } from '@rimeward/field-log';
import { Column, Entity, PrimaryColumn } from 'typeorm';

@Entity('systems')
export class System {
  @PrimaryColumn('uuid', { name: 'company_id' })
  companyId: string;

  @PrimaryColumn('uuid')
  id: string;

  @Column('uuid', { name: 'site_id' })
  siteId: string;

  /** Checked by the field log's schema before it is written. */
  @Column('jsonb')
  description: SystemDescription;
}
