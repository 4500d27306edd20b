import {
  Inject,
  Injectable,
  Logger,
  type OnApplicationBootstrap,
  type OnApplicationShutdown,
} from '@nestjs/common';
import { DiscoveryService } from '@nestjs/core';
import { run, type Runner, type Task, type TaskList } from 'graphile-worker';
import { WORKER_ENV, type WorkerEnv } from '../config/worker-env.js';
import { runInScope } from '../tenancy/request-context.js';
import { JobHandler, type HandlesJob } from './job-handler.decorator.js';
import type { JobTask } from './jobs.service.js';
import { PassedOver } from './passed-over.js';

interface Envelope {
  organisationId: string;
  payload: never;
}

/** Takes jobs from the queue and runs each in the context of its organisation. */
@Injectable()
export class JobRunnerService implements OnApplicationBootstrap, OnApplicationShutdown {
  private readonly log = new Logger('Jobs');
  private runner: Runner | undefined;

  constructor(
    private readonly discovery: DiscoveryService,
    private readonly passedOver: PassedOver,
    @Inject(WORKER_ENV) private readonly env: WorkerEnv,
  ) {}

  async onApplicationBootstrap() {
    this.runner = await run({
      connectionString: this.env.databaseWorkerUrl,
      concurrency: this.env.concurrency,
      noHandleSignals: true,
      forbiddenFlags: () => this.passedOver.flags(),
      parsedCronItems: [],
      taskList: this.taskList(),
    });
  }

  async onApplicationShutdown() {
    await this.runner?.stop();
  }

  private taskList(): TaskList {
    const wrappers = this.discovery.getProviders({ metadataKey: JobHandler.KEY });
    const entries = wrappers.map((wrapper): [JobTask, Task] => [
      this.discovery.getMetadataByDecorator(JobHandler, wrapper)!,
      this.inOrganisation(wrapper.instance as HandlesJob<JobTask>),
    ]);
    return Object.fromEntries(entries);
  }

  private inOrganisation(handler: HandlesJob<JobTask>): Task {
    return async (envelope, { job }) => {
      const { organisationId, payload } = envelope as Envelope;
      const caller = { organisationId, membershipId: null, userId: null, sessionId: null, roles: [] };
      this.log.log(`${job.task_identifier} ${job.id} organisation ${organisationId}`);
      await runInScope({ requestId: `job-${job.id}`, caller, loaders: new Map() }, () =>
        handler.run(payload),
      );
    };
  }
}
