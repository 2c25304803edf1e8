import { createServer } from 'node:net';

/** A port that nobody listens on just now. */
export function freePort() {
  return listenOn(0);
}

/** The wanted port, or the next free one above it. */
export async function portFrom(wanted) {
  for (let port = wanted; port < wanted + 50; port += 1) {
    if (await isFree(port)) return port;
  }
  return freePort();
}

async function isFree(port) {
  try {
    await listenOn(port);
    return true;
  } catch {
    return false;
  }
}

function listenOn(port) {
  return new Promise((resolve, reject) => {
    const probe = createServer();
    probe.once('error', reject);
    probe.listen(port, '127.0.0.1', () => {
      const { port: got } = probe.address();
      probe.close(() => resolve(got));
    });
  });
}
