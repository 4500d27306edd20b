import { mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { endLeftovers } from './process-marks.mjs';
import { root } from './root.mjs';

/** Makes this process the only one that runs the stack `name` of this checkout; ends what a killed one left behind. */
export async function claimStack(processes, name) {
  const file = join(root, '.local', name, 'running.json');
  const holder = readHolder(file);
  if (holder && isVerb(holder.pid)) {
    throw new Error(
      `It already runs in this checkout (process ${holder.pid}, ${holder.verb}); stop that one first.`,
    );
  }
  mkdirSync(dirname(file), { recursive: true });
  writeFileSync(file, JSON.stringify({ pid: process.pid, verb: process.argv[1].slice(root.length + 1) }));
  await processes.hold(Promise.resolve(file), async () => rmSync(file, { force: true }));
  const ended = endLeftovers(name);
  if (ended > 0) console.log(`• Ended ${ended} processes that an earlier run had left behind`);
}

/** Whether some verb runs the stack now. */
export function isClaimed(name) {
  const holder = readHolder(join(root, '.local', name, 'running.json'));
  return holder !== undefined && isVerb(holder.pid);
}

function readHolder(file) {
  try {
    return JSON.parse(readFileSync(file, 'utf8'));
  } catch {
    return undefined;
  }
}

/** A process id may have been given to another program since. */
function isVerb(pid) {
  try {
    return readFileSync(`/proc/${pid}/cmdline`, 'utf8').includes('scripts/');
  } catch {
    return false;
  }
}
