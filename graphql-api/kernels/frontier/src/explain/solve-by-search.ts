import { searchFrontier, type SearchProgress, type SearchSettings } from '../search.js';
import type { Solve } from './solve.js';

/**
 * The frontier search as the explanations ask for it, each time run to its end or until `goesOn` says no: there a host
 * counts its seconds. Explanations ask small questions, so that a small budget answers most of them.
 */
export function solveBySearch(
  settings: SearchSettings = SMALL_BUDGET,
  goesOn: (progress: SearchProgress) => boolean = () => true,
): Solve {
  return (problem) => {
    const search = searchFrontier(problem, { lookedAtSample: 0, ...settings });
    let step = search.next();
    while (!step.done) step = search.next({ stop: !goesOn(step.value) });
    return step.value;
  };
}

/** Seconds at most, even where the proof does not come to an end. */
const SMALL_BUDGET: SearchSettings = { evaluations: 50_000, effort: 10_000_000 };
