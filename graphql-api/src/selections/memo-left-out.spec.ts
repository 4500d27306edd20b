import type { Problem } from '@metewand/frontier';
import { reasonOut } from './memo-left-out.js';

const items = [
  { id: 'cheap', benefit: 100, cost: 10, uses: [1] },
  { id: 'good', benefit: 900, cost: 30, uses: [1] },
  { id: 'rich', benefit: 2_000, cost: 50, uses: [1] },
  { id: 'poor', benefit: 10, cost: 40, uses: [1] },
  { id: 'wide', benefit: 500, cost: 1, uses: [9] },
  { id: 'rival', benefit: 500, cost: 1, uses: [1] },
  { id: 'washer', benefit: 500, cost: 1, uses: [1], needs: [['cabinet']] },
  { id: 'cabinet', benefit: 1, cost: 90, uses: [1] },
];

const problem: Problem = {
  format: 'metewand-problem/1',
  ceiling: 60,
  limits: [{ name: 'Floor area', most: 5 }],
  items,
  mustInclude: ['cheap'],
  eitherOr: [['good', 'rival']],
};

const out = (code: string) =>
  reasonOut(code, problem, { cheap: 1, good: 1 }, 'EUR').replaceAll('\u00a0', ' ');

describe('why a candidate is not in', () => {
  it.each([
    ['the one it excludes is', 'rival', 'Either this or good, which is in'],
    ['a limit has no room', 'wide', 'Does not fit: Floor area'],
    [
      'the rest of the money does not pay for it',
      'rich',
      'Would cost more than what is left under the ceiling',
    ],
    ['everything in is worth more for its cost', 'poor', 'Worth less than what is in for the same money'],
    [
      'its partner does not fit',
      'washer',
      'Worth less than what is in for the same money (with cabinet, which it needs)',
    ],
  ])('because %s', (_why, code, reason) => {
    expect(out(code)).toBe(reason);
  });

  it('is a matter of choice where it would fit', () => {
    const fits = { ...problem, ceiling: 100 };
    expect(reasonOut('poor', fits, { cheap: 1, good: 1 }, 'EUR').replaceAll('\u00a0', ' ')).toBe(
      'Fits, and costs 0.40 EUR more',
    );
  });
});
