import { rmSync } from 'node:fs';
import { join } from 'node:path';
import { runChecks } from './checks.mjs';
import { chromium } from './chromium.mjs';
import { claimStack } from './claim.mjs';
import {
  build,
  checkNode,
  databaseUrls,
  installDependencies,
  makeDatabase,
  migrate,
  postgres,
  step,
} from './ground.mjs';
import { freePort } from './ports.mjs';
import { runVerb } from './processes.mjs';
import { productEnvironment, publicUrlOf, startFakes, startProduct } from './product.mjs';
import { root } from './root.mjs';
import { notRun, runEndToEnd, runJest, runKernels, runVitest } from './suites.mjs';

// Everything: `npm test`. One suite, narrowed: `npm test -- --only=jest -- quotes`.

const name = 'test';
const [ownArgs, suiteArgs] = splitArguments(process.argv.slice(2));
const only = ownArgs.find((arg) => arg.startsWith('--only='))?.slice('--only='.length);

await runVerb(name, async (processes) => {
  checkNode();
  await claimStack(processes, name);
  await installDependencies(processes);
  const tallies = [];
  const suite = async (suiteName, run) => {
    if (only && only !== suiteName) return;
    console.log(`\n── ${suiteName}`);
    tallies.push(await processes.part(run).catch((error) => notRun(suiteName, error)));
  };
  await suite('check', runChecks);
  if (only !== 'check') await build(processes).catch((error) => tallies.push(notRun('build', error)));
  await suite('vitest', (part) => runVitest(part, suiteArgs));
  const cluster = await openTestCluster(processes).catch((error) => tallies.push(notRun('postgres', error)));
  // The kernels need one core and no database, the API waits for its database and workers much of the time.
  await Promise.all([
    suite('kernels', (part) => runKernels(part, suiteArgs)),
    suite('jest', (part) => jest(part, cluster)),
  ]);
  await suite('e2e', (part) => endToEnd(part, cluster));
  return report(tallies);
});

function openTestCluster(processes) {
  const isNeeded = !only || only === 'jest' || only === 'e2e';
  return isNeeded ? postgres(processes, name, { durable: false }) : Promise.resolve();
}

async function jest(processes, cluster) {
  const environment = await prepareDatabase(processes, cluster, 'metewand_test', 'test');
  return runJest(processes, environment, suiteArgs);
}

async function endToEnd(processes, cluster) {
  let browser;
  await step('Chromium: find or install it', async () => (browser = chromium()));
  const environment = await prepareDatabase(processes, cluster, 'metewand_e2e', 'production');
  const { seedDemo } = await import('./seed/demo.mjs');
  await step('Demo organisations', async () => void (await seedDemo(environment.DATABASE_OWNER_URL)));
  const address = await startProduct(processes, environment);
  return runEndToEnd(
    processes,
    { E2E_URL: address, E2E_INBOX_URL: environment.INBOX_URL, CHROMIUM_PATH: browser },
    suiteArgs,
  );
}

/** A fresh database and fresh fakes for one suite; resolves with the environment of the product. */
async function prepareDatabase(processes, cluster, database, nodeEnv) {
  await step(`Database ${database}: make anew, migrate`, async () => {
    await makeDatabase(cluster, database, { fresh: true });
    await migrate(processes, databaseUrls(cluster, database));
  });
  const folder = `${name}/${database}`;
  rmSync(join(root, '.local', folder), { recursive: true, force: true });
  const port = await freePort();
  const fakes = await startFakes(processes, folder, { publicUrl: publicUrlOf(port) });
  return productEnvironment({ cluster, database, name: folder, port, fakes, nodeEnv });
}

function report(tallies) {
  const sum = (key) => tallies.reduce((total, tally) => total + tally[key], 0);
  console.log('');
  for (const tally of tallies) {
    console.log(
      `${tally.name.padEnd(9)} ${tally.passed} passed, ${tally.failed} failed, ${tally.skipped} skipped`,
    );
  }
  console.log(`${sum('passed')} passed, ${sum('failed')} failed`);
  return sum('failed') === 0 ? 0 : 1;
}

function splitArguments(args) {
  const end = args.indexOf('--');
  return end === -1 ? [args, []] : [args.slice(0, end), args.slice(end + 1)];
}
