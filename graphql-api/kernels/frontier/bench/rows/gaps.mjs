import { hypervolume } from '@metewand/frontier';
import { freshInstance } from '../fresh.mjs';
import { measure } from '../processes.mjs';
import { ceilingOf } from '../trace.mjs';

export const largeRow = {
  id: 'T7',
  what: 'certified hypervolume gap at 1 000 alternatives after 10 CPU s; at 5 000 after 30 s',
  floor: '5e-4; 5e-3',
  goal: '1e-4; 5e-4',
  async run({ seed, say }) {
    const thousand = await gapAfter(freshInstance(seed, 50, { alternatives: 1_000 }), 10, { seed, say });
    const five = await gapAfter(freshInstance(seed, 51, { alternatives: 5_000 }), 30, { seed, say });
    return {
      measured: `1 000: ${thousand.words}; 5 000: ${five.words}`,
      floor: thousand.gap <= 5e-4 && five.gap <= 5e-3,
      goal: thousand.gap <= 1e-4 && five.gap <= 5e-4,
    };
  },
};

export const correlatedRow = {
  id: 'T8',
  what: 'strongly correlated, benefit = cost + 20, 100 alternatives: certified hypervolume gap after 20 s',
  floor: '4e-3',
  goal: 'exact',
  async run({ seed, say }) {
    const problem = freshInstance(seed, 52, { alternatives: 100, addedBenefit: 20 });
    const { gap, words, status } = await gapAfter(problem, 20, { seed, say });
    return { measured: words, floor: gap <= 4e-3, goal: status === 'complete' };
  },
};

async function gapAfter(problem, seconds, { seed, say }) {
  const result = await measure('search', { problem, settings: { seed }, seconds });
  const gap = gapOf(problem, result);
  const words =
    `${gap.toExponential(1)} (${result.status}, ${result.points.length} points, ` +
    `${result.seconds.toFixed(1)} CPU s, ${result.megabytes.toFixed(0)} MB)`;
  say(`${problem.name}: ${words}`);
  return { gap, words, status: result.status };
}

/** By how much of itself the bound's hypervolume is above the front's; 1 where nothing is proven. */
export function gapOf(problem, { points, bound }) {
  if (bound.length === 0) return 1;
  const reference = { benefit: 0, cost: ceilingOf(problem) };
  const bounded = hypervolume(bound, reference);
  return (bounded - hypervolume(points, reference)) / bounded;
}
