import { readFileSync, readdirSync } from 'node:fs';
import { root } from './root.mjs';

const variable = 'METEWAND_STARTED_BY';
const separator = '\u001f';

/** What a process inherits from the verb that started it; it survives a change of parent, group and session. */
export function markOf(name, pid) {
  return `${root}#${name}#${pid}`;
}

/** The environment of a child: a verb started by another verb carries both marks. */
export function marks(mark) {
  const inherited = process.env[variable];
  return { [variable]: inherited ? `${inherited}${separator}${mark}` : mark };
}

/** Ends what an earlier run of this verb, itself killed, left running. Only for verbs that run once at a time. */
export function endLeftovers(name) {
  return endProcessesMarked((mark) => mark.startsWith(markOf(name, '')));
}

/** Kills every process whose mark is wanted, and says how many there were. Without /proc there is nothing to read. */
export function endProcessesMarked(isWanted) {
  const found = runningProcesses().filter((pid) => pid !== process.pid && marksOf(pid).some(isWanted));
  for (const pid of found) kill(pid);
  return found.length;
}

function runningProcesses() {
  try {
    return readdirSync('/proc')
      .filter((entry) => /^\d+$/.test(entry))
      .map(Number);
  } catch {
    return [];
  }
}

function marksOf(pid) {
  const entry = environmentOf(pid).find((line) => line.startsWith(`${variable}=`));
  return entry ? entry.slice(variable.length + 1).split(separator) : [];
}

/** Another user's process, or one that has just ended, has no environment to read. */
function environmentOf(pid) {
  try {
    return readFileSync(`/proc/${pid}/environ`, 'utf8').split('\0');
  } catch {
    return [];
  }
}

function kill(pid) {
  try {
    process.kill(pid, 'SIGKILL');
  } catch (error) {
    if (error.code !== 'ESRCH') throw error;
  }
}
