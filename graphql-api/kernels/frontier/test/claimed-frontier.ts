import { hypervolume } from '../src/archive/hypervolume.js';
import { totalsOf, type Picks } from '../src/problem/feasible.js';
import type { Problem } from '../src/problem/problem.js';
import type { ClaimedFrontier } from '../src/result/parse-frontier.js';
import { twoNeedsAndAHoist } from './examples.js';

export const SOME_FINGERPRINT = `sha256:${'0'.repeat(64)}`;

/** The whole front of the format's example, with one portfolio for each of its nine points, written by hand. */
export function twoNeedsAndAHoistFrontier(): ClaimedFrontier {
  return claimedOf(twoNeedsAndAHoist(), [
    {},
    { hoist: 1 },
    { hoist: 2 },
    { hoist: 3 },
    { 'scanner-b': 1, viewer: 1 },
    { 'scanner-b': 1, hoist: 1 },
    { 'scanner-b': 1, hoist: 2 },
    { 'scanner-b': 1, hoist: 3 },
    { 'scanner-a': 1, hoist: 3 },
  ]);
}

/** A frontier that claims these portfolios, in order of cost, to be all that count; the problem has a ceiling. */
export function claimedOf(
  problem: Problem & { ceiling?: number },
  portfolios: readonly Picks[],
): ClaimedFrontier {
  const points = portfolios.map((picks) => {
    const { benefit, cost } = totalsOf(problem, picks);
    return { benefit, cost, picks };
  });
  const bound = points.map(({ cost, benefit }) => [cost, benefit] as const);
  const reference = { benefit: 0, cost: problem.ceiling ?? points[points.length - 1].cost };
  const area = hypervolume(bound, reference);
  return {
    format: 'metewand-frontier/1',
    problem: problem.name,
    fingerprint: SOME_FINGERPRINT,
    seed: 1,
    threads: 2,
    seconds: 0.41,
    points,
    certificate: {
      status: 'complete',
      provenStretches: [[0, reference.cost]],
      bound,
      hypervolume: area,
      hypervolumeBound: area,
      reference,
    },
    counts: { lookedAt: 14, kept: points.length, sinceBeaten: 2 },
    notes: [],
  };
}
