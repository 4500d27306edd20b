import type { YearlyCost } from './cash-flow.js';
import { presentValueOfYearly } from './cash-flow.js';
import { checkNumber, checkWhole, checkYear } from './checks.js';
import type { Timing } from './discount.js';
import { discountFactor } from './discount.js';

export interface DatedCost {
  readonly year: number;
  readonly amount: number;
}

/** All amounts in one money unit and one price basis: a real rate with constant prices, or a nominal one with risen prices. */
export interface LifeCycleInput {
  readonly rate: number;
  readonly years: number;
  readonly initial: number;
  readonly yearly: readonly YearlyCost[];
  readonly replacements?: readonly DatedCost[];
  readonly residual?: number;
  readonly timing?: Timing;
}

/** Present values; `residual` counts against the cost and is therefore zero or less. */
export interface LifeCycleCost {
  readonly initial: number;
  readonly replacements: number;
  readonly yearly: readonly number[];
  readonly residual: number;
  readonly total: number;
}

/**
 * LCC = I + Repl − Res + the present values of energy, water, maintenance and other yearly costs (Fuller, NIST).
 * A yearly amount below zero is a saving. Replacements and the residual fall at the end of their year.
 */
export function lifeCycleCost(input: LifeCycleInput): LifeCycleCost {
  const { rate, years, initial, yearly, replacements = [], residual = 0, timing } = input;
  checkWhole('years', years, 1);
  checkNumber('initial', initial);
  checkNumber('residual', residual);
  const parts = {
    initial,
    replacements: replacements.reduce((total, cost) => total + presentValueOfDated(cost, rate, years), 0),
    yearly: yearly.map((cost) => presentValueOfYearly(cost, rate, years, timing)),
    residual: -residual * discountFactor(rate, years),
  };
  const total = parts.yearly.reduce(
    (sum, part) => sum + part,
    parts.initial + parts.replacements + parts.residual,
  );
  return { ...parts, total };
}

function presentValueOfDated({ year, amount }: DatedCost, rate: number, years: number): number {
  checkYear('replacements.year', year, years);
  checkNumber('replacements.amount', amount);
  return amount * discountFactor(rate, year);
}
