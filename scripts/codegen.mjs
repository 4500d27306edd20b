import { execFileSync } from 'node:child_process';
import { existsSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { root } from './root.mjs';
import { generateWebTypes } from './web-types.mjs';

// Emits schema/schema.graphql and schema/roles.json from the compiled API, and the types of the web from the schema.
// With --check the committed files stay as they are, and a difference fails.

const emitted = ['schema.graphql', 'roles.json'];

if (process.argv.includes('--check')) {
  await typesOfTheWeb();
  for (const { file } of differences())
    complain(`schema/${file} is out of date; bring it up to date: npm run codegen`);
} else {
  for (const { file, path, fresh } of differences()) {
    writeFileSync(path, fresh);
    console.log(`schema/${file} has changed`);
  }
  await typesOfTheWeb();
}

async function typesOfTheWeb() {
  const { operations, written } = await generateWebTypes();
  console.log(`${operations} GraphQL documents of the web, ${written.length} generated files changed`);
}

function complain(sentence) {
  console.error(sentence);
  process.exitCode = 1;
}

/** What the API emits now and the committed files do not say. */
function differences() {
  const folder = mkdtempSync(join(tmpdir(), 'metewand-schema-'));
  try {
    execFileSync(process.execPath, ['--enable-source-maps', 'graphql-api/dist/emit-schema.js', folder], {
      cwd: root,
      stdio: ['ignore', 'ignore', 'inherit'],
    });
    return emitted
      .map((file) => ({
        file,
        path: join(root, 'schema', file),
        fresh: readFileSync(join(folder, file), 'utf8'),
      }))
      .filter(({ path, fresh }) => !existsSync(path) || readFileSync(path, 'utf8') !== fresh);
  } finally {
    rmSync(folder, { recursive: true });
  }
}
