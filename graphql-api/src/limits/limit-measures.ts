import { formatDecimal, money, parseMoney } from '@metewand/money';
import type { PricedCandidate } from '../costing/round-costs.service.js';
import { LimitMeasure } from './entities/limit.entity.js';

/** Under this name a search on the life-cycle axis carries the ceiling on capital among the limits. */
export const CEILING_LIMIT_NAME = 'Budget ceiling';

/** What of a candidate and its quote in force a limit can count. */
export interface MeasuredCandidate {
  siteId: string;
  /** Minor units of the organisation's currency; below zero where running gets cheaper. */
  addedRunningYearlyMinor: number;
  /** Decimal text with at most two decimals, as `floorAreaM2`. */
  installationDays: string;
  floorAreaM2: string;
}

export function measured({ candidate, addedRunningYearlyMinor }: PricedCandidate): MeasuredCandidate {
  const { siteId, installationDays, floorAreaM2 } = candidate;
  return { siteId, installationDays, floorAreaM2, addedRunningYearlyMinor };
}

/**
 * What one candidate takes of a limit, as a whole number: minor units for money, hundredths of a day or square metre,
 * 1 for being a candidate. Nothing when the limit is of another site.
 */
export function useOf(
  { measure, siteId }: { measure: LimitMeasure; siteId: string | null },
  candidate: MeasuredCandidate,
): number {
  if (siteId && siteId !== candidate.siteId) return 0;
  switch (measure) {
    case LimitMeasure.ADDED_RUNNING_COST:
      return candidate.addedRunningYearlyMinor;
    case LimitMeasure.INSTALLATION_DAYS:
      return hundredths(candidate.installationDays);
    case LimitMeasure.FLOOR_AREA:
      return hundredths(candidate.floorAreaM2);
    case LimitMeasure.CANDIDATES:
      return 1;
  }
}

/** A bound of a limit in the whole numbers of `useOf`. Decimals that the measure does not have are refused. */
export function boundOf(measure: LimitMeasure, text: string, currency: string): number {
  switch (measure) {
    case LimitMeasure.ADDED_RUNNING_COST:
      return parseMoney(withoutTrailingZeros(text), currency).minor;
    case LimitMeasure.CANDIDATES:
      return wholeNumber(text);
    default:
      return hundredths(text);
  }
}

/** A sum of uses as decimal text: "26160.00", "50", "12.5". */
export function formatUse(measure: LimitMeasure, use: number, currency: string): string {
  switch (measure) {
    case LimitMeasure.ADDED_RUNNING_COST:
      return formatDecimal(money(use, currency));
    case LimitMeasure.CANDIDATES:
      return String(use);
    default:
      return withoutTrailingZeros((use / 100).toFixed(2));
  }
}

/** "12.5" is 1250. Read digit by digit: 0.29 × 100 is no whole number in floating point. */
function hundredths(text: string): number {
  const parts = /^(-?)(\d+)(?:\.(\d{1,2})0*)?$/.exec(text);
  if (!parts) throw new RangeError(`"${text}" has more than two decimals.`);
  const [, sign, whole, decimals = ''] = parts;
  return Number(`${sign}${whole}${decimals.padEnd(2, '0')}`);
}

function wholeNumber(text: string): number {
  const parts = /^(\d+)(?:\.0+)?$/.exec(text);
  if (!parts) throw new RangeError(`"${text}" is no number of candidates.`);
  return Number(parts[1]);
}

function withoutTrailingZeros(text: string): string {
  return text.includes('.') ? text.replace(/\.?0+$/, '') : text;
}
