import { runChecks } from './checks.mjs';
import { checkNode, installDependencies } from './ground.mjs';
import { runVerb } from './processes.mjs';

await runVerb('check', async (processes) => {
  checkNode();
  await installDependencies(processes);
  const { passed, failed } = await runChecks(processes);
  console.log(`${passed} passed, ${failed} failed`);
  return failed === 0 ? 0 : 1;
});
