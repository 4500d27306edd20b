import { setImmediate, setTimeout as sleep } from 'node:timers/promises';
import { workTask, type beginSearch, type Problem, type ProofTask } from '@metewand/frontier';
import { SharedTasks } from './shared-tasks.js';
import type { TaskExchange } from './task-exchange.js';
import { TaskThreads, ThreadLostError } from './task-threads.js';

type Begun = Extract<ReturnType<typeof beginSearch>, { search: unknown }>;

/** Sees to it that the tasks of a search are worked on, by threads of this process and by whoever else takes them. */
export class ProofWork {
  private readonly threads: TaskThreads;
  private readonly tasks: SharedTasks;
  private broken: Error | undefined;

  constructor(
    problem: Problem,
    private readonly begun: Begun,
    { threads, exchange }: { threads: number; exchange?: TaskExchange },
  ) {
    this.threads = new TaskThreads(problem, threads > 1 ? threads : 0);
    this.tasks = new SharedTasks(begun.search, Math.max(1, threads), exchange);
  }

  /** Hands out what there is to do and waits until something has come of it. */
  async goOn(): Promise<void> {
    const { rounds } = this.begun.search;
    await this.tasks.exchange(this.threads.idle > 0 || this.threads.ready === 0);
    // many a search is over in the first round, before a thread could have started
    if (rounds > ROUNDS_ALONE) this.threads.start();
    while (this.threads.idle > 0) {
      const task = this.tasks.next();
      if (task === undefined) break;
      void this.handOut(task);
    }
    if (this.threads.ready === 0 || rounds <= ROUNDS_OF_SHORT_TASKS) await this.workHere();
    else await this.somethingNew();
    if (this.broken) throw this.broken;
  }

  end(): Promise<void> {
    return this.threads.end();
  }

  /** Where there are no threads yet, and where tasks are so short that threads are not kept waiting by it. */
  private async workHere(): Promise<void> {
    const task = this.tasks.next();
    if (!task) return this.somethingNew();
    this.tasks.accept(workTask(this.begun.model, task));
    await setImmediate();
  }

  private async somethingNew(): Promise<void> {
    await Promise.race([this.threads.change(), sleep(LOOK_AGAIN_MS, undefined, { ref: false })]);
  }

  private async handOut(task: ProofTask): Promise<void> {
    try {
      this.tasks.accept(await this.threads.work(task));
    } catch (error) {
      if (error instanceof ThreadLostError) this.tasks.putBack(task);
      else this.broken = error as Error;
    }
  }
}

const LOOK_AGAIN_MS = 100;
const ROUNDS_ALONE = 1;
const ROUNDS_OF_SHORT_TASKS = 2;
