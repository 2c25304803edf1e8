import type { CompanyDocument } from '@rimeward/contracts';
import { database } from '../database/database';

/** The company's equipment, people and settings as last pulled; null before the first pull. */
export async function companyDocument(): Promise<CompanyDocument | null> {
  const row = await database().read_meta.get('company');
  return row?.key === 'company' ? row.document : null;
}
