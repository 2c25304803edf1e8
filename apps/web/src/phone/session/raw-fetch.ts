export type Fetcher = typeof fetch;

export interface RawInit extends Omit<RequestInit, 'credentials' | 'signal'> {
  limitMs?: number;
}

const defaultLimitMs = 20_000;

/** One request with cookies, our header and a time limit. Null when no answer of the office came. */
export async function rawFetch(path: string, init: RawInit, fetcher: Fetcher): Promise<Response | null> {
  const { limitMs = defaultLimitMs, headers, ...rest } = init;
  try {
    const response = await fetcher(path, {
      ...rest,
      headers: {
        accept: 'application/json',
        'x-rimeward-request': '1',
        ...(typeof rest.body === 'string' ? { 'content-type': 'application/json' } : {}),
        ...(headers as Record<string, string> | undefined),
      },
      credentials: 'same-origin',
      redirect: 'error',
      cache: 'no-store',
      signal: AbortSignal.timeout(limitMs),
    });
    return isForeignPage(response) ? null : response;
  } catch {
    // fetch rejects for the network and for the time limit, and for nothing that the office has said.
    return null;
  }
}

/** A captive portal answers with a page of its own. */
function isForeignPage(response: Response): boolean {
  return response.status < 500 && (response.headers.get('content-type') ?? '').includes('text/html');
}
