import { Injectable } from '@nestjs/common';
import { photoLimits, type AnnounceRequest, type PhotoState } from '@rimeward/contracts';
import { ProblemException } from '../common/problem.exception';
import { CompanyContext } from '../database/company-context';
import { readExif } from './content/read-exif';
import { sniffType } from './content/sniff-type';
import { missingParts, partCount, partSize } from './part-plan';
import { announceRows, completeRow, photoRows, refuseRow, type PhotoRow } from './photo-rows';
import { Previews } from './previews.service';
import { PhotoStorage, StorageFullError, type JoinedPhoto, type PhotoKey } from './storage/photo-storage';

/** Takes photographs in parts. One counts as proof only when it is whole, checked and on the disk. */
@Injectable()
export class PhotoIntakeService {
  constructor(
    private readonly context: CompanyContext,
    private readonly storage: PhotoStorage,
    private readonly previews: Previews,
  ) {}

  async announce(companyId: string, { photos }: AnnounceRequest): Promise<PhotoState[]> {
    const judged = photos.map((photo) => ({
      ...photo,
      refusedBecause: photo.bytes > photoLimits.originalBytes ? 'photo-too-large' : null,
    }));
    const once = [...new Map(judged.map((photo) => [photo.sha256, photo])).values()];
    const sha256s = once.map(({ sha256 }) => sha256);
    const rows = await this.context.run(companyId, async (manager) => {
      await announceRows(manager, once);
      return photoRows(manager, sha256s);
    });
    if (rows.length !== once.length) throw new Error('announced photographs were not written');
    const states = await Promise.all(rows.map((row) => this.stateOf(companyId, row)));
    const bySha = new Map(states.map((state) => [state.sha256, state]));
    return sha256s.flatMap((sha256) => bySha.get(sha256) ?? []);
  }

  async takePart(photo: PhotoKey, part: number, bytes: Buffer): Promise<PhotoState> {
    const row = await this.announced(photo);
    if (row.state !== 'partial') return this.stateOf(photo.companyId, row);
    const due = partSize(row.bytes, part);
    if (due === 0 || due !== bytes.length) {
      throw new ProblemException('bad-request', { fields: [{ path: 'part', fault: 'invalid' }] });
    }
    await roomOrProblem(() => this.storage.writePart(photo, part, bytes));
    return this.stateOf(photo.companyId, row);
  }

  async takePreview(photo: PhotoKey, bytes: Buffer): Promise<PhotoState> {
    const row = await this.announced(photo);
    if (row.state === 'refused' || row.has_preview) return this.stateOf(photo.companyId, row);
    const kept = await roomOrProblem(() => this.previews.takeFromPhone(photo, bytes));
    if (!kept) throw new ProblemException('photo-type-refused');
    return this.stateOf(photo.companyId, { ...row, has_preview: true });
  }

  async complete(photo: PhotoKey): Promise<PhotoState> {
    const row = await this.announced(photo);
    if (row.state === 'partial') {
      const sizes = await this.storage.partSizes(photo);
      if (missingParts(row.bytes, sizes).length > 0) return this.stateOf(photo.companyId, row);
      const joined = await roomOrProblem(() => this.storage.join(photo, partCount(row.bytes)));
      if (joined !== null) await this.judge(photo, joined);
    }
    return this.stateOf(photo.companyId, await this.announced(photo));
  }

  private async judge(photo: PhotoKey, joined: JoinedPhoto): Promise<void> {
    if (joined.sha256 !== photo.sha256) {
      await this.storage.drop(joined);
      await this.storage.dropParts(photo);
      throw new ProblemException('photo-hash-mismatch');
    }
    const type = sniffType(joined.start);
    if (type === null) {
      await this.storage.setAside(photo, joined);
      await this.context.run(photo.companyId, (manager) =>
        refuseRow(manager, photo.sha256, 'photo-type-refused'),
      );
      await this.storage.dropParts(photo);
      throw new ProblemException('photo-type-refused');
    }
    await roomOrProblem(() => this.storage.keep(photo, joined));
    const exif = await readExif(this.storage.localOriginal(photo));
    await this.context.run(photo.companyId, (manager) => completeRow(manager, photo.sha256, type, exif));
    await this.storage.dropParts(photo);
    this.previews.makeSoon(photo);
  }

  private async announced(photo: PhotoKey): Promise<PhotoRow> {
    const [row] = await this.context.run(photo.companyId, (manager) => photoRows(manager, [photo.sha256]));
    if (row === undefined) throw new ProblemException('not-found');
    return row;
  }

  private async stateOf(companyId: string, row: PhotoRow): Promise<PhotoState> {
    const { sha256, state } = row;
    const parts =
      state === 'partial' ? missingParts(row.bytes, await this.storage.partSizes({ companyId, sha256 })) : [];
    return {
      sha256,
      state,
      missingParts: parts,
      hasPreview: row.has_preview,
      ...(row.refused_because !== null && { refusedBecause: row.refused_because }),
    };
  }
}

async function roomOrProblem<T>(act: () => Promise<T>): Promise<T> {
  try {
    return await act();
  } catch (error) {
    if (error instanceof StorageFullError) throw new ProblemException('storage-full');
    throw error;
  }
}
