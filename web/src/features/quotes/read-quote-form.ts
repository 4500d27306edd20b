import type { QuoteFieldsInput } from '../../generated/graphql';
import type { FieldProblems } from '../../lib/refusal';
import { typedText } from '../../lib/typed-text';
import { QUOTE_LABELS } from './quote-figures';
import type { QuoteFieldName } from './quote-figures';

type Fields = Omit<QuoteFieldsInput, 'documentId'>;

const TEXTS = ['vendorName', 'number'] as const;
const DATES = ['quoteDate', 'validUntil'] as const;
const AMOUNTS = ['unitPrice', 'discount', 'delivery', 'installation', 'training'] as const;
const COUNTS = { quantity: 1, warrantyYears: 0, leadWeeks: 0 } as const;

/** What was typed, or how to write right what is missing or unreadable. The API judges the rest. */
export function readQuoteForm(data: FormData): { fields: Fields } | { problems: FieldProblems } {
  const text = (name: QuoteFieldName) => typedText(data, name);
  const problems = problemsIn(text);
  if (Object.keys(problems).length > 0) return { problems };
  return {
    fields: {
      vendorName: text('vendorName'),
      number: text('number'),
      quoteDate: text('quoteDate'),
      validUntil: text('validUntil'),
      currency: text('currency').toUpperCase(),
      pricesIncludeVat: data.has('pricesIncludeVat'),
      unitPrice: text('unitPrice'),
      discount: text('discount'),
      delivery: text('delivery'),
      installation: text('installation'),
      training: text('training'),
      quantity: Number(text('quantity')),
      warrantyYears: Number(text('warrantyYears')),
      leadWeeks: Number(text('leadWeeks')),
      serviceTier: text('serviceTier'),
      serviceYearly: text('serviceYearly') || null,
      incoterm: text('incoterm').toUpperCase(),
      namedPlace: text('namedPlace'),
      paymentTerms: text('paymentTerms'),
    },
  };
}

function problemsIn(text: (name: QuoteFieldName) => string): FieldProblems {
  const problems: [QuoteFieldName, string][] = [];
  for (const name of TEXTS) if (!text(name)) problems.push([name, `Write the ${lower(name)}.`]);
  for (const name of DATES)
    if (!text(name)) problems.push([name, `${QUOTE_LABELS[name]}: write a whole date.`]);
  if (!/^[a-z]{3}$/iu.test(text('currency')))
    problems.push(['currency', 'Write the currency as three letters, such as EUR.']);
  for (const name of AMOUNTS)
    if (!text(name)) problems.push([name, `${QUOTE_LABELS[name]}: write an amount in digits, or 0.`]);
  for (const [name, least] of Object.entries(COUNTS) as [keyof typeof COUNTS, number][])
    if (!/^\d{1,4}$/u.test(text(name)) || Number(text(name)) < least)
      problems.push([name, `${QUOTE_LABELS[name]}: write a whole number of ${least} or more.`]);
  const place = Object.keys(QUOTE_LABELS);
  return Object.fromEntries(problems.sort(([one], [other]) => place.indexOf(one) - place.indexOf(other)));
}

function lower(name: QuoteFieldName): string {
  return QUOTE_LABELS[name].toLowerCase();
}
