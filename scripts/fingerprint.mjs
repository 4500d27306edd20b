import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, readdirSync, statSync, writeFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { root } from './root.mjs';

const notSource = /(^|\/)(node_modules|dist|generated|\.local)(\/|$)|\.generated\.ts$|\.tsbuildinfo$/;

/** One hash over the names and contents of all source files below the given paths of the checkout. */
export function fingerprint(paths) {
  const hash = createHash('sha256');
  for (const file of paths.flatMap((path) => filesBelow(path)).sort()) {
    hash
      .update(`${file}\0`)
      .update(readFileSync(join(root, file)))
      .update('\0');
  }
  return hash.digest('hex');
}

/** Does `work` unless its outcome was made from the same sources; `stamp` lies inside that outcome. */
export async function unlessUnchanged(stamp, paths, work) {
  const now = fingerprint(paths);
  if (existsSync(stamp) && readFileSync(stamp, 'utf8') === now) return false;
  await work();
  mkdirSync(dirname(stamp), { recursive: true });
  writeFileSync(stamp, now);
  return true;
}

function filesBelow(path) {
  if (notSource.test(path) || !existsSync(join(root, path))) return [];
  if (statSync(join(root, path)).isFile()) return [path];
  return readdirSync(join(root, path)).flatMap((name) => filesBelow(`${path}/${name}`));
}
