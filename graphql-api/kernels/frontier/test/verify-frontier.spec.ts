import type { Problem } from '../src/problem/problem.js';
import type { ClaimedCertificate, ClaimedFrontier, ClaimedPoint } from '../src/result/parse-frontier.js';
import { verifyFrontier } from '../src/result/verify-frontier.js';
import { claimedOf, SOME_FINGERPRINT, twoNeedsAndAHoistFrontier } from './claimed-frontier.js';
import { aProblem, twoNeedsAndAHoist } from './examples.js';
import { runToEnd } from './run-search.js';
import { aRandomProblem } from './seeded.js';

const problem = twoNeedsAndAHoist();
const whole = twoNeedsAndAHoistFrontier();

function findings(claimed: ClaimedFrontier, of: Problem = problem): string[] {
  return verifyFrontier(of, claimed, SOME_FINGERPRINT).map(({ path, sentence }) => `${path}: ${sentence}`);
}

function withCertificate(part: Partial<ClaimedCertificate>): ClaimedFrontier {
  return { ...whole, certificate: { ...whole.certificate, ...part } };
}

function withPoint(index: number, part: Partial<ClaimedPoint>): ClaimedFrontier {
  return { ...whole, points: whole.points.with(index, { ...whole.points[index], ...part }) };
}

describe('the check of a frontier', () => {
  it('finds nothing in the front of the example', () => {
    expect(findings(whole)).toEqual([]);
  });

  it('finds nothing in fronts the search made of random problems', () => {
    let checked = 0;
    for (let seed = 1; seed <= 12; seed++) {
      const random = aRandomProblem(seed, 8);
      const { points } = runToEnd(random, { evaluations: 5_000 });
      if (points.length === 0) continue;
      const portfolios = points.map(({ picks }) => picks);
      expect(findings(claimedOf(random, portfolios), random)).toEqual([]);
      checked += points.length;
    }
    expect(checked).toBeGreaterThan(50);
  });

  it('tells another problem by its fingerprint, its name and its counts', () => {
    const other = `sha256:${'1'.repeat(64)}`;
    expect(findings({ ...whole, fingerprint: other })[0]).toMatch(
      /^fingerprint: .*another problem.*sha256:0+\.$/,
    );
    expect(findings({ ...whole, problem: 'a lift' })).toEqual([
      'problem: It says "a lift", but the problem is called "two needs and a hoist".',
    ]);
    expect(findings({ ...whole, counts: { kept: 8 } })).toEqual([
      'counts.kept: It is 8, but there are 9 points.',
    ]);
  });

  it('refuses a portfolio that breaks a limit', () => {
    const picks = { 'scanner-a': 1, viewer: 1, hoist: 3 };
    const claimed = withPoint(8, { picks, benefit: 135, cost: 100 });
    expect(findings(claimed)).toEqual(
      expect.arrayContaining([
        expect.stringMatching(
          /^points\[8\]\.picks: The portfolio is not feasible: 2 of viewer, hoist, which exclude/,
        ),
        expect.stringMatching(/^points\[8\]\.picks: .*4 pieces of ward 2, where at most 3/),
      ]),
    );
  });

  it('refuses items that are not there and sums that are wrong', () => {
    expect(findings(withPoint(1, { picks: { lift: 1 } }))).toEqual([
      'points[1].picks: The portfolio is not feasible: there is no item lift.',
      'points[1].benefit: It says 20, but the picks add up to 0.',
      'points[1].cost: It says 12, but the picks add up to 0.',
    ]);
    expect(findings(withPoint(1, { secondCost: 3 }))).toEqual([
      'points[1].secondCost: The problem knows no second cost.',
    ]);
  });

  it('adds up in whole numbers of any size', () => {
    const pieces = 2 ** 53 - 1;
    const claimed = withPoint(1, { picks: { hoist: pieces } });
    expect(findings(claimed)).toContainEqual(
      `points[1].cost: It says 12, but the picks add up to ${BigInt(pieces) * 12n}.`,
    );
  });

  it('refuses points out of order, doubled or beaten', () => {
    const { points } = whole;
    const swapped = { ...whole, points: points.with(1, points[2]).with(2, points[1]) };
    expect(findings(swapped)).toContainEqual(
      'points[2].cost: Points are in order of cost, but the one before costs 24.',
    );
    const doubled = { ...whole, points: points.toSpliced(2, 0, points[1]), counts: {} };
    expect(findings(doubled)).toContainEqual(
      'points[2]: It is beaten or equalled by points[1], which costs 12 and has benefit 20.',
    );
    const dear = { benefit: 48, cost: 40, picks: { 'scanner-b': 1 } };
    const beaten = { ...whole, points: points.toSpliced(4, 0, dear), counts: {} };
    expect(findings(beaten)).toContainEqual(
      'points[4]: It is beaten or equalled by points[3], which costs 36 and has benefit 60.',
    );
    const free = aProblem([], {
      items: [
        { id: 'poster', benefit: 1, cost: 0 },
        { id: 'bed', benefit: 5, cost: 4 },
      ],
    });
    expect(findings(claimedOf(free, [{}, { poster: 1 }, { poster: 1, bed: 1 }]), free)).toContainEqual(
      'points[0]: It is beaten by points[1], which has more benefit for its cost.',
    );
  });
});

