import { addRates, rateToNumber, roundHalfUp, roundTogether } from '@metewand/money';
import { equivalentAnnualCost } from './annual-equivalent.js';
import { CostingError } from './costing-error.js';
import type { CostPart, Horizon, LaterPart } from './cost-parts.js';
import { capitalParts, factorOf, laterParts, presentValueIn } from './cost-parts.js';
import type { CostYear } from './cost-years.js';
import { costYears, yearsOf } from './cost-years.js';
import type { Timing } from './discount.js';
import { capitalRecovery } from './discount.js';
import type { CandidateFigures, CostAssumptions, QuoteFigures } from './quote-figures.js';
import { checkCandidate, checkQuote, quoteRates } from './quote-figures.js';

/** All amounts gross, in minor units of `currency`. */
export interface QuoteCost {
  readonly currency: string;
  readonly capitalGrossMinor: number;
  readonly lifeCycleCostMinor: number;
  readonly equivalentAnnualCostMinor: number;
  /** A/P: equivalent annual cost = life-cycle cost × this factor, before either is rounded. */
  readonly capitalRecoveryFactor: number;
  /** Service, consumables and energy of a year after the warranty. */
  readonly runningYearlyGrossMinor: number;
  /** The same less what the replaced unit costs; below zero is a saving. */
  readonly incrementalRunningYearlyMinor: number;
  /** True when service was counted as nothing for want of a price: the figures are then too low. */
  readonly servicePriceMissing: boolean;
  readonly parts: readonly CostPart[];
  readonly years: readonly CostYear[];
}

/**
 * Costs a quote over the candidate's useful life in constant prices. Rounding, always half up: the capital once, each
 * yearly amount once, the present value of all that comes after year 0 once. The life-cycle cost is the sum of the two
 * rounded totals; the annual cost is capital and unrounded present value times A/P, rounded once. Parts and years are
 * rounded together with their total (largest remainder), so both columns add up to the life-cycle cost exactly.
 */
export function costOfQuote(
  quote: QuoteFigures,
  candidate: CandidateFigures,
  assumptions: CostAssumptions,
): QuoteCost {
  checkQuote(quote);
  checkCandidate(candidate);
  checkTiming(assumptions.timing);
  const rates = quoteRates(quote.currency, assumptions);
  const { discountRate } = rates;
  const horizon = { years: candidate.usefulLifeYears, discountRate, timing: assumptions.timing };
  const capital = capitalParts(quote, candidate, rates);
  const capitalGrossMinor = sumOf(capital, (part) => part.presentMinor);
  const unrounded = laterParts(quote, candidate, rates);
  const later = withPresentValues(unrounded, horizon);
  const exactCost = capitalGrossMinor + exactPresentValue(unrounded, horizon);
  const runningYearlyGrossMinor = sumOf(later, (part) => (part.kind === 'RESIDUAL' ? 0 : part.amountMinor));
  return {
    currency: assumptions.currency,
    capitalGrossMinor,
    lifeCycleCostMinor: capitalGrossMinor + sumOf(later, (part) => part.presentMinor),
    equivalentAnnualCostMinor: roundHalfUp(equivalentAnnualCost(exactCost, discountRate, horizon.years)),
    capitalRecoveryFactor: capitalRecovery(discountRate, horizon.years),
    runningYearlyGrossMinor,
    incrementalRunningYearlyMinor: runningYearlyGrossMinor - candidate.currentRunningYearlyMinor,
    servicePriceMissing: quote.serviceYearlyMinor === null,
    parts: [...capital, ...later],
    years: costYears(capitalGrossMinor, unrounded, horizon),
  };
}

function withPresentValues(parts: readonly LaterPart[], horizon: Horizon): CostPart[] {
  const years = yearsOf(horizon);
  const exact = parts.map((part) => addRates(...years.map((year) => presentValueIn(part, year, horizon))));
  const rounded = roundTogether(exact).parts;
  return parts.map((part, i) => ({
    ...part,
    factor: sumOf(years, (year) => factorOf(part, year, horizon)),
    presentMinor: rounded[i],
  }));
}

function exactPresentValue(parts: readonly LaterPart[], horizon: Horizon): number {
  const values = parts.flatMap((part) => yearsOf(horizon).map((year) => presentValueIn(part, year, horizon)));
  return rateToNumber(addRates(...values));
}

function sumOf<T>(items: readonly T[], amount: (item: T) => number): number {
  return items.reduce((sum, item) => sum + amount(item), 0);
}

function checkTiming(timing: Timing): void {
  if (timing === 'END_OF_YEAR' || timing === 'MIDDLE_OF_YEAR') return;
  throw new CostingError('timing', `must be END_OF_YEAR or MIDDLE_OF_YEAR, got ${String(timing)}.`);
}
