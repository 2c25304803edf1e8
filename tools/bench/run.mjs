import { readdirSync } from 'node:fs';
import { join } from 'node:path';
import { build } from '../lib/build.mjs';
import { checkNode, installPackages } from '../lib/packages.mjs';
import { root } from '../lib/paths.mjs';
import { runShown } from '../lib/processes.mjs';
import { Fault, run, say } from '../lib/say.mjs';

/** The programs that measure; the other files beside them are their parts. */
const benches = ['delivery/delivery.mjs', 'phone/save.mjs', 'physics/zone-plans.mjs', 'trips/tour-gap.mjs'];

/** Runs every bench, or those whose folder is named, one after another: side by side they would measure each other. */
run(async () => {
  checkNode();
  const wanted = process.argv.slice(2);
  const folder = (bench) => bench.split('/')[0];
  const unlisted = readdirSync(join(root, 'tools/bench'), { withFileTypes: true }).filter(
    (entry) => entry.isDirectory() && !benches.some((bench) => folder(bench) === entry.name),
  );
  if (unlisted.length > 0) throw new Fault(`Not in the list of benches: ${unlisted[0].name}.`);
  const unknown = wanted.find((name) => !benches.some((bench) => folder(bench) === name));
  if (unknown) throw new Fault(`There is no bench "${unknown}". Benches: ${benches.map(folder).join(', ')}.`);
  await installPackages();
  await build();
  const missed = [];
  for (const bench of benches.filter((one) => wanted.length === 0 || wanted.includes(folder(one)))) {
    say(`\n${bench}`);
    const code = await runShown(process.execPath, [join(root, 'tools/bench', bench)], { cwd: root });
    if (code !== 0) missed.push(bench);
  }
  say(missed.length === 0 ? '\nEvery limit is met.' : `\nLimits missed or broken off: ${missed.join(', ')}.`);
  process.exit(missed.length === 0 ? 0 : 1);
});
