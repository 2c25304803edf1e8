import { emptyChain, verifyChain } from '@rimeward/delivery';
import { codec, sha256Hex } from './codec';
import type { Office } from './office/office';
import type { Phone } from './phone/phone';

/**
 * What must hold at the end of a run, each breach a sentence that begins with its number. I6 is watched at every
 * acknowledgement by the world; here only its trace on the disk is.
 */
export function breaches(office: Office, phones: readonly Phone[]): string[] {
  return [
    ...phones.flatMap((phone) => savedIsSomewhere(office, phone)),
    ...phones.flatMap((phone) => chainIsDense(office, phone)),
    ...photosAreWhole(office, phones),
    ...phones.flatMap((phone) => feedWasReadOnce(office, phone)),
    ...phones.flatMap(outboxMatchesAcknowledgement),
    ...phones.flatMap(queueIsEmpty),
  ];
}

function savedIsSomewhere(office: Office, { disk, saved }: Phone): string[] {
  const atOffice = new Set(
    office.disk.rows.filter((row) => row.device === disk.device).map((row) => row.text),
  );
  return saved
    .filter(({ seq, text }) => !atOffice.has(text) && disk.entries.get(seq)?.text !== text)
    .map(({ seq }) => `I1 entry ${seq} of ${disk.device} was called saved and is nowhere`);
}

function chainIsDense(office: Office, { disk }: Phone): string[] {
  const rows = office.disk.rows.filter((row) => row.device === disk.device && row.held !== 'fork');
  const bySeq = [...rows].sort((a, b) => a.seq - b.seq || a.position - b.position);
  const verdict = verifyChain(disk.device, emptyChain, bySeq, codec);
  if (!verdict.ok) return [`I2 chain of ${disk.device} at the office: ${verdict.fault} at ${verdict.index}`];
  return bySeq
    .filter((row) => disk.entries.get(row.seq)?.text !== row.text)
    .map((row) => `I2 entry ${row.seq} of ${disk.device} has other bytes at the office`);
}

function photosAreWhole(office: Office, phones: readonly Phone[]): string[] {
  const wrong = [...office.disk.complete]
    .filter(([sha256, content]) => sha256Hex(content) !== sha256)
    .map(([sha256]) => `I4 photograph ${sha256} counts and is another`);
  const missing = phones.flatMap(({ disk }) =>
    [...disk.photos]
      .filter(([sha256, { state }]) => state === 'complete' && !office.disk.complete.has(sha256))
      .map(([sha256]) => `I4 photograph ${sha256} counts as delivered and is not at the office`),
  );
  return [...wrong, ...missing];
}

function feedWasReadOnce(office: Office, { disk }: Phone): string[] {
  if (disk.place.epoch !== null && disk.place.epoch !== office.disk.epoch)
    return [`I5 ${disk.device} still reads epoch ${disk.place.epoch}`];
  const committed = office.disk.rows.map(({ position }) => position).sort((a, b) => a - b);
  const readable = committed.filter((position) => position <= disk.place.cursor);
  if (
    disk.seen.length === readable.length &&
    disk.seen.every((position, index) => position === readable[index])
  ) {
    return readable.length === committed.length
      ? []
      : [`I5 ${disk.device} stopped reading at ${disk.place.cursor}`];
  }
  return [
    `I5 ${disk.device} read ${disk.seen.length} of ${readable.length} positions up to ${disk.place.cursor}, or not in order`,
  ];
}

function outboxMatchesAcknowledgement({ disk }: Phone): string[] {
  const wanting = [...disk.entries.keys()].filter(
    (seq) => seq > disk.acknowledged.seq && !disk.outbox.has(seq),
  );
  return wanting.map(
    (seq) => `I6 entry ${seq} of ${disk.device} left the outbox without a stored acknowledgement`,
  );
}

function queueIsEmpty({ disk, lastStatus }: Phone): string[] {
  const photos = [...disk.photos.values()].filter(({ state }) => state === 'pending').length;
  if (disk.outbox.size === 0 && photos === 0) return [];
  return [
    `I7 ${disk.device} still holds ${disk.outbox.size} entries and ${photos} photographs (${lastStatus?.reason ?? 'no reason'})`,
  ];
}
