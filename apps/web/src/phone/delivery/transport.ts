import type { HttpAnswer, PhotoToSend, Sent, Transport } from '@rimeward/delivery';
import type { Enrolment } from '../database/schema';
import { photoFields } from '../photos/limits';
import type { Fetcher } from '../session/raw-fetch';
import { renewSession } from '../session/renew';
import { compressed } from './compress';

/** Carries delivery's requests over HTTP: entries and photographs with the device's credential, the feed with the session. */
export function httpTransport(enrolment: Enrolment, fetcher: Fetcher = fetch): Transport {
  const asDevice = { authorization: `Device ${enrolment.deviceId}.${enrolment.ingestSecret}` };

  const postJson = async (path: string, value: unknown, limitMs: number): Promise<Sent> => {
    const body = await compressed(JSON.stringify(value));
    return send(
      fetcher,
      path,
      { method: 'POST', ...body, headers: { ...asDevice, ...body.headers } },
      limitMs,
    );
  };
  const postFile = (
    path: string,
    field: string,
    bytes: Uint8Array,
    type: string,
    limitMs: number,
  ): Promise<Sent> => {
    const form = new FormData();
    form.append(field, new Blob([bytes as Uint8Array<ArrayBuffer>], { type }), field);
    return send(fetcher, path, { method: 'POST', body: form, headers: asDevice }, limitMs);
  };

  return {
    push: (batch, limitMs) => postJson('/api/sync/push', batch, limitMs),
    announce: (photos: readonly PhotoToSend[], limitMs) =>
      postJson('/api/photos/announce', { photos }, limitMs),
    sendPreview: (sha256, bytes, limitMs) =>
      postFile(`/api/photos/${sha256}/preview`, photoFields.preview, bytes, 'image/jpeg', limitMs),
    sendPart: (sha256, part, bytes, limitMs) =>
      postFile(
        `/api/photos/${sha256}/parts/${part}`,
        photoFields.part,
        bytes,
        'application/octet-stream',
        limitMs,
      ),
    complete: (sha256, limitMs) => postJson(`/api/photos/${sha256}/complete`, {}, limitMs),
    pull: ({ epoch, cursor }, limit, limitMs) => {
      const query = new URLSearchParams({ cursor: String(cursor), limit: String(limit) });
      if (epoch !== null) query.set('epoch', epoch);
      return send(fetcher, `/api/sync/pull?${query.toString()}`, { method: 'GET', headers: {} }, limitMs);
    },
    renewSession: async () => {
      const renewal = await renewSession(fetcher);
      if (renewal.ok) return 'renewed';
      return renewal.fault === 'sign-in' ? 'sign-in' : 'no-answer';
    },
  };
}

interface Request {
  method: string;
  headers: Record<string, string>;
  body?: BodyInit;
}

async function send(fetcher: Fetcher, path: string, request: Request, limitMs: number): Promise<Sent> {
  const signal = AbortSignal.timeout(limitMs);
  try {
    const response = await fetcher(path, {
      ...request,
      headers: { accept: 'application/json', 'x-rimeward-request': '1', ...request.headers },
      credentials: 'same-origin',
      cache: 'no-store',
      redirect: 'manual',
      signal,
    });
    // A redirect is never ours: it leads to a portal's page.
    if (response.type === 'opaqueredirect') return { arrived: true, answer: portalPage };
    const answer: HttpAnswer = {
      status: response.status,
      contentType: response.headers.get('content-type'),
      retryAfter: response.headers.get('retry-after'),
      text: await response.text(),
    };
    return { arrived: true, answer };
  } catch {
    // fetch and text() reject for the network and for the time limit alone.
    return { arrived: false, why: signal.aborted ? 'timeout' : 'no-network' };
  }
}

const portalPage: HttpAnswer = { status: 302, contentType: 'text/html', retryAfter: null, text: '' };
