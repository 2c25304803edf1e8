import { existsSync, readFileSync, rmSync } from 'node:fs';
import { join } from 'node:path';

/** Where the process id of the running API stands, so that a launcher after a crash can find it. */
export function apiPidFile(dataDir) {
  return join(dataDir, 'api.pid');
}

/** Stops the API that a killed launcher left behind: it would keep the port. A number that now belongs to another program is left alone. */
export async function stopLeftoverApi(dataDir, script, limitMs = 8_000) {
  const file = apiPidFile(dataDir);
  if (!existsSync(file)) return false;
  const pid = Number(readFileSync(file, 'utf8'));
  const runs = () => commandOf(pid).includes(script);
  const found = runs();
  const hardAt = Date.now() + limitMs;
  if (found) process.kill(pid, 'SIGTERM');
  while (runs()) {
    if (Date.now() > hardAt) process.kill(pid, 'SIGKILL');
    await new Promise((resolve) => setTimeout(resolve, 50));
  }
  rmSync(file, { force: true });
  return found;
}

/** The words of a process's command line; none when it is gone. */
function commandOf(pid) {
  const place = `/proc/${pid}/cmdline`;
  if (!Number.isInteger(pid) || pid <= 0 || !existsSync(place)) return [];
  return readFileSync(place, 'utf8').split('\0');
}
