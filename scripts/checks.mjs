import { compile } from './ground.mjs';
import { root, tool } from './root.mjs';

/** In this order: the later ones read what the first two make. */
const checks = [
  ['types of the API', (processes) => compile(processes)],
  ['emitted files', command(() => [process.execPath, 'scripts/codegen.mjs', '--check'])],
  ['types of the web', command(() => [...tool('tsc'), '-p', 'web', '--noEmit'])],
  [
    'types of the API tests',
    command(() => [...tool('tsc'), '-p', 'graphql-api/tsconfig.test.json', '--noEmit']),
  ],
  ['lint', command(() => [...tool('eslint'), '--max-warnings=0', '.'])],
  ['boundaries', command(() => [...tool('depcruise'), '--config', '.dependency-cruiser.mjs', ...sources])],
  ['format', command(() => [...tool('prettier'), '--check', '--log-level=warn', '.'])],
];
const sources = ['graphql-api/src', 'graphql-api/kernels', 'web/src', 'web/e2e', 'scripts', 'storage-fake'];

/** Runs every check, shows what the failing ones said, and counts both kinds. */
export async function runChecks(processes) {
  const tally = { name: 'check', passed: 0, failed: 0, skipped: 0 };
  for (const [name, check] of checks) {
    const began = performance.now();
    const complaint = await check(processes).then(
      () => undefined,
      (error) => error.message,
    );
    tally[complaint === undefined ? 'passed' : 'failed'] += 1;
    const seconds = ((performance.now() - began) / 1000).toFixed(1);
    console.log(`${complaint === undefined ? '✓' : '✗'} ${name} (${seconds} s)`);
    if (complaint !== undefined) console.log(complaint.replace(/^/gm, '    '));
  }
  return tally;
}

function command(commandLine) {
  return (processes) => processes.mustRun('The check', commandLine(), { cwd: root });
}
