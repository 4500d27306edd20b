import { Worker } from 'node:worker_threads';
import type { Problem, ProofTask, ProofTaskResult } from '@metewand/frontier';

/** The thread that worked on a task is gone. */
export class ThreadLostError extends Error {}

interface TaskThread {
  readonly worker: Worker;
  isReady: boolean;
  task?: { resolve: (result: ProofTaskResult) => void; reject: (error: Error) => void };
}

/** Threads that work on tasks of one problem, each with a model of its own. One that dies is replaced. */
export class TaskThreads {
  private readonly threads = new Set<TaskThread>();
  private readonly waiting: (() => void)[] = [];
  private losses = 0;
  private hasEnded = false;

  constructor(
    private readonly problem: Problem,
    private readonly count: number,
  ) {}

  /** Threads whose model is compiled. */
  get ready(): number {
    return this.numberOf(({ isReady }) => isReady);
  }

  get idle(): number {
    return this.numberOf(isIdle);
  }

  /** Starts what is missing; later, what has died. */
  start(): void {
    while (this.threads.size < this.count && !this.hasEnded) this.startOne();
  }

  /** Only while a thread is idle. Rejects with ThreadLostError when the thread dies. */
  work(task: ProofTask): Promise<ProofTaskResult> {
    const thread = [...this.threads].find(isIdle);
    if (!thread) throw new Error('No thread is idle.');
    return new Promise((resolve, reject) => {
      thread.task = { resolve, reject };
      thread.worker.postMessage(task);
    });
  }

  /** Resolves as soon as a thread is ready, done or dead. */
  change(): Promise<void> {
    return new Promise((resolve) => this.waiting.push(resolve));
  }

  async end(): Promise<void> {
    this.hasEnded = true;
    await Promise.all([...this.threads].map(({ worker }) => worker.terminate()));
  }

  private startOne(): void {
    const worker = new Worker(new URL('./task-thread.js', import.meta.url), { workerData: this.problem });
    const thread: TaskThread = { worker, isReady: false };
    this.threads.add(thread);
    worker.on('message', (message: ProofTaskResult | 'ready') => this.hear(thread, message));
    worker.on('error', (error) => this.lose(thread, error));
    worker.on('exit', () => this.lose(thread, new Error('A thread of the search ended.')));
  }

  private hear(thread: TaskThread, message: ProofTaskResult | 'ready'): void {
    if (message === 'ready') thread.isReady = true;
    else {
      this.losses = 0;
      thread.task?.resolve(message);
      thread.task = undefined;
    }
    this.tellChange();
  }

  private lose(thread: TaskThread, reason: Error): void {
    if (!this.threads.delete(thread) || this.hasEnded) return;
    this.losses += 1;
    const given = this.losses > MOST_LOSSES ? reason : new ThreadLostError(reason.message);
    thread.task?.reject(given);
    if (this.losses > MOST_LOSSES) this.hasEnded = true;
    this.tellChange();
  }

  private tellChange(): void {
    // what waits for a task's result must have taken it in before
    queueMicrotask(() => this.waiting.splice(0).forEach((resolve) => resolve()));
  }

  private numberOf(is: (thread: TaskThread) => boolean): number {
    let number = 0;
    for (const thread of this.threads) if (is(thread)) number += 1;
    return number;
  }
}

function isIdle({ isReady, task }: TaskThread): boolean {
  return isReady && task === undefined;
}

/** So many in a row without a task done between are no accident. */
const MOST_LOSSES = 5;
