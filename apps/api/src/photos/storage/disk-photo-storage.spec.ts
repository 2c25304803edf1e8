import { createHash, randomBytes } from 'node:crypto';
import { mkdtemp, readdir, readFile, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { buffer } from 'node:stream/consumers';
import { DiskPhotoStorage } from './disk-photo-storage';
import { StorageFullError, type PhotoKey } from './photo-storage';
import { whenRoom } from './storage-faults';

const companyId = '018f5b3e-0000-7000-8000-0000000000c0';

describe('photographs on the disk', () => {
  let root: string;
  let storage: DiskPhotoStorage;
  const bytes = randomBytes(700);
  const photo: PhotoKey = { companyId, sha256: createHash('sha256').update(bytes).digest('hex') };

  beforeEach(async () => {
    root = await mkdtemp(join(tmpdir(), 'photos-'));
    storage = new DiskPhotoStorage(root);
  });
  afterEach(() => rm(root, { recursive: true }));

  it('joins parts that came in any order, one of them twice', async () => {
    for (const part of [2, 0, 2, 1])
      await storage.writePart(photo, part, bytes.subarray(part * 300, part * 300 + 300));
    expect(await storage.partSizes(photo)).toEqual(
      new Map([
        [0, 300],
        [1, 300],
        [2, 100],
      ]),
    );
    const joined = await storage.join(photo, 3);
    expect(joined).toMatchObject({ sha256: photo.sha256, bytes: 700 });
    await storage.keep(photo, joined!);
    await storage.dropParts(photo);
    const opened = await storage.open(photo, 'original');
    expect(opened?.bytes).toBe(700);
    expect(await buffer(opened!.stream)).toEqual(bytes);
    expect(await readFile(join(root, companyId, photo.sha256.slice(0, 2), photo.sha256))).toEqual(bytes);
  });

  it('makes nothing of parts that have been wiped', async () => {
    await storage.writePart(photo, 0, bytes.subarray(0, 300));
    await storage.writePart(photo, 2, bytes.subarray(600));
    expect(await storage.join(photo, 3)).toBeNull();
    expect(await readdir(join(root, companyId, 'joining'))).toEqual([]);
    expect(await storage.open(photo, 'original')).toBeNull();
  });

  it('keeps what is no photograph aside, out of reach', async () => {
    await storage.writePart(photo, 0, bytes);
    await storage.setAside(photo, (await storage.join(photo, 1))!);
    expect(await storage.open(photo, 'original')).toBeNull();
    expect(await readFile(join(root, companyId, 'refused', photo.sha256))).toEqual(bytes);
  });

  it('names a full disk, and lets every other fault be what it is', async () => {
    const fail = (code: string) => () => Promise.reject(Object.assign(new Error(code), { code }));
    await expect(whenRoom(fail('ENOSPC'))).rejects.toBeInstanceOf(StorageFullError);
    await expect(whenRoom(fail('EDQUOT'))).rejects.toBeInstanceOf(StorageFullError);
    await expect(whenRoom(fail('EIO'))).rejects.not.toBeInstanceOf(StorageFullError);
  });
});
