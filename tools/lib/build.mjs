import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { root } from './paths.mjs';
import { runShown } from './processes.mjs';
import { Fault, say } from './say.mjs';

const cache = join(root, '.cache');
const parts = {
  api: {
    inputs: ['libs', 'apps/api/src', 'apps/api/tsconfig.json', 'tsconfig.base.json', 'package-lock.json'],
    output: 'apps/api/dist/main.js',
    command: ['node_modules/.bin/tsc', ['-b', 'apps/api']],
    cwd: root,
  },
  web: {
    inputs: ['libs', 'apps/web', 'tsconfig.base.json', 'package-lock.json'],
    output: 'apps/web/dist/index.html',
    command: [join(root, 'node_modules/.bin/vite'), ['build', '--logLevel', 'warn']],
    cwd: join(root, 'apps/web'),
  },
};

/** Builds what has changed since its last build: the API with the libs, and the web application. */
export async function build(names = Object.keys(parts)) {
  mkdirSync(cache, { recursive: true });
  for (const name of names) {
    const part = parts[name];
    const mark = join(cache, `built-${name}`);
    const state = hashOf(part.inputs);
    if (existsSync(join(root, part.output)) && existsSync(mark) && readFileSync(mark, 'utf8') === state)
      continue;
    say(`Building ${name}.`);
    const [command, args] = part.command;
    const code = await runShown(command, args, { cwd: part.cwd });
    if (code !== 0) throw new Fault(`The build of ${name} failed; its messages stand above.`);
    writeFileSync(mark, state);
  }
}

const passedOver = new Set(['node_modules', 'dist']);

function hashOf(inputs) {
  const hash = createHash('sha256');
  for (const input of inputs) add(hash, join(root, input));
  return hash.digest('hex');
}

function add(hash, path) {
  const entries = readdirSafely(path);
  if (entries === null) {
    hash.update(path).update(readFileSync(path));
    return;
  }
  for (const entry of entries.sort((a, b) => (a.name < b.name ? -1 : 1))) {
    if (
      passedOver.has(entry.name) ||
      entry.name.endsWith('.tsbuildinfo') ||
      /\.(test|spec)\.tsx?$/.test(entry.name)
    )
      continue;
    add(hash, join(path, entry.name));
  }
}

function readdirSafely(path) {
  try {
    return readdirSync(path, { withFileTypes: true });
  } catch (error) {
    if (error.code === 'ENOTDIR') return null;
    throw error;
  }
}
