import pg from 'pg';
import { claimStack } from '../claim.mjs';
import { databaseUrls, makeDatabase, migrate, postgres, step } from '../ground.mjs';
import { freePort } from '../ports.mjs';
import { runVerb } from '../processes.mjs';
import { productEnvironment, publicUrlOf, startFakes, startProduct } from '../product.mjs';
import { demoPassword, demoSignIns, seedDemo } from '../seed/demo.mjs';

/**
 * Runs a bench against the product as it is started: API, worker and fakes in processes of their own, over a fresh
 * database with the demo organisations. `work` gets a StartedProduct.
 */
export function benchStartedProduct(name, work) {
  return runVerb(name, async (processes) => {
    await claimStack(processes, name);
    const cluster = await postgres(processes, name);
    const database = 'metewand_bench';
    await step('Database: make anew, migrate', async () => {
      await makeDatabase(cluster, database, { fresh: true });
      await migrate(processes, databaseUrls(cluster, database));
    });
    const ownerUrl = cluster.url('app_owner', database);
    await step('Demo organisations', async () => void (await seedDemo(ownerUrl)));
    const port = await freePort();
    const fakes = await startFakes(processes, name, { publicUrl: publicUrlOf(port) });
    const environment = productEnvironment({ cluster, database, name, port, fakes, nodeEnv: 'production' });
    const address = await startProduct(processes, environment);
    return work(new StartedProduct(address, ownerUrl));
  });
}

export class StartedProduct {
  constructor(address, ownerUrl) {
    this.address = address;
    this.ownerUrl = ownerUrl;
  }

  /** Signs in as the purchasing coordinator of a demo organisation, 0 or 1, and brings its round to the search. */
  async coordinator(place) {
    const names = [...new Set(demoSignIns.map(({ organisation }) => organisation))];
    const { email } = demoSignIns.find(
      ({ organisation, role }) => organisation === names[place] && role === 'PURCHASING_COORDINATOR',
    );
    const input = { email, password: demoPassword };
    const { signIn } = await this.ask(
      'mutation ($input: SignInInput!) { signIn(input: $input) { ... on SignedIn { accessToken } } }',
      { input },
    );
    const ask = (query, variables) => this.ask(query, variables, signIn.accessToken);
    const { viewer } = await ask('{ viewer { organisation { id } rounds { id } } }');
    const organisationId = viewer.organisation.id;
    await this.asOwner(organisationId, (db) => db.query(`update metewand.round set stage = 'SEARCH'`));
    return { ask, organisationId, roundId: viewer.rounds[0].id };
  }

  /** The data of an answer; one with errors throws. */
  async ask(query, variables = {}, accessToken) {
    const response = await fetch(new URL('/graphql', this.address), {
      method: 'POST',
      headers: {
        'content-type': 'application/json',
        ...(accessToken ? { authorization: `Bearer ${accessToken}` } : {}),
      },
      body: JSON.stringify({ query, variables }),
    });
    const { data, errors } = await response.json();
    if (errors) throw new Error(`The API refused: ${JSON.stringify(errors)}`);
    return data;
  }

  /** Statements as the owner, in one transaction in the context of an organisation. */
  async asOwner(organisationId, work) {
    const client = new pg.Client({ connectionString: this.ownerUrl });
    await client.connect();
    try {
      await client.query('begin');
      await client.query(`select set_config('app.organisation_id', $1, true)`, [organisationId]);
      const outcome = await work(client);
      await client.query('commit');
      return outcome;
    } finally {
      await client.end();
    }
  }
}
