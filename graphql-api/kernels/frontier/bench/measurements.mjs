import {
  ParetoFront,
  parseFrontier,
  parseProblem,
  Random,
  searchFrontier,
  toFrontierDocument,
  verifyFrontier,
} from '@metewand/frontier';
import { fingerprintOf } from '../../../../scripts/frontier/fingerprint.mjs';
import { costSteps } from '../../../../scripts/frontier/highs-cost-steps.mjs';
import { HighsSolver } from '../../../../scripts/frontier/highs-solver.mjs';
import { solve } from '../../../../scripts/frontier/solve.mjs';
import { LocalSearch } from '../dist/local-search/local-search.js';
import { compileModel } from '../dist/model/compile-model.js';
import { nsga2 } from './nsga2.mjs';
import { Stopwatch } from './stopwatch.mjs';
import { Trace } from './trace.mjs';

/**
 * Runs the search to its end, or for so many CPU seconds, or until its hypervolume has come to `area`.
 *
 * @returns its result without portfolios: status, points and bound as [cost, benefit], CPU seconds, the trace
 */
export function search({ problem, settings, seconds = Infinity, area = Infinity }) {
  const watch = new Stopwatch();
  const trace = new Trace(problem, watch);
  const result = searched(parseProblem(problem), settings, ({ points }) => {
    const reached = trace.note(points);
    return reached >= area || watch.seconds >= seconds;
  });
  const spent = watch.seconds;
  const { status, bound, evaluations } = result;
  const points = result.points.map(({ cost, benefit }) => [cost, benefit]);
  return { status, points, bound, evaluations, seconds: spent, trace: trace.entries };
}

/** A search, and then what checking its file takes, from the texts of both files on. */
export function searchAndVerify({ problem, settings, seconds }) {
  const searching = new Stopwatch();
  const result = searched(parseProblem(problem), settings, () => searching.seconds >= seconds);
  const searchSeconds = searching.seconds;
  const fingerprint = fingerprintOf(problem);
  const facts = { fingerprint, threads: 1, seconds: searchSeconds };
  const texts = [problem, toFrontierDocument(parseProblem(problem), result, facts)].map((document) =>
    JSON.stringify(document),
  );

  const verifying = new Stopwatch();
  const [read, claimed] = texts.map((text) => JSON.parse(text));
  const findings = verifyFrontier(parseProblem(read), parseFrontier(claimed), fingerprintOf(read));
  const { status, points } = result;
  return { status, points: points.length, findings, searchSeconds, verifySeconds: verifying.seconds };
}

/** The search as the command line runs it, on so many threads; CPU seconds of all of them, and seconds by the wall. */
export async function solveOnThreads({ problem, seed, threads }) {
  const watch = new Stopwatch();
  const began = performance.now();
  const result = await solve(parseProblem(problem), { seed, threads });
  const wallSeconds = (performance.now() - began) / 1000;
  const points = result.points.map(({ cost, benefit }) => [cost, benefit]);
  return { status: result.status, points, seconds: watch.seconds, wallSeconds };
}

/** Runs the NSGA-II for so many CPU seconds, or until its hypervolume has come to `area`. */
export function evolve({ problem, seed, seconds, area = Infinity }) {
  const watch = new Stopwatch();
  const trace = new Trace(problem, watch);
  for (const { front, evaluations } of nsga2(problem, { seed })) {
    const reached = trace.note(() => front.points());
    if (reached >= area || watch.seconds >= seconds) {
      return { points: front.size, evaluations, seconds: watch.seconds, trace: trace.entries };
    }
  }
}

/** The whole front by HiGHS, cost step by cost step. */
export async function solveAllSteps({ problem }) {
  const watch = new Stopwatch();
  const points = [];
  for await (const { cost, benefit } of costSteps(problem)) points.push([cost, benefit]);
  return { points: points.reverse(), seconds: watch.seconds };
}

/** Some of the steps only: the most benefit at no more than each cost, once HiGHS is loaded. */
export async function solveSteps({ problem, costs }) {
  const solver = new HighsSolver(problem);
  await solver.ask({ costMost: -1 });
  const watch = new Stopwatch();
  const benefits = [];
  for (const costMost of costs) {
    const { verdict, why, benefit } = await solver.ask({ costMost, seconds: 600 });
    if (verdict === 'undecided') throw new Error(`Cost up to ${costMost}: ${why}.`);
    benefits.push(benefit);
  }
  const { seconds } = watch;
  solver.close();
  return { benefits, seconds };
}

/** The local search on its own, without proof: so many evaluations, and the front they found. */
export function searchLocally({ problem, seed, evaluations }) {
  const model = compileModel(parseProblem(problem));
  const watch = new Stopwatch();
  const local = new LocalSearch(model, seed, 0);
  while (local.archive.evaluations < evaluations) local.step(100_000);
  return { perSecond: local.archive.evaluations / watch.seconds, points: local.archive.front.points() };
}

/** Offers to a front of so many members, one in eight of which may take a member's place; the others are refused. */
export function offer({ members }) {
  const random = new Random(1);
  const front = new ParetoFront(8);
  const choices = new Int32Array(8);
  const step = 1_000;
  for (let place = 0; place < members; place++) front.offer(place * step, place * step, choices);
  const offers = 2_000_000;
  const watch = new Stopwatch();
  for (let count = 0; count < offers; count++) {
    const cost = random.below(members) * step;
    const benefit = count % 8 === 0 ? cost + random.below(step) : cost - random.below(step);
    front.offer(benefit, cost, choices);
  }
  return { perSecond: offers / watch.seconds };
}

/** Runs a search until it ends or `isEnough` says so of a progress. */
function searched(problem, settings, isEnough) {
  const steps = searchFrontier(problem, settings);
  let step = steps.next();
  while (!step.done) step = steps.next({ stop: isEnough(step.value) });
  return step.value;
}
