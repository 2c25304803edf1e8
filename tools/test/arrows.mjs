import { mkdtempSync, mkdirSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { root } from '../lib/paths.mjs';
import { runKept } from '../lib/processes.mjs';

/**
 * Imports run one way (.dependency-cruiser.cjs). The check is checked: it must have read a floor of modules, and it must find
 * each of a set of bad imports planted for it.
 */
const floor = 150;
const planted = {
  'lib-imports-app': ['libs/units/src', "import '../../../apps/web/src/app/theme/modes';"],
  'app-imports-app': ['apps/web/src/app', "import '../../../api/src/common/problem.exception';"],
  'delivery-and-field-log': ['libs/delivery/src', "import '../../field-log/src/index';"],
  'lib-without-frameworks': ['libs/rules/src', "import 'react';"],
  'lib-without-node': ['libs/trips/src', "import 'node:fs';"],
  'feature-imports-feature': ['apps/web/src/features/today', "import '../settings/SettingsScreen';"],
  'phone-imports-libs-only': ['apps/web/src/phone', "import '../components/MainAction';"],
};

const real = await cruise(['libs', 'apps']);
const problems = [];
if (real.modules < floor)
  problems.push(`Only ${real.modules} modules were read; at least ${floor} are expected.`);
problems.push(...real.violations.map(({ rule, from, to }) => `${rule.name}: ${from} -> ${to}`));

for (const [rule, [folder, line]] of Object.entries(planted)) {
  const place = mkdtempSync(join(root, folder, 'planted-'));
  mkdirSync(place, { recursive: true });
  const file = join(place, 'planted.ts');
  // One folder deeper than the place it stands for.
  writeFileSync(file, `${line.replace("'..", "'../..")}\n`);
  const found = await cruise([file]);
  rmSync(place, { recursive: true });
  if (!found.violations.some((one) => one.rule.name === rule))
    problems.push(`The planted import for "${rule}" was not found.`);
}

console.log(problems.length === 0 ? `${real.modules} modules read, every arrow holds.` : problems.join('\n'));
process.exit(problems.length === 0 ? 0 : 1);

async function cruise(paths) {
  const args = ['--config', '.dependency-cruiser.cjs', '--output-type', 'json', ...paths];
  const { output } = await runKept(join(root, 'node_modules/.bin/depcruise'), args, { cwd: root });
  const { summary } = JSON.parse(output.slice(output.indexOf('{')));
  return { modules: summary.totalCruised, violations: summary.violations };
}
