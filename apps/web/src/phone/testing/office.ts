import { createHash, generateKeyPairSync, sign } from 'node:crypto';
import { gunzipSync } from 'node:zlib';
import type { FeedItem, PhotoState, PushRequest, PushResponse } from '@rimeward/contracts';
import { entryHash, noPrevious, readHeader } from '@rimeward/delivery';
import { codec } from '../codec';

const partBytes = 256 * 1024;

/** An office behind `fetch`: enough of the API for the phone's own tests. The real one is tested with the server. */
export class Office {
  readonly keys = generateKeyPairSync('ec', { namedCurve: 'P-256' });
  readonly stored = new Map<string, { text: string; hash: string }[]>();
  readonly parts = new Map<string, Map<number, Uint8Array>>();
  readonly complete = new Map<string, Uint8Array>();
  readonly previews = new Set<string>();
  readonly requests: { path: string; authorization: string | null; encoding: string | null }[] = [];
  epoch = 'first';
  feed: FeedItem[] = [];
  /** What to do with the n-th request instead of, or after, answering it. */
  fault: (path: string, n: number) => 'lose-request' | 'lose-answer' | Response | null = () => null;

  get verifyKey(): Record<string, unknown> {
    return { ...this.keys.publicKey.export({ format: 'jwk' }) };
  }

  readonly fetch: typeof fetch = async (input, init) => {
    const request = new Request(new URL(input as string, 'https://office.test'), init);
    const path = new URL(request.url).pathname + new URL(request.url).search;
    this.requests.push({
      path,
      authorization: request.headers.get('authorization'),
      encoding: request.headers.get('content-encoding'),
    });
    const fault = this.fault(path, this.requests.length);
    if (fault === 'lose-request') throw new TypeError('network');
    if (fault instanceof Response) return fault;
    const answer = await this.answer(path, request);
    if (fault === 'lose-answer') throw new TypeError('network');
    return answer;
  };

  jws(claims: object): string {
    const encode = (value: object): string => Buffer.from(JSON.stringify(value)).toString('base64url');
    const signed = `${encode({ alg: 'ES256' })}.${encode(claims)}`;
    const signature = sign('sha256', Buffer.from(signed), {
      key: this.keys.privateKey,
      dsaEncoding: 'ieee-p1363',
    });
    return `${signed}.${signature.toString('base64url')}`;
  }

  private async answer(path: string, request: Request): Promise<Response> {
    const [, , area, first, second, third] = path.split('?')[0]!.split('/');
    if (area === 'sync' && first === 'push') return json(this.push(await readJson<PushRequest>(request)));
    if (area === 'sync' && first === 'pull') return json(this.pull(new URL(request.url).searchParams));
    if (area === 'photos' && first === 'announce') {
      const { photos } = await readJson<{ photos: { sha256: string; bytes: number }[] }>(request);
      return json({
        photos: photos.map(({ sha256, bytes }) => this.photo(sha256, Math.ceil(bytes / partBytes))),
      });
    }
    if (area === 'photos' && second === 'parts') {
      const part = (await request.formData()).get('part') as File;
      const parts = this.parts.get(first!) ?? new Map<number, Uint8Array>();
      this.parts.set(first!, parts.set(Number(third), new Uint8Array(await part.arrayBuffer())));
      return json(this.photo(first!, 0));
    }
    if (area === 'photos' && second === 'preview') {
      this.previews.add(first!);
      return json(this.photo(first!, 0));
    }
    if (area === 'photos' && second === 'complete') return this.join(first!);
    return json({ code: 'not-found', status: 404, type: '', title: '' }, 404);
  }

  private push({ device, entries }: PushRequest): PushResponse {
    const chain = this.stored.get(device) ?? [];
    this.stored.set(device, chain);
    const results = entries.map((text): PushResponse['results'][number] => {
      const header = readHeader(text)!;
      const known = chain[header.seq - 1];
      const previous = chain[header.seq - 2]?.hash ?? noPrevious;
      const hash = entryHash(header.prev, codec.utf8(text), codec.sha256);
      if (known !== undefined) {
        return known.hash === hash
          ? { seq: header.seq, result: 'duplicate' }
          : { seq: header.seq, result: 'held', heldReason: 'fork' };
      }
      if (header.seq > chain.length + 1) return { seq: header.seq, result: 'gap' };
      chain.push({ text, hash });
      return header.prev === previous
        ? { seq: header.seq, result: 'stored' }
        : { seq: header.seq, result: 'held', heldReason: 'chain-broken' };
    });
    const hash = chain.at(-1)?.hash ?? null;
    const at = new Date().toISOString();
    const receipt =
      hash === null
        ? null
        : this.jws({ typ: 'receipt', device, acknowledgedThrough: chain.length, hash, at });
    const named = chain.flatMap(({ text }) => (JSON.parse(text) as { photos: { sha256: string }[] }).photos);
    const missingPhotos = named.map(({ sha256 }) => sha256).filter((sha256) => !this.complete.has(sha256));
    return {
      acknowledgedThrough: chain.length,
      acknowledgedHash: hash,
      results,
      serverTime: at,
      receipt,
      missingPhotos,
    };
  }

  private pull(query: URLSearchParams): object {
    const cursor =
      query.get('epoch') === this.epoch || query.get('epoch') === null ? Number(query.get('cursor')) : 0;
    const items = this.feed.slice(cursor, cursor + 2);
    const next = cursor + items.length;
    return {
      epoch: this.epoch,
      cursor: next,
      more: next < this.feed.length,
      items,
      serverTime: new Date().toISOString(),
    };
  }

  private photo(sha256: string, count: number): PhotoState {
    const here = this.parts.get(sha256) ?? new Map<number, Uint8Array>();
    const missingParts = Array.from({ length: count }, (_, part) => part).filter((part) => !here.has(part));
    const state = this.complete.has(sha256) ? 'complete' : 'partial';
    return {
      sha256,
      state,
      missingParts: state === 'complete' ? [] : missingParts,
      hasPreview: this.previews.has(sha256),
    };
  }

  private join(sha256: string): Response {
    const parts = [...(this.parts.get(sha256) ?? new Map<number, Uint8Array>()).entries()].sort(
      ([a], [b]) => a - b,
    );
    const whole = Buffer.concat(parts.map(([, bytes]) => bytes));
    if (createHash('sha256').update(whole).digest('hex') !== sha256) {
      this.parts.delete(sha256);
      return json({ code: 'photo-hash-mismatch', status: 409, type: '', title: '' }, 409);
    }
    this.complete.set(sha256, whole);
    return json(this.photo(sha256, 0));
  }
}

async function readJson<T>(request: Request): Promise<T> {
  const bytes = Buffer.from(await request.arrayBuffer());
  const plain = request.headers.get('content-encoding') === 'gzip' ? gunzipSync(bytes) : bytes;
  return JSON.parse(plain.toString('utf8')) as T;
}

function json(body: unknown, status = 200): Response {
  return new Response(JSON.stringify(body), { status, headers: { 'content-type': 'application/json' } });
}
