import { hypervolume } from '@metewand/frontier';
import { freshInstance } from '../fresh.mjs';
import { measure } from '../processes.mjs';
import { areaAt } from '../trace.mjs';
import { gapOf } from './gaps.mjs';

/** Up to 400 alternatives the search may end by itself; above it gets as long as in T7. */
const SIZES = [
  { alternatives: 40, seconds: 300 },
  { alternatives: 100, seconds: 300 },
  { alternatives: 200, seconds: 300 },
  { alternatives: 400, seconds: 300 },
  { alternatives: 1_000, seconds: 10 },
  { alternatives: 5_000, seconds: 30 },
];
const MARKS = [0.1, 1, 10];

/** Not a row with a target: how time, quality and memory grow with size, ours beside the NSGA-II's. */
export const growthTable = {
  id: 'growth',
  head: [
    'alternatives',
    'points',
    'status',
    'CPU s',
    'growth',
    'gap',
    'MB',
    ...MARKS.map((mark) => `ours ${mark} s`),
    ...MARKS.map((mark) => `NSGA-II ${mark} s`),
    'NSGA-II MB',
  ],
  foot:
    'Growth: the power of the size by which CPU time rose since the row above, where both are complete. ' +
    'Columns with seconds: hypervolume by then as a share of the best known.',
  async lines({ seed, say }) {
    const lines = [];
    let before;
    for (const [place, { alternatives, seconds }] of SIZES.entries()) {
      const problem = freshInstance(seed, 60 + place, { alternatives });
      const ours = await measure('search', { problem, settings: { seed, reportEvery: 20_000 }, seconds });
      const theirs = await measure('evolve', { problem, seed, seconds: 10 });
      lines.push(lineOf({ alternatives, problem, ours, theirs, before }));
      before = ours.status === 'complete' ? { alternatives, seconds: ours.seconds } : undefined;
      say(lines.at(-1).join('  '));
    }
    return lines;
  },
};

function lineOf({ alternatives, problem, ours, theirs, before }) {
  const known = hypervolume(ours.points, { benefit: 0, cost: problem.ceiling });
  const best = Math.max(known, theirs.trace.at(-1)[1]);
  const complete = ours.status === 'complete';
  const power =
    complete && before
      ? (Math.log(ours.seconds / before.seconds) / Math.log(alternatives / before.alternatives)).toFixed(1)
      : '';
  const shares = (trace) => MARKS.map((mark) => (areaAt(trace, mark) / best).toFixed(5));
  return [
    `${alternatives}`,
    `${ours.points.length}`,
    ours.status,
    ours.seconds.toFixed(2),
    power,
    gapOf(problem, ours).toExponential(1),
    ours.megabytes.toFixed(0),
    ...shares(ours.trace),
    ...shares(theirs.trace),
    theirs.megabytes.toFixed(0),
  ];
}
