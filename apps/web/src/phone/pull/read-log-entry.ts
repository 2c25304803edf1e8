import type { LogEntry } from '@rimeward/field-log';
import { typeVersions } from '../save/type-versions';

/**
 * An entry's parsed form; null when its envelope, type or version is not one of this app's. The office has checked the
 * body against its type before it came here.
 */
export function readLogEntry(text: string): LogEntry | null {
  let value: unknown;
  try {
    value = JSON.parse(text);
  } catch {
    return null;
  }
  if (typeof value !== 'object' || value === null) return null;
  const { v, type, typeVersion } = value as Record<string, unknown>;
  if (v !== 1 || typeof type !== 'string' || typeof typeVersion !== 'number') return null;
  const known = Object.entries(typeVersions).find(([name]) => name === type)?.[1];
  return known !== undefined && typeVersion <= known ? (value as LogEntry) : null;
}
