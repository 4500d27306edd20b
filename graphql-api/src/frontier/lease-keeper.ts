import { Logger } from '@nestjs/common';
import type { HeldRun, RunLeasesService } from './run-leases.service.js';
import type { RunProgressRow } from './run-result.js';
import type { SearchHost } from './search-host.js';
import { HEARTBEAT_MS } from './search-settings.js';

/** Keeps a worker's hold on a run while its search goes on, and tells the search when to end. */
export class LeaseKeeper {
  private readonly log = new Logger('Lease');
  private readonly timer = setInterval(() => this.renew(), HEARTBEAT_MS);
  private isLost = false;
  private latest: RunProgressRow | undefined;
  private renewal: Promise<void> | undefined;

  constructor(
    private readonly leases: RunLeasesService,
    private readonly run: HeldRun,
    private readonly search: SearchHost,
  ) {}

  /** Another worker holds the run now. */
  get lost(): boolean {
    return this.isLost;
  }

  /** Passes over progress that comes faster than the database takes it. */
  report(progress: RunProgressRow): void {
    this.latest = progress;
    this.renew();
  }

  async end(): Promise<void> {
    clearInterval(this.timer);
    await this.renewal;
  }

  private renew(): void {
    this.renewal ??= this.renewOnce().finally(() => (this.renewal = undefined));
  }

  private async renewOnce(): Promise<void> {
    try {
      const answer = await this.leases.renew(this.run, this.latest);
      if (answer === 'STOP') this.search.stop();
      if (answer !== 'LOST') return;
      this.isLost = true;
      await this.search.abandon();
    } catch (error) {
      // the next beat tries again; should the lease run out first, another worker takes the run over
      this.log.warn(`run ${this.run.id}: ${String(error)}`);
    }
  }
}
