import { createHash, randomUUID } from 'node:crypto';
import type { PushResponse } from '@rimeward/contracts';
import { emptyChain, sealEntry, type ChainHead, type Codec, type SealedEntry } from '@rimeward/delivery';
import type { EntryBody, EntryType, PhotoReference } from '@rimeward/field-log';

export const codec: Codec = {
  utf8: (text) => new TextEncoder().encode(text),
  sha256: (bytes) => new Uint8Array(createHash('sha256').update(bytes).digest()),
};

/** Who a phone belongs to and where its office is. */
export interface PhoneOwner {
  url: string;
  company: string;
  device: string;
  ingestSecret: string;
  user: string;
}

export interface Answer<T> {
  status: number;
  body: T;
}

/** A phone as the office sees it: one chain of entries, sealed by the delivery library, sent over real HTTP. */
export class TestPhone {
  head: ChainHead = emptyChain;
  readonly entries: SealedEntry[] = [];

  constructor(readonly owner: PhoneOwner) {}

  get authorization(): string {
    return `Device ${this.owner.device}.${this.owner.ingestSecret}`;
  }

  /** Writes the next entry of the chain. `over` replaces fields of the envelope, to make odd entries. */
  write<T extends EntryType>(
    visit: string,
    type: T,
    body: EntryBody<T>,
    over: Record<string, unknown> & { photos?: PhotoReference[] } = {},
  ): SealedEntry {
    return this.seal({ visit, type, body, ...over });
  }

  seal(fields: Record<string, unknown>): SealedEntry {
    const sealed = sealEntry(
      {
        v: 1,
        id: randomUUID(),
        device: this.owner.device,
        company: this.owner.company,
        actor: this.owner.user,
        typeVersion: 1,
        photos: [],
        time: { wall: '2026-10-12T14:03:05.123Z', zone: 'America/Denver', offsetMs: 0, offsetAgeMs: 5_000 },
        app: 'test',
        ...fields,
      },
      this.head,
      codec,
    );
    this.head = { seq: sealed.seq, hash: sealed.hash };
    this.entries.push(sealed);
    return sealed;
  }

  /** A simple note, for when only the chain matters. */
  note(visit: string, text = 'heads along the fence are clear'): SealedEntry {
    return this.write(visit, 'note-written', { text });
  }

  push(texts: readonly string[] = this.entries.map(({ text }) => text)): Promise<Answer<PushResponse>> {
    return this.pushBody({
      device: this.owner.device,
      manifest: this.manifest(texts.length),
      entries: texts,
    });
  }

  async pushBody(body: unknown): Promise<Answer<PushResponse>> {
    const answer = await fetch(`${this.owner.url}/api/sync/push`, {
      method: 'POST',
      headers: { 'content-type': 'application/json', authorization: this.authorization },
      body: typeof body === 'string' ? body : JSON.stringify(body),
    });
    return { status: answer.status, body: (await answer.json()) as PushResponse };
  }

  /** Any request with the credential of the device. */
  async send<T>(path: string, body?: string | FormData, type?: string): Promise<Answer<T>> {
    const headers = { authorization: this.authorization, ...(type && { 'content-type': type }) };
    const answer = await fetch(`${this.owner.url}/api${path}`, {
      method: 'POST',
      headers,
      body: body ?? null,
    });
    return { status: answer.status, body: (await answer.json()) as T };
  }

  manifest(pending: number): Record<string, unknown> {
    return {
      head: this.head.seq,
      pendingEntries: pending,
      pendingPhotos: 0,
      pendingBytes: 0,
      oldestPendingWall: null,
      appVersion: 'test',
    };
  }
}
