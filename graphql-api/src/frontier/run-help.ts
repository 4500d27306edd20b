import { setTimeout as sleep } from 'node:timers/promises';
import { Logger } from '@nestjs/common';
import type { Problem } from '@metewand/frontier';
import type { RunTasksService } from './run-tasks.service.js';
import { TASK_HEARTBEAT_MS } from './search-settings.js';
import { packResult, unpackTask, type PackedTask } from './threads/packed-task.js';
import { TaskThreads } from './threads/task-threads.js';

/** A worker's threads at the tasks of a run that another worker holds. */
export class RunHelp {
  private readonly log = new Logger('Help');
  private readonly threads: TaskThreads;
  /** Ids of the tasks that this worker is at. */
  private readonly held = new Set<string>();
  private busyAt = performance.now();
  private isOver = false;

  constructor(
    private readonly tasks: RunTasksService,
    private readonly runId: string,
    problem: Problem,
    threads: number,
  ) {
    this.threads = new TaskThreads(problem, threads);
  }

  /** Resolves when no task was left for a while, or this worker is to end. */
  async go(): Promise<void> {
    const beat = setInterval(() => void this.renew(), TASK_HEARTBEAT_MS);
    try {
      while (!this.isOver && performance.now() - this.busyAt < LINGER_MS) {
        this.threads.start();
        await this.takeTasks();
        await Promise.race([this.threads.change(), sleep(LOOK_AGAIN_MS)]);
      }
    } finally {
      clearInterval(beat);
      await this.threads.end();
      await this.tasks.renew(this.runId, [...this.held], 0);
    }
  }

  end(): void {
    this.isOver = true;
  }

  private async takeTasks(): Promise<void> {
    if (this.threads.idle === 0) return;
    const taken = await this.tasks.claim(this.runId, this.threads.idle);
    for (const task of taken) void this.work(task);
    if (this.held.size > 0) this.busyAt = performance.now();
  }

  private async work(packed: PackedTask): Promise<void> {
    this.held.add(packed.id);
    try {
      const result = await this.threads.work(unpackTask(packed.task));
      await this.tasks.finish(this.runId, packResult(packed, result));
      this.held.delete(packed.id);
    } catch (error) {
      // nobody renews it any more, so that somebody else takes it
      this.held.delete(packed.id);
      this.log.warn(`task ${packed.id} of run ${this.runId}: ${String(error)}`);
    }
  }

  private async renew(): Promise<void> {
    if (this.held.size === 0) return;
    await this.tasks
      .renew(this.runId, [...this.held])
      .catch((error: unknown) => this.log.warn(`run ${this.runId}: ${String(error)}`));
  }
}

const LOOK_AGAIN_MS = 250;
/** The next round of the proof may be about to begin. */
const LINGER_MS = 5_000;
