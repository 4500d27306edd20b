import { addRates, roundTogether } from '@metewand/money';
import type { Horizon, LaterPart } from './cost-parts.js';
import { presentValueIn } from './cost-parts.js';

/** Payments of one year; year 0 is now. Present values of all years add up to the life-cycle cost. */
export interface CostYear {
  readonly year: number;
  readonly capitalMinor: number;
  readonly serviceMinor: number;
  readonly consumablesMinor: number;
  readonly energyMinor: number;
  readonly residualMinor: number;
  readonly totalMinor: number;
  readonly presentMinor: number;
}

/** Year 0 with the capital, then each year of the life; present values are rounded together. */
export function costYears(capitalMinor: number, parts: readonly LaterPart[], horizon: Horizon): CostYear[] {
  const years = yearsOf(horizon);
  const exact = years.map((year) => addRates(...parts.map((part) => presentValueIn(part, year, horizon))));
  const rounded = roundTogether(exact).parts;
  const now = { ...paymentsIn([], 0), capitalMinor, totalMinor: capitalMinor, presentMinor: capitalMinor };
  return [now, ...years.map((year, i) => ({ ...paymentsIn(parts, year), presentMinor: rounded[i] }))];
}

/** 1, 2, … to the end of the life. */
export function yearsOf({ years }: Horizon): number[] {
  return Array.from({ length: years }, (_, i) => i + 1);
}

function paymentsIn(parts: readonly LaterPart[], year: number): Omit<CostYear, 'presentMinor'> {
  const paid = parts.filter((part) => part.firstYear <= year && year <= part.lastYear);
  const amountOf = (kind: LaterPart['kind']) => paid.find((part) => part.kind === kind)?.amountMinor ?? 0;
  return {
    year,
    capitalMinor: 0,
    serviceMinor: amountOf('SERVICE'),
    consumablesMinor: amountOf('CONSUMABLES'),
    energyMinor: amountOf('ENERGY'),
    residualMinor: amountOf('RESIDUAL'),
    totalMinor: paid.reduce((sum, part) => sum + part.amountMinor, 0),
  };
}
