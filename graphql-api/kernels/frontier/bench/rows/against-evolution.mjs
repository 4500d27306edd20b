import { hypervolume } from '@metewand/frontier';
import { freshInstance } from '../fresh.mjs';
import { measure } from '../processes.mjs';
import { secondsTo } from '../trace.mjs';

export const evolutionRow = {
  id: 'T4',
  what: 'hypervolume of 0.999 of the exact within the time a plain NSGA-II with repair takes for 0.95, six fresh instances of 100 and 200',
  floor: '6 of 6',
  goal: '6 of 6 in half that time',
  async run({ seed, say }) {
    const told = [];
    for (const [place, alternatives] of [100, 100, 100, 200, 200, 200].entries()) {
      const problem = freshInstance(seed, 30 + place, { alternatives });
      told.push({ alternatives, ...(await race(problem, seed)) });
      say(`${problem.name}: ${inWords(told.at(-1))}`);
    }
    const within = (share) => told.filter(({ ours, theirs }) => ours <= share * theirs).length;
    const measured = [`${within(1)} of 6, ${within(0.5)} in half the time`, ...told.map(inWords)].join('; ');
    return { measured, floor: within(1) === 6, goal: within(0.5) === 6 };
  },
};

const GIVEN_UP_SECONDS = 60;

async function race(problem, seed) {
  const exact = await measure('search', { problem, settings: { seed }, seconds: 300 });
  const whole = hypervolume(exact.points, { benefit: 0, cost: problem.ceiling });
  const settings = { seed, reportEvery: 2_000 };
  const limits = { problem, seconds: GIVEN_UP_SECONDS };
  const ours = await measure('search', { ...limits, settings, area: 0.999 * whole });
  const theirs = await measure('evolve', { ...limits, seed, area: 0.95 * whole });
  return {
    proven: exact.status === 'complete',
    ours: secondsTo(ours.trace, 0.999 * whole) ?? Infinity,
    theirs: secondsTo(theirs.trace, 0.95 * whole) ?? GIVEN_UP_SECONDS,
  };
}

function inWords({ alternatives, ours, theirs, proven }) {
  const own = Number.isFinite(ours) ? `${ours.toFixed(3)} s` : `not in ${GIVEN_UP_SECONDS} s`;
  const against = theirs < GIVEN_UP_SECONDS ? `${theirs.toFixed(3)} s` : `over ${theirs} s`;
  return `${alternatives}: ${own} against ${against}${proven ? '' : ' (of the best known)'}`;
}
