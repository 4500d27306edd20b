import { explainInfeasible } from '../src/explain/explain-infeasible.js';
import { loosen } from '../src/explain/loosening.js';
import { rulesOf, type Rule } from '../src/explain/rules.js';
import { smallestCollisions } from '../src/explain/smallest-collisions.js';
import { smallestHittingSet } from '../src/explain/smallest-hitting-set.js';
import type { Solve } from '../src/explain/solve.js';
import { violationsOf, type Violation } from '../src/problem/feasible.js';
import { parseProblem } from '../src/problem/parse-problem.js';
import type { Problem } from '../src/problem/problem.js';
import { allPortfolios, solveByTrying } from './all-portfolios.js';
import { aProblem, twoNeedsAndAHoist } from './examples.js';
import { aRandomProblem } from './seeded.js';

/** Two wards that want a piece each, and a ceiling that pays for one: no single count passes it. */
const twoWards = (rest: Partial<Problem> = {}): Problem =>
  aProblem(['bed', 'lamp', 'desk', 'shelf'], {
    ceiling: 15,
    limits: [{ name: 'rooms', most: 4 }],
    counts: [
      { name: 'ward 1', items: ['bed', 'lamp'], least: 1 },
      { name: 'ward 2', items: ['desk', 'shelf'], least: 1, most: 2 },
    ],
    ...rest,
  });

describe('rules that collide', () => {
  it('are found where none collides plainly, with what would have to give way', () => {
    expect(explainInfeasible(twoWards())).toEqual([]);
    expect(
      explainInfeasible(twoWards(), (figure, of) => `${figure} (${of === 'cost' ? of : '?'})`, solveByTrying),
    ).toEqual([
      'These cannot all be kept: a ceiling of 15 (cost); at least 1 pieces of ward 1; at least 1 pieces of ward 2.',
      'It would be enough to have a ceiling of 20 (cost), 5 (cost) more.',
      'It would be enough to have at least 0 pieces of ward 1, 1 less.',
      'It would be enough to have at least 0 pieces of ward 2, 1 less.',
    ]);
  });

  it('are named beside the plain reasons', () => {
    const problem = aProblem(['bed', 'lamp'], { ceiling: 15, mustInclude: ['bed', 'lamp'] });
    expect(explainInfeasible(problem, String, solveByTrying)).toEqual([
      'What must be taken (bed, lamp) brings cost to 20 at least, 5 over the ceiling of 15.',
      'These cannot all be kept: a ceiling of 15; bed must be taken; lamp must be taken.',
      'It would be enough to have a ceiling of 20, 5 more.',
      'It would be enough to give this up: bed must be taken.',
      'It would be enough to give this up: lamp must be taken.',
    ]);
  });

  it('are all named where there are several, and then no single one is enough', () => {
    const items = [
      ...twoWards().items,
      { id: 'tower', benefit: 1, cost: 0, needs: [['scope', 'lens']] },
      { id: 'scope', benefit: 1, cost: 0 },
      { id: 'lens', benefit: 1, cost: 0 },
    ];
    const both = twoWards({
      items,
      mustInclude: ['tower'],
      eitherOr: [
        ['tower', 'scope'],
        ['lens', 'tower'],
      ],
    });
    expect(smallestCollisions(both, solveByTrying).map(({ rules }) => rules.length)).toEqual([3, 4]);
    const links = { ...both, counts: [] };
    expect(smallestCollisions(links, solveByTrying)).toEqual([
      {
        rules: [
          { kind: 'must include', name: 'tower', place: 0 },
          { kind: 'either or', name: 'tower, scope', place: 0 },
          { kind: 'either or', name: 'lens, tower', place: 1 },
          { kind: 'needs', name: 'tower needs scope or lens', place: 4, needPlace: 0 },
        ],
        smallest: true,
      },
    ]);
    const [ceiling] = smallestCollisions(both, solveByTrying)[0].rules;
    expect(loosen(both, ceiling, solveByTrying)).toMatchObject({ outcome: 'not enough', exact: true });
  });

  it('are not claimed where the search proves nothing, or where there is a portfolio', () => {
    const nothing: Solve = () => ({ status: 'unproven', points: [] });
    expect(smallestCollisions(twoWards(), nothing)).toEqual([]);
    expect(smallestCollisions(twoNeedsAndAHoist(), solveByTrying)).toEqual([]);
    const [{ rules }] = smallestCollisions(twoWards(), solveByTrying);
    expect(loosen(twoWards(), rules[0], nothing)).toMatchObject({ outcome: 'unknown', exact: false });
  });

  it('are still irreducible when the questions run out', () => {
    const [collision, ...others] = smallestCollisions(twoWards(), solveByTrying, { questions: 1 });
    expect(others).toEqual([]);
    expect(collision.smallest).toBe(false);
    expect(collision.rules.map(({ name }) => name)).toEqual(['ceiling', 'ward 1', 'ward 2']);
  });

  it.each([1, 2, 3, 4])('are the smallest there are, on random problems of every kind (part %i)', (part) => {
    let compared = 0;
    for (let seed = part; seed <= 100; seed += 4) {
      const problem = parseProblem(tight(aRandomProblem(seed, 4 + (seed % 2)), seed));
      const broken = brokenByEach(problem);
      if (broken.some((rules) => rules.size === 0)) continue;
      const collisions = smallestCollisions(problem, solveByTrying);
      const size = smallestHittingSet(
        broken.map((rules) => [...rules.keys()]),
        [],
      )?.size;
      expect({ seed, size: collisions[0].rules.length }).toEqual({ seed, size });
      for (const { rules, smallest } of collisions) {
        expect(smallest).toBe(true);
        expect({ seed, collides: isHit(broken, rules) }).toEqual({ seed, collides: true });
        for (const rule of rules) {
          const rest = rules.filter((other) => other !== rule);
          expect({ seed, restCollides: isHit(broken, rest) }).toEqual({ seed, restCollides: false });
          expectLeastGiving(problem, broken, rule, seed);
        }
        compared += rules.length;
      }
    }
    expect(compared).toBeGreaterThan(30);
  });
});

