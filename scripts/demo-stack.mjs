import { databaseUrls, makeDatabase, migrate, postgres, step } from './ground.mjs';
import { freePortFrom } from './ports.mjs';
import { productEnvironment, publicUrlOf, startFakes } from './product.mjs';
import { root } from './root.mjs';

const name = 'demo';
const database = 'metewand';
const preferredPort = Number(process.env.PORT ?? 4000);
const preferredInboxPort = 4080;

/** Database, migrations, demo organisations and fakes of `npm start` and `npm run dev`; resolves with the environment. */
export async function prepareDemo(processes, { nodeEnv }) {
  const cluster = await postgres(processes, name);
  await step('Database: make, migrate', async () => {
    await makeDatabase(cluster, database);
    await migrate(processes, databaseUrls(cluster, database));
  });
  const { seedDemo } = await import('./seed/demo.mjs');
  await step('Demo organisations', async () => {
    const isNew = await seedDemo(cluster.url('app_owner', database));
    return isNew ? 'made' : 'already there';
  });
  const port = await portFor('the product', preferredPort);
  const inboxPort = await portFor('the inbox', preferredInboxPort);
  const fakes = await startFakes(processes, name, { publicUrl: publicUrlOf(port), inboxPort });
  return productEnvironment({ cluster, database, name, port, fakes, nodeEnv });
}

/** The last thing said: where the product is and who may sign in. */
export async function welcome(address, inboxUrl) {
  const { demoPassword, demoSignIns } = await import('./seed/demo.mjs');
  const width = Math.max(...demoSignIns.map(({ email }) => email.length));
  const organisations = [...new Set(demoSignIns.map(({ organisation }) => organisation))];
  const lines = organisations.flatMap((organisation) => [
    `  ${organisation}`,
    ...demoSignIns
      .filter((signIn) => signIn.organisation === organisation)
      .map(
        ({ email, role, name: person }) =>
          `    ${email.padEnd(width)}  ${person}, ${role.toLowerCase().replaceAll('_', ' ')}`,
      ),
  ]);
  console.log(`
Metewand runs at   ${address}
Letters arrive at  ${inboxUrl}

Sign in with the password "${demoPassword}" as
${lines.join('\n')}

Ctrl-C stops everything; the data stay in ${root}/.local.`);
}

async function portFor(what, preferred) {
  const port = await freePortFrom(preferred);
  if (port !== preferred) console.log(`• Port ${preferred} is taken; ${what} uses ${port}`);
  return port;
}
