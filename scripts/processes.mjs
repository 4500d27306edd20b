import { spawn } from 'node:child_process';
import { readFileSync } from 'node:fs';
import { createInterface } from 'node:readline';
import { endProcessesMarked, markOf, marks } from './process-marks.mjs';

const patienceMs = 10_000;
const lastWordsMs = 2_000;

/**
 * Runs one verb. `work(processes)` returns the exit code, or nothing for 0. Every way out – the end, an error,
 * a child that died, Ctrl-C, a closed terminal, a parent that is gone – stops all that was started, newest first.
 */
export async function runVerb(name, work) {
  for (const stream of [process.stdout, process.stderr]) stream.on('error', () => {}); // the terminal may be gone
  const processes = new Processes(markOf(name, process.pid));
  let code;
  try {
    code = (await Promise.race([work(processes), processes.broken, interruption()])) ?? 0;
  } catch (error) {
    if (error.message) console.error(`\n${error.message}`);
    code = error.exitCode ?? 1;
  }
  await processes.stop();
  process.exit(code);
}

/** The child processes of one verb, and whatever else must be let go before it ends. */
export class Processes {
  #mark;
  #parts = 0;
  #held = [];
  #stopped;
  #break;
  /** Rejects as soon as a child that should keep running has ended. */
  broken = new Promise((_resolve, reject) => (this.#break = reject));

  constructor(mark) {
    this.#mark = mark;
    this.broken.catch(() => {});
  }

  /** Starts a child that runs until the verb ends; resolves with the match of its ready line. */
  start(name, command, { ready, ...options }) {
    const child = this.#spawn(command, options);
    let isReady = false;
    return new Promise((resolve, reject) => {
      forEachLine(child, (line) => {
        console.log(`${name.padEnd(8)}| ${line}`);
        const match = isReady ? null : ready.exec(line);
        if (!match) return;
        isReady = true;
        resolve(match);
      });
      child.ended.then((how) => {
        if (this.#stopped) return;
        const error = new Error(
          `${name} ended ${isReady ? 'unexpectedly' : 'before it was ready'} (${how}).`,
        );
        reject(error);
        this.#break(error);
      });
    });
  }

  /** Runs a child to its end; resolves with its exit code and its output, which is also shown unless `quiet`. */
  async run(command, { quiet = false, limitMs, ...options } = {}) {
    const child = this.#spawn(command, options);
    let output = '';
    for (const [source, target] of [
      [child.stdout, process.stdout],
      [child.stderr, process.stderr],
    ]) {
      source.setEncoding('utf8').on('data', (text) => {
        output += text;
        if (!quiet) target.write(text);
      });
    }
    const limit = limitMs && setTimeout(() => void terminate(child), limitMs);
    const how = await child.ended;
    clearTimeout(limit);
    return { code: child.exitCode ?? 1, how, output };
  }

  /** Like `run`, quietly; a failure throws with the output, success resolves with it. */
  async mustRun(what, command, options) {
    const { code, how, output } = await this.run(command, { quiet: true, ...options });
    if (code !== 0) throw new Error(`${what} failed (${how}):\n${output.trim()}`);
    return output;
  }

  /** Keeps what `opening` resolves with until the verb ends, then releases it, even if stopping came first. */
  hold(opening, release) {
    this.#held.push(async () => {
      const opened = await opening.then((value) => ({ value })).catch(() => undefined);
      if (opened) await release(opened.value);
    });
    return opening;
  }

  /** A part of the verb: its children stop when it ends, and the death of one of them ends only this part. */
  async part(work) {
    this.#parts += 1;
    const part = new Processes(`${this.#mark}.${this.#parts}`);
    this.#held.push(() => part.stop());
    try {
      return await Promise.race([work(part), part.broken]);
    } finally {
      await part.stop();
    }
  }

  stop() {
    this.#stopped ??= this.#releaseAll();
    return this.#stopped;
  }

  async #releaseAll() {
    while (this.#held.length > 0) {
      await this.#held
        .pop()()
        .catch((error) => console.error(error.message));
    }
    endProcessesMarked((mark) => mark === this.#mark);
  }

  /** Each child leads a group of its own, so that a Ctrl-C reaches it only through `stop`, in order. */
  #spawn([program, ...args], { cwd, env } = {}) {
    if (this.#stopped) throw new Error('');
    const child = spawn(program, args, {
      cwd,
      env: { ...process.env, ...env, ...marks(this.#mark) },
      detached: true,
      stdio: ['ignore', 'pipe', 'pipe'],
    });
    child.ended = new Promise((resolve) => {
      child.once('error', (error) => resolve(error.message));
      const end = (code, signal) => resolve(signal ?? `exit code ${code}`);
      child.once('close', end);
      child.once('exit', (...how) => setTimeout(end, lastWordsMs, ...how)); // a grandchild may hold the pipes open
    });
    this.#held.push(() => terminate(child));
    return child;
  }
}

function forEachLine(child, show) {
  for (const stream of [child.stdout, child.stderr]) createInterface({ input: stream }).on('line', show);
}

/** Ends a child and its group: asks first, insists after ten seconds, then takes what is left of the group. */
async function terminate(child) {
  if (child.pid === undefined) return;
  if (child.exitCode === null && child.signalCode === null) {
    signalGroup(child.pid, 'SIGTERM');
    const insist = setTimeout(() => signalGroup(child.pid, 'SIGKILL'), patienceMs);
    await new Promise((resolve) => child.once('exit', resolve));
    clearTimeout(insist);
  }
  signalGroup(child.pid, 'SIGKILL');
}

function signalGroup(leader, signal) {
  try {
    process.kill(-leader, signal);
  } catch (error) {
    if (error.code !== 'ESRCH') throw error;
  }
}

/** Rejects, with the exit code a shell would report, when someone wants the verb to end. */
function interruption() {
  return new Promise((_resolve, reject) => {
    for (const [signal, number] of [
      ['SIGINT', 2],
      ['SIGTERM', 15],
      ['SIGHUP', 1],
    ]) {
      process.on(signal, () => reject(Object.assign(new Error('Stopping.'), { exitCode: 128 + number })));
    }
    process.on('uncaughtException', reject);
    process.on('unhandledRejection', reject);
    if (process.env.npm_lifecycle_event)
      watchParent(() => reject(Object.assign(new Error(''), { exitCode: 129 })));
  });
}

/** npm can be killed in a way it cannot pass on; then this process, or the shell between, gets another parent. */
function watchParent(whenGone) {
  const ancestry = () => `${process.ppid} ${shellParent(process.ppid)}`;
  const atFirst = ancestry();
  setInterval(() => ancestry() === atFirst || whenGone(), 1000).unref();
}

function shellParent(pid) {
  try {
    return /^\d+ \(sh\) \S (\d+)/.exec(readFileSync(`/proc/${pid}/stat`, 'utf8'))?.[1];
  } catch {
    return undefined;
  }
}
