import { entryTypes, type EntryType } from '../entry-types/registry';

type Body = Record<string, unknown>;

/**
 * One step from a version of a body to the next, keyed by the version it starts from. Written when a version is raised and
 * never edited afterwards. No type has been raised so far.
 */
const raises: Partial<Record<EntryType, Record<number, (body: Body) => Body>>> = {};

/** Brings a body of an old version to the newest one, step by step. */
export function upcast(
  type: EntryType,
  fromVersion: number,
  body: Body,
  steps: Partial<Record<EntryType, Record<number, (body: Body) => Body>>> = raises,
): Body {
  let current = body;
  for (let version = fromVersion; version < entryTypes[type].version; version += 1) {
    const raise = steps[type]?.[version];
    if (!raise) return current;
    current = raise(current);
  }
  return current;
}
