import { normaliseWeights } from '@metewand/scoring';
import { dayInWords } from '../common/words.js';
import { CostAxis } from '../frontier/cost-axis.enum.js';
import { PaymentTiming } from '../rounds/entities/round.entity.js';
import type { MemoSource } from './memo-source.js';
import type { MemoAssumption } from './models/memo.model.js';

/** What the figures rest on, so that somebody else can work them out again. */
export function memoAssumptions(source: MemoSource): MemoAssumption[] {
  const { round, run } = source;
  return [
    { name: 'Decision date', text: dayInWords(round.decisionDate) },
    { name: 'Discount rate', text: `${percent(round.discountRate)} a year, real` },
    {
      name: 'Yearly costs',
      text:
        round.paymentTiming === PaymentTiming.END_OF_YEAR
          ? 'paid at the end of each year'
          : 'paid in the middle of each year',
    },
    { name: 'Prices', text: round.priceBasis },
    { name: 'VAT', text: `${percent(round.vatRate)}, not recoverable, so all amounts are gross` },
    { name: 'Exchange rates', text: exchangeRates(source) },
    { name: 'Held back from the ceiling', text: `${Number(round.heldBackPercent)} %` },
    {
      name: 'Quotes that count',
      text: `open on the decision date, with a service price, at most ${round.longestLeadWeeks} weeks to delivery`,
    },
    { name: 'Weights', text: weights(source) },
    {
      name: 'Search',
      text: `run ${run.number} on ${run.costAxis === CostAxis.CAPITAL ? 'capital' : 'life-cycle cost'}, seed ${run.seed}, input ${run.fingerprint}`,
    },
  ];
}

function percent(share: string): string {
  return `${Number((Number(share) * 100).toFixed(3))} %`;
}

function exchangeRates({ exchangeRates: rates, input }: MemoSource): string {
  if (rates.length === 0) return `none: everything is quoted in ${input.currency}`;
  return rates
    .map(({ currency, rate, asOf, source }) => {
      const origin = source ? `, ${source}` : '';
      return `1 ${currency} = ${Number(rate)} ${input.currency} (${dayInWords(asOf)}${origin})`;
    })
    .join('; ');
}

function weights({ criteria }: MemoSource): string {
  const shares = normaliseWeights(criteria.map(({ swingWeight }) => swingWeight));
  return criteria.map(({ name }, i) => `${name} ${(shares[i] * 100).toFixed(1)} %`).join('; ');
}
