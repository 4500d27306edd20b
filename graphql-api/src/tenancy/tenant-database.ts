import { AsyncLocalStorage } from 'node:async_hooks';
import { Injectable } from '@nestjs/common';
import { DataSource, type EntityManager } from 'typeorm';
import { currentCaller } from './request-context.js';

/** The one door to the organisation's rows: a transaction that says for whom it asks. */
@Injectable()
export class TenantDatabase {
  private readonly open = new AsyncLocalStorage<EntityManager>();

  constructor(private readonly dataSource: DataSource) {}

  /** Runs `work` in a transaction of the caller's organisation; joins the one already open. */
  transaction<T>(work: (em: EntityManager) => Promise<T>): Promise<T> {
    const joined = this.open.getStore();
    if (joined) return work(joined);
    const { organisationId, membershipId } = currentCaller();
    return this.dataSource.transaction(async (em) => {
      await em.query(
        `select set_config('app.organisation_id', $1, true), set_config('app.membership_id', $2, true)`,
        [organisationId, membershipId ?? ''],
      );
      return this.open.run(em, () => work(em));
    });
  }
}
