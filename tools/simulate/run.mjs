// npm run simulate -- --seeds 200 [--from 1]: many histories of phones and office, each repeatable from its seed.
import { spawnSync } from 'node:child_process';
import { parseArgs } from 'node:util';

const { values } = parseArgs({
  options: { seeds: { type: 'string', default: '200' }, from: { type: 'string', default: '1' } },
});
const run = spawnSync(
  'npx',
  ['vitest', 'run', '--config', 'tools/simulate/vitest.config.mts', '--silent=false'],
  {
    stdio: 'inherit',
    env: { ...process.env, SIMULATE_SEEDS: values.seeds, SIMULATE_FROM: values.from },
  },
);
process.exit(run.status ?? 1);
