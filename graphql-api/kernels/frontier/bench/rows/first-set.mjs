import { hypervolume } from '@metewand/frontier';
import { freshInstance } from '../fresh.mjs';
import { measure } from '../processes.mjs';
import { secondsTo } from '../trace.mjs';

export const firstSetRow = {
  id: 'T5',
  what: 'first useful set (hypervolume of 0.9 of the best known), each in a fresh process, reading the problem included',
  floor: '50 ms up to 200 alternatives',
  goal: '20 ms',
  async run({ seed, say }) {
    const told = [];
    for (const [place, alternatives] of [40, 100, 100, 200, 200, 400].entries()) {
      const problem = freshInstance(seed, 40 + place, { alternatives });
      const milliseconds = 1000 * (await firstUseful(problem, seed));
      told.push({ alternatives, milliseconds });
      say(`${problem.name}: ${milliseconds.toFixed(0)} ms`);
    }
    const slowest = (upTo) =>
      Math.max(
        ...told.filter(({ alternatives }) => alternatives <= upTo).map(({ milliseconds }) => milliseconds),
      );
    const measured = told.map(
      ({ alternatives, milliseconds }) => `${alternatives}: ${milliseconds.toFixed(0)} ms`,
    );
    return { measured: measured.join('; '), floor: slowest(200) <= 50, goal: slowest(200) <= 20 };
  },
};

/** The best known is what the search has after some seconds. */
async function firstUseful(problem, seed) {
  const best = await measure('search', { problem, settings: { seed }, seconds: 5 });
  const useful = 0.9 * hypervolume(best.points, { benefit: 0, cost: problem.ceiling });
  const settings = { seed, reportEvery: 500 };
  const { trace } = await measure('search', { problem, settings, seconds: 5, area: useful });
  return secondsTo(trace, useful) ?? Infinity;
}
