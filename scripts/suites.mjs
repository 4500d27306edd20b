import { existsSync, mkdirSync, readFileSync, rmSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { root, tool } from './root.mjs';

/** A suite that has not ended by then hangs; it is ended, so that the others run and there is a last line. */
const limitMinutes = 15;

/** The kernels: jest, with nothing around them. */
export function runKernels(processes, args) {
  const command = (report) => [...jest(report, ['kernels']), ...args];
  return runSuite(processes, 'kernels', command, { cwd: join(root, 'graphql-api') });
}

/** The API: jest, with a database and both fakes in its environment; one file after the other shares them. */
export function runJest(processes, environment, args) {
  const command = (report) => [...jest(report, ['src', 'test']), '--runInBand', ...args];
  return runSuite(processes, 'jest', command, { cwd: join(root, 'graphql-api'), env: environment });
}

/** The components of the web: vitest in jsdom. */
export function runVitest(processes, args) {
  const command = (report) => [...vitest(report), ...args];
  return runSuite(processes, 'vitest', command, { cwd: join(root, 'web') });
}

/** The journeys: vitest drives Chromium against the started product. */
export function runEndToEnd(processes, environment, args) {
  const command = (report) => [...vitest(report), '--config=vitest.e2e.config.ts', ...args];
  return runSuite(processes, 'e2e', command, { cwd: join(root, 'web'), env: environment });
}

/** A suite that could not run, or not to its end, counts as one failure. */
export function notRun(name, error) {
  console.log(`${name} did not get through: ${error.message}`);
  return { name, passed: 0, failed: 1, skipped: 0 };
}

function jest(report, folders) {
  const roots = folders.map((folder) => `--roots=${join(root, 'graphql-api', folder)}`);
  return [...tool('jest', 'graphql-api'), '--ci', '--json', `--outputFile=${report}`, ...roots];
}

function vitest(report) {
  return [
    ...tool('vitest', 'web'),
    'run',
    '--reporter=default',
    '--reporter=json',
    `--outputFile.json=${report}`,
  ];
}

async function runSuite(processes, name, command, options) {
  const report = join(root, '.local/test/reports', `${name}.json`);
  mkdirSync(dirname(report), { recursive: true });
  rmSync(report, { force: true });
  const began = performance.now();
  const { code, how } = await processes.run(command(report), { ...options, limitMs: limitMinutes * 60_000 });
  if (performance.now() - began > limitMinutes * 60_000)
    return notRun(name, new Error(`${limitMinutes} minutes were not enough`));
  if (!existsSync(report)) return notRun(name, new Error(`it ended without a report (${how})`));
  return count(name, JSON.parse(readFileSync(report, 'utf8')), code);
}

/** Jest and vitest report alike. A file that could not be loaded, or a bad end with no failed test, is a failure too. */
function count(name, report, code) {
  const unloadable = report.testResults.filter(
    (file) => file.status === 'failed' && !file.assertionResults.some(({ status }) => status === 'failed'),
  );
  const failed = report.numFailedTests + unloadable.length;
  return {
    name,
    passed: report.numPassedTests,
    failed: code !== 0 && failed === 0 ? 1 : failed,
    skipped: report.numPendingTests + report.numTodoTests,
  };
}
