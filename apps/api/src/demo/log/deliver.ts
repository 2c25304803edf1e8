import type { INestApplicationContext } from '@nestjs/common';
import { photoLimits, pushLimits } from '@rimeward/contracts';
import { createHash, randomBytes } from 'node:crypto';
import type { DevicePrincipal } from '../../auth/device.guard';
import { CompanyContext } from '../../database/company-context';
import { Device } from '../../devices/entities/device.entity';
import { PhotoIntakeService } from '../../photos/photo-intake.service';
import { PushService } from '../../sync/push/push.service';
import { demoCompany } from '../world/company';
import type { DemoPhone } from './demo-phone';
import type { Picture } from './picture';

const companyId = demoCompany.id;

/** Enrols the phone, unless it is known, with a secret that nobody keeps: nobody can send as it afterwards. */
export async function enrol(app: INestApplicationContext, phone: DemoPhone, at: Date): Promise<void> {
  await app.get(CompanyContext).run(companyId, async (manager) => {
    if (await manager.existsBy(Device, { companyId, id: phone.id })) return;
    await manager.insert(Device, {
      companyId,
      id: phone.id,
      userId: phone.owner.id,
      name: `${phone.owner.name.split(' ')[0]}’s phone`,
      platform: 'Demo phone',
      secretHash: createHash('sha256').update(randomBytes(32)).digest(),
      enrolledAt: at,
    });
  });
}

/** Sends all but the last `pending` entries, and their photographs, by the way that every phone's work takes. */
export async function deliver(app: INestApplicationContext, phone: DemoPhone, pending = 0): Promise<void> {
  const pushes = app.get(PushService, { strict: false });
  const device: DevicePrincipal = { deviceId: phone.id, companyId, userId: phone.owner.id, revoked: false };
  const going = phone.written.slice(0, phone.written.length - pending);
  for (let start = 0; start < going.length; start += pushLimits.entries / 2) {
    const batch = going.slice(start, start + pushLimits.entries / 2);
    await pushes.push(device, {
      device: phone.id,
      manifest: phone.manifest(phone.written.slice(start + batch.length)),
      entries: batch.map(({ sealed }) => sealed.text),
    });
  }
  const pictures = going.flatMap((entry) => entry.pictures);
  if (pictures.length > 0) await sendPictures(app.get(PhotoIntakeService, { strict: false }), pictures);
}

async function sendPictures(intake: PhotoIntakeService, pictures: readonly Picture[]): Promise<void> {
  const photos = pictures.map(({ sha256, bytes }) => ({
    sha256,
    bytes: bytes.length,
    type: 'image/jpeg' as const,
  }));
  for (let start = 0; start < photos.length; start += 100) {
    await intake.announce(companyId, { photos: photos.slice(start, start + 100) });
  }
  for (const { sha256, bytes } of pictures) {
    const key = { companyId, sha256 };
    for (let part = 0; part * photoLimits.partBytes < bytes.length; part += 1) {
      const from = part * photoLimits.partBytes;
      await intake.takePart(key, part, bytes.subarray(from, from + photoLimits.partBytes));
    }
    await intake.complete(key);
  }
}
