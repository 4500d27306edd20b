import type { Rate } from '@metewand/money';
import {
  isKnownCurrency,
  minorExchangeRate,
  MoneyError,
  parseRate,
  rate,
  rateToNumber,
} from '@metewand/money';
import { checkMinor, checkRate, checkWhole } from './checks.js';
import { CostingError } from './costing-error.js';
import type { Timing } from './discount.js';

/** What the vendor quoted, in minor units of the quote's currency; all but service net or gross as `pricesIncludeVat` says. */
export interface QuoteFigures {
  readonly currency: string;
  readonly pricesIncludeVat: boolean;
  readonly unitPriceMinor: number;
  readonly quantity: number;
  readonly deliveryMinor: number;
  readonly installationMinor: number;
  readonly trainingMinor: number;
  readonly discountMinor: number;
  readonly warrantyYears: number;
  /** Gross, for all pieces, paid from the year after the warranty. Null: no price given. */
  readonly serviceYearlyMinor: number | null;
}

/** What the candidate brings whoever the vendor is, in minor units of the organisation's currency. */
export interface CandidateFigures {
  readonly usefulLifeYears: number;
  /** Percent of the net unit price got back at the end of the useful life, as a decimal string: "4" or "2.5". */
  readonly residualPercent: string;
  /** The buyer's own estimate of building works, without VAT. */
  readonly worksNetMinor: number;
  /** Gross; below zero when the candidate saves it elsewhere. */
  readonly consumablesYearlyMinor: number;
  /** Gross; below zero when the candidate saves it elsewhere. */
  readonly energyYearlyMinor: number;
  /** What the unit to be replaced costs to run each year; zero when nothing is replaced. */
  readonly currentRunningYearlyMinor: number;
}

/** The round's assumptions. Rates are decimal strings ("0.035" for 3.5 %), so that no digit is lost on the way. */
export interface CostAssumptions {
  /** The organisation's currency, in which every result is given. */
  readonly currency: string;
  readonly discountRate: string;
  readonly vatRate: string;
  readonly timing: Timing;
  /** Price of one unit of a quoted currency in the organisation's; its own currency needs no entry. */
  readonly exchangeRates: Readonly<Record<string, string>>;
}

/** The assumptions as they bear on one quote. */
export interface QuoteRates {
  readonly discountRate: number;
  readonly vatRate: Rate;
  readonly exchangeRate: Rate;
  /** From minor units of the quote to minor units of the organisation; the same number as `exchangeRate` unless decimals differ. */
  readonly minorExchangeRate: Rate;
}

export function checkQuote(quote: QuoteFigures): void {
  checkWhole('quantity', quote.quantity, 1);
  checkWhole('warrantyYears', quote.warrantyYears, 0);
  checkWhole('unitPriceMinor', quote.unitPriceMinor, 0);
  checkWhole('deliveryMinor', quote.deliveryMinor, 0);
  checkWhole('installationMinor', quote.installationMinor, 0);
  checkWhole('trainingMinor', quote.trainingMinor, 0);
  checkWhole('discountMinor', quote.discountMinor, 0);
  if (quote.serviceYearlyMinor !== null) checkWhole('serviceYearlyMinor', quote.serviceYearlyMinor, 0);
  const quoted =
    quote.unitPriceMinor * quote.quantity +
    quote.deliveryMinor +
    quote.installationMinor +
    quote.trainingMinor;
  checkWhole('unitPriceMinor × quantity', quoted, 0);
  if (quote.discountMinor > quoted)
    throw new CostingError('discountMinor', 'must not be more than the quoted prices.');
}

export function checkCandidate(candidate: CandidateFigures): void {
  checkWhole('usefulLifeYears', candidate.usefulLifeYears, 1);
  checkWhole('worksNetMinor', candidate.worksNetMinor, 0);
  checkMinor('consumablesYearlyMinor', candidate.consumablesYearlyMinor);
  checkMinor('energyYearlyMinor', candidate.energyYearlyMinor);
  checkWhole('currentRunningYearlyMinor', candidate.currentRunningYearlyMinor, 0);
  const residual = rateToNumber(readRate('residualPercent', candidate.residualPercent));
  if (residual < 0 || residual > 100) {
    throw new CostingError(
      'residualPercent',
      `must lie between 0 and 100, got ${candidate.residualPercent}.`,
    );
  }
}

export function quoteRates(quoteCurrency: string, assumptions: CostAssumptions): QuoteRates {
  const { currency } = assumptions;
  checkCurrency('currency', quoteCurrency);
  checkCurrency('currency', currency);
  const discountRate = rateToNumber(readRate('discountRate', assumptions.discountRate));
  checkRate('discountRate', discountRate);
  const vatRate = readRate('vatRate', assumptions.vatRate);
  if (vatRate.numerator < 0n)
    throw new CostingError('vatRate', `must not be below 0, got ${assumptions.vatRate}.`);
  const exchangeRate = exchangeRateOf(quoteCurrency, assumptions);
  return {
    discountRate,
    vatRate,
    exchangeRate,
    minorExchangeRate: minorExchangeRate(exchangeRate, quoteCurrency, currency),
  };
}

function exchangeRateOf(quoteCurrency: string, { currency, exchangeRates }: CostAssumptions): Rate {
  if (quoteCurrency === currency) return rate(1n);
  const field = `exchangeRates.${quoteCurrency}`;
  if (!Object.hasOwn(exchangeRates, quoteCurrency)) {
    throw new CostingError(field, `is missing: what does 1 ${quoteCurrency} cost in ${currency}?`);
  }
  const exchangeRate = readRate(field, exchangeRates[quoteCurrency]);
  if (exchangeRate.numerator <= 0n) {
    throw new CostingError(field, `must be above 0, got ${exchangeRates[quoteCurrency]}.`);
  }
  return exchangeRate;
}

function checkCurrency(field: string, code: string): void {
  if (!isKnownCurrency(code)) throw new CostingError(field, `"${code}" is not a currency code known here.`);
}

function readRate(field: string, text: string): Rate {
  try {
    return parseRate(text);
  } catch (error) {
    if (error instanceof MoneyError)
      throw new CostingError(field, `must be a decimal such as 0.035, got "${text}".`);
    throw error;
  }
}
