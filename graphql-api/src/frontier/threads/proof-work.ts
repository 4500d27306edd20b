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
    await this.tasks.exchange(this.threads.idle > 0 || this.threads.ready === 0);
    this.threads.start();
    while (this.threads.idle > 0) {
      const task = this.tasks.next();
      if (task === undefined) break;
      void this.handOut(task);
    }
    if (this.threads.ready === 0) await this.workHere();
    else await Promise.race([this.threads.change(), sleep(LOOK_AGAIN_MS, undefined, { ref: false })]);
    if (this.broken) throw this.broken;
  }

  end(): Promise<void> {
    return this.threads.end();
  }

  /** While threads are still starting, or where there are none. */
  private async workHere(): Promise<void> {
    const task = this.tasks.next();
    if (task) this.tasks.accept(workTask(this.begun.model, task));
    else await sleep(LOOK_AGAIN_MS);
    await setImmediate();
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
