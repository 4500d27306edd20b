import { spawn, type ChildProcess } from 'node:child_process';
import { once } from 'node:events';
import { join } from 'node:path';

/** The real worker, as built, in a process of its own; with so many threads for a search, or its default. */
export async function startWorker(threads?: number): Promise<ChildProcess> {
  const worker = spawn(process.execPath, [join(__dirname, '../dist/worker.js')], {
    stdio: ['ignore', 'pipe', 'inherit'],
    env: threads ? { ...process.env, SEARCH_THREADS: String(threads) } : process.env,
  });
  let output = '';
  while (!output.includes('worker ready')) {
    const [chunk] = (await once(worker.stdout, 'data')) as [Buffer];
    output += chunk.toString();
  }
  worker.stdout.resume();
  return worker;
}

export async function stopWorker(worker: ChildProcess, signal: NodeJS.Signals = 'SIGTERM') {
  if (worker.exitCode !== null || worker.signalCode !== null) return;
  const exited = once(worker, 'exit');
  worker.kill(signal);
  await exited;
}
