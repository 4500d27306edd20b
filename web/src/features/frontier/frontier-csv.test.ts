import { describe, expect, it } from 'vitest';
import { csvCell, frontierCsv } from './frontier-csv';
import { toPortfolios } from './portfolio';

const EUR = (amount: string) => ({ amount, currency: 'EUR' });

describe('frontierCsv', () => {
  it('writes exact figures, what each step gains, and the candidates', () => {
    const portfolios = toPortfolios(
      [
        { cost: EUR('10.50'), capital: EUR('9.00'), benefit: '1.0001', picks: [0] },
        { cost: EUR('20.00'), capital: EUR('19.00'), benefit: '3.5000', picks: [0, 1] },
      ],
      EUR('18'),
    );
    expect(frontierCsv(portfolios, { currency: 'EUR', codes: ['C-01', '=C-02'] }).split('\r\n')).toEqual([
      'portfolio,cost EUR,capital EUR,benefit points,points gained,candidates,above the ceiling,candidate codes',
      '1,10.50,9.00,1.0001,,1,no,C-01',
      '2,20.00,19.00,3.5000,2.4999,2,yes,C-01 =C-02',
      '',
    ]);
  });
});

describe('csvCell', () => {
  it.each([
    ['=SUM(A1)', "'=SUM(A1)"],
    ['+49 30', "'+49 30"],
    ['@cmd', "'@cmd"],
    ['-1+cmd', "'-1+cmd"],
    ['\tx', "'\tx"],
    ['-12.5', '-12.5'],
    ['Pumps, "twenty"', '"Pumps, ""twenty"""'],
  ])('writes %j as %j', (text, cell) => expect(csvCell(text)).toBe(cell));
});
