import type { Manifest } from '@rimeward/contracts';
import { emptyChain, sealEntry, type Codec, type SealedEntry } from '@rimeward/delivery';
import type { PhotoReference } from '@rimeward/field-log';
import { createHash } from 'node:crypto';
import { idOf } from '../chance';
import { demoCompany } from '../world/company';
import type { DemoPerson } from '../world/people';
import type { DemoSite } from '../world/sites';
import type { Line } from './line';
import { drawPicture, type Picture } from './picture';

const codec: Codec = {
  utf8: (text) => new TextEncoder().encode(text),
  sha256: (bytes) => new Uint8Array(createHash('sha256').update(bytes).digest()),
};

export interface WrittenEntry {
  sealed: SealedEntry;
  at: Date;
  pictures: Picture[];
}

/** A technician's phone: seals what is written into its chain, as the app does. */
export class DemoPhone {
  readonly id: string;
  readonly written: WrittenEntry[] = [];
  private head = emptyChain;

  constructor(readonly owner: DemoPerson) {
    this.id = idOf('device', owner.id);
  }

  /** Writes the lines of one visit, the first of them at this instant. */
  async writeVisit(visitId: string, site: DemoSite, lines: readonly Line[], from: Date): Promise<void> {
    let at = from.getTime();
    for (const { type, body, afterSeconds, pictures } of lines) {
      at += afterSeconds * 1_000;
      const moment = new Date(at);
      const drawn = await Promise.all(
        pictures.map((of, index) => drawPicture(`${visitId} ${this.head.seq} ${index}`, of, moment)),
      );
      const photos = drawn.map((picture, index) => reference(picture, pictures[index] ?? 'site', site));
      this.seal({ visit: visitId, type, body, photos }, moment, drawn);
    }
  }

  /** Seals any fields into the chain: also what this version of the office does not know. */
  seal(fields: Record<string, unknown>, at: Date, pictures: Picture[] = []): void {
    const envelope = {
      v: 1,
      id: idOf('entry', this.id, this.head.seq + 1),
      device: this.id,
      company: demoCompany.id,
      actor: this.owner.id,
      typeVersion: 1,
      photos: [],
      time: {
        wall: at.toISOString(),
        zone: demoCompany.settings.timeZone,
        offsetMs: 140,
        offsetAgeMs: 90_000,
      },
      app: '0.1.0',
      ...fields,
    };
    const sealed = sealEntry(envelope, this.head, codec);
    this.head = { seq: sealed.seq, hash: sealed.hash };
    this.written.push({ sealed, at, pictures });
  }

  /** What the phone says of itself when all but the last entries have gone out. */
  manifest(pending: readonly WrittenEntry[]): Manifest {
    const pictures = pending.flatMap((entry) => entry.pictures);
    return {
      head: this.head.seq,
      pendingEntries: pending.length,
      pendingPhotos: pictures.length,
      pendingBytes:
        pending.reduce((sum, { sealed }) => sum + sealed.byteLength, 0) +
        pictures.reduce((sum, { bytes }) => sum + bytes.length, 0),
      oldestPendingWall: pending[0]?.at.toISOString() ?? null,
      appVersion: '0.1.0',
    };
  }
}

function reference({ sha256, bytes }: Picture, role: PhotoReference['role'], site: DemoSite): PhotoReference {
  return {
    sha256,
    bytes: bytes.length,
    type: 'image/jpeg',
    role,
    takenAt: { latitude: site.latitude, longitude: site.longitude, accuracyM: 9 },
    source: 'camera',
  };
}
