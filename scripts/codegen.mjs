import { execFileSync } from 'node:child_process';
import { existsSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { root } from './root.mjs';
import { generateWebTypes } from './web-types.mjs';

// Emits schema/schema.graphql and schema/roles.json from the compiled API, then the types of the web from the schema.
// With --check the committed files stay as they are, and a difference fails.

const emitted = ['schema.graphql', 'roles.json'];

const different = withFreshlyEmitted((file, fresh) => {
  const path = join(root, 'schema', file);
  const same = existsSync(path) && readFileSync(path, 'utf8') === fresh;
  if (!same && !process.argv.includes('--check')) writeFileSync(path, fresh);
  return !same;
});
const { operations, written } = await generateWebTypes();
console.log(`${operations} GraphQL documents of the web, ${written.length} generated files changed`);

for (const file of different)
  console.log(
    `schema/${file} ${process.argv.includes('--check') ? 'is out of date: npm run codegen' : 'has changed'}`,
  );
if (process.argv.includes('--check') && different.length > 0) process.exitCode = 1;

function withFreshlyEmitted(differs) {
  const folder = mkdtempSync(join(tmpdir(), 'metewand-schema-'));
  try {
    execFileSync(process.execPath, ['--enable-source-maps', 'graphql-api/dist/emit-schema.js', folder], {
      cwd: root,
      stdio: ['ignore', 'ignore', 'inherit'],
    });
    return emitted.filter((file) => differs(file, readFileSync(join(folder, file), 'utf8')));
  } finally {
    rmSync(folder, { recursive: true });
  }
}
