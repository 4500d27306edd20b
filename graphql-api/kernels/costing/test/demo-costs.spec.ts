import type { CostAssumptions } from '../src/index.js';
import { chooseQuote, costOfQuote, quoteFaults } from '../src/index.js';
import demo from './demo-costs.json' with { type: 'json' };

type Organisation = (typeof demo.organisations)[number];

function assumptionsOf({ assumptions }: Organisation): CostAssumptions {
  const exchangeRates = Object.fromEntries(Object.entries(assumptions.exchangeRates));
  return { ...assumptions, exchangeRates, timing: assumptions.timing as CostAssumptions['timing'] };
}

function costedQuotes(organisation: Organisation, candidateId: string) {
  const candidate = organisation.candidates.find(({ id }) => id === candidateId)!;
  return organisation.quotes
    .filter(({ id }) => id.startsWith(`${candidateId}-`))
    .map((quote) => ({
      id: quote.id,
      faults: quoteFaults(quote, organisation),
      cost: costOfQuote(quote, candidate, assumptionsOf(organisation)),
    }));
}

describe.each(demo.organisations)(
  'demo round of $organisation [invented, results computed independently]',
  (organisation) => {
    it('finds the quotes that cannot be kept on the decision date', () => {
      const faulty = organisation.quotes.filter((quote) => quoteFaults(quote, organisation).length > 0);
      expect(faulty.map(({ id }) => id)).toEqual(organisation.quotesNotUsable);
    });

    it.each(organisation.results)(
      'costs $id by its quote $quote to the cent',
      ({ id, quote, usableQuotes, ...expected }) => {
        const quotes = costedQuotes(organisation, id);
        expect(quotes.find((costed) => costed.id === quote)!.cost).toMatchObject(expected);
        expect(quotes.filter(({ faults }) => faults.length === 0)).toHaveLength(usableQuotes);
      },
    );

    it.each(organisation.results)(
      'keeps the cheapest usable quote of $id over a year',
      ({ id, quote, usableQuotes }) => {
        const quotes = costedQuotes(organisation, id);
        if (usableQuotes === 0) expect(chooseQuote(quotes)).toBeUndefined();
        const openOrExtended =
          usableQuotes > 0 ? quotes : quotes.map((costed) => ({ ...costed, faults: [] }));
        expect(chooseQuote(openOrExtended)?.id).toBe(quote);
      },
    );

    it('adds up: parts and years of every quote to its life-cycle cost', () => {
      const costs = organisation.candidates.flatMap(({ id }) =>
        costedQuotes(organisation, id).map(({ cost }) => cost),
      );
      expect(costs).toHaveLength(organisation.quotes.length);
      for (const cost of costs) {
        const total = (amounts: readonly { presentMinor: number }[]) =>
          amounts.reduce((sum, { presentMinor }) => sum + presentMinor, 0);
        expect(total(cost.parts)).toBe(cost.lifeCycleCostMinor);
        expect(total(cost.years)).toBe(cost.lifeCycleCostMinor);
      }
    });
  },
);

it('leaves two candidates of the second organisation without an open quote: D05 and D17', () => {
  const without = demo.organisations[1].results.filter(({ usableQuotes }) => usableQuotes === 0);
  expect(without.map(({ id }) => id)).toEqual(['D05', 'D17']);
});
