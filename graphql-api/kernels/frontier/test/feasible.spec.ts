import { describeViolation, totalsOf, violationsOf, type Picks } from '../src/problem/feasible.js';
import type { Problem } from '../src/problem/problem.js';
import { aProblem, twoNeedsAndAHoist } from './examples.js';

describe('the check of a portfolio', () => {
  it('adds up benefit, cost and uses per piece', () => {
    expect(totalsOf(twoNeedsAndAHoist(), { 'scanner-a': 1, hoist: 3 })).toEqual({
      benefit: 120,
      cost: 91,
      uses: [9],
    });
  });

  it('finds nothing in a feasible one', () => {
    expect(violationsOf(twoNeedsAndAHoist(), {})).toEqual([]);
    expect(violationsOf(twoNeedsAndAHoist(), { 'scanner-b': 1, viewer: 1 })).toEqual([]);
  });

  it.each<[Problem, Picks, object, string]>([
    [
      aProblem(['bed']),
      { lamp: 1 },
      { kind: 'unknown item', name: 'lamp', used: 1, allowed: 0 },
      'there is no item lamp',
    ],
    [
      aProblem(['bed']),
      { bed: 2 },
      { kind: 'pieces', name: 'bed', used: 2, allowed: 1 },
      '2 pieces of bed, where whole pieces up to 1 may be taken',
    ],
    [
      aProblem(['bed']),
      { bed: 0.5 },
      { kind: 'pieces', name: 'bed', used: 0.5, allowed: 1 },
      '0.5 pieces of bed, where whole pieces up to 1 may be taken',
    ],
    [
      aProblem(['bed'], { ceiling: 9 }),
      { bed: 1 },
      { kind: 'ceiling', name: 'ceiling', used: 10, allowed: 9 },
      'the cost is 10, over the ceiling of 9',
    ],
    [
      aProblem([], {
        limits: [{ name: 'days', most: 3 }],
        items: [{ id: 'bed', benefit: 1, cost: 1, uses: [4] }],
      }),
      { bed: 1 },
      { kind: 'limit most', name: 'days', used: 4, allowed: 3 },
      'days is 4, over its limit of 3',
    ],
    [
      aProblem(['bed'], { limits: [{ name: 'days', most: 3, least: 1 }] }),
      { bed: 1 },
      { kind: 'limit least', name: 'days', used: 0, allowed: 1 },
      'days is 0, under its least of 1',
    ],
    [
      aProblem([], { items: aProblem(['a', 'b']).items.map((item) => ({ ...item, oneOf: 'scanner' })) }),
      { a: 1, b: 1 },
      { kind: 'one of', name: 'scanner', used: 2, allowed: 1 },
      '2 items of the group scanner, where only one may be taken',
    ],
    [
      aProblem([], {
        items: [{ id: 'lens', benefit: 1, cost: 1, needs: [['a', 'b']] }, ...aProblem(['a', 'b']).items],
      }),
      { lens: 1 },
      { kind: 'needs', name: 'lens needs a or b', used: 0, allowed: 1 },
      'lens needs a or b, and none of them is taken',
    ],
    [
      aProblem(['a', 'b'], { eitherOr: [['a', 'b']] }),
      { a: 1, b: 1 },
      { kind: 'either or', name: 'a, b', used: 2, allowed: 1 },
      '2 of a, b, which exclude each other',
    ],
    [
      aProblem(['a', 'b'], { counts: [{ items: ['a', 'b'], most: 1 }] }),
      { a: 1, b: 1 },
      { kind: 'count most', name: 'a, b', used: 2, allowed: 1 },
      '2 pieces of a, b, where at most 1 may be taken',
    ],
    [
      aProblem(['a', 'b'], { counts: [{ name: 'ward 2', items: ['a', 'b'], least: 2 }] }),
      { a: 1 },
      { kind: 'count least', name: 'ward 2', used: 1, allowed: 2 },
      '1 pieces of ward 2, where at least 2 must be taken',
    ],
    [
      aProblem(['a'], { mustInclude: ['a'] }),
      { a: 0 },
      { kind: 'must include', name: 'a', used: 0, allowed: 1 },
      'a must be taken and is not',
    ],
    [
      aProblem(['a'], { leaveOut: ['a'] }),
      { a: 1 },
      { kind: 'left out', name: 'a', used: 1, allowed: 0 },
      'a is left out and was taken',
    ],
    [
      aProblem(['a'], { leastBenefit: 11 }),
      { a: 1 },
      { kind: 'least benefit', name: 'benefit', used: 10, allowed: 11 },
      'the benefit is 10, under the least of 11',
    ],
  ])(
    'names the rule that is broken, what it has and what it may (%#)',
    (problem, picks, violation, words) => {
      const violations = violationsOf(problem, picks);
      expect(violations).toEqual([violation]);
      expect(violations.map(describeViolation)).toEqual([words]);
    },
  );

  it('counts one piece of a partner as enough for any number', () => {
    const items = [
      { id: 'pump', benefit: 1, cost: 1, most: 5, needs: [['stand']] },
      { id: 'stand', benefit: 0, cost: 1 },
    ];
    expect(violationsOf(aProblem([], { items }), { pump: 5, stand: 1 })).toEqual([]);
  });
});
