import { Logger } from '@nestjs/common';
import type { HeldRun, LeaseAnswer, RunLeasesService } from './run-leases.service.js';
import type { RunProgressRow } from './run-result.js';
import type { SearchHost } from './search-host.js';
import { HEARTBEAT_MS } from './search-settings.js';

/** Keeps a worker's hold on a run while its search goes on, and tells the search when to end. */
export class LeaseKeeper {
  private readonly log = new Logger('Lease');
  private readonly timer = setInterval(() => this.renew(), HEARTBEAT_MS);
  private isLost = false;
  /** Not saved yet. */
  private latest: RunProgressRow | undefined;
  private savesFrom = -Infinity;
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

  /** Passes over progress that would keep the database busy: a large front is saved seldom. */
  report(progress: RunProgressRow): void {
    this.latest = progress;
    if (performance.now() >= this.savesFrom) this.renew();
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
      const answer = await this.save();
      if (answer === 'STOP') this.search.stop();
      if (answer !== 'LOST') return;
      this.isLost = true;
      await this.search.abandon();
    } catch (error) {
      // the next beat tries again; should the lease run out first, another worker takes the run over
      this.log.warn(`run ${this.run.id}: ${String(error)}`);
    }
  }

  private async save(): Promise<LeaseAnswer> {
    const began = performance.now();
    const progress = began >= this.savesFrom ? this.latest : undefined;
    if (progress) this.latest = undefined;
    const answer = await this.leases.renew(this.run, progress);
    const now = performance.now();
    if (progress) this.savesFrom = now + PAUSE_PER_SAVE * (now - began);
    return answer;
  }
}

/** Between two savings of progress lies at least so many times what a saving takes. */
const PAUSE_PER_SAVE = 10;
