import { hypervolume } from '@metewand/frontier';
import { demoFront, demoRounds } from '../demo.mjs';
import { freshInstance } from '../fresh.mjs';
import { measure } from '../processes.mjs';

const MEMBERS = [1_000, 5_000, 10_000, 100_000, 1_000_000];

export const ratesRow = {
  id: 'T6',
  what: 'delta evaluations of the local search per CPU second; offers per second to an archive of 100 k members',
  floor: '10 M; 1 M, growth below 2 from 5 k to 100 k',
  goal: '20 M; 2 M',
  async run({ seed, say }) {
    const evaluations = await evaluationRates(seed, say);
    const offers = new Map();
    for (const members of MEMBERS) {
      offers.set(members, (await measure('offer', { members })).perSecond);
      say(`offers to ${members} members: ${millions(offers.get(members))}`);
    }
    const slowest = Math.min(...evaluations.map(({ perSecond }) => perSecond));
    const large = offers.get(100_000);
    const growth = offers.get(5_000) / large;
    const measured = [
      ...evaluations.map(({ words }) => words),
      `offers to ${MEMBERS.map((members) => `${thousands(members)} ${millions(offers.get(members))}`).join(', ')}`,
      `growth ${growth.toFixed(2)}`,
    ].join('; ');
    return {
      measured,
      floor: slowest >= 10e6 && large >= 1e6 && growth < 2,
      goal: slowest >= 20e6 && large >= 2e6,
    };
  },
};

async function evaluationRates(seed, say) {
  const [{ problem: demo }] = demoRounds();
  const problems = [
    { name: 'demo', problem: demo, exact: demoFront() },
    ...[100, 200, 400].map((alternatives, place) => ({
      name: `${alternatives}`,
      problem: freshInstance(seed, 70 + place, { alternatives }),
    })),
  ];
  const rates = [];
  for (const { name, problem, exact } of problems) {
    const task = { problem, seed, evaluations: 20_000_000 };
    const { perSecond, points } = await measure('searchLocally', task);
    const found = exact === undefined ? '' : ` (${shareFound(points, exact, problem)} without proof)`;
    rates.push({ perSecond, words: `${name} ${millions(perSecond)}${found}` });
    say(`evaluations, ${rates.at(-1).words}`);
  }
  return rates;
}

function shareFound(points, exact, { ceiling }) {
  const known = new Set(exact.map(String));
  const found = points.filter((point) => known.has(String(point))).length;
  const corner = { benefit: 0, cost: ceiling };
  const share = hypervolume(points, corner) / hypervolume(exact, corner);
  return `${found} of ${exact.length} exact points, hypervolume ${share.toFixed(7)} of exact`;
}

function millions(perSecond) {
  return `${(perSecond / 1e6).toFixed(2)} M/s`;
}

function thousands(count) {
  return count >= 1e6 ? `${count / 1e6} M` : `${count / 1e3} k`;
}
