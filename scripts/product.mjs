import { join } from 'node:path';
import { databaseUrls, signingKey } from './ground.mjs';
import { root } from './root.mjs';

/** The fakes of one stack: S3 with its files below .local, and the inbox. Resolves with what the product must know of them. */
export async function startFakes(processes, name, { publicUrl, inboxPort = 0 }) {
  const [storage, mail] = await Promise.all([
    processes.start('storage', [process.execPath, 'storage-fake/main.mjs'], {
      cwd: root,
      ready: /ready on (\S+)/,
      env: { STORAGE_FOLDER: join(root, '.local', name, 'storage'), ALLOWED_ORIGIN: publicUrl },
    }),
    processes.start('mail', [process.execPath, 'scripts/mail-fake.mjs'], {
      cwd: root,
      ready: /ready on (\S+) with SMTP on port (\d+)/,
      env: { INBOX_PORT: String(inboxPort) },
    }),
  ]);
  return { S3_ENDPOINT: storage[1], INBOX_URL: mail[1], SMTP_PORT: mail[2] };
}

/** Everything API and worker read from their environment, see .env.example. */
export function productEnvironment({ cluster, database, name, port, fakes, nodeEnv }) {
  return {
    ...databaseUrls(cluster, database),
    ...fakes,
    NODE_ENV: nodeEnv,
    PORT: String(port),
    PUBLIC_URL: publicUrlOf(port),
    WEB_DIST: join(root, 'web/dist'),
    S3_REGION: 'eu-central-1',
    S3_BUCKET: 'metewand',
    S3_ACCESS_KEY_ID: 'S3RVER',
    S3_SECRET_ACCESS_KEY: 'S3RVER',
    SMTP_HOST: '127.0.0.1',
    MAIL_FROM: 'Metewand <metewand@example.org>',
    JWT_PRIVATE_KEY_FILE: signingKey(name),
    AWS_SDK_JS_NODE_VERSION_SUPPORT_WARNING_DISABLED: 'true',
  };
}

export function publicUrlOf(port) {
  return `http://127.0.0.1:${port}`;
}

/** Starts the API, which also serves the built web, and the worker; resolves with the address once both are ready. */
export async function startProduct(processes, environment, nodeOptions = []) {
  const start = (name, file, ready) =>
    processes.start(
      name,
      [process.execPath, '--enable-source-maps', ...nodeOptions, `graphql-api/dist/${file}`],
      {
        cwd: root,
        env: environment,
        ready,
      },
    );
  const [[, address]] = await Promise.all([
    start('api', 'main.js', /listening on (http\S+)/),
    start('worker', 'worker.js', /worker ready/),
  ]);
  const { status } = await fetch(new URL('/ready', address));
  if (status !== 200)
    throw new Error(`The API started, but says it is not ready (${address}/ready answers ${status}).`);
  return address;
}