/** More is asked for than the drawn limits pay for, so that most have no portfolio. */
const tight = (problem: Problem, seed: number): Problem => ({
  ...problem,
  ceiling: 20 + (seed % 20),
  limits: problem.limits?.map(({ name, most }) => ({ name, most: Math.ceil(most / 3), least: most % 4 })),
  leastBenefit: seed % 3 === 0 ? 60 : undefined,
  counts: problem.counts?.map((count) => ({ ...count, least: Math.min(2, count.most ?? 2) })),
});

type Broken = ReadonlyMap<string, Violation>;

const key = ({ kind, name }: { kind: string; name: string }): string => `${kind} ${name}`;

/** Of every combination of pieces the rules it breaks. */
function brokenByEach(problem: Problem): Map<string, Violation>[] {
  const { format, items } = problem;
  const free = items.map(({ id, most, benefit, cost }) => ({ id, most, benefit, cost }));
  return allPortfolios({ format, items: free }).map(
    ({ picks }) => new Map(violationsOf(problem, picks).map((each) => [key(each), each])),
  );
}

function isHit(broken: readonly Broken[], rules: readonly Rule[]): boolean {
  return broken.every((each) => rules.some((rule) => each.has(key(rule))));
}

/** The least overrun among the combinations that break nothing else, or none. */
function expectLeastGiving(problem: Problem, broken: readonly Broken[], rule: Rule, seed: number): void {
  // rules of one name cannot be told apart here
  if (rulesOf(problem).filter((other) => key(other) === key(rule)).length > 1) return;
  const overruns = broken
    .filter((each) => each.size === 1 && each.has(key(rule)))
    .map((each) => each.get(key(rule))!)
    .map(({ used, allowed }) => Math.abs(used - allowed));
  const found = loosen(problem, rule, solveByTrying);
  const outcome = overruns.length > 0 ? 'enough' : 'not enough';
  const by = overruns.length > 0 && rule.bound !== undefined ? Math.min(...overruns) : undefined;
  expect({ seed, rule: key(rule), outcome: found.outcome, by: found.by, exact: found.exact }).toEqual({
    seed,
    rule: key(rule),
    outcome,
    by,
    exact: true,
  });
}

describe('a smallest hitting set', () => {
  it('has a member of each set, and no fewer would do', () => {
    const sets = [['a', 'b'], ['b', 'c'], ['c', 'd'], ['e']];
    expect(smallestHittingSet(sets, [])?.size).toBe(3);
    expect([
      ...smallestHittingSet(
        [
          ['a', 'b'],
          ['b', 'c'],
        ],
        [],
      )!,
    ]).toEqual(['b']);
    expect(
      smallestHittingSet(
        [
          ['a', 'b'],
          ['b', 'c'],
        ],
        [new Set('b')],
      ),
    ).toEqual(new Set(['a', 'c']));
    expect(smallestHittingSet([['b']], [new Set('b')])).toBeUndefined();
    expect(smallestHittingSet([], [])).toEqual(new Set());
  });
});
