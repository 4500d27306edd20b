import { readArguments, UsageError, usage } from './frontier/arguments.mjs';
import { buildKernel } from './frontier/build-kernel.mjs';

// The search kernel on the command line: `npm run -s frontier -- solve problem.json` writes the frontier on standard
// output and nothing else, `verify problem.json result.json` says by its exit code whether one holds.
// 0 all is well, 1 no (a frontier that does not hold), 2 what was asked cannot be read, 130 stopped with nothing found.

process.stdout.on('error', () => process.exit(1)); // whoever was to read it is gone
process.exitCode = await run().catch((error) => {
  console.error(error.isFault ? error.message : (error.stack ?? error));
  return error.exitCode ?? 1;
});

async function run() {
  const request = readArguments(process.argv.slice(2));
  if (request instanceof UsageError) {
    console.error(`${request.message}\n\n${usage}`);
    return 2;
  }
  await buildKernel();
  // only now: what they import may not have been built before
  const { solveCommand } = await import('./frontier/solve-command.mjs');
  const { verifyCommand } = await import('./frontier/verify-command.mjs');
  return request.command === 'solve' ? solveCommand(request) : verifyCommand(request);
}
