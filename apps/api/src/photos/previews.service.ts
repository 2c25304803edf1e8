import { Injectable, Logger } from '@nestjs/common';
import { CompanyContext } from '../database/company-context';
import { makePreview } from './content/make-preview';
import { sniffType } from './content/sniff-type';
import { photoRows, previewRow } from './photo-rows';
import { PhotoStorage, type PhotoKey, type StoredPicture } from './storage/photo-storage';

/** Small pictures to look at. Whatever a phone sends is drawn anew, so that only pixels are served. */
@Injectable()
export class Previews {
  private readonly logger = new Logger(Previews.name);
  /** One picture at a time: decoding is the most memory that this process ever needs. */
  private turn: Promise<unknown> = Promise.resolve();

  constructor(
    private readonly context: CompanyContext,
    private readonly storage: PhotoStorage,
  ) {}

  /** False when the bytes are no JPEG picture. */
  async takeFromPhone(photo: PhotoKey, bytes: Buffer): Promise<boolean> {
    if (sniffType(bytes) !== 'image/jpeg') return false;
    return this.draw(photo, bytes);
  }

  /** Makes the preview of a complete original when nobody has sent one. A failure is made good when it is first looked at. */
  makeSoon(photo: PhotoKey): void {
    this.make(photo).catch((error: unknown) => {
      this.logger.error({ err: error, sha256: photo.sha256 }, 'a preview could not be made');
    });
  }

  /** Null when there is neither a preview nor an original from which one can be made. */
  async open(photo: PhotoKey): Promise<StoredPicture | null> {
    const there = await this.storage.open(photo, 'preview');
    if (there !== null) return there;
    return (await this.make(photo)) ? this.storage.open(photo, 'preview') : null;
  }

  private async make(photo: PhotoKey): Promise<boolean> {
    const [row] = await this.context.run(photo.companyId, (manager) => photoRows(manager, [photo.sha256]));
    if (row?.state !== 'complete') return row?.has_preview === true;
    if (row.has_preview) {
      const there = await this.storage.open(photo, 'preview');
      there?.stream.destroy();
      if (there !== null) return true;
    }
    return this.draw(photo, this.storage.localOriginal(photo));
  }

  private async draw(photo: PhotoKey, input: string | Buffer): Promise<boolean> {
    const picture = await this.inTurn(() => makePreview(input));
    if (picture === null) return false;
    await this.storage.writePreview(photo, picture);
    await this.context.run(photo.companyId, (manager) => previewRow(manager, photo.sha256));
    return true;
  }

  private inTurn<T>(act: () => Promise<T>): Promise<T> {
    const mine = this.turn.then(act, act);
    this.turn = mine.catch(() => undefined);
    return mine;
  }
}
