import { describe, expect, it } from 'vitest';
import { readQuoteForm } from './read-quote-form';

const TYPED = {
  vendorName: ' Oslander ',
  number: 'Q-2731',
  quoteDate: '2026-11-01',
  validUntil: '2027-06-30',
  currency: 'chf',
  unitPrice: '62000',
  quantity: '2',
  discount: '0',
  delivery: '0',
  installation: '3400.50',
  training: '0',
  warrantyYears: '2',
  serviceTier: '',
  serviceYearly: '',
  leadWeeks: '12',
  incoterm: 'dap',
  namedPlace: 'Alder House',
  paymentTerms: '',
};

function read(over: Partial<Record<keyof typeof TYPED | 'pricesIncludeVat', string>> = {}) {
  const data = new FormData();
  for (const [name, value] of Object.entries({ ...TYPED, ...over })) data.set(name, value);
  return readQuoteForm(data);
}

describe('the form of a quote', () => {
  it('gives the fields as the API takes them', () => {
    expect(read()).toMatchObject({
      fields: {
        vendorName: 'Oslander',
        currency: 'CHF',
        quantity: 2,
        installation: '3400.50',
        incoterm: 'DAP',
      },
    });
  });

  it('takes an empty service price as one the quote does not name', () => {
    expect(read()).toMatchObject({ fields: { serviceYearly: null } });
    expect(read({ serviceYearly: '4100.50' })).toMatchObject({ fields: { serviceYearly: '4100.50' } });
  });

  it('reads the VAT box', () => {
    expect(read()).toMatchObject({ fields: { pricesIncludeVat: false } });
    expect(read({ pricesIncludeVat: 'on' })).toMatchObject({ fields: { pricesIncludeVat: true } });
  });

  it('names every field to mend, in the order of the form', () => {
    const result = read({
      leadWeeks: 'soon',
      vendorName: '',
      unitPrice: '',
      currency: 'euro',
      quantity: '0',
    });
    expect('problems' in result && Object.keys(result.problems)).toEqual([
      'vendorName',
      'currency',
      'unitPrice',
      'quantity',
      'leadWeeks',
    ]);
  });

  it.each(['-1', '1.5', '', 'two'])('refuses %s as a number of years', (warrantyYears) => {
    expect(read({ warrantyYears })).toEqual({
      problems: { warrantyYears: 'Warranty: write a whole number of 0 or more.' },
    });
  });
});
