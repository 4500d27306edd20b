import type { ComparedQuote, CostTerms } from '../features/costing/compared-quote';
import type { QuoteFigures } from '../features/quotes/quote-figures';
import type { PageData } from '../routes/candidate-quotes';

type PageQuote = PageData['candidate']['quotes'][number];
type PageDocument = PageData['candidate']['documents'][number];

export function euros(amount: string) {
  return { __typename: 'Money' as const, amount, currency: 'EUR' };
}

interface CostFigures {
  acquisition?: string;
  delivery?: string;
  installation?: string;
  training?: string;
  works?: string;
  service?: string;
  consumables?: string;
  energy?: string;
  residual?: string;
}

/** A cost whose parts add up to its life-cycle cost. */
export function aCost(figures: CostFigures = {}): ComparedQuote['cost'] {
  const entries = Object.entries({ acquisition: '100.00', ...figures });
  const total = entries.reduce((sum, [, amount]) => sum + Number(amount), 0);
  return {
    __typename: 'QuoteCost',
    years: 8,
    capital: euros('100.00'),
    lifeCycleCost: euros(total.toFixed(2)),
    equivalentAnnualCost: euros((total / 8).toFixed(2)),
    parts: entries.map(([kind, amount]) => ({
      __typename: 'CostPart',
      kind: kind.toUpperCase() as ComparedQuote['cost']['parts'][number]['kind'],
      amount: euros(amount),
    })),
  };
}

export function aQuote(over: Partial<PageQuote> & { vendorName?: string } = {}): PageQuote & QuoteFigures {
  const { vendorName = 'Oslander', ...rest } = over;
  return {
    __typename: 'Quote',
    id: `quote-${vendorName}`,
    version: 1,
    number: 'Q-2731',
    quoteDate: '2026-11-01',
    validUntil: '2027-06-30',
    pricesIncludeVat: false,
    quantity: 1,
    warrantyYears: 2,
    serviceTier: 'full cover',
    leadWeeks: 12,
    incoterm: 'DAP',
    namedPlace: 'Alder House',
    paymentTerms: '30 days',
    faults: [],
    inForce: false,
    vendor: { __typename: 'Vendor', id: `vendor-${vendorName}`, name: vendorName },
    unitPrice: euros('62000.00'),
    delivery: euros('0.00'),
    installation: euros('3400.00'),
    training: euros('4100.00'),
    discount: euros('0.00'),
    serviceYearly: euros('5200.00'),
    cost: aCost(),
    ...rest,
  };
}

export function aDocument(over: Partial<PageDocument> = {}): PageDocument {
  return {
    __typename: 'Document',
    id: 'document-1',
    fileName: 'oslander-offer.pdf',
    sizeBytes: 3_000_000,
    quoteId: null,
    createdAt: '2026-11-02T09:30:00Z',
    uploadedBy: { __typename: 'Membership', id: 'm-1', name: 'Hanne Vos' },
    ...over,
  };
}

export function someTerms(over: Partial<CostTerms> = {}): CostTerms {
  return {
    __typename: 'Round',
    id: 'round-1',
    decisionDate: '2027-04-30',
    longestLeadWeeks: 48,
    discountRate: '0.035',
    paymentTiming: 'END_OF_YEAR',
    vatRate: '0.2',
    exchangeRates: [{ __typename: 'ExchangeRate', currency: 'CHF', rate: '1.050000', asOf: '2026-09-01' }],
    ...over,
  };
}

/** What the page of a candidate's quotes asks for. */
export function aCandidateWithQuotes(
  quotes: readonly PageQuote[],
  over: Partial<PageData['candidate']> & { stage?: PageData['round']['stage'] } = {},
): PageData {
  const { stage = 'GATHER', ...rest } = over;
  const inForce = quotes.find((quote) => quote.inForce);
  return {
    __typename: 'Query',
    candidate: {
      __typename: 'Candidate',
      id: 'candidate-2',
      code: 'C-122',
      name: 'Echo scanner, cardiac',
      version: 3,
      quantity: 1,
      usefulLifeYears: 8,
      residualPercent: '5',
      keptReason: '',
      quoteInForceReason: inForce ? 'LOWEST_ANNUAL_COST' : null,
      quoteInForce: inForce ? { __typename: 'Quote', id: inForce.id } : null,
      department: { __typename: 'Department', id: 'd-1', name: 'Cardiology' },
      site: { __typename: 'Site', id: 's-1', name: 'Alder House' },
      worksNet: euros('0.00'),
      consumablesYearly: euros('600.00'),
      energyYearly: euros('190.00'),
      quotes: [...quotes],
      documents: [],
      ...rest,
    },
    round: { ...someTerms(), stage },
  };
}
