import { Inject, Injectable, type BeforeApplicationShutdown } from '@nestjs/common';
import { JobHandler, type HandlesJob } from '../jobs/job-handler.decorator.js';
import { PassedOver } from '../jobs/passed-over.js';
import { RunHelp } from './run-help.js';
import { RunTasksService } from './run-tasks.service.js';
import { SEARCH_THREADS } from './search-settings.js';

/** Calls a worker to a run that another one holds: it does tasks of its proof as long as there are any. */
@JobHandler('frontier.task')
@Injectable()
export class FrontierTaskJob implements HandlesJob<'frontier.task'>, BeforeApplicationShutdown {
  private readonly underWay = new Map<RunHelp, Promise<void>>();
  private closing = false;

  constructor(
    private readonly tasks: RunTasksService,
    private readonly passedOver: PassedOver,
    @Inject(SEARCH_THREADS) private readonly threads: number,
  ) {}

  async run({ runId }: { runId: string }) {
    const problem = this.closing ? undefined : await this.tasks.problemOf(runId);
    if (!problem || this.closing) return;
    const help = new RunHelp(this.tasks, runId, problem, this.threads);
    const going = this.passedOver.during(runId, () => help.go());
    this.underWay.set(help, going);
    await going.finally(() => this.underWay.delete(help));
  }

  /** Tasks under way go back, so that nobody need wait for their leases to run out. */
  async beforeApplicationShutdown() {
    this.closing = true;
    for (const help of this.underWay.keys()) help.end();
    await Promise.allSettled(this.underWay.values());
  }
}
