import type { QuoteFault } from '@metewand/costing';
import { quoteInForce, QuoteInForceReason, type JudgedQuote } from './quote-in-force.js';

interface Facts {
  number: string;
  annual: number;
  capital?: number;
  faults?: QuoteFault[];
}

function aJudgedQuote({ number, annual, capital = 0, faults = [] }: Facts): JudgedQuote {
  return {
    quote: { id: `id of ${number}`, number },
    faults,
    cost: { equivalentAnnualCostMinor: annual, capitalGrossMinor: capital },
  } as unknown as JudgedQuote;
}

function numberInForce(facts: Facts[], keptNumber?: string) {
  const kept = keptNumber ? `id of ${keptNumber}` : null;
  const found = quoteInForce(facts.map(aJudgedQuote), kept);
  return found && { number: found.judged.quote.number, reason: found.reason };
}

const LOWEST = QuoteInForceReason.LOWEST_ANNUAL_COST;

describe('quoteInForce', () => {
  it('takes the lowest equivalent annual cost, not the lowest capital', () => {
    const facts = [
      { number: 'Q1', annual: 500, capital: 100 },
      { number: 'Q2', annual: 400, capital: 900 },
    ];
    expect(numberInForce(facts)).toEqual({ number: 'Q2', reason: LOWEST });
  });

  it('takes the lower capital of equal annual costs, then the number that sorts first', () => {
    const dear = { number: 'Q1', annual: 400, capital: 900 };
    const cheap = [
      { number: 'Q3', annual: 400, capital: 100 },
      { number: 'Q2', annual: 400, capital: 100 },
    ];
    expect(numberInForce([dear, ...cheap])).toEqual({ number: 'Q2', reason: LOWEST });
  });

  it('passes over quotes with a fault', () => {
    const facts: Facts[] = [
      { number: 'Q1', annual: 100, faults: ['RUN_OUT'] },
      { number: 'Q2', annual: 400 },
    ];
    expect(numberInForce(facts)).toEqual({ number: 'Q2', reason: LOWEST });
  });

  it('stays with the kept quote while it is usable', () => {
    const facts = [
      { number: 'Q1', annual: 100 },
      { number: 'Q2', annual: 400 },
    ];
    expect(numberInForce(facts, 'Q2')).toEqual({ number: 'Q2', reason: QuoteInForceReason.KEPT });
  });

  it('goes back to the rule when the kept quote gets a fault', () => {
    const facts: Facts[] = [
      { number: 'Q1', annual: 100 },
      { number: 'Q2', annual: 400, faults: ['LEAD_TIME_TOO_LONG'] },
    ];
    expect(numberInForce(facts, 'Q2')).toEqual({ number: 'Q1', reason: LOWEST });
  });

  it('finds none among no quotes, or among faulty ones only', () => {
    expect(numberInForce([])).toBeNull();
    expect(numberInForce([{ number: 'Q1', annual: 1, faults: ['SERVICE_PRICE_MISSING'] }], 'Q1')).toBeNull();
  });
});
