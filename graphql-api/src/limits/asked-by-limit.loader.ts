import { Injectable } from '@nestjs/common';
import { RequestLoader } from '../common/request-loader.js';
import { TenantDatabase } from '../tenancy/tenant-database.js';
import type { Limit } from './entities/limit.entity.js';
import { LimitsService } from './limits.service.js';

/** What all candidates of the round would take of each limit; a round is costed once, whatever its number of limits. */
@Injectable()
export class AskedByLimitLoader extends RequestLoader<Limit, string> {
  constructor(
    private readonly db: TenantDatabase,
    private readonly limits: LimitsService,
  ) {
    super();
  }

  protected batch(limits: readonly Limit[]) {
    return this.db.transaction(async () => {
      const asked = new Map<string, string>();
      for (const roundId of new Set(limits.map((limit) => limit.roundId))) {
        for (const [id, amount] of await this.limits.askedOfRound(roundId)) asked.set(id, amount);
      }
      return limits.map(({ id }) => asked.get(id) ?? new Error(`Limit ${id} is gone.`));
    });
  }
}
