import { HighsSolver } from './highs-solver.mjs';

/**
 * The whole front by HiGHS, cost step by cost step, from the dearest point down: the most benefit at no more than a
 * cost, then the same at one unit less than what was found. Of portfolios of equal benefit HiGHS names any; the step
 * after it names a cheaper one then, so a point is yielded only once the next has less benefit.
 *
 * Yields { benefit, cost, picks }. Throws where a step cannot be decided in `seconds`.
 */
export async function* costSteps(problem, { from = Infinity, seconds = 600 } = {}) {
  const solver = new HighsSolver(problem);
  try {
    let pending;
    for (let costMost = from; ; costMost = pending.cost - 1) {
      const { verdict, why, ...point } = await solver.ask({ costMost, seconds });
      if (verdict === 'undecided') throw new Error(`Cost up to ${costMost}: ${why}.`);
      if (pending && !(verdict === 'found' && point.benefit === pending.benefit)) yield pending;
      if (verdict === 'infeasible') return;
      pending = { benefit: point.benefit, cost: point.cost, picks: point.picks };
    }
  } finally {
    solver.close();
  }
}
