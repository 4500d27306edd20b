import { checkNumber, checkWhole } from './checks.js';
import type { Timing } from './discount.js';
import { discountFactor } from './discount.js';
import { escalate } from './escalation.js';

/** A yearly payment in today's prices, from `firstYear` (1 unless said) to the end, rising by `growth` each year. */
export interface YearlyCost {
  readonly amount: number;
  readonly firstYear?: number;
  readonly growth?: number;
}

/** Net present value of flows[0] now, flows[1] in year 1 and so on. */
export function presentValue(flows: readonly number[], rate: number, timing: Timing = 'END_OF_YEAR'): number {
  return flows.reduce((total, flow, year) => {
    checkNumber(`flows[${year}]`, flow);
    return total + flow * discountFactor(rate, year, timing);
  }, 0);
}

export function presentValueOfYearly(
  { amount, firstYear = 1, growth = 0 }: YearlyCost,
  rate: number,
  years: number,
  timing: Timing = 'END_OF_YEAR',
): number {
  checkNumber('amount', amount);
  checkWhole('firstYear', firstYear, 1);
  checkWhole('years', years, 1);
  const flows = Array.from({ length: years + 1 }, (_, year) =>
    year < firstYear ? 0 : escalate(amount, growth, year),
  );
  return presentValue(flows, rate, timing);
}
