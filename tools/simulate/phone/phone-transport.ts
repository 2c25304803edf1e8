import type { Sent, Transport } from '@rimeward/delivery';
import type { Network } from '../network';
import type { Office } from '../office/office';
import type { Seeded } from '../random';

/** Requests of one phone through a bad network. Parts may be cut or flipped on their way. */
export function phoneTransport(
  office: Office,
  network: Network,
  random: Seeded,
  serverNow: () => number,
  alive: (sent: Promise<Sent>) => Promise<Sent>,
): Transport {
  // A model's mistake must reject, not throw past the network.
  const soon = <T>(work: () => T): Promise<T> => Promise.resolve().then(work);
  const stamped = <T extends object>(reply: T) => ({
    ...reply,
    serverTime: new Date(serverNow()).toISOString(),
  });
  const ask = (limitMs: number, deliver: () => Promise<unknown>): Promise<Sent> =>
    alive(network.carry(limitMs, deliver));
  const spoil = (bytes: Uint8Array): Uint8Array => {
    if (!random.chance(network.faultChance / 2)) return bytes;
    const copy = bytes.slice();
    if (random.chance(0.5)) return copy.subarray(0, random.whole(0, copy.length - 1));
    const at = random.whole(0, copy.length - 1);
    copy[at] = (copy[at] ?? 0) ^ 0x10;
    return copy;
  };
  return {
    push: (batch, limitMs) => ask(limitMs, async () => stamped(await office.push(batch))),
    announce: (photos, limitMs) => ask(limitMs, () => soon(() => office.announce(photos))),
    sendPreview: (sha256, _bytes, limitMs) =>
      ask(limitMs, () => soon(() => office.storePart(sha256, -1, new Uint8Array()))),
    sendPart: (sha256, part, bytes, limitMs) =>
      ask(limitMs, () => soon(() => office.storePart(sha256, part, spoil(bytes)))),
    complete: (sha256, limitMs) => ask(limitMs, () => office.complete(sha256)),
    pull: (place, limit, limitMs) =>
      ask(limitMs, () => soon(() => stamped(office.pull(place, Math.min(limit, 20))))),
    renewSession: () => Promise.resolve('renewed'),
  };
}
