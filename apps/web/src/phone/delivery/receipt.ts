import type { ReceiptReading } from '@rimeward/delivery';
import type { Enrolment } from '../database/schema';
import { readJws } from '../device/jws';

/** Reads the office's signed receipt with the key that was given at enrolment or with the last lease. */
export async function readReceipt(receipt: string, enrolment: Enrolment): Promise<ReceiptReading | null> {
  const reading = await readJws(receipt, enrolment.verifyKey);
  if (reading === null) return null;
  const { typ, device, acknowledgedThrough, hash } = reading.claims;
  if (typ !== 'receipt' || typeof device !== 'string' || typeof hash !== 'string') return null;
  if (typeof acknowledgedThrough !== 'number') return null;
  return { device, acknowledgedThrough, hash, verified: reading.genuine };
}
