import { spawnSync } from 'node:child_process';
import { existsSync, readdirSync, statSync } from 'node:fs';
import { join } from 'node:path';
import { root, tool } from '../root.mjs';

const kernel = 'graphql-api/kernels/frontier';

/** Builds the kernel if that was never done or a source is newer, and says nothing unless it fails. */
export async function buildKernel() {
  if (isUpToDate()) return;
  const [node, ...args] = [...tool('tsc'), '-b', kernel];
  const { status, stdout, stderr } = spawnSync(node, args, { cwd: root, encoding: 'utf8' });
  if (status === 0) return;
  throw Object.assign(new Error(`The kernel could not be built:\n${stdout}${stderr}`), { isFault: true });
}

function isUpToDate() {
  const record = join(root, kernel, 'dist/.tsbuildinfo');
  if (!existsSync(record) || !existsSync(join(root, kernel, 'dist/index.js'))) return false;
  const built = statSync(record).mtimeMs;
  const sources = readdirSync(join(root, kernel, 'src'), { recursive: true, withFileTypes: true });
  const files = sources.map((entry) => join(entry.parentPath ?? entry.path, entry.name));
  return [...files, join(root, kernel, 'tsconfig.json')].every((file) => statSync(file).mtimeMs <= built);
}
