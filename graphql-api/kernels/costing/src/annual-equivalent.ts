import { checkNumber, checkWhole } from './checks.js';
import { CostingError } from './costing-error.js';
import { capitalRecovery, discountFactor, sinkingFund } from './discount.js';
import type { DatedCost } from './life-cycle-cost.js';

/** EAC = LCC · A/P: the level payment at the end of each year that is worth the present cost (Newnan ch. 6). */
export function equivalentAnnualCost(presentCost: number, rate: number, years: number): number {
  checkNumber('presentCost', presentCost);
  return presentCost * capitalRecovery(rate, years);
}

export interface CapitalisedInput {
  readonly rate: number;
  readonly single: readonly DatedCost[];
  /** Paid at the end of every `everyYears` years, for ever. */
  readonly recurring: readonly { readonly amount: number; readonly everyYears: number }[];
  /** Paid each year from `firstYear` on, for ever. */
  readonly yearly: readonly { readonly amount: number; readonly firstYear: number }[];
}

/** Present cost of something kept for ever: A/i for what comes each year, A/F first for what comes less often. */
export function capitalisedCost({ rate, single, recurring, yearly }: CapitalisedInput): number {
  if (!(rate > 0)) throw new CostingError('rate', `must be above 0 for a cost without end, got ${rate}.`);
  const singles = single.map(({ year, amount }) => amount * discountFactor(rate, year));
  const repeats = recurring.map(({ amount, everyYears }) => (amount * sinkingFund(rate, everyYears)) / rate);
  const yearlies = yearly.map(({ amount, firstYear }) => {
    checkWhole('yearly.firstYear', firstYear, 1);
    return (amount / rate) * discountFactor(rate, firstYear - 1);
  });
  return [...singles, ...repeats, ...yearlies].reduce((total, part) => total + part, 0);
}

export interface EconomicLifeInput {
  readonly rate: number;
  readonly price: number;
  /** Cost of year 1, 2, …; its length is the longest life looked at. */
  readonly yearlyCosts: readonly number[];
  /** What is got back when sold after 1, 2, … years. */
  readonly salvages: readonly number[];
}

export interface EconomicLife {
  readonly lifeYears: number;
  readonly annualCost: number;
  /** Equivalent annual cost when kept for 1, 2, … years. */
  readonly annualCosts: readonly number[];
}

/** The life with the lowest equivalent annual cost; of equals the shortest (Newnan ch. 13). */
export function economicLife({ rate, price, yearlyCosts, salvages }: EconomicLifeInput): EconomicLife {
  checkWhole('yearlyCosts.length', yearlyCosts.length, 1);
  if (salvages.length !== yearlyCosts.length) {
    throw new CostingError('salvages', `must have one amount for each of the ${yearlyCosts.length} years.`);
  }
  let paid = price;
  const annualCosts = yearlyCosts.map((cost, i) => {
    const factor = discountFactor(rate, i + 1);
    paid += cost * factor;
    return equivalentAnnualCost(paid - salvages[i] * factor, rate, i + 1);
  });
  const annualCost = Math.min(...annualCosts);
  return { lifeYears: annualCosts.indexOf(annualCost) + 1, annualCost, annualCosts };
}
