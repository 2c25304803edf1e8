import { join } from 'node:path';
import { readFileSync } from 'node:fs';
import { root } from '../lib/paths.mjs';
import { runKept, runShown } from '../lib/processes.mjs';

const bin = (name) => join(root, 'node_modules/.bin', name);

/** A check that is right or wrong as a whole. */
function check(name, command, args, { fast = true } = {}) {
  return {
    name,
    fast,
    async run() {
      const { code, output } = await runKept(command, args, { cwd: root });
      return { passed: code === 0 ? 1 : 0, failed: code === 0 ? 0 : 1, output: code === 0 ? '' : output };
    },
  };
}

/** A test runner that writes its counts as JSON. */
function suite(name, command, args, { reportFile, cwd = root, needs = [] }) {
  return {
    name,
    fast: false,
    needs,
    async run(env, folder) {
      const report = join(folder, reportFile);
      const code = await runShown(command, args(report), { cwd, env });
      const counts = countsOf(report);
      if (counts === null)
        return { passed: 0, failed: 1, output: `${name} wrote no report (exit code ${code}).` };
      const failed = counts.failed + (code !== 0 && counts.failed === 0 ? 1 : 0);
      const output = failed > counts.failed ? `${name} ended with code ${code}.` : '';
      return { passed: counts.passed, failed, output };
    },
  };
}

function countsOf(report) {
  try {
    const { numPassedTests, numFailedTests, numFailedTestSuites } = JSON.parse(readFileSync(report, 'utf8'));
    return { passed: numPassedTests, failed: Math.max(numFailedTests, numFailedTestSuites) };
  } catch {
    return null;
  }
}

const vitest = (config) => (report) => [
  'run',
  '--config',
  config,
  '--reporter=default',
  '--reporter=json',
  `--outputFile.json=${report}`,
];

/** Everything `npm test` checks, in order; the fast ones are `npm run check`. */
export const steps = [
  check('format', bin('prettier'), ['--check', '--log-level', 'warn', '.']),
  check('lint', bin('eslint'), ['--max-warnings', '0', '.']),
  check('types', process.execPath, ['tools/test/types.mjs']),
  check('arrows', process.execPath, ['tools/test/arrows.mjs']),
  check('dead code', bin('knip'), ['--no-progress']),
  {
    name: 'tools',
    fast: false,
    needs: ['postgres'],
    async run(env) {
      const { code, output } = await runKept(
        process.execPath,
        ['--test', '--test-reporter=tap', 'tools/test/units/'],
        { cwd: root, env },
      );
      const count = (word) => Number(new RegExp(`^# ${word} (\\d+)`, 'm').exec(output)?.[1] ?? 0);
      const failed = count('fail') || (code === 0 ? 0 : 1);
      return { passed: count('pass'), failed, output: failed > 0 ? output : '' };
    },
  },
  suite('unit', bin('vitest'), vitest('vitest.config.mts'), { reportFile: 'unit.json' }),
  suite('server', bin('jest'), (report) => ['--ci', '--json', `--outputFile=${report}`], {
    reportFile: 'server.json',
    cwd: join(root, 'apps/api'),
    needs: ['postgres'],
  }),
  suite('browser', bin('vitest'), vitest('apps/e2e/vitest.config.mts'), {
    reportFile: 'browser.json',
    needs: ['postgres', 'chromium', 'build'],
  }),
];
