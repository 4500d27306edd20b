import { claimStack } from './claim.mjs';
import { build, checkNode, installDependencies } from './ground.mjs';
import { prepareDemo, welcome } from './demo-stack.mjs';
import { runVerb } from './processes.mjs';
import { startProduct } from './product.mjs';

await runVerb('demo', async (processes) => {
  checkNode();
  await claimStack(processes, 'demo');
  await installDependencies(processes);
  await build(processes);
  const environment = await prepareDemo(processes, { nodeEnv: 'production' });
  const address = await startProduct(processes, environment);
  await welcome(address, environment.INBOX_URL);
  await processes.broken;
});
