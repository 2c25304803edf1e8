import { createHash, randomUUID } from 'node:crypto';
import { createReadStream } from 'node:fs';
import { mkdir, open, readdir, readFile, rename, rm, stat, writeFile } from 'node:fs/promises';
import { dirname, join } from 'node:path';
import {
  PhotoStorage,
  type JoinedPhoto,
  type PhotoKey,
  type PictureKind,
  type StoredPicture,
} from './photo-storage';
import { codeOf, whenRoom } from './storage-faults';

const startBytes = 64;

/** Photographs as files: `<company>/<aa>/<sha256>`, parts beside them until they are joined. */
export class DiskPhotoStorage extends PhotoStorage {
  constructor(private readonly root: string) {
    super();
  }

  async partSizes(photo: PhotoKey): Promise<Map<number, number>> {
    const folder = this.partsFolder(photo);
    const sizes = new Map<number, number>();
    for (const name of await namesIn(folder)) {
      if (/^\d+$/.test(name)) sizes.set(Number(name), (await stat(join(folder, name))).size);
    }
    return sizes;
  }

  writePart(photo: PhotoKey, part: number, bytes: Buffer): Promise<void> {
    return replaceFile(join(this.partsFolder(photo), String(part)), bytes);
  }

  async join(photo: PhotoKey, parts: number): Promise<JoinedPhoto | null> {
    const place = join(this.root, photo.companyId, 'joining', randomUUID());
    try {
      return await whenRoom(() => this.joinInto(place, photo, parts));
    } catch (error) {
      await rm(place, { force: true });
      if (codeOf(error) === 'ENOENT') return null;
      throw error;
    }
  }

  private async joinInto(place: string, photo: PhotoKey, parts: number): Promise<JoinedPhoto> {
    await mkdir(dirname(place), { recursive: true });
    const hash = createHash('sha256');
    const file = await open(place, 'wx');
    let bytes = 0;
    let start = Buffer.alloc(0);
    try {
      for (let part = 0; part < parts; part += 1) {
        const chunk = await readFile(join(this.partsFolder(photo), String(part)));
        if (part === 0) start = Buffer.from(chunk.subarray(0, startBytes));
        hash.update(chunk);
        bytes += chunk.length;
        await file.writeFile(chunk);
      }
      await file.sync();
    } finally {
      await file.close();
    }
    return { place, sha256: hash.digest('hex'), bytes, start };
  }

  async keep(photo: PhotoKey, joined: JoinedPhoto): Promise<void> {
    await moveForGood(joined.place, this.pathOf(photo, 'original'));
  }

  async setAside(photo: PhotoKey, joined: JoinedPhoto): Promise<void> {
    await moveForGood(joined.place, join(this.root, photo.companyId, 'refused', photo.sha256));
  }

  async dropParts(photo: PhotoKey): Promise<void> {
    await rm(this.partsFolder(photo), { recursive: true, force: true });
  }

  async drop(joined: JoinedPhoto): Promise<void> {
    await rm(joined.place, { force: true });
  }

  writePreview(photo: PhotoKey, bytes: Buffer): Promise<void> {
    return replaceFile(this.pathOf(photo, 'preview'), bytes);
  }

  async open(photo: PhotoKey, kind: PictureKind): Promise<StoredPicture | null> {
    const path = this.pathOf(photo, kind);
    try {
      const { size } = await stat(path);
      return { stream: createReadStream(path), bytes: size };
    } catch (error) {
      if (codeOf(error) === 'ENOENT') return null;
      throw error;
    }
  }

  localOriginal(photo: PhotoKey): string {
    return this.pathOf(photo, 'original');
  }

  private partsFolder({ companyId, sha256 }: PhotoKey): string {
    return join(this.root, companyId, 'parts', sha256);
  }

  private pathOf({ companyId, sha256 }: PhotoKey, kind: PictureKind): string {
    const name = kind === 'original' ? sha256 : `${sha256}.preview.jpg`;
    return join(this.root, companyId, sha256.slice(0, 2), name);
  }
}

async function namesIn(folder: string): Promise<string[]> {
  try {
    return await readdir(folder);
  } catch (error) {
    if (codeOf(error) === 'ENOENT') return [];
    throw error;
  }
}

/** Whole or not at all, whatever happens in between. */
async function replaceFile(path: string, bytes: Buffer): Promise<void> {
  const meanwhile = `${path}.${randomUUID()}`;
  try {
    await whenRoom(async () => {
      await mkdir(dirname(path), { recursive: true });
      await writeFile(meanwhile, bytes);
      await rename(meanwhile, path);
    });
  } catch (error) {
    await rm(meanwhile, { force: true });
    throw error;
  }
}

/** The file's bytes have been synced; the new name is synced with its folder. */
async function moveForGood(from: string, to: string): Promise<void> {
  await whenRoom(async () => {
    await mkdir(dirname(to), { recursive: true });
    await rename(from, to);
    const folder = await open(dirname(to), 'r');
    try {
      await folder.sync();
    } finally {
      await folder.close();
    }
  });
}
