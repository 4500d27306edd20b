/**
 * Works out the fronts of verifiedProblems by HiGHS, cost step by cost step, and writes them to test/highs-fronts.json;
 * takes about ten minutes of CPU:
 *
 *   node graphql-api/kernels/frontier/bench/work-out-fronts.mjs
 */
import { writeFileSync } from 'node:fs';
import { costSteps } from '../../../../scripts/frontier/highs-cost-steps.mjs';
import { verifiedProblems } from './verified.mjs';

const fronts = [];
for (const problem of verifiedProblems()) {
  const points = [];
  for await (const { cost, benefit } of costSteps(problem)) points.push([cost, benefit]);
  fronts.push({ name: problem.name, points: points.reverse() });
  console.error(`${fronts.length}: ${problem.name}, ${points.length} points`);
}
const lines = fronts.map((front) => `  ${JSON.stringify(front)}`);
writeFileSync(new URL('../test/highs-fronts.json', import.meta.url), `[\n${lines.join(',\n')}\n]\n`);
