import { Injectable } from '@nestjs/common';
import type { EntityManager } from 'typeorm';

/** Every task that a worker knows, with what its job carries. */
export interface JobPayloads {
  'frontier.search': { runId: string };
  'frontier.task': { runId: string };
  'letter.send': { letterId: string };
}

export type JobTask = keyof JobPayloads;

@Injectable()
export class JobsService {
  /** Queues the job in the open transaction: the change and its job both happen or neither. */
  async enqueue<T extends JobTask>(em: EntityManager, task: T, payload: JobPayloads[T]): Promise<void> {
    await em.query('select jobs.enqueue($1, $2)', [task, JSON.stringify(payload)]);
  }

  /** Queues a 'frontier.task' that only a worker takes which does not work on the run already. */
  async callToRun(em: EntityManager, runId: string): Promise<void> {
    await em.query('select jobs.call_to_run($1)', [runId]);
  }
}
