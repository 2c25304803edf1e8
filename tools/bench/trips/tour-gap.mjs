/**
 * Order of stops against known optima: gap (limit 2 %) and time (limit 300 ms of one core), the worst of the seeds. The
 * limit holds for processor time, which other work on the machine does not lengthen much; the clock is printed beside it.
 * TSPLIB instances against their published optima; random uniform instances of 100 stops against the exact optimum
 * (exact-optima.py, integer program), and in this same run against a 1-tree bound and a long simulated annealing.
 * Needs the libs built (tsc -b). Exits 1 when a limit is broken.
 */
import { readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { annealedLength, oneTreeBound } from './independent.mjs';

const { costMatrix, orderStops, seededRandom, shortestTour } = createRequire(import.meta.url)(
  '@rimeward/trips',
);

const gapLimit = 0.02;
const msLimit = 300;
const seeds = [1, 2, 3, 4, 5, 6, 7, 8, 9, 10];
const fixtures = new URL('../../../libs/trips/fixtures/', import.meta.url);
let broken = 0;

const rows = (name) =>
  readFileSync(new URL(`${name}.csv`, fixtures), 'utf8')
    .trim()
    .split('\n')
    .slice(1)
    .map((line) => line.split(','));

const plane = (nodes) => (a, b) =>
  Math.floor(Math.hypot(nodes[a][0] - nodes[b][0], nodes[a][1] - nodes[b][1]) + 0.5);

function geo(nodes) {
  const radians = (value) => (3.141592 * (Math.trunc(value) + (5 * (value - Math.trunc(value))) / 3)) / 180;
  const angles = nodes.map(([latitude, longitude]) => [radians(latitude), radians(longitude)]);
  return (a, b) => {
    const q1 = Math.cos(angles[a][1] - angles[b][1]);
    const q2 = Math.cos(angles[a][0] - angles[b][0]);
    const q3 = Math.cos(angles[a][0] + angles[b][0]);
    return Math.floor(6378.388 * Math.acos(0.5 * ((1 + q1) * q2 - (1 - q1) * q3)) + 1);
  };
}

/** Value of a call, the processor time it took (all threads of the process), and the time on the clock. */
function timed(call) {
  const start = performance.now();
  const before = process.cpuUsage();
  const result = call();
  const { user, system } = process.cpuUsage(before);
  if (!result.ok) throw new Error(JSON.stringify(result.error));
  return { value: result.value, ms: (user + system) / 1000, clockMs: performance.now() - start };
}

/** Worst length and worst times over the seeds. */
function worst(costs) {
  const runs = seeds.map((seed) =>
    timed(() => shortestTour(costs, { end: 'closed', random: seededRandom(seed) })),
  );
  return { length: Math.max(...runs.map(({ value }) => value.length)), ...worstTimes(runs) };
}

const worstTimes = (runs) => ({
  ms: Math.max(...runs.map(({ ms }) => ms)),
  clockMs: Math.max(...runs.map(({ clockMs }) => clockMs)),
});
const times = ({ ms, clockMs }) => `${ms.toFixed(0).padStart(4)} ms (${clockMs.toFixed(0)} on the clock)`;

function line(name, optimum, found, more = '') {
  const { length, ms } = found;
  const gap = length / optimum - 1;
  const good = gap <= gapLimit && gap >= 0 && ms <= msLimit;
  if (!good) broken++;
  console.log(
    `${name.padEnd(14)} optimum ${String(optimum).padStart(6)}  worst ${String(length).padStart(6)}  ` +
      `gap ${(gap * 100).toFixed(2).padStart(5)} %  ${times(found)}  ${good ? 'ok' : 'BROKEN'}${more}`,
  );
}

console.log(
  `order of stops, worst of ${seeds.length} seeds; limits: gap 2 %, ${msLimit} ms of processor time (the first line includes warming up)`,
);
const tsplib = [
  ['kroA100', 21282, plane],
  ['burma14', 3323, geo],
  ['ulysses16', 6859, geo],
  ['eil51', 426, plane],
  ['berlin52', 7542, plane],
  ['st70', 675, plane],
  ['eil76', 538, plane],
];
for (const [name, optimum, distances] of tsplib) {
  const nodes = rows(name).map(([, x, y]) => [Number(x), Number(y)]);
  line(name, optimum, worst(costMatrix(nodes.length, distances(nodes))));
}

const exact = new Map(rows('exact_optima').map(([name, optimum]) => [name, Number(optimum)]));
for (let k = 1; k <= 5; k++) {
  const name = `uniform100_${k}`;
  const nodes = rows(name).map(([, x, y]) => [Number(x), Number(y)]);
  const distance = plane(nodes);
  const found = worst(costMatrix(nodes.length, distance));
  const bound = oneTreeBound(nodes.length, distance, found.length);
  const annealed = annealedLength(nodes.length, distance, seededRandom(k));
  const percent = (reference) => `${((found.length / reference - 1) * 100).toFixed(2)} %`;
  if (found.length > bound * (1 + gapLimit) || found.length > annealed * (1 + gapLimit)) broken++;
  line(
    name,
    exact.get(name),
    found,
    `   over the 1-tree bound ${percent(bound)}, over annealing ${percent(annealed)}`,
  );
}

for (const count of [10, 25, 100]) {
  const found = worstTimes(
    seeds.map((seed) => timed(() => orderStops(dayWithWindows(count, seededRandom(seed * 97))))),
  );
  if (found.ms > msLimit) broken++;
  console.log(
    `${count} stops, half with windows: ${times(found)} at worst  ${found.ms <= msLimit ? 'ok' : 'BROKEN'}`,
  );
}
process.exitCode = broken > 0 ? 1 : 0;

function dayWithWindows(count, random) {
  const stops = Array.from({ length: count }, (_, at) => {
    const fromMinute = 480 + Math.floor(random() * 420);
    const location = { latitude: 41 + random() * 0.3, longitude: -96 + random() * 0.3 };
    const window = at % 2 === 0 ? { window: { fromMinute, toMinute: fromMinute + 120 } } : {};
    return { id: `stop ${at}`, location, serviceMinutes: 15, ...window };
  });
  return { yard: { latitude: 41.1, longitude: -96.1 }, stops, departMinute: 450, random };
}
