import { entryTypes } from '../entry-types/registry';

/** Whether a body is one of this entry type at its newest version. Used for the replacement bodies of corrections. */
export function bodyFits(type: string, body: Record<string, unknown>): boolean {
  if (!Object.hasOwn(entryTypes, type)) return false;
  return entryTypes[type as keyof typeof entryTypes].body.safeParse(body).success;
}
