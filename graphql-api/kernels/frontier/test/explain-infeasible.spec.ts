import { explainInfeasible } from '../src/explain/explain-infeasible.js';
import type { Problem } from '../src/problem/problem.js';
import { aProblem, twoNeedsAndAHoist } from './examples.js';
import { runToEnd } from './run-search.js';

const needing = (id: string, ...needs: string[][]) => ({ id, benefit: 10, cost: 10, needs });

describe('a problem that no portfolio can meet', () => {
  it.each<[string, Problem, string]>([
    [
      'mandatory items over the ceiling',
      aProblem(['bed', 'lamp'], { ceiling: 15, mustInclude: ['bed', 'lamp'] }),
      'What must be taken (bed, lamp) brings cost to 20 at least, 5 over the ceiling of 15.',
    ],
    [
      'a partner that is needed counts with them',
      aProblem([], {
        ceiling: 15,
        items: [needing('tower', ['scope']), { id: 'scope', benefit: 1, cost: 8 }],
        mustInclude: ['tower'],
      }),
      'What must be taken (tower, scope) brings cost to 18 at least, 3 over the ceiling of 15.',
    ],
    [
      'mandatory items over a limit',
      aProblem([], {
        limits: [{ name: 'installation days', most: 5 }],
        items: [{ id: 'scanner', benefit: 1, cost: 1, uses: [9] }],
        mustInclude: ['scanner'],
      }),
      'What must be taken (scanner) brings installation days to 9 at least, 4 over its limit of 5.',
    ],
    [
      'a limit whose least is out of reach',
      aProblem([], {
        limits: [{ name: 'rooms', most: 9, least: 6 }],
        items: [{ id: 'bed', benefit: 1, cost: 1, uses: [2], most: 2 }],
      }),
      'rooms comes to 4 at most, 2 under its least of 6.',
    ],
    [
      'a needed item that is left out',
      aProblem([], {
        items: [needing('laser', ['interlock']), ...aProblem(['interlock']).items],
        mustInclude: ['laser'],
        leaveOut: ['interlock'],
      }),
      'laser must be taken, and laser needs interlock, but interlock is left out.',
    ],
    [
      'a chain of needs that ends in a left out item',
      aProblem([], {
        items: [needing('a', ['b']), needing('b', ['c', 'd']), ...aProblem(['c', 'd']).items],
        mustInclude: ['a'],
        leaveOut: ['c', 'd'],
      }),
      'b must be taken because a needs b, and b needs c or d, but c is left out, d is left out.',
    ],
    [
      'two mandatory items that exclude each other',
      aProblem(['bed', 'lamp'], { mustInclude: ['bed', 'lamp'], eitherOr: [['bed', 'lamp']] }),
      'bed must be taken, lamp must be taken, and bed and lamp exclude each other.',
    ],
    [
      'two mandatory items of one group',
      aProblem([], {
        items: aProblem(['a', 'b']).items.map((item) => ({ ...item, oneOf: 'scanner' })),
        mustInclude: ['a', 'b'],
      }),
      'a must be taken, b must be taken, and only one of the group scanner may be.',
    ],
    [
      'a count that asks for more than can be taken',
      aProblem(['bed', 'lamp'], {
        leaveOut: ['bed'],
        counts: [{ name: 'ward 2', items: ['bed', 'lamp'], least: 2 }],
      }),
      'At least 2 pieces of ward 2 are asked for, and only 1 can be taken.',
    ],
    [
      'a count that mandatory items pass',
      aProblem(['bed', 'lamp'], {
        mustInclude: ['bed'],
        counts: [{ name: 'ward 2', items: ['bed'], most: 0 }],
      }),
      'At most 0 pieces of ward 2 are allowed, and 1 must be taken.',
    ],
    [
      'a count that the ceiling does not pay for',
      aProblem(['bed', 'lamp', 'desk'], {
        ceiling: 25,
        mustInclude: ['desk'],
        counts: [{ name: 'ward 2', items: ['bed', 'lamp'], least: 2 }],
      }),
      'What must be taken and 2 pieces of ward 2 bring cost to 30 at least, 5 over the ceiling of 25.',
    ],
    [
      'a benefit that is out of reach',
      aProblem(['bed'], { leastBenefit: 11 }),
      'All that may be taken brings a benefit of 10 at most, under the least of 11.',
    ],
  ])('is explained: %s', (_, problem, reason) => {
    expect(explainInfeasible(problem)).toEqual([reason]);
    expect(runToEnd(problem)).toMatchObject({ status: 'infeasible', points: [], notes: [reason] });
  });

  it('is explained in the units of the host', () => {
    const problem = aProblem(['bed', 'lamp'], { ceiling: 15, mustInclude: ['bed', 'lamp'] });
    expect(explainInfeasible(problem, (figure, of) => `${figure / 100} of ${JSON.stringify(of)}`)).toEqual([
      'What must be taken (bed, lamp) brings cost to 0.2 of "cost" at least, 0.05 of "cost" over the ceiling of 0.15 of "cost".',
    ]);
  });

  it('has no reason where there is a portfolio', () => {
    expect(explainInfeasible(twoNeedsAndAHoist())).toEqual([]);
  });

  it('leaves alone what gives back', () => {
    const problem = aProblem([], {
      limits: [{ name: 'running cost', most: 5 }],
      items: [
        { id: 'scanner', benefit: 1, cost: 1, uses: [9] },
        { id: 'retrofit', benefit: 1, cost: 1, uses: [-4] },
      ],
      mustInclude: ['scanner'],
    });
    expect(explainInfeasible(problem)).toEqual([]);
    expect(runToEnd(problem).points).toEqual([{ benefit: 2, cost: 2, picks: { scanner: 1, retrofit: 1 } }]);
  });
});
