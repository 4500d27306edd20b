import {
  add,
  convert,
  formatDecimal,
  grossOf,
  isKnownCurrency,
  minorDigits,
  money,
  MoneyError,
  multiply,
  negate,
  netOf,
  parseMoney,
  parseRate,
  subtract,
  sum,
} from '../src/index.js';

const problemOf = (work: () => unknown) => {
  try {
    work();
  } catch (error) {
    if (error instanceof MoneyError) return error.problem;
    throw error;
  }
  return 'NONE';
};

describe('currencies (ISO 4217 minor units, from memory)', () => {
  it.each([
    ['EUR USD GBP CHF SEK PLN DKK NOK CZK', 2],
    ['JPY KRW ISK CLP', 0],
    ['KWD BHD OMR JOD TND', 3],
  ])('%s have %i decimals', (codes, digits) => {
    expect(codes.split(' ').map(minorDigits)).toEqual(codes.split(' ').map(() => digits));
  });

  it.each(['XYZ', 'eur', '', 'EURO', 'constructor'])('refuses %p as a currency', (code) => {
    expect(isKnownCurrency(code)).toBe(false);
    expect(problemOf(() => money(1, code))).toBe('UNKNOWN_CURRENCY');
  });
});

describe('reading and writing amounts', () => {
  it.each([
    ['2300556.00', 'EUR', 230055600, '2300556.00'],
    ['0.07', 'EUR', 7, '0.07'],
    ['-0.05', 'GBP', -5, '-0.05'],
    ['12', 'CHF', 1200, '12.00'],
    ['12.5', 'KWD', 12500, '12.500'],
    ['1250', 'JPY', 1250, '1250'],
    ['90071992547409.91', 'EUR', Number.MAX_SAFE_INTEGER, '90071992547409.91'],
  ])('reads %s %s exactly', (text, currency, minor, written) => {
    expect(parseMoney(text, currency)).toEqual({ minor, currency });
    expect(formatDecimal(parseMoney(text, currency))).toBe(written);
  });

  it.each(['', ' 1', '1,5', '1.', '.5', '1e3', '+1', '1 000', 'NaN', '0x10'])(
    'refuses %p as an amount',
    (text) => {
      expect(problemOf(() => parseMoney(text, 'EUR'))).toBe('NOT_AN_AMOUNT');
    },
  );

  it('refuses more decimals than the currency has and says how many are expected', () => {
    expect(() => parseMoney('1.005', 'EUR')).toThrow('"1.005" has 3 decimals; expected at most 2 for EUR.');
    expect(problemOf(() => parseMoney('1.5', 'JPY'))).toBe('TOO_MANY_DECIMALS');
  });

  it('refuses what can no longer be counted exactly', () => {
    expect(problemOf(() => parseMoney('90071992547409.92', 'EUR'))).toBe('TOO_LARGE');
    expect(problemOf(() => money(0.5, 'EUR'))).toBe('NOT_AN_AMOUNT');
    expect(problemOf(() => add(money(Number.MAX_SAFE_INTEGER, 'EUR'), money(1, 'EUR')))).toBe('TOO_LARGE');
  });
});

describe('arithmetic', () => {
  it('adds, subtracts and turns round within one currency', () => {
    expect(add(money(10, 'EUR'), money(25, 'EUR'))).toEqual(money(35, 'EUR'));
    expect(subtract(money(10, 'EUR'), money(25, 'EUR'))).toEqual(money(-15, 'EUR'));
    expect(Object.is(negate(money(0, 'EUR')).minor, 0)).toBe(true);
    expect(sum([], 'EUR')).toEqual(money(0, 'EUR'));
  });

  it('refuses to mix currencies', () => {
    expect(problemOf(() => add(money(1, 'EUR'), money(1, 'GBP')))).toBe('MIXED_CURRENCIES');
    expect(problemOf(() => sum([money(1, 'GBP')], 'EUR'))).toBe('MIXED_CURRENCIES');
  });

  it('multiplies exactly and rounds once: 1.005 as a float would lose the half', () => {
    expect(multiply(money(100, 'EUR'), parseRate('1.005'))).toEqual(money(101, 'EUR'));
  });

  it('converts with an exact decimal rate, also between different decimals', () => {
    expect(convert(money(6745000, 'EUR'), parseRate('0.86'), 'GBP')).toEqual(money(5800700, 'GBP'));
    expect(convert(money(1000, 'JPY'), parseRate('0.0061'), 'EUR')).toEqual(money(610, 'EUR'));
    expect(convert(money(1, 'EUR'), parseRate('0.3335'), 'KWD')).toEqual(money(3, 'KWD'));
    expect(convert(money(50, 'EUR'), parseRate('163.99'), 'JPY')).toEqual(money(82, 'JPY'));
    expect(problemOf(() => convert(money(1, 'EUR'), parseRate('0'), 'GBP'))).toBe('NOT_A_RATE');
  });

  it('adds VAT to a net price and takes it out again', () => {
    expect(grossOf(money(7680000, 'EUR'), parseRate('0.2'))).toEqual(money(9216000, 'EUR'));
    expect(netOf(money(9216000, 'EUR'), parseRate('0.2'))).toEqual(money(7680000, 'EUR'));
    expect(problemOf(() => grossOf(money(1, 'EUR'), parseRate('-0.2')))).toBe('NOT_A_RATE');
  });
});
