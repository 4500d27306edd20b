import { formatDate } from '../../lib/dates';
import { formatMoney, formatNumber, formatPercent } from '../../lib/money';
import type { Amount } from '../../lib/money';
import type { ComparedQuote, CostTerms, CostedCandidate } from './compared-quote';
import { COST_LINES, lineAmount } from './cost-lines';
import type { CostLineId } from './cost-lines';
import { annualFactor, endFactor, yearlyFactor } from './discount';

export interface Explanation {
  /** The same for every quote. */
  formula: string;
  /** What goes into it for one quote, in the order of the formula. */
  inputs: (quote: ComparedQuote) => Input[];
}

interface Input {
  name: string;
  value: string;
}

const PAID_NOW: readonly CostLineId[] = ['acquisition', 'installation', 'training'];

/** How each line, and each total, is worked out. */
export function explanations(
  terms: CostTerms,
  candidate: CostedCandidate,
): Record<CostLineId | 'capital' | 'annual', Explanation> {
  const vat = Number(terms.vatRate);
  const years = candidate.usefulLifeYears;
  const withVat = (quote: ComparedQuote) =>
    quote.pricesIncludeVat ? input('VAT', 'in the prices') : input('VAT', `${formatPercent(vat, 1)} on top`);
  const vendorPrice = (quote: ComparedQuote) => [
    ...conversion(quote.unitPrice.currency, terms),
    withVat(quote),
  ];
  const timing =
    terms.paymentTiming === 'MIDDLE_OF_YEAR' ? 'in the middle of each year' : 'at the end of each year';
  const discounted = `discounted at ${formatPercent(Number(terms.discountRate), 1)} ${timing}`;
  const everyYear = (name: string, amount: Amount): Explanation => ({
    formula: `Yearly ${name} × sum of the discount factors, ${discounted}`,
    inputs: () => [
      money('Yearly, the buyer’s estimate', amount),
      input('Years', span(1, years)),
      factor(yearlyFactor(terms, 1, years)),
    ],
  });
  return {
    acquisition: {
      formula: '(Unit price × quantity − discount) × exchange rate, with VAT, paid now',
      inputs: (quote) => [
        money('Unit price', quote.unitPrice),
        input('Quantity', String(quote.quantity)),
        money('Discount', quote.discount),
        ...vendorPrice(quote),
      ],
    },
    installation: {
      formula: '(Delivery + installation) × exchange rate, with VAT, and the works with VAT, paid now',
      inputs: (quote) => [
        money('Delivery', quote.delivery),
        money('Installation', quote.installation),
        ...vendorPrice(quote),
        money('Works without VAT, the buyer’s estimate', candidate.worksNet),
      ],
    },
    training: {
      formula: 'Training × exchange rate, with VAT, paid now',
      inputs: (quote) => [money('Training', quote.training), ...vendorPrice(quote)],
    },
    service: {
      formula: `Yearly service × exchange rate × sum of the discount factors after the warranty, ${discounted}`,
      inputs: (quote) => serviceInputs(quote, terms, years),
    },
    consumables: everyYear('consumables', candidate.consumablesYearly),
    energy: everyYear('energy', candidate.energyYearly),
    residual: {
      formula: `Price without VAT × residual share × discount factor of the end of year ${years}`,
      inputs: (quote) => [
        money('Unit price', quote.unitPrice),
        input('Quantity', String(quote.quantity)),
        ...vendorPrice(quote),
        input('Residual share', formatPercent(Number(candidate.residualPercent) / 100, 2)),
        factor(endFactor(terms, years)),
      ],
    },
    capital: {
      formula: 'Acquisition, installation, delivery, works and training, all paid now, with VAT',
      inputs: (quote) =>
        COST_LINES.filter(({ id }) => PAID_NOW.includes(id)).map((line) =>
          money(line.name, lineAmount(quote, line)),
        ),
    },
    annual: {
      formula: `Life-cycle cost × factor that spreads it evenly over ${years} years at ${formatPercent(Number(terms.discountRate), 1)}`,
      inputs: (quote) => [
        money('Life-cycle cost', quote.cost.lifeCycleCost),
        factor(annualFactor(terms, years)),
      ],
    },
  };
}

/** "1.05 (1 Sep 2026)": by what the vendor's prices are turned into the organisation's currency. */
export function rateInWords({ exchangeRates }: CostTerms, currency: string): string | undefined {
  const rate = exchangeRates.find((each) => each.currency === currency);
  return rate && `${plainRate(rate.rate)} (${formatDate(rate.asOf)})`;
}

function serviceInputs(quote: ComparedQuote, terms: CostTerms, years: number): Input[] {
  const first = quote.warrantyYears + 1;
  if (!quote.serviceYearly) return [input('Yearly price', 'the quote names none')];
  const covered = quote.warrantyYears === 0 ? '' : `, after ${quote.warrantyYears} of warranty`;
  return [
    money('Yearly, with VAT', quote.serviceYearly),
    ...conversion(quote.serviceYearly.currency, terms),
    input('Years', first > years ? 'none, the warranty covers all' : `${span(first, years)}${covered}`),
    factor(yearlyFactor(terms, first, years)),
  ];
}

function conversion(currency: string, terms: CostTerms): Input[] {
  const rate = rateInWords(terms, currency);
  return rate ? [input('Exchange rate', rate)] : [];
}

function money(name: string, amount: Amount): Input {
  return input(name, formatMoney(amount));
}

function factor(value: number): Input {
  return input('Factor', formatNumber(value, 4));
}

function input(name: string, value: string): Input {
  return { name, value };
}

function span(first: number, last: number): string {
  return first === last ? String(first) : `${first} to ${last}`;
}

/** As many places as the rate has, two at least. */
function plainRate(rate: string): string {
  const places = rate.replace(/0+$/u, '').split('.')[1]?.length ?? 0;
  return formatNumber(rate, Math.max(2, places));
}
