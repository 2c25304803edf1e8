import { createServer } from 'node:net';
import { Fault } from './say.mjs';

/** A port that nobody listens on just now. */
export function freePort() {
  return listenOn(0);
}

/** The port that PORT asks for, or the default where it asks for none. */
export function portOf(text, defaultPort) {
  if (text === undefined || text === '') return defaultPort;
  const port = Number(text);
  if (!Number.isInteger(port) || port < 1 || port > 65_535)
    throw new Fault(`PORT is "${text}"; it must be a whole number from 1 to 65535.`);
  return port;
}

/** The wanted port, or the next free one above it. */
export async function portFrom(wanted) {
  for (let port = wanted; port < Math.min(wanted + 50, 65_536); port += 1) {
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
