import { Injectable } from '@nestjs/common';
import type { DevicesResponse, Manifest } from '@rimeward/contracts';
import { CompanyContext } from '../database/company-context';
import { companySetting as company } from '../database/protect-table';

interface DeviceRow {
  id: string;
  name: string;
  user_name: string;
  revoked: boolean;
  last_contact_at: Date | null;
  seq: number | null;
  manifest: Manifest | null;
}

/** What is still on which phone, as the phones told it when they last had contact. */
@Injectable()
export class ReviewDevicesService {
  constructor(private readonly context: CompanyContext) {}

  async list(companyId: string): Promise<DevicesResponse> {
    const rows = await this.context.run(companyId, (manager) =>
      manager.query<DeviceRow[]>(
        `select d.id, d.name, u.name as user_name, d.revoked_at is not null as revoked, c.last_contact_at, c.seq, c.manifest
         from devices d
         join users u on u.company_id = d.company_id and u.id = d.user_id
         left join device_chains c on c.company_id = d.company_id and c.device_id = d.id
         where d.company_id = ${company}
         order by c.last_contact_at desc nulls last, d.id`,
      ),
    );
    return {
      devices: rows.map((row) => ({
        id: row.id,
        name: row.name,
        userName: row.user_name,
        revoked: row.revoked,
        lastContactAt: row.last_contact_at?.toISOString() ?? null,
        acknowledgedThrough: row.seq ?? 0,
        manifest: row.manifest,
      })),
    };
  }
}
