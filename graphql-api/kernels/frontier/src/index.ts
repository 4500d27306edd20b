export { canonicalText } from './problem/canonical-text.js';
export { explainInfeasible } from './explain/explain-infeasible.js';
export type { WriteFigure } from './explain/write-figure.js';
export {
  describeViolation,
  totalsOf,
  violationsOf,
  type Picks,
  type Totals,
  type Violation,
} from './problem/feasible.js';
export {
  toFrontierDocument,
  type Certificate,
  type FrontierDocument,
  type RunFacts,
} from './result/frontier-document.js';
export { hypervolume } from './archive/hypervolume.js';
export { kneeOf } from './archive/knee.js';
export { ParetoFront } from './archive/pareto-front.js';
export { parseProblem } from './problem/parse-problem.js';
export { ProblemError } from './problem/problem-error.js';
export { PROBLEM_FORMAT, type Count, type Item, type Limit, type Problem } from './problem/problem.js';
export { Random } from './local-search/random.js';
export {
  searchFrontier,
  type FrontierPoint,
  type SearchProgress,
  type SearchResult,
  type SearchSettings,
  type StopSearch,
} from './search.js';