describe('the check of a certificate', () => {
  it('refuses a bound that does not rise', () => {
    const bound = whole.certificate.bound.with(2, [24, 20]);
    expect(findings(withCertificate({ bound }))).toContainEqual(
      'certificate.bound[2]: Steps rise in cost and in benefit; this one does not after [12, 20].',
    );
  });

  it('refuses a bound below a point', () => {
    const { bound } = whole.certificate;
    expect(findings(withCertificate({ bound: bound.with(2, [24, 39]) }))).toEqual(
      expect.arrayContaining([
        'points[2].benefit: The benefit is 40, above the bound at its cost of 24, which is 39.',
        'certificate.provenStretches[0]: Nothing is said to be missing in it, but at a cost of 24 the points have a benefit of 40 and the bound allows a benefit of 39.',
      ]),
    );
    expect(findings(withCertificate({ bound: bound.slice(1) }))).toContainEqual(
      'points[0].benefit: The benefit is 0, above the bound at its cost of 0, which allows no portfolio.',
    );
  });

  it('refuses a front with a point removed, by its bound', () => {
    const claimed = { ...whole, points: whole.points.toSpliced(3, 1), counts: {} };
    expect(findings(claimed)).toEqual([
      'certificate.provenStretches[0]: Nothing is said to be missing in it, but at a cost of 36 the points have a benefit of 40 and the bound allows a benefit of 60.',
      'certificate.hypervolume: It says 6261, but the steps give 6001.',
      'certificate.bound: The bound of a complete frontier is its points, but step 3 is [36, 60] and point 3 is [49, 63].',
    ]);
  });

  it('refuses stretches that leave the axis, overlap or run backwards', () => {
    const stretches = (...provenStretches: [number, number][]): string[] =>
      findings(withCertificate({ status: 'bounded', provenStretches }));
    expect(stretches([0, 30], [40, 100])).toEqual([]);
    expect(stretches([0, 101])).toEqual([
      'certificate.provenStretches[0]: It ends at 101, beyond the ceiling of 100.',
    ]);
    expect(stretches([0, 30], [30, 40])).toEqual([
      'certificate.provenStretches[1]: Stretches are in order and apart; this one begins at 30, and the one before ends at 30.',
    ]);
    expect(stretches([30, 20])).toContainEqual(
      'certificate.provenStretches[0]: It ends at 20, before it begins at 30.',
    );
  });

  it('looks at the bound inside proven stretches only', () => {
    const bound = whole.certificate.bound.with(4, [45, 64]);
    const claim = (provenStretches: [number, number][]): string[] => {
      const part = { status: 'bounded' as const, bound, provenStretches, hypervolumeBound: undefined };
      return findings(withCertificate(part));
    };
    expect(
      claim([
        [0, 44],
        [52, 100],
      ]),
    ).toEqual([]);
    expect(
      claim([
        [0, 45],
        [52, 100],
      ]),
    ).toHaveLength(1);
    expect(
      claim([
        [0, 44],
        [51, 100],
      ]),
    ).toEqual([
      'certificate.provenStretches[1]: Nothing is said to be missing in it, but at a cost of 51 the points have a benefit of 63 and the bound allows a benefit of 64.',
    ]);
  });

  it('works out the areas again', () => {
    expect(findings(withCertificate({ hypervolume: 6260 }))).toEqual([
      'certificate.hypervolume: It says 6260, but the steps give 6261.',
    ]);
    expect(findings(withCertificate({ hypervolumeBound: 7000 }))).toEqual([
      'certificate.hypervolumeBound: It says 7000, but the steps give 6261.',
    ]);
    expect(findings(withCertificate({ reference: { benefit: 0, cost: 91 } }))[0]).toMatch(
      /^certificate\.reference: .*from benefit 0 at cost 100/,
    );
  });

  it('refuses a complete status without its proof', () => {
    expect(findings(withCertificate({ provenStretches: [[1, 100]] }))).toEqual([
      'certificate.provenStretches: A complete frontier has one proven stretch, over the whole axis from 0 to 100.',
    ]);
    expect(
      findings(
        withCertificate({
          provenStretches: [
            [0, 50],
            [51, 100],
          ],
        }),
      ),
    ).toHaveLength(1);
    expect(findings(withCertificate({ stopped: true }))).toEqual([
      'certificate.stopped: A complete frontier was not ended before it was done.',
    ]);
    const empty = {
      ...withCertificate({ bound: [], hypervolume: 0, hypervolumeBound: 0 }),
      points: [],
      counts: {},
    };
    expect(findings(empty)).toEqual([
      'certificate.status: It is complete, and there is no point; it should be infeasible.',
    ]);
  });

  it('refuses the other statuses where they do not fit', () => {
    const nothing = { bound: [], provenStretches: [], hypervolumeBound: undefined };
    expect(findings(withCertificate({ ...nothing, status: 'unproven' }))).toEqual([]);
    expect(findings(withCertificate({ ...nothing, status: 'bounded' }))).toEqual([
      'certificate.bound: The status is bounded, and there is no bound.',
    ]);
    expect(findings(withCertificate({ status: 'unproven' }))).toEqual([
      'certificate.bound: The status is unproven, and yet there is a bound.',
      'certificate.provenStretches: The status is unproven, and yet there are proven stretches.',
    ]);
    expect(findings(withCertificate({ ...nothing, status: 'infeasible' }))).toEqual([
      'points: The status is infeasible, and yet there are points.',
      'notes: The status is infeasible, and no note names what collides.',
    ]);
    expect(findings(withCertificate({ status: 'infeasible' }))).toContainEqual(
      'certificate.bound: The status is infeasible, and yet there is a bound.',
    );
  });
});

