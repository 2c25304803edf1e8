import { renewSession } from './renew';
import { rawFetch, type Fetcher } from './raw-fetch';

export type { Fetcher } from './raw-fetch';

export interface ApiInit extends Omit<RequestInit, 'credentials' | 'signal'> {
  limitMs?: number;
}

/**
 * Asks our API with the session's cookies. A 401 renews the session once and asks again. Null when no answer of the
 * office came: network, time limit, or somebody else's page.
 */
export async function apiFetch(
  path: string,
  init: ApiInit = {},
  fetcher: Fetcher = fetch,
): Promise<Response | null> {
  const first = await rawFetch(path, init, fetcher);
  if (first?.status !== 401) return first;
  const renewal = await renewSession(fetcher);
  return renewal.ok ? rawFetch(path, init, fetcher) : first;
}

/** The answer's JSON object; null when it is not one, or was cut off. */
export async function jsonBody(response: Response): Promise<Record<string, unknown> | null> {
  try {
    const value: unknown = await response.json();
    return typeof value === 'object' && value !== null ? (value as Record<string, unknown>) : null;
  } catch {
    return null;
  }
}
