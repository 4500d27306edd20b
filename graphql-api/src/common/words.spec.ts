import { amountInWords, dayInWords, figureInWords } from './words.js';

const plain = (text: string) => text.replaceAll('\u00a0', ' ');

describe('figures in running text', () => {
  it.each([
    ['30000.00', '30 000'],
    ['12.50', '12.5'],
    ['-1234567.05', '−1 234 567.05'],
    ['7', '7'],
  ])('writes %s as %s', (decimal, words) => {
    expect(plain(figureInWords(decimal))).toBe(words);
  });

  it('keeps every minor unit of an amount', () => {
    expect(plain(amountInWords(230_055_600, 'EUR'))).toBe('2 300 556.00 EUR');
  });

  it('writes days in full', () => {
    expect(dayInWords('2027-02-15')).toBe('15 Feb 2027');
  });
});
