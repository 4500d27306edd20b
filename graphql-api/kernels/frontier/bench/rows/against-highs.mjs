import { freshInstance } from '../fresh.mjs';
import { measure } from '../processes.mjs';

export const hundredRow = {
  id: 'T2',
  what: 'the complete frontier of 100 alternatives, 3 capacities: CPU time of HiGHS by cost steps over ours',
  floor: '25',
  goal: '60',
  async run({ seed, say }) {
    const [first, ...others] = [20, 21, 22].map((index) => freshInstance(seed, index, { alternatives: 100 }));
    const told = [await wholeRatio(first, { seed, say })];
    for (const problem of others) told.push(await sampledRatio(problem, { seed, say, steps: 60 }));
    return judged(told, 25, 60);
  },
};

export const largerRow = {
  id: 'T3',
  what: 'the same at 200 and 400 alternatives (400 in at most 30 CPU s)',
  floor: '20',
  goal: '50, and 400 in 30 CPU s',
  async run({ seed, say }) {
    const told = [];
    for (const index of [23, 24]) {
      const problem = freshInstance(seed, index, { alternatives: 200 });
      told.push(await sampledRatio(problem, { seed, say, steps: 60 }));
    }
    const largest = freshInstance(seed, 25, { alternatives: 400 });
    const atLargest = await sampledRatio(largest, { seed, say, steps: 40 });
    const outcome = judged([...told, atLargest], 20, 50);
    return { ...outcome, goal: outcome.goal && atLargest.seconds <= 30 };
  },
};

const MOST_SECONDS = 300;

async function wholeRatio(problem, { seed, say }) {
  const ours = await complete(problem, seed);
  const theirs = await measure('solveAllSteps', { problem });
  const same = JSON.stringify(ours.points) === JSON.stringify(theirs.points);
  const ratio = theirs.seconds / ours.seconds;
  return tell({ problem, ours, same, ratio, theirs: `HiGHS ${theirs.seconds.toFixed(1)} s`, say });
}

/** So many steps at points spread evenly over the frontier, for the mean time of one; the whole has a step per point. */
async function sampledRatio(problem, { seed, say, steps }) {
  const ours = await complete(problem, seed);
  const count = ours.points.length;
  const places = Array.from({ length: steps }, (_, step) => Math.floor(((step + 0.5) * count) / steps));
  const sample = [...new Set(places)].map((place) => ours.points[place]);
  const theirs = await measure('solveSteps', { problem, costs: sample.map(([cost]) => cost) });
  const same = sample.every(([, benefit], place) => theirs.benefits[place] === benefit);
  const estimate = (theirs.seconds / sample.length) * (count + 1);
  const words = `HiGHS about ${estimate.toFixed(0)} s, from ${sample.length} of ${count + 1} steps`;
  return tell({ problem, ours, same, ratio: estimate / ours.seconds, theirs: words, say });
}

function complete(problem, seed) {
  return measure('search', { problem, settings: { seed }, seconds: MOST_SECONDS });
}

function tell({ problem, ours, same, ratio, theirs, say }) {
  const right = ours.status === 'complete' && same;
  const own = `${ours.points.length} points ${ours.status} in ${ours.seconds.toFixed(1)} s`;
  const words = `${problem.items.length}: ${ratio.toFixed(1)} (${own}; ${theirs}${same ? '' : '; NOT the same'})`;
  say(`${problem.name}: ${words}`);
  return { ratio, right, words, seconds: ours.seconds };
}

/** Every ratio has to pass, and every front has to be proven and to agree with HiGHS wherever both were asked. */
function judged(told, floor, goal) {
  const right = told.every((each) => each.right);
  const least = Math.min(...told.map(({ ratio }) => ratio));
  const measured = told.map(({ words }) => words).join('; ');
  return { measured, floor: right && least >= floor, goal: right && least >= goal };
}
