import { Injectable } from '@nestjs/common';
import { In } from 'typeorm';
import { normaliseWeights } from '@metewand/scoring';
import { groupByKey, RequestLoader } from '../common/request-loader.js';
import { TenantDatabase } from '../tenancy/tenant-database.js';
import { Criterion } from './entities/criterion.entity.js';

/** A criterion's share of all swing weights of its round, as decimal text with six decimals. */
@Injectable()
export class WeightByCriterionLoader extends RequestLoader<Criterion, string> {
  constructor(private readonly db: TenantDatabase) {
    super();
  }

  protected batch(criteria: readonly Criterion[]) {
    return this.db.transaction(async (em) => {
      const roundIds = [...new Set(criteria.map(({ roundId }) => roundId))];
      const all = await em.findBy(Criterion, { roundId: In(roundIds) });
      const rounds = groupByKey(roundIds, all, ({ roundId }) => roundId);
      const weights = new Map(rounds.flatMap(weightsOf));
      return criteria.map(({ id }) => weights.get(id) ?? new Error(`Criterion ${id} is gone.`));
    });
  }
}

function weightsOf(criteria: readonly Criterion[]): [id: string, weight: string][] {
  const shares = normaliseWeights(criteria.map(({ swingWeight }) => swingWeight));
  return criteria.map(({ id }, i) => [id, shares[i].toFixed(6)]);
}
