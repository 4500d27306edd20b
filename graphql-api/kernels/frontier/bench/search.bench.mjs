/**
 * Figures of the search kernel as built (`dist`), in CPU time of this process. Run it on its own; on a loaded machine
 * trust the ratios, not the absolute figures.
 *
 *   npx tsc -b graphql-api/kernels/frontier && node graphql-api/kernels/frontier/bench/search.bench.mjs
 */
import { readFileSync } from 'node:fs';
import { ParetoFront, Random, hypervolume, searchFrontier } from '../dist/index.js';

const readJson = (name) => JSON.parse(readFileSync(new URL(`../test/${name}`, import.meta.url), 'utf8'));

function cpuSeconds(work) {
  const before = process.cpuUsage();
  const outcome = work();
  const { user, system } = process.cpuUsage(before);
  return { seconds: (user + system) / 1e6, outcome };
}

/** Offers per second to a front of so many members: one in eight may replace a member, the others are refused. */
function offersPerSecond(members) {
  const random = new Random(1);
  const front = new ParetoFront(Int32Array.from({ length: 9 }, (_, k) => k));
  const choices = Int32Array.from({ length: 8 }, (_, k) => k);
  const step = 1_000;
  for (let place = 0; place < members; place++) front.offer(place * step, place * step, choices);
  const offers = 1_000_000;
  const { seconds } = cpuSeconds(() => {
    for (let offer = 0; offer < offers; offer++) {
      const cost = random.below(members) * step;
      const benefit = offer % 8 === 0 ? cost + random.below(step) : cost - random.below(step);
      front.offer(benefit, cost, choices);
    }
  });
  return { offers: offers / seconds, size: front.size };
}

function runToEnd(problem, settings) {
  const search = searchFrontier(problem, settings);
  let step = search.next();
  while (!step.done) step = search.next();
  return step.value;
}

const small = offersPerSecond(5_000);
for (const members of [5_000, 100_000, 1_000_000]) {
  const { offers, size } = offersPerSecond(members);
  const slower = (small.offers / offers).toFixed(2);
  console.log(
    `archive, ${size} members: ${(offers / 1e6).toFixed(2)} M offers/s, an offer costs ${slower} of one at 5 000`,
  );
}

const demo = readJson('demo-problems.json').firstOrganisation;
const exact = readJson('demo-exact-front.json');
const corner = { benefit: 0, cost: demo.ceiling };
const exactVolume = hypervolume(exact, corner);
for (const evaluations of [200_000, 2_000_000, 20_000_000]) {
  const { seconds, outcome } = cpuSeconds(() => runToEnd(demo, { evaluations }));
  const points = outcome.points.map(({ cost, benefit }) => [cost, benefit]);
  const known = new Set(exact.map(String));
  const found = points.filter((point) => known.has(String(point))).length;
  console.log(
    `demo, ${(outcome.evaluations / 1e6).toFixed(1)} M evaluations: ${(outcome.evaluations / seconds / 1e6).toFixed(1)} M/s, ` +
      `${found} of ${exact.length} exact points, hypervolume ${(hypervolume(points, corner) / exactVolume).toFixed(7)} of exact`,
  );
}
