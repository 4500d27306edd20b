import { describeReduction } from '../src/explain/describe-reduction.js';
import type { Problem } from '../src/problem/problem.js';
import { reduceProblem } from '../src/reduction/reduce-problem.js';
import type { Reduction } from '../src/reduction/reduction.js';
import { allPortfolios } from './all-portfolios.js';
import { aProblem } from './examples.js';
import { bruteForceFront } from './brute-force.js';
import { aRandomProblem } from './seeded.js';

const sentences = (problem: Problem): string[] =>
  reduceProblem(problem).reductions.map((reduction) => describeReduction(reduction));

const scanners = (...rest: object[]) =>
  rest.map((each, index) => ({
    id: `scanner-${'abc'[index]}`,
    benefit: 10,
    cost: 10,
    oneOf: 'scanner',
    ...each,
  }));

/** Few different figures, two groups and few links, so that alternatives beat and equal each other often. */
const coarsened = (problem: Problem): Problem => ({
  ...problem,
  items: problem.items.map((item, index) => ({
    ...item,
    benefit: 20 * Math.floor(item.benefit / 20),
    cost: 20 * Math.floor(item.cost / 20),
    uses: item.uses?.map((use) => 6 * Math.floor(use / 6)),
    oneOf: index % 3 === 0 ? undefined : `group ${index % 2}`,
    needs: index % 4 === 0 ? item.needs : undefined,
  })),
  counts: problem.counts?.slice(1),
});

