import { cheapestExchange } from '../src/explain/cheapest-exchange.js';
import { describeLeftOut } from '../src/explain/describe-left-out.js';
import { whyLeftOut } from '../src/explain/why-left-out.js';
import { totalsOf, violationsOf, type Picks } from '../src/problem/feasible.js';
import { groupsOf } from '../src/problem/groups.js';
import type { Problem } from '../src/problem/problem.js';
import { allPortfolios, solveByTrying } from './all-portfolios.js';
import { aProblem, twoNeedsAndAHoist } from './examples.js';
import { aRandomProblem } from './seeded.js';

const sentences = (problem: Problem, picks: Picks, item: string, mostCost?: number): string[] =>
  describeLeftOut(whyLeftOut(problem, solveByTrying(problem).points, picks, item, mostCost), problem.limits);

describe('why an item is not in a portfolio', () => {
  it('names the group and the links in the way, and the cheapest exchange', () => {
    const picks = { 'scanner-a': 1, hoist: 3 };
    expect(sentences(twoNeedsAndAHoist(), picks, 'scanner-b')).toEqual([
      'With scanner-b the cost would be 131, 31 over the ceiling of 100.',
      'With scanner-b installation days would be 13, 3 over its limit of 10.',
      'Only one of the group scanner may be taken, and scanner-a is in.',
      'The cheapest exchange for scanner-b: scanner-a goes, scanner-b comes; \u221212 benefit, \u221215 cost, \u22122 installation days.',
    ]);
    expect(sentences(twoNeedsAndAHoist(), picks, 'viewer')).toEqual([
      'viewer and hoist exclude each other, and hoist is in.',
      'With viewer there would be 4 pieces of ward 2, where at most 3 may be taken; in are hoist.',
      'The cheapest exchange for viewer: hoist goes, viewer comes; \u221245 benefit, \u221227 cost, \u22122 installation days.',
    ]);
  });

  it('names the partners of which one would have to be in, and brings one', () => {
    expect(sentences(twoNeedsAndAHoist(), { hoist: 1 }, 'viewer', 100)).toEqual([
      'viewer needs scanner-a or scanner-b, and none of them is in.',
      'viewer and hoist exclude each other, and hoist is in.',
      'The cheapest exchange for viewer: scanner-a comes, hoist goes, viewer comes; +55 benefit, +52 cost, +6 installation days.',
    ]);
  });

  it('says so where no exchange is cheap enough', () => {
    expect(sentences(twoNeedsAndAHoist(), { hoist: 1 }, 'viewer')).toContain(
      'No exchange with up to two other candidates brings viewer in at a cost of at most 12.',
    );
  });

  it('says that an item that fits is dearer than its worth', () => {
    const problem = aProblem([], {
      items: [
        { id: 'bed', benefit: 10, cost: 10 },
        { id: 'lamp', benefit: 3, cost: 10 },
        { id: 'desk', benefit: 8, cost: 9 },
      ],
    });
    expect(sentences(problem, { bed: 1 }, 'lamp')).toEqual([
      'lamp fits in but is dearer than its worth: with it there is a benefit of 13 at a cost of 20, and another portfolio has a benefit of 18 at a cost of 19.',
      'The cheapest exchange for lamp: bed goes, lamp comes; \u22127 benefit, no change in cost.',
    ]);
    expect(sentences(problem, { bed: 1 }, 'desk')[0]).toBe(
      'desk fits in; with it the portfolio is another one, of a benefit of 18 at a cost of 19, that none beats.',
    );
  });

  it('speaks of what is to be left out, and of what a limit still asks for', () => {
    const problem = aProblem([], {
      limits: [{ name: 'rooms', most: 9, least: 2 }],
      items: [
        { id: 'bed', benefit: 1, cost: 1, uses: [2] },
        { id: 'wall', benefit: 9, cost: 1, uses: [-1] },
        { id: 'lamp', benefit: 1, cost: 1, uses: [0] },
      ],
      leaveOut: ['lamp'],
    });
    expect(sentences(problem, { bed: 1 }, 'wall')).toEqual([
      'With wall rooms would be 1, 1 under its least of 2.',
      'No exchange with up to two other candidates brings wall in at a cost of at most 1.',
    ]);
    expect(sentences(problem, { bed: 1 }, 'lamp')[0]).toBe('lamp is to be left out.');
  });

  it('refuses an item that is in', () => {
    expect(() => whyLeftOut(aProblem(['bed']), [], { bed: 1 }, 'bed')).toThrow(RangeError);
    expect(() => whyLeftOut(aProblem(['bed']), [], {}, 'lamp')).toThrow(RangeError);
  });
});

describe('the cheapest exchange', () => {
  it('is the best within reach, on random problems with every kind of limit and link', () => {
    const met = { all: 0, wide: 0, none: 0 };
    for (let seed = 1; seed <= 400; seed++) {
      const drawn = aRandomProblem(seed, 5 + (seed % 3));
      const problem = seed % 2 === 0 ? drawn : inThreeGroups(drawn);
      const portfolios = allPortfolios(problem);
      const { picks, cost } = portfolios[seed % portfolios.length] ?? { picks: undefined, cost: 0 };
      if (picks === undefined) continue;
      const mostCost = seed % 3 === 0 ? (problem.ceiling ?? Infinity) : cost;
      for (const { id } of problem.items.filter((item) => !picks[item.id])) {
        const withIt = portfolios.filter((point) => point.picks[id] > 0 && point.cost <= mostCost);
        const near = withIt.filter((point) => groupsChanged(problem, picks, point.picks, id) <= 2);
        const exchange = cheapestExchange(problem, picks, id, mostCost);
        const best = Math.max(...near.map(({ benefit }) => benefit));
        if (exchange === undefined) {
          expect({ seed, id, best }).toEqual({ seed, id, best: -Infinity });
          met.none++;
          continue;
        }
        const after = totalsOf(problem, exchange.picks);
        expect(violationsOf(problem, exchange.picks)).toEqual([]);
        expect(exchange.picks[id]).toBeGreaterThan(0);
        expect(after.cost).toBeLessThanOrEqual(mostCost);
        expect({ seed, id, short: after.benefit < best }).toEqual({ seed, id, short: false });
        if (near.length < withIt.length) {
          met.wide++;
          continue;
        }
        // everything is within reach: the exchange is the best there is, and the cheapest of those
        const cheapest = Math.min(
          ...near.filter((point) => point.benefit === best).map((point) => point.cost),
        );
        expect({ seed, id, ...after }).toMatchObject({ seed, id, benefit: best, cost: cheapest });
        met.all++;
      }
    }
    expect(Math.min(met.all, met.wide, met.none)).toBeGreaterThan(30);
  });
});

/** With three groups in all, an item's own and two more, every portfolio is one exchange away. */
const inThreeGroups = (problem: Problem): Problem => ({
  ...problem,
  items: problem.items.map((item, index) => ({ ...item, oneOf: `group ${index % 3}` })),
});

function groupsChanged(problem: Problem, before: Picks, after: Picks, except: string): number {
  return groupsOf(problem.items).filter(
    (items) =>
      items.every(({ id }) => id !== except) &&
      items.some(({ id }) => (before[id] ?? 0) !== (after[id] ?? 0)),
  ).length;
}
