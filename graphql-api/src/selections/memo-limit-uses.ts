import type { PricedCandidate } from '../costing/round-costs.service.js';
import type { Limit } from '../limits/entities/limit.entity.js';
import { boundOf, formatUse, measured, useOf } from '../limits/limit-measures.js';
import type { MemoLimitUse } from './models/memo.model.js';

export interface LimitUse extends MemoLimitUse {
  /** Of its most, 0 to 1; undefined without a most above zero. */
  share: number | undefined;
}

/** What the chosen candidates take of each limit. */
export function limitUses(
  limits: readonly Limit[],
  chosen: readonly PricedCandidate[],
  currency: string,
): LimitUse[] {
  return limits.map((limit) => {
    const used = chosen.reduce((sum, each) => sum + useOf(limit, measured(each)), 0);
    const most = limit.most === null ? 0 : boundOf(limit.measure, limit.most, currency);
    return {
      name: limit.name,
      used: formatUse(limit.measure, used, currency),
      least: limit.least,
      most: limit.most,
      share: most > 0 ? used / most : undefined,
    };
  });
}
