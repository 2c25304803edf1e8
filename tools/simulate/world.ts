import { breaches } from './invariants';
import { Network } from './network';
import { Office, type OfficeFlaws } from './office/office';
import { Phone } from './phone/phone';
import { Seeded } from './random';
import { VirtualTime } from './virtual-time';

export interface RunResult {
  seed: number;
  breaches: string[];
  /** What happened, so that a run that tests nothing is noticed. */
  entries: number;
  photos: number;
  kills: number;
  restored: boolean;
}

const faultyMs = 20 * 60_000;
/** I7: everything has left this long after the last fault. A photograph's request may still be under way when it ends. */
const calmMs = 5 * 60_000;

/** One history: phones, an office and everything that goes wrong between them, from one seed. */
export async function run(seed: number, flaws: OfficeFlaws = {}): Promise<RunResult> {
  const random = new Seeded(seed);
  const time = new VirtualTime();
  const office = new Office(time, random, flaws);
  const phones = Array.from({ length: random.whole(2, 5) }, () => {
    const network = new Network(time, random);
    const phone = new Phone(time, random, office, network, random.chance(0.25) ? 2 : 1);
    return { phone, network };
  });
  const found: string[] = [];
  let kills = 0;
  for (const { phone, network } of phones) {
    network.faultChance = random.pick([0, 0.1, 0.3, 0.6]);
    phone.crashChance = random.pick([0, 0, 0.001, 0.005]);
    phone.storageFaultChance = random.pick([0, 0, 0.002]);
    phone.watch = {
      acknowledged: ({ seq, hash }) => {
        if (office.everCommitted.has(`${phone.disk.device}:${seq}:${hash}`)) return;
        found.push(`I6 ${phone.disk.device} took an acknowledgement of ${seq} that was never committed`);
      },
      photoComplete: (sha256) => {
        if (!office.everComplete.has(sha256))
          found.push(`I4 photograph ${sha256} counted before it was whole`);
      },
    };
    phone.open();
    work(time, random, phone, network, () => (kills += 1));
  }
  office.deathChance = random.pick([0, 0.05, 0.2]);
  const restores = random.chance(0.3);
  if (restores) {
    void time.sleep(random.between(60_000, faultyMs / 2)).then(() => office.takeBackup());
    void time.sleep(random.between(faultyMs / 2, faultyMs)).then(() => office.restore());
  }
  if (random.chance(0.3)) void time.sleep(random.between(0, faultyMs)).then(() => office.parts.clear());

  await time.runUntil(faultyMs);
  office.deathChance = 0;
  for (const { phone, network } of phones) {
    network.faultChance = 0;
    network.downUntilMs = 0;
    phone.crashChance = 0;
    phone.storageFaultChance = 0;
  }
  await time.runUntil(faultyMs + calmMs);
  const all = phones.map(({ phone }) => phone);
  return {
    seed,
    breaches: [...found, ...breaches(office, all)],
    entries: all.reduce((sum, phone) => sum + phone.saved.length, 0),
    photos: office.disk.complete.size,
    kills,
    restored: restores,
  };
}

/** What a person and the weather do to a phone while faults are allowed. */
function work(time: VirtualTime, random: Seeded, phone: Phone, network: Network, onKill: () => void): void {
  const until = (everyMs: number, act: () => void): void => {
    const next = async (): Promise<void> => {
      await time.sleep(random.between(0, 2 * everyMs));
      if (time.nowMs >= faultyMs) return;
      act();
      await next();
    };
    void next();
  };
  until(random.pick([5_000, 20_000, 60_000]), () => {
    const photo = random.chance(0.08) ? random.whole(1_000, 700_000) : null;
    phone.save(photo).catch(() => undefined);
  });
  until(random.pick([60_000, 300_000]), () => {
    network.downUntilMs = time.nowMs + random.pick([5_000, 60_000, 400_000]);
  });
  until(400_000, () => {
    onKill();
    phone.kill();
  });
  until(300_000, () => {
    phone.clockErrorMs = random.pick([0, -3 * 3_600_000, 2 * 86_400_000, -1_790_000_000_000]);
  });
}
