import { dirname, join, resolve } from 'node:path';
import { fileURLToPath } from 'node:url';

export const root = dirname(dirname(dirname(fileURLToPath(import.meta.url))));

/** Where the start command keeps its data: DATA_DIR, or a folder of the project that git does not see. */
export function startDataDir() {
  return process.env.DATA_DIR ? resolve(process.env.DATA_DIR) : join(root, '.data', 'start');
}
