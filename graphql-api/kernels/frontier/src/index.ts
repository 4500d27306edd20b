export { canonicalText } from './canonical-text.js';
export { explainInfeasible, type WriteFigure } from './explain-infeasible.js';
export {
  describeViolation,
  totalsOf,
  violationsOf,
  type Picks,
  type Totals,
  type Violation,
} from './feasible.js';
export {
  toFrontierDocument,
  type Certificate,
  type FrontierDocument,
  type RunFacts,
} from './frontier-document.js';
export { hypervolume } from './hypervolume.js';
export { kneeOf } from './knee.js';
export { ParetoFront } from './pareto-front.js';
export { parseProblem } from './parse-problem.js';
export { ProblemError } from './problem-error.js';
export { PROBLEM_FORMAT, type Count, type Item, type Limit, type Problem } from './problem.js';
export { Random } from './random.js';
export {
  searchFrontier,
  type FrontierPoint,
  type SearchProgress,
  type SearchResult,
  type SearchSettings,
  type StopSearch,
} from './search.js';