describe('what is settled before a search', () => {
  it.each<[string, Problem, string[]]>([
    [
      'an alternative that another one beats',
      aProblem([], { items: scanners({}, { benefit: 11 }, { cost: 9, benefit: 9 }) }),
      [
        'scanner-a was left out before the search: scanner-b, of the same group, is at least as good in everything.',
      ],
    ],
    [
      'the later of two equals',
      aProblem([], { items: scanners({}, {}) }),
      [
        'scanner-b was left out before the search: scanner-a, of the same group, is at least as good in everything.',
      ],
    ],
    [
      'an item that brings nothing',
      aProblem([], { items: [{ id: 'plaque', benefit: 0, cost: 3 }] }),
      ['plaque was left out before the search: it adds no benefit, and nothing else asks for it.'],
    ],
    [
      'an item over the ceiling',
      aProblem(['bed'], { ceiling: 8 }),
      ['bed was left out before the search: with it cost comes to 10 at least, 2 over the ceiling of 8.'],
    ],
    [
      'an item that what must be taken leaves no room for',
      aProblem(['bed', 'lamp'], { ceiling: 15, mustInclude: ['lamp'] }),
      ['bed was left out before the search: with it cost comes to 20 at least, 5 over the ceiling of 15.'],
    ],
    [
      'an item over a limit together with its partner',
      aProblem([], {
        limits: [{ name: 'days', most: 5 }],
        items: [
          { id: 'tower', benefit: 5, cost: 1, uses: [3], needs: [['scope']] },
          { id: 'scope', benefit: 5, cost: 1, uses: [4] },
        ],
      }),
      [
        'tower was left out before the search: with it and scope, which it needs, days comes to 7 at least, 2 over its limit of 5.',
      ],
    ],
    [
      'pieces over a limit',
      aProblem([], {
        limits: [{ name: 'days', most: 5 }],
        items: [{ id: 'pump', benefit: 5, cost: 1, uses: [2], most: 4 }],
      }),
      ['At most 2 of pump can be taken: with all of them days comes to 8 at least, 3 over its limit of 5.'],
    ],
    [
      'an item without which a count is out of reach',
      aProblem(['bed', 'lamp'], { counts: [{ name: 'ward 2', items: ['bed', 'lamp'], least: 2 }] }),
      [
        'bed is in every portfolio: without it ward 2 comes to 1 pieces at most, 1 fewer than the 2 asked for.',
        'lamp is in every portfolio: without it ward 2 comes to 1 pieces at most, 1 fewer than the 2 asked for.',
      ],
    ],
    [
      'links of mandatory and left out items',
      aProblem([], {
        items: [
          { id: 'tower', benefit: 5, cost: 1, needs: [['scope']] },
          ...aProblem(['scope', 'rival', 'lens']).items,
          { id: 'camera', benefit: 5, cost: 1, needs: [['lens']] },
        ],
        mustInclude: ['tower'],
        leaveOut: ['lens'],
        eitherOr: [['scope', 'rival']],
      }),
      [
        'scope must be taken because tower needs scope; so it is in every portfolio.',
        'camera is out because lens is left out; so camera was left out before the search.',
        'rival is out because scope must be taken because tower needs scope; so rival was left out before the search.',
      ],
    ],
    [
      'an item that excludes what it needs',
      aProblem([], {
        items: [{ id: 'tower', benefit: 5, cost: 1, needs: [['scope']] }, ...aProblem(['scope']).items],
        eitherOr: [['tower', 'scope']],
      }),
      ['tower needs scope, and that cannot come with it; so tower was left out before the search.'],
    ],
  ])('says so: %s', (_, problem, said) => {
    expect(sentences(problem)).toEqual(said);
    expect(bruteForceFront(reduceProblem(problem).problem)).toEqual(bruteForceFront(problem));
  });

  it.each<[string, Partial<Problem>, object?]>([
    ['that uses less of a limit', { limits: [{ name: 'days', most: 9 }] }, { uses: [0] }],
    ['that uses more of a limit with a least', { limits: [{ name: 'days', most: 9, least: 1 }] }],
    ['that another item needs', { items: [{ id: 'lens', benefit: 1, cost: 1, needs: [['scanner-a']] }] }],
    ['that a count asks for', { counts: [{ items: ['scanner-a'], least: 1 }] }],
    ['whose rival is in an either-or', { eitherOr: [['scanner-b', 'lens']] }],
    ['whose rival is in a count', { counts: [{ items: ['scanner-b', 'lens'], most: 1 }] }],
    ['of which more pieces may be taken', {}, { most: 2 }],
    ['whose rival needs something', {}, { rivalNeeds: [['lens']] }],
    ['that must be taken', { mustInclude: ['scanner-a'] }],
  ])('keeps a dearer alternative %s', (_, { items = [], ...rules }, more = {}) => {
    const { rivalNeeds, ...of } = more as { rivalNeeds?: string[][] };
    const uses = rules.limits ? { uses: [1] } : {};
    const alternatives = scanners(
      { cost: 12, ...uses, ...of },
      { ...(rules.limits?.[0].least === undefined ? uses : { uses: [0] }), needs: rivalNeeds },
    );
    const lens = { id: 'lens', benefit: 1, cost: 1, ...(rules.limits ? { uses: [0] } : {}) };
    const problem = aProblem([], {
      items: [...alternatives, ...(items.length > 0 ? items : [lens])],
      ...rules,
    });
    const { reductions } = reduceProblem(problem);
    expect(reductions.filter(({ kind, item }) => kind === 'beaten' && item === 'scanner-a')).toEqual([]);
  });

  it('keeps both of two equals where every portfolio of a point is wanted', () => {
    const problem = aProblem([], { items: scanners({}, {}, { cost: 11 }) });
    expect(reduceProblem(problem, 'keep all').reductions.map(({ item }) => item)).toEqual(['scanner-c']);
  });

  it('knows when nothing can be feasible', () => {
    const problem = aProblem(['bed', 'lamp'], { ceiling: 15, mustInclude: ['bed', 'lamp'] });
    expect(reduceProblem(problem)).toEqual({ problem, reductions: [], infeasible: true });
  });

  it('keeps every portfolio of every point where they are wanted', () => {
    let several = 0;
    for (let seed = 1; seed <= 120; seed++) {
      const problem = coarsened(aRandomProblem(seed, 6));
      const front = new Set(bruteForceFront(problem).map(String));
      const onFront = (of: Problem): string[] =>
        allPortfolios(of)
          .filter(({ cost, benefit }) => front.has(String([cost, benefit])))
          .map(({ picks }) => JSON.stringify(picks));
      const all = onFront(problem);
      expect({ seed, all: onFront(reduceProblem(problem, 'keep all').problem) }).toEqual({ seed, all });
      if (all.length > front.size) several++;
    }
    expect(several).toBeGreaterThan(10);
  });

  it('never loses a point of the frontier, on random problems with every kind of limit and link', () => {
    const met = new Map<Reduction['kind'] | 'infeasible', number>();
    const count = (kind: Reduction['kind'] | 'infeasible'): unknown =>
      met.set(kind, (met.get(kind) ?? 0) + 1);
    for (let seed = 1; seed <= 500; seed++) {
      const drawn = aRandomProblem(seed, 4 + (seed % 6));
      const problem = seed % 2 === 0 ? drawn : coarsened(drawn);
      const exact = bruteForceFront(problem);
      const { problem: reduced, reductions, infeasible } = reduceProblem(problem);
      expect({ seed, front: bruteForceFront(reduced) }).toEqual({ seed, front: exact });
      if (infeasible) expect(exact).toEqual([]);
      if (infeasible) count('infeasible');
      for (const { kind } of reductions) count(kind);
    }
    expect([...met.values()].every((times) => times > 15)).toBe(true);
    expect(met.size).toBe(8);
  });
});
