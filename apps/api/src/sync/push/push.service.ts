import { Injectable } from '@nestjs/common';
import type { PushRequest, PushResponse } from '@rimeward/contracts';
import type { EntityManager } from 'typeorm';
import type { DevicePrincipal } from '../../auth/device.guard';
import { CompanyContext } from '../../database/company-context';
import { ProjectionService } from '../../projection/projection.service';
import { markStale } from '../feed/feed.service';
import { appendEntries, knownEntries, lockChain } from './chain-store';
import { KnownVisits } from './known-visits';
import { missingPhotos, referPhotos } from './photo-references';
import { placeEntries, type ChainHead, type Placement } from './place-entries';
import { readEntry, type ReadEntry } from './read-entry';
import { Receipts } from './receipts';
import { keepStrays } from './stray-store';

interface Kept {
  results: PushResponse['results'];
  head: ChainHead;
  missing: string[];
  changed: boolean;
}

/** Takes what phones send. An answer leaves only after the database has committed what it acknowledges. */
@Injectable()
export class PushService {
  constructor(
    private readonly context: CompanyContext,
    private readonly visits: KnownVisits,
    private readonly projections: ProjectionService,
    private readonly receipts: Receipts,
  ) {}

  async push(device: DevicePrincipal, request: PushRequest): Promise<PushResponse> {
    const batch = request.entries.map(readEntry);
    const kept = await this.context.run(device.companyId, (manager) =>
      this.keep(manager, device, request, batch),
    );
    if (kept.changed) this.projections.wake(device.companyId);
    const { seq, hash } = kept.head;
    const now = new Date();
    return {
      acknowledgedThrough: seq,
      acknowledgedHash: seq === 0 ? null : hash,
      results: kept.results,
      serverTime: now.toISOString(),
      receipt: seq === 0 ? null : this.receipts.sign(device, { seq, hash }, now),
      missingPhotos: kept.missing,
    };
  }

  private async keep(
    manager: EntityManager,
    device: DevicePrincipal,
    { manifest }: PushRequest,
    batch: readonly ReadEntry[],
  ): Promise<Kept> {
    const head = await lockChain(manager, device.deviceId, manifest);
    const placement = placeEntries(batch, {
      company: device.companyId,
      device: device.deviceId,
      deviceRevoked: device.revoked,
      head,
      firstPending: manifest.head - manifest.pendingEntries + 1,
      known: await this.known(manager, device.deviceId, head, batch),
      visits: await this.visits.among(manager, device.companyId, batch),
      person: device.userId,
    });
    const { visits, named } = await this.write(manager, device.deviceId, placement);
    return {
      results: placement.results,
      head: placement.head,
      missing: named ? await missingPhotos(manager, device.deviceId) : head.missing,
      changed: visits.length > 0,
    };
  }

  private async known(
    manager: EntityManager,
    device: string,
    head: ChainHead,
    batch: readonly ReadEntry[],
  ): ReturnType<typeof knownEntries> {
    const seqs = batch.flatMap(({ header }) => (header?.device === device ? [header.seq] : []));
    const readable = seqs.length === batch.length;
    const from = Math.min(...seqs, readable ? Infinity : head.seq) - (readable ? 0 : batch.length);
    return knownEntries(
      manager,
      device,
      from,
      Math.min(head.seq, Math.max(...seqs, readable ? 0 : head.seq)),
    );
  }

  /** Marks before positions: whatever waits for other locks must not hold the company's counter. */
  private async write(
    manager: EntityManager,
    device: string,
    { append, strays, head }: Placement,
  ): Promise<{ visits: string[]; named: boolean }> {
    const visits = visitsOf([...append, ...strays]);
    if (strays.length > 0 && visits.length > 0) await markStale(manager, visits);
    let named = false;
    if (append.length > 0) {
      const positions = await appendEntries(manager, device, append, head, visits);
      named = await referPhotos(manager, device, append, positions);
    }
    await keepStrays(manager, device, strays);
    return { visits, named };
  }
}

function visitsOf(entries: readonly { entry: ReadEntry }[]): string[] {
  return [...new Set(entries.flatMap(({ entry }) => entry.visit ?? []))];
}
