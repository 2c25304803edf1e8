import type { System as SystemDescription } from '@rimeward/field-log';
import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';

@Entity('systems')
@Index('systems_by_site', ['companyId', 'siteId'])
@ForeignKey('Site', ['companyId', 'siteId'], ['companyId', 'id'], { name: 'systems_company_id_site_id_fkey' })
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
