import { claimStack, isClaimed } from './claim.mjs';
import {
  checkNode,
  compile,
  databaseUrls,
  installDependencies,
  makeDatabase,
  migrate,
  postgres,
  step,
} from './ground.mjs';
import { openCluster } from './postgres.mjs';
import { runVerb } from './processes.mjs';
import { root } from './root.mjs';

// Brings the database of `npm start` and `npm run dev` up to date, also while one of them runs.

await runVerb('migrate', async (processes) => {
  checkNode();
  await installDependencies(processes);
  await step('Build: API and kernels', () => compile(processes));
  const cluster = await runningOrOwnCluster(processes);
  await step('Database: make, migrate', async () => {
    await makeDatabase(cluster, 'metewand');
    await migrate(processes, databaseUrls(cluster, 'metewand'));
  });
});

async function runningOrOwnCluster(processes) {
  if (isClaimed('demo')) return openCluster({ root, name: 'demo' });
  await claimStack(processes, 'demo');
  return postgres(processes, 'demo');
}
