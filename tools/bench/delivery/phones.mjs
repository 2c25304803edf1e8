import { Agent, request } from 'node:http';

/** Entries a second from the first request to the last acknowledgement, each phone one batch after another. */
export async function measurePhones({ origin, phones, batch }) {
  const agent = new Agent({ keepAlive: true, maxSockets: phones.length });
  const start = performance.now();
  await Promise.all(phones.map((phone) => deliver(origin, agent, phone, batch)));
  const seconds = (performance.now() - start) / 1_000;
  agent.destroy();
  return phones.reduce((sum, { texts }) => sum + texts.length, 0) / seconds;
}

async function deliver(origin, agent, { device, secret, texts, head }, batch) {
  let answer = null;
  for (let at = 0; at < texts.length; at += batch) {
    const entries = texts.slice(at, at + batch);
    const manifest = {
      head: texts.length,
      pendingEntries: texts.length - at,
      pendingPhotos: 0,
      pendingBytes: 0,
      oldestPendingWall: null,
      appVersion: 'bench',
    };
    answer = await post(origin, agent, `Device ${device}.${secret}`, { device, manifest, entries });
    if (answer.acknowledgedThrough !== at + entries.length)
      throw new Error(`acknowledged only ${answer.acknowledgedThrough}`);
    if (answer.results.some(({ result }) => result !== 'stored')) throw new Error('an entry was not stored');
  }
  if (answer.acknowledgedHash !== head) throw new Error('the office has another chain');
}

function post(origin, agent, authorization, body) {
  const sent = JSON.stringify(body);
  return new Promise((resolve, reject) => {
    const outgoing = request(`${origin}/api/sync/push`, {
      method: 'POST',
      agent,
      headers: {
        authorization,
        'content-type': 'application/json',
        'content-length': Buffer.byteLength(sent),
      },
    });
    outgoing.once('error', reject);
    outgoing.once('response', async (incoming) => {
      let text = '';
      for await (const part of incoming.setEncoding('utf8')) text += part;
      if (incoming.statusCode === 200) resolve(JSON.parse(text));
      else reject(new Error(`${incoming.statusCode} ${text}`));
    });
    outgoing.end(sent);
  });
}
