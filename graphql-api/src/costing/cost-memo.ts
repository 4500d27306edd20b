import {
  costOfQuote,
  type CandidateFigures,
  type CostAssumptions,
  type QuoteCost,
  type QuoteFigures,
} from '@metewand/costing';

/** Three quotes for each of 500 candidates, several times over; about 3 kB each. */
const MOST_HELD = 5_000;

const held = new Map<string, QuoteCost>();

/**
 * The kernel's cost of a quote, looked up when the same figures were costed before: exact sums take about a
 * millisecond, and a table asks for hundreds. The key is every figure that goes in and nothing else, so a result can
 * neither go stale nor tell one organisation of another.
 */
export function costOf(
  quote: QuoteFigures,
  candidate: CandidateFigures,
  assumptions: CostAssumptions,
): QuoteCost {
  const key = JSON.stringify([quoteKey(quote), candidateKey(candidate), assumptions]);
  const known = held.get(key);
  if (known) {
    held.delete(key);
    held.set(key, known);
    return known;
  }
  const cost = costOfQuote(quote, candidate, assumptions);
  held.set(key, cost);
  if (held.size > MOST_HELD) held.delete(held.keys().next().value as string);
  return cost;
}

function quoteKey(quote: QuoteFigures): readonly unknown[] {
  const figures: { [Name in keyof QuoteFigures]: QuoteFigures[Name] } = {
    currency: quote.currency,
    pricesIncludeVat: quote.pricesIncludeVat,
    unitPriceMinor: quote.unitPriceMinor,
    quantity: quote.quantity,
    deliveryMinor: quote.deliveryMinor,
    installationMinor: quote.installationMinor,
    trainingMinor: quote.trainingMinor,
    discountMinor: quote.discountMinor,
    warrantyYears: quote.warrantyYears,
    serviceYearlyMinor: quote.serviceYearlyMinor,
  };
  return Object.values(figures);
}

function candidateKey(candidate: CandidateFigures): readonly unknown[] {
  const figures: { [Name in keyof CandidateFigures]: CandidateFigures[Name] } = {
    usefulLifeYears: candidate.usefulLifeYears,
    residualPercent: candidate.residualPercent,
    worksNetMinor: candidate.worksNetMinor,
    consumablesYearlyMinor: candidate.consumablesYearlyMinor,
    energyYearlyMinor: candidate.energyYearlyMinor,
    currentRunningYearlyMinor: candidate.currentRunningYearlyMinor,
  };
  return Object.values(figures);
}
