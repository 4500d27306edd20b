import { generateKeyPairSync } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { unlessUnchanged } from './fingerprint.mjs';
import { ensurePostgres, openCluster } from './postgres.mjs';
import { root, tool } from './root.mjs';

// This file and what it imports use node: modules only, because it is what installs all others.

/** Says what is about to be done, does it, then says how it went and how long it took. */
export async function step(title, work) {
  console.log(`• ${title}`);
  const began = performance.now();
  const outcome = await work();
  console.log(`  ${outcome ?? 'done'} (${((performance.now() - began) / 1000).toFixed(1)} s)`);
}

export function checkNode() {
  const [major, minor] = process.versions.node.split('.').map(Number);
  if (major > 20 || (major === 20 && minor >= 19)) return;
  throw new Error(`Metewand needs Node 20.19 or newer; this is Node ${process.versions.node}.`);
}

export function installDependencies(processes) {
  return step('Dependencies: what package-lock.json asks for', async () => {
    if (dependenciesMatchLockfile()) return 'all there';
    await processes.mustRun('npm ci', ['npm', 'ci', '--no-audit', '--no-fund'], { cwd: root });
    return 'installed with npm ci';
  });
}

export async function build(processes) {
  await step('Build: API and kernels', () => compile(processes));
  await step('Build: types of the web from the schema', () => generate(processes));
  await step('Build: web', () => bundle(processes));
}

/** The compiler keeps its own record of what has changed. */
export async function compile(processes) {
  await processes.mustRun('The build of the API', [...tool('tsc'), '-b', 'graphql-api'], { cwd: root });
}

async function generate(processes) {
  const stamp = join(root, 'web/src/generated/.sources');
  const sources = ['package-lock.json', 'scripts', 'schema', 'graphql-api/src', 'web/src'];
  const done = await unlessUnchanged(stamp, sources, () =>
    processes.mustRun('Code generation', [process.execPath, 'scripts/codegen.mjs'], { cwd: root }),
  );
  return done ? 'generated' : 'unchanged';
}

async function bundle(processes) {
  const stamp = join(root, 'web/dist/.sources');
  const sources = ['package-lock.json', 'schema', 'web'];
  const done = await unlessUnchanged(stamp, sources, () =>
    processes.mustRun('The build of the web', [...tool('vite', 'web'), 'build'], { cwd: join(root, 'web') }),
  );
  return done ? 'built' : 'unchanged';
}

/** Keeps the private key that signs access tokens; a new one would sign everybody out. */
export function signingKey(name) {
  const file = join(root, '.local', name, 'jwt-private-key.pem');
  if (existsSync(file)) return file;
  const { privateKey } = generateKeyPairSync('ec', { namedCurve: 'P-256' });
  mkdirSync(dirname(file), { recursive: true });
  writeFileSync(file, privateKey.export({ type: 'pkcs8', format: 'pem' }), { mode: 0o600 });
  return file;
}

/** The private cluster of one stack, running, with the roles of the product; stopped when the verb ends. */
export async function postgres(processes, name, { durable = true } = {}) {
  await step('PostgreSQL: find or install it', async () => ensurePostgres());
  let cluster;
  await step('PostgreSQL: a private cluster with the roles of the product', async () => {
    cluster = await processes.hold(openCluster({ root, name, durable }), async (opened) => opened.stop());
    await makeRoles(cluster);
    return `${cluster.wasRunning ? 'still running' : 'running'} on 127.0.0.1:${cluster.port}`;
  });
  return cluster;
}

/** Makes the database unless it is there; with `fresh`, drops the one of an earlier run first. */
export function makeDatabase(cluster, database, { fresh = false } = {}) {
  return asSuperuser(cluster, async (client) => {
    if (fresh) await client.query(`drop database if exists ${database} with (force)`);
    const { rowCount } = await client.query('select from pg_database where datname = $1', [database]);
    if (rowCount === 0) await client.query(`create database ${database} owner app_owner`);
    await client.query(`grant create on database ${database} to app_worker`); // the queue brings its own schema
  });
}

export function databaseUrls(cluster, database) {
  return {
    DATABASE_URL: cluster.url('app_api', database),
    DATABASE_OWNER_URL: cluster.url('app_owner', database),
    DATABASE_WORKER_URL: cluster.url('app_worker', database),
  };
}

export async function migrate(processes, environment) {
  const command = [process.execPath, 'graphql-api/dist/migrate.js'];
  await processes.mustRun('The migration of the database', command, { cwd: root, env: environment });
}

function makeRoles(cluster) {
  return asSuperuser(cluster, async (client) => {
    await client.query(readFileSync(join(root, 'graphql-api/src/database/roles.sql'), 'utf8'));
    for (const role of ['app_owner', 'app_api', 'app_worker']) {
      await client.query(`alter role ${role} password ${client.escapeLiteral(cluster.passwords[role])}`);
    }
  });
}

async function asSuperuser(cluster, work) {
  const { default: pg } = await import('pg');
  const client = new pg.Client({ connectionString: cluster.url('postgres', 'postgres') });
  await client.connect();
  try {
    await work(client);
  } finally {
    await client.end();
  }
}

/** npm leaves a copy of the lockfile behind once everything is installed; optional packages may be missing. */
function dependenciesMatchLockfile() {
  const installed = packagesOf('node_modules/.package-lock.json');
  const wanted = packagesOf('package-lock.json');
  return Object.entries(wanted)
    .filter(([path, entry]) => path.includes('node_modules/') && !entry.optional)
    .every(([path, { version, integrity }]) => {
      const there = installed[path];
      return there && there.version === version && there.integrity === integrity;
    });
}

function packagesOf(lockfile) {
  const path = join(root, lockfile);
  return existsSync(path) ? JSON.parse(readFileSync(path, 'utf8')).packages : {};
}
