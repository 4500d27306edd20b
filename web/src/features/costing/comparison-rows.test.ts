import { describe, expect, it } from 'vitest';
import { aCost, aQuote, euros } from '../../test/quote-factories';
import { aboveLowest, lineRows, markLowest, totalRow } from './comparison-rows';

const cheap = aQuote({
  vendorName: 'Pellworth',
  cost: aCost({ acquisition: '71900.00', service: '39800.00' }),
});
const dear = aQuote({
  vendorName: 'Oslander',
  cost: aCost({ acquisition: '78200.00', service: '41200.00' }),
});
const unpriced = aQuote({
  vendorName: 'Quillmoor',
  faults: ['SERVICE_PRICE_MISSING'],
  cost: aCost({ acquisition: '60000.00', service: '0.00' }),
});

describe('the lowest figure of a row', () => {
  const lowest = (...amounts: (string | undefined)[]) =>
    markLowest(amounts.map((amount) => (amount === undefined ? undefined : euros(amount)))).map(
      (figure) => figure.lowest,
    );

  it('is marked', () => expect(lowest('3.00', '1.00', '2.00')).toEqual([false, true, false]));

  it('is marked at each of several equal ones', () =>
    expect(lowest('1.00', '1.00', '2.00')).toEqual([true, true, false]));

  it('is not marked where all are alike', () => expect(lowest('1.00', '1.00')).toEqual([false, false]));

  it('is not told from one a cent above, which rounding can bring about', () =>
    expect(lowest('1598.57', '1598.56', '1598.57')).toEqual([false, false, false]));

  it('is the greatest residual value', () => expect(lowest('-6400.00', '-9100.00')).toEqual([false, true]));

  it('passes over a price that is missing', () =>
    expect(lowest(undefined, '5.00', '4.00')).toEqual([false, false, true]));
});

describe('the rows of the comparison', () => {
  it('hold only lines that some quote has something on', () => {
    expect(lineRows([cheap, dear]).map(({ line }) => line.id)).toEqual(['acquisition', 'service']);
  });

  it('put delivery and works together with installation', () => {
    const quote = aQuote({ cost: aCost({ delivery: '100.50', installation: '3400.00', works: '0.25' }) });
    const row = lineRows([quote]).find(({ line }) => line.id === 'installation');
    expect(row?.figures[0]?.amount?.amount).toBe('3500.75');
  });

  it('leave the service of a quote without its price open', () => {
    const service = lineRows([cheap, unpriced]).find(({ line }) => line.id === 'service');
    expect(service?.figures.map(({ amount }) => amount?.amount)).toEqual(['39800.00', undefined]);
  });

  it('never call a total without service the lowest', () => {
    const totals = totalRow([cheap, dear, unpriced], ({ cost }) => cost.lifeCycleCost);
    expect(totals.map(({ lowest }) => lowest)).toEqual([true, false, false]);
    expect(totals[2]?.amount?.amount).toBe('60000.00');
  });

  it('say how far each is above the lowest that can be compared', () => {
    expect(aboveLowest([cheap, dear, unpriced]).map((amount) => amount?.amount)).toEqual([
      '0.00',
      '7700.00',
      undefined,
    ]);
  });
});
