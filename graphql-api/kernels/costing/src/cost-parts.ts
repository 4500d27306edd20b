import type { Rate } from '@metewand/money';
import {
  addRates,
  invertRate,
  multiplyRates,
  parseRate,
  rate,
  rateOfNumber,
  roundHalfUp,
  roundTogether,
} from '@metewand/money';
import type { Timing } from './discount.js';
import { discountFactor } from './discount.js';
import type { CandidateFigures, QuoteFigures, QuoteRates } from './quote-figures.js';

export type CostPartKind =
  | 'ACQUISITION'
  | 'DELIVERY'
  | 'INSTALLATION'
  | 'TRAINING'
  | 'WORKS'
  | 'SERVICE'
  | 'CONSUMABLES'
  | 'ENERGY'
  | 'RESIDUAL';

/**
 * One line of a life-cycle cost: `amountMinor` is paid in each year from `firstYear` to `lastYear` (0 is now; a part
 * whose first year lies after its last is never paid), `factor` is the sum of those years' discount factors, and
 * `presentMinor` is amount × factor. Gross, in the organisation's currency; the residual is below zero.
 */
export interface CostPart {
  readonly kind: CostPartKind;
  readonly amountMinor: number;
  readonly firstYear: number;
  readonly lastYear: number;
  readonly factor: number;
  readonly presentMinor: number;
}

/** A part paid after year 0, before its present value is rounded together with its neighbours. */
export type LaterPart = Omit<CostPart, 'factor' | 'presentMinor'>;

/** What is paid now. Discount is taken off the units; works carry VAT whether or not the quote's prices hold it. */
export function capitalParts(
  quote: QuoteFigures,
  candidate: CandidateFigures,
  rates: QuoteRates,
): CostPart[] {
  const vatFactor = addRates(rate(1n), rates.vatRate);
  const toGross = quote.pricesIncludeVat
    ? rates.minorExchangeRate
    : multiplyRates(rates.minorExchangeRate, vatFactor);
  const exact: [CostPartKind, Rate][] = [
    ['ACQUISITION', times(quote.unitPriceMinor * quote.quantity - quote.discountMinor, toGross)],
    ['DELIVERY', times(quote.deliveryMinor, toGross)],
    ['INSTALLATION', times(quote.installationMinor, toGross)],
    ['TRAINING', times(quote.trainingMinor, toGross)],
    ['WORKS', times(candidate.worksNetMinor, vatFactor)],
  ];
  const { parts } = roundTogether(exact.map(([, amount]) => amount));
  return exact.map(([kind], i) => ({
    kind,
    amountMinor: parts[i],
    firstYear: 0,
    lastYear: 0,
    factor: 1,
    presentMinor: parts[i],
  }));
}

/** What is paid later, each amount rounded once as its invoice would be. */
export function laterParts(quote: QuoteFigures, candidate: CandidateFigures, rates: QuoteRates): LaterPart[] {
  const lastYear = candidate.usefulLifeYears;
  const service = roundHalfUp(times(quote.serviceYearlyMinor ?? 0, rates.minorExchangeRate));
  return [
    { kind: 'SERVICE', amountMinor: service, firstYear: quote.warrantyYears + 1, lastYear },
    { kind: 'CONSUMABLES', amountMinor: candidate.consumablesYearlyMinor, firstYear: 1, lastYear },
    { kind: 'ENERGY', amountMinor: candidate.energyYearlyMinor, firstYear: 1, lastYear },
    { kind: 'RESIDUAL', amountMinor: 0 - residual(quote, candidate, rates), firstYear: lastYear, lastYear },
  ];
}

/** Over how many years, at which real rate and when in the year running costs are counted. */
export interface Horizon {
  readonly years: number;
  readonly discountRate: number;
  readonly timing: Timing;
}

/** A resale at the end of the life falls at the end of its year, even where running costs are taken at the middle. */
export function factorOf(part: LaterPart, year: number, { discountRate, timing }: Horizon): number {
  if (year < part.firstYear || year > part.lastYear) return 0;
  return discountFactor(discountRate, year, part.kind === 'RESIDUAL' ? 'END_OF_YEAR' : timing);
}

/** The exact product of the amount and the floating-point factor that is also shown. */
export function presentValueIn(part: LaterPart, year: number, horizon: Horizon): Rate {
  return times(part.amountMinor, rateOfNumber(factorOf(part, year, horizon)));
}

/** Percent of the price without VAT, since a clinic resells without adding any. */
function residual(quote: QuoteFigures, candidate: CandidateFigures, rates: QuoteRates): number {
  const withoutVat = quote.pricesIncludeVat ? invertRate(addRates(rate(1n), rates.vatRate)) : rate(1n);
  const share = multiplyRates(parseRate(candidate.residualPercent), rate(1n, 100n));
  const price = times(quote.unitPriceMinor * quote.quantity, rates.minorExchangeRate);
  return roundHalfUp(multiplyRates(price, withoutVat, share));
}

function times(minor: number, factor: Rate): Rate {
  return multiplyRates(rate(BigInt(minor)), factor);
}