describe('the check of a frontier with a second cost', () => {
  const three: Problem = {
    format: 'metewand-problem/1',
    ceiling: 10,
    items: [
      { id: 'bed', benefit: 6, cost: 4, secondCost: 1 },
      { id: 'lift', benefit: 6, cost: 3, secondCost: 5 },
      { id: 'lamp', benefit: 1, cost: 1, secondCost: 1 },
    ],
    eitherOr: [['bed', 'lift', 'lamp']],
  };
  const points: ClaimedPoint[] = [
    { benefit: 0, cost: 0, secondCost: 0, picks: {} },
    { benefit: 1, cost: 1, secondCost: 1, picks: { lamp: 1 } },
    { benefit: 6, cost: 3, secondCost: 5, picks: { lift: 1 } },
    { benefit: 6, cost: 4, secondCost: 1, picks: { bed: 1 } },
  ];
  const surface: ClaimedFrontier = {
    format: 'metewand-frontier/1',
    fingerprint: SOME_FINGERPRINT,
    points,
    certificate: {
      status: 'complete',
      bound: [
        [0, 0],
        [1, 1],
        [3, 6],
      ],
      surfaceBound: points.map(({ benefit, cost, secondCost = 0 }) => [cost, benefit, secondCost] as const),
      provenSecondCosts: [[0, 5]],
      reference: { benefit: 0, cost: 10, secondCost: 10 },
      hypervolume: 376,
      hypervolumeBound: 376,
    },
  };
  const certified = (part: Partial<ClaimedCertificate>): string[] =>
    findings({ ...surface, certificate: { ...surface.certificate, ...part } }, three);
  const withPoints = (changed: readonly ClaimedPoint[]): string[] =>
    findings({ ...surface, points: changed }, three);

  it('finds nothing in a right one', () => {
    expect(findings(surface, three)).toEqual([]);
  });

  it('refuses a second cost that is wrong or missing', () => {
    expect(withPoints(points.with(3, { ...points[3], secondCost: 0 }))).toContainEqual(
      'points[3].secondCost: It says 0, but the picks add up to 1.',
    );
    expect(withPoints(points.with(3, { ...points[3], secondCost: undefined }))).toContainEqual(
      'points[3].secondCost: It is missing; the picks have 1.',
    );
  });

  it('refuses points beaten in all three and out of order', () => {
    expect(withPoints([...points, points[3]])).toContainEqual(
      'points[4]: Another point is as good or better in benefit, cost and second cost.',
    );
    expect(withPoints([points[0], points[1], points[3], points[2]])).toContainEqual(
      'points[3]: Points are in order of cost, and of second cost where the cost is equal; this one is not.',
    );
  });

  it('refuses points beyond the surface bound, and a bound that is more than the points', () => {
    const surfaceBound = surface.certificate.surfaceBound!;
    expect(certified({ surfaceBound: surfaceBound.slice(0, 3) })).toEqual(
      expect.arrayContaining([expect.stringMatching(/^points\[3\]: It lies beyond the surface bound/)]),
    );
    expect(certified({ surfaceBound: [...surfaceBound, [2, 3, 0]] })).toContainEqual(
      'certificate.surfaceBound: The surface bound of a complete frontier is its points, but [2, 3, 0] is not one.',
    );
  });

  it('refuses volumes and intervals that are wrong', () => {
    expect(certified({ hypervolume: 400 })).toEqual([
      'certificate.hypervolume: It says 400, but the set gives 376.',
    ]);
    expect(
      certified({
        provenSecondCosts: [
          [0, 5],
          [6, 7],
        ],
      }),
    ).toHaveLength(1);
    expect(certified({ provenSecondCosts: [[5, 0]] })).toHaveLength(1);
  });

  it('refuses what only a second cost has where there is none', () => {
    expect(findings(withCertificate({ surfaceBound: [] }))).toEqual([
      'certificate.surfaceBound: The problem knows no second cost.',
    ]);
  });
});
