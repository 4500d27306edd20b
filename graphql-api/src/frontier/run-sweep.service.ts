import { Injectable, Logger, type OnApplicationBootstrap, type OnModuleDestroy } from '@nestjs/common';
import { DataSource } from 'typeorm';
import { JobsService } from '../jobs/jobs.service.js';
import { runInScope } from '../tenancy/request-context.js';
import { TenantDatabase } from '../tenancy/tenant-database.js';
import { SWEEP_MS } from './search-settings.js';

interface LostRun {
  organisationId: string;
  runId: string;
}

/** Queues again every run whose worker fell silent, of whatever organisation. */
@Injectable()
export class RunSweepService implements OnApplicationBootstrap, OnModuleDestroy {
  private readonly log = new Logger('Sweep');
  private timer: NodeJS.Timeout | undefined;

  constructor(
    private readonly dataSource: DataSource,
    private readonly db: TenantDatabase,
    private readonly jobs: JobsService,
  ) {}

  async onApplicationBootstrap() {
    await this.sweep();
    this.timer = setInterval(() => void this.sweep(), SWEEP_MS);
  }

  onModuleDestroy() {
    clearInterval(this.timer);
  }

  private async sweep() {
    try {
      const lost = await this.dataSource.query<LostRun[]>(
        'select organisation_id as "organisationId", run_id as "runId" from jobs.lost_runs()',
      );
      for (const run of lost) await this.queue(run);
    } catch (error) {
      this.log.warn(String(error));
    }
  }

  private queue({ organisationId, runId }: LostRun) {
    this.log.log(`run ${runId} of organisation ${organisationId} is queued again`);
    const caller = { organisationId, membershipId: null, userId: null, sessionId: null, roles: [] };
    return runInScope({ requestId: `sweep-${runId}`, caller, loaders: new Map() }, () =>
      this.db.transaction((em) => this.jobs.enqueue(em, 'frontier.search', { runId })),
    );
  }
}
