import { spawnSync } from 'node:child_process';
import { existsSync, readdirSync, statSync } from 'node:fs';
import { join } from 'node:path';
import { root, tool } from '../root.mjs';

/** The search, and the threads of the API that it runs on; the compiler builds the one with the other. */
const parts = ['graphql-api/kernels/frontier', 'graphql-api'];
const sources = ['graphql-api/kernels/frontier/src', 'graphql-api/src/frontier/threads'];

/** Builds the kernel and its threads if that was never done or a source is newer, and says nothing unless it fails. */
export async function buildKernel() {
  if (isUpToDate()) return;
  const [node, ...args] = [...tool('tsc'), '-b', 'graphql-api'];
  const { status, stdout, stderr } = spawnSync(node, args, { cwd: root, encoding: 'utf8' });
  if (status === 0) return;
  throw Object.assign(new Error(`The kernel could not be built:\n${stdout}${stderr}`), { isFault: true });
}

function isUpToDate() {
  const records = parts.map((part) => join(root, part, 'dist/.tsbuildinfo'));
  if (!records.every(existsSync)) return false;
  return parts.every((part, place) => {
    const built = statSync(records[place]).mtimeMs;
    const files = [...filesBelow(sources[place]), join(root, part, 'tsconfig.json')];
    return files.every((file) => statSync(file).mtimeMs <= built);
  });
}

function filesBelow(folder) {
  const entries = readdirSync(join(root, folder), { recursive: true, withFileTypes: true });
  return entries.map((entry) => join(entry.parentPath ?? entry.path, entry.name));
}
