import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';

/** The folder of the checkout, without a slash at its end. */
export const root = fileURLToPath(new URL('..', import.meta.url)).replace(/\/$/, '');

/** The command line that runs a tool of a workspace's dependencies under this Node. */
export function tool(name, workspace = '.') {
  const candidates = [
    join(root, workspace, 'node_modules/.bin', name),
    join(root, 'node_modules/.bin', name),
  ];
  const found = candidates.find((path) => existsSync(path));
  if (!found) throw new Error(`The tool ${name} is missing; run npm ci.`);
  return [process.execPath, found];
}
