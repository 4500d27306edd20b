import { freshInstance } from '../fresh.mjs';
import { openData } from '../open-data.mjs';
import { demoRounds } from '../demo.mjs';
import { measure } from '../processes.mjs';
import { aTangledProblem } from '../tangled.mjs';

export const exactRow = {
  id: 'T1',
  what: 'exact and proven, the same list as HiGHS by cost steps: fresh instances of 20 to 80, all kinds of limits',
  floor: 'all',
  goal: 'all up to 200',
  async run({ seed, say }) {
    const wrong = [];
    const problems = [...realistic(seed), ...tangled(seed)];
    for (const problem of problems) {
      const ours = await measure('search', { problem, settings: { seed } });
      const theirs = await measure('solveAllSteps', { problem });
      const expected = theirs.points.length > 0 ? 'complete' : 'infeasible';
      const same = ours.status === expected && isSame(ours.points, theirs.points);
      if (!same) wrong.push(`${problem.name}: ${ours.status}, ${ours.points.length} points`);
      say(`${problem.name}: ${same ? 'the same' : 'NOT the same'} ${theirs.points.length} points,`);
      say(`  ${ours.seconds.toFixed(2)} s, HiGHS ${theirs.seconds.toFixed(1)} s`);
    }
    const right = problems.length - wrong.length;
    const measured = [`${right} of ${problems.length}`, ...wrong].join('; ');
    return { measured, floor: wrong.length === 0, goal: undefined };
  },
};

function realistic(seed) {
  const kinds = [
    ...[20, 30, 40, 50, 60, 80].map((alternatives) => ({ alternatives })),
    ...[0, 1, 2, 6, 12].map((capacities) => ({ alternatives: 40, capacities })),
    { alternatives: 60, money: 'minor' },
    { alternatives: 30, addedBenefit: 20 },
  ];
  return kinds.map((kind, index) => freshInstance(seed, index, kind));
}

function tangled(seed) {
  return [20, 24, 28, 32, 36, 40].map((itemCount, index) => aTangledProblem(seed + index, itemCount));
}

export const openDataRow = {
  id: 'T11',
  what: 'open data: the front of vOptLib 1A and MOMKP instances, identical and proven',
  floor: 'all six with a front',
  goal: 'also 2KP500-41 proven (120 s)',
  async run({ seed, say }) {
    const instances = openData();
    if (!instances) {
      return { measured: 'not run: FRONTIER_DATA names no folder of open data' };
    }
    const told = [];
    let right = 0;
    let goal = true;
    for (const { name, problem, front } of instances) {
      const ours = await measure('search', { problem, settings: { seed }, seconds: OPEN_SECONDS });
      const complete = ours.status === 'complete';
      const same = front ? isSame(ours.points, front) : undefined;
      if (complete && same) right++;
      goal &&= complete && same !== false;
      const verdict = same === undefined ? '' : same ? ', identical' : `, NOT the published ${front.length}`;
      told.push(`${name} ${ours.points.length} ${ours.status}${verdict} ${ours.seconds.toFixed(1)} s`);
      say(told.at(-1));
    }
    const published = instances.filter(({ front }) => front).length;
    return { measured: [`${right} of ${published}`, ...told].join('; '), floor: right === published, goal };
  },
};

const OPEN_SECONDS = 120;

export const demoRow = {
  id: 'T12',
  what: 'the demo round as it stands, complete: 853 points on the capital axis, 788 on the life-cycle axis, 48 for the second organisation',
  floor: 'the same counts, 2 s',
  goal: '0.5 s',
  async run({ seed, say }) {
    const told = [];
    let right = true;
    let slowest = 0;
    for (const { name, problem, points } of demoRounds()) {
      const ours = await measure('search', { problem, settings: { seed }, seconds: 60 });
      right &&= ours.status === 'complete' && ours.points.length === points;
      slowest = Math.max(slowest, ours.seconds);
      told.push(`${name}: ${ours.points.length} of ${points}, ${ours.status}, ${ours.seconds.toFixed(2)} s`);
      say(told.at(-1));
    }
    return { measured: told.join('; '), floor: right && slowest <= 2, goal: right && slowest <= 0.5 };
  },
};

function isSame(one, other) {
  return JSON.stringify(one) === JSON.stringify(other);
}
