import { existsSync, mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { Fault } from './say.mjs';

/** Keeps two launchers from one data folder; a lock whose process is gone does not count. */
export function lockDataDir(dataDir) {
  mkdirSync(dataDir, { recursive: true });
  const file = join(dataDir, 'launcher.pid');
  if (existsSync(file)) {
    const pid = Number(readFileSync(file, 'utf8'));
    if (pid !== process.pid && isLauncher(pid)) {
      throw new Fault(
        `Rimeward already runs with the data in ${dataDir} (process ${pid}). Stop it, or set DATA_DIR to another folder.`,
      );
    }
  }
  writeFileSync(file, String(process.pid));
  return () => rmSync(file, { force: true });
}

function isLauncher(pid) {
  const file = `/proc/${pid}/cmdline`;
  if (!Number.isInteger(pid) || pid <= 0) return false;
  if (existsSync('/proc/self/cmdline'))
    return existsSync(file) && readFileSync(file, 'utf8').includes('tools/');
  try {
    process.kill(pid, 0);
    return true;
  } catch (error) {
    return error.code === 'EPERM';
  }
}
