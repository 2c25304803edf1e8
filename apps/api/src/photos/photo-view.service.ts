import { Injectable } from '@nestjs/common';
import type { Principal } from '../auth/principal';
import { ProblemException } from '../common/problem.exception';
import { CompanyContext } from '../database/company-context';
import { assignedVisits } from '../sync/visibility/assigned-visits';
import { isNamedFor } from './photo-access';
import { photoRows } from './photo-rows';
import { Previews } from './previews.service';
import { PhotoStorage, type PhotoKey, type PictureKind, type StoredPicture } from './storage/photo-storage';

export interface Picture extends StoredPicture {
  type: string;
}

/** Shows photographs: to the desk those of the company, to a technician those of his own visits. */
@Injectable()
export class PhotoViewService {
  constructor(
    private readonly context: CompanyContext,
    private readonly storage: PhotoStorage,
    private readonly previews: Previews,
  ) {}

  /** @throws ProblemException `not-found`, whether it does not exist or is not for this reader */
  async open(reader: Principal, photo: PhotoKey, kind: PictureKind): Promise<Picture> {
    const row = await this.context.run(reader.companyId, async (manager) => {
      const [found] = await photoRows(manager, [photo.sha256]);
      if (found === undefined || reader.role !== 'technician') return found;
      const visits = await assignedVisits(manager, reader.userId, null);
      return (await isNamedFor(manager, photo.sha256, reader.userId, visits)) ? found : undefined;
    });
    if (row === undefined || row.state === 'refused') throw new ProblemException('not-found');
    if (kind === 'original' && row.state !== 'complete') throw new ProblemException('not-found');
    const picture =
      kind === 'preview' ? await this.previews.open(photo) : await this.storage.open(photo, kind);
    if (picture === null) throw new ProblemException('not-found');
    return { ...picture, type: kind === 'preview' ? 'image/jpeg' : row.type };
  }
}
