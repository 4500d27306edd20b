import { nextCode } from './next-code.js';

describe('nextCode', () => {
  it('follows the highest number of the round', () => {
    expect(nextCode(['C01', 'C56', 'C07'])).toBe('C57');
    expect(nextCode(['D17', 'D05'])).toBe('D18');
  });

  it('keeps two digits, and takes a third when they are used up', () => {
    expect(nextCode(['X-1'])).toBe('X-02');
    expect(nextCode(['C99'])).toBe('C100');
  });

  it('starts an empty round, and passes over codes without a number', () => {
    expect(nextCode([])).toBe('C01');
    expect(nextCode(['scanner', 'E04'])).toBe('E05');
  });
});
