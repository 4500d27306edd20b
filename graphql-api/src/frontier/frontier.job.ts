import { AsyncResource } from 'node:async_hooks';
import { Inject, Injectable, Logger, type BeforeApplicationShutdown } from '@nestjs/common';
import { JobHandler, type HandlesJob } from '../jobs/job-handler.decorator.js';
import { PassedOver } from '../jobs/passed-over.js';
import { LeaseKeeper } from './lease-keeper.js';
import { RunLeasesService, type HeldRun } from './run-leases.service.js';
import type { RunResultRow } from './run-result.js';
import { RunTasksService } from './run-tasks.service.js';
import type { SearchHost } from './search-host.js';
import { SEARCH_THREADS } from './search-settings.js';
import { SearchThreads } from './search-threads.js';

/**
 * Searches a run. The same run may be delivered twice, or its worker may die: the lease lets one worker at a time
 * search, and a search begun again from its seed comes to the same result.
 */
@JobHandler('frontier.search')
@Injectable()
export class FrontierJob implements HandlesJob<'frontier.search'>, BeforeApplicationShutdown {
  private readonly log = new Logger('Frontier');
  private readonly handBacks = new Set<() => Promise<void>>();
  private closing = false;

  constructor(
    private readonly leases: RunLeasesService,
    private readonly tasks: RunTasksService,
    private readonly passedOver: PassedOver,
    private readonly searchThreads: SearchThreads,
    @Inject(SEARCH_THREADS) private readonly threads: number,
  ) {}

  async run({ runId }: { runId: string }) {
    if (this.closing) return;
    const run = await this.leases.claim(runId);
    if (run) await this.passedOver.during(run.id, () => this.search(run));
  }

  /** Runs under way go back, so that another worker need not wait for their leases to run out. */
  async beforeApplicationShutdown() {
    this.closing = true;
    for (const handBack of this.handBacks) await handBack();
  }

  private async search(run: HeldRun) {
    const { problem, seed, evaluations, effort, seenEvaluations } = run;
    const search = this.searchThreads.begin({
      problem,
      seed,
      evaluations,
      effort,
      threads: this.threads,
      leastEvaluations: seenEvaluations,
    });
    const keeper = new LeaseKeeper(this.leases, run, search);
    let abandoned = false;
    const handBack = AsyncResource.bind(async () => {
      abandoned = true;
      await search.abandon();
      await this.leases.handBack(run);
    });
    this.handBacks.add(handBack);
    try {
      const outcome = await this.outcomeOf(search, run, keeper);
      await keeper.end();
      if (abandoned || keeper.lost) return;
      if (outcome) await this.leases.finish(run, outcome);
      else
        await this.leases.fail(
          run,
          'The search broke off by an error of ours. Nothing you entered is lost; start it again.',
        );
    } finally {
      this.handBacks.delete(handBack);
    }
  }

  private async outcomeOf(
    search: SearchHost,
    run: HeldRun,
    keeper: LeaseKeeper,
  ): Promise<RunResultRow | undefined> {
    try {
      return await search.result({
        onProgress: (progress) => keeper.report(progress),
        exchange: (request) => this.tasks.exchange(run, request),
      });
    } catch (error) {
      this.log.error(error instanceof Error ? (error.stack ?? error.message) : String(error));
      return undefined;
    }
  }
}
