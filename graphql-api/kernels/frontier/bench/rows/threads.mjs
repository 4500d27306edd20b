import { freshInstance } from '../fresh.mjs';
import { measure } from '../processes.mjs';

export const threadsRow = {
  id: 'T10',
  what: 'two threads: extra CPU time, speed-up by the wall; the same set on 1, 2 and 4 threads',
  floor: 'at most 5 %; 1.5 on free cores; same',
  goal: 'at most 2 %; 1.9; same',
  async run({ seed, say }) {
    const told = [];
    for (const index of [90, 91]) {
      const problem = freshInstance(seed, index, { alternatives: 200 });
      told.push(await compare(problem, seed));
      say(`${problem.name}: ${told.at(-1).words}`);
    }
    const same = told.every((each) => each.same);
    const extra = Math.max(...told.map((each) => each.extra));
    const speedUp = Math.min(...told.map((each) => each.speedUp));
    return {
      measured: told.map(({ words }) => words).join('; '),
      floor: same && extra <= 0.05 && speedUp >= 1.5,
      goal: same && extra <= 0.02 && speedUp >= 1.9,
    };
  },
};

async function compare(problem, seed) {
  const [one, two, four] = [
    await measure('solveOnThreads', { problem, seed, threads: 1 }),
    await measure('solveOnThreads', { problem, seed, threads: 2 }),
    await measure('solveOnThreads', { problem, seed, threads: 4 }),
  ];
  const text = ({ status, points }) => JSON.stringify([status, points]);
  const same = text(one) === text(two) && text(one) === text(four);
  const extra = two.seconds / one.seconds - 1;
  const speedUp = one.wallSeconds / two.wallSeconds;
  const words =
    `${(100 * extra).toFixed(1)} % extra, speed-up ${speedUp.toFixed(2)}, ${same ? 'same' : 'NOT the same'} ` +
    `${one.points.length} points (${one.seconds.toFixed(1)} and ${two.seconds.toFixed(1)} CPU s)`;
  return { same, extra, speedUp, words };
}
