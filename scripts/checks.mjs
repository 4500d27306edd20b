import { compile } from './ground.mjs';
import { root, tool } from './root.mjs';

/** One after the other: the later checks read what these make. */
const first = [
  ['types of the API', (processes) => compile(processes)],
  ['emitted files', command(() => [process.execPath, 'scripts/codegen.mjs', '--check'])],
];

/** Two at a time, the longest first. */
const rest = [
  ['lint', command(() => [...tool('eslint'), '--max-warnings=0', '.'])],
  ['format', command(() => [...tool('prettier'), '--check', '--log-level=warn', '.'])],
  ['types of the web', command(() => [...tool('tsc'), '-p', 'web', '--noEmit'])],
  [
    'types of the API tests',
    command(() => [...tool('tsc'), '-p', 'graphql-api/tsconfig.test.json', '--noEmit']),
  ],
  ['boundaries', command(() => [...tool('depcruise'), '--config', '.dependency-cruiser.mjs', ...sources])],
];
const sources = ['graphql-api/src', 'graphql-api/kernels', 'web/src', 'web/e2e', 'scripts', 'storage-fake'];

/** Runs every check, shows what the failing ones said, and counts both kinds. */
export async function runChecks(processes) {
  const tally = { name: 'check', passed: 0, failed: 0, skipped: 0 };
  const work = async (checks) => {
    for (let next = checks.shift(); next; next = checks.shift()) {
      const passed = await runCheck(processes, ...next);
      tally[passed ? 'passed' : 'failed'] += 1;
    }
  };
  await work([...first]);
  const waiting = [...rest];
  await Promise.all([work(waiting), work(waiting)]);
  return tally;
}

async function runCheck(processes, name, check) {
  const began = performance.now();
  const complaint = await check(processes).then(
    () => undefined,
    (error) => error.message,
  );
  const seconds = ((performance.now() - began) / 1000).toFixed(1);
  console.log(`${complaint === undefined ? '✓' : '✗'} ${name} (${seconds} s)`);
  if (complaint !== undefined) console.log(complaint.replace(/^/gm, '    '));
  return complaint === undefined;
}

function command(commandLine) {
  return (processes) => processes.mustRun('The check', commandLine(), { cwd: root });
}
