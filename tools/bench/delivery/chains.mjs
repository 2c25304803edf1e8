import { createHash, randomBytes, randomUUID } from 'node:crypto';

/** Hash rule of the chain: SHA-256 over the previous hash's 32 bytes and the exact text. */
const link = (prev, text) => createHash('sha256').update(prev, 'hex').update(text).digest('hex');

/** Ready chains of a company's phones: gauge readings of about 550 bytes, a visit's worth of them under each visit. */
export function makeChains({ company, actor, visits, phones, entries }) {
  const each = entries / phones;
  let visit = 0;
  return Array.from({ length: phones }, () => {
    const device = randomUUID();
    let prev = '0'.repeat(64);
    const texts = [];
    for (let seq = 1; seq <= each; seq += 1) {
      if (seq % 60 === 1) visit = (visit + 1) % visits.length;
      const text = sealed({ device, seq, prev, company, actor, visit: visits[visit] });
      prev = link(prev, text);
      texts.push(text);
    }
    return { device, secret: randomBytes(32).toString('base64url'), texts, head: prev };
  });
}

function sealed({ device, seq, prev, company, actor, visit }) {
  const entry = {
    actor,
    app: 'bench',
    body: { cycleId: randomUUID(), pressurePsi: 40 + (seq % 20) },
    company,
    device,
    id: randomUUID(),
    photos: [],
    prev,
    seq,
    time: {
      offsetAgeMs: 0,
      offsetMs: 0,
      wall: new Date(Date.UTC(2026, 9, 12) + seq * 1_000).toISOString(),
      zone: 'UTC',
    },
    type: 'gauge-read',
    typeVersion: 1,
    v: 1,
    visit,
  };
  return JSON.stringify(entry);
}
