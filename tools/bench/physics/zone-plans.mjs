/**
 * How many zone plans a second one core computes, and whether the heap stays flat over a million of them.
 * `node --expose-gc tools/bench/physics/zone-plans.mjs` from a checkout; it compiles the library first and starts itself again with
 * `--expose-gc` where that is missing. Ends with 1 when a limit is not met.
 */
import { execFileSync, spawnSync } from 'node:child_process';
import { createRequire } from 'node:module';
import { join } from 'node:path';
import { sampleInput } from './sample-system.mjs';

const limitPlansPerSecond = 20_000;
const limitHeapGrowthMb = 2;
const plansInAll = 1_000_000;

const root = join(import.meta.dirname, '../../..');
if (typeof globalThis.gc !== 'function') {
  const { status } = spawnSync(process.execPath, ['--expose-gc', import.meta.filename], { stdio: 'inherit' });
  process.exit(status ?? 1);
}
execFileSync(join(root, 'node_modules/.bin/tsc'), ['-b', 'libs/pneumatics'], { cwd: root, stdio: 'inherit' });
const { planSystem, planZone } = createRequire(import.meta.url)(join(root, 'libs/pneumatics/dist/index.js'));

const zones = sampleInput.system.zones;
const complete = planSystem(sampleInput).zones.every((zone) =>
  Object.values(zone).every((figure) => typeof figure !== 'object' || figure.ok),
);
if (!complete) throw new Error('the sample leaves a figure out: the measurement would flatter');

/** Runs `work` until it has made `plans` plans: plans per second of processor time (all threads), and by the clock on the wall. */
function rate(plans, work) {
  const processor = process.cpuUsage();
  const from = performance.now();
  let made = 0;
  while (made < plans) made += work();
  const wallSeconds = (performance.now() - from) / 1000;
  const { user, system } = process.cpuUsage(processor);
  return { perSecond: (made * 1e6) / (user + system), wallPerSecond: made / wallSeconds };
}

const bySystem = () => planSystem(sampleInput).zones.length;
let next = 0;
const oneByOne = () => {
  const at = next++ % zones.length;
  planZone(sampleInput, zones[at], at === 0);
  return 1;
};

rate(20_000, bySystem);
rate(20_000, oneByOne);
globalThis.gc();
const heapBefore = process.memoryUsage().heapUsed;
const perSystem = rate(plansInAll / 2, bySystem);
const perZone = rate(plansInAll / 2, oneByOne);
globalThis.gc();
const growthMb = (process.memoryUsage().heapUsed - heapBefore) / 2 ** 20;

const line = (name, value, limit) => console.log(`${name.padEnd(52)} ${value.padStart(10)}   limit ${limit}`);
line(
  'zone plans per processor second, systems of eight',
  perSystem.perSecond.toFixed(0),
  `${limitPlansPerSecond}`,
);
line('  by the clock on the wall', perSystem.wallPerSecond.toFixed(0), 'none');
line('zone plans per processor second, one by one', perZone.perSecond.toFixed(0), `${limitPlansPerSecond}`);
line('  by the clock on the wall', perZone.wallPerSecond.toFixed(0), 'none');
line(`heap growth over ${plansInAll} plans, MB`, growthMb.toFixed(2), `${limitHeapGrowthMb}`);
const slowest = Math.min(perSystem.perSecond, perZone.perSecond);
process.exitCode = slowest >= limitPlansPerSecond && growthMb <= limitHeapGrowthMb ? 0 : 1;
