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
export {
  parseFrontier,
  type ClaimedCertificate,
  type ClaimedFrontier,
  type ClaimedPoint,
} from './result/parse-frontier.js';
export { verifyFrontier, type Finding } from './result/verify-frontier.js';
export { hypervolume } from './archive/hypervolume.js';
export { kneeOf } from './archive/knee.js';
export { ParetoFront } from './archive/pareto-front.js';
export { parseProblem } from './problem/parse-problem.js';
export { ProblemError } from './problem/problem-error.js';
export {
  hasSecondCost,
  PROBLEM_FORMAT,
  type Count,
  type Item,
  type Limit,
  type Problem,
} from './problem/problem.js';
export { Random } from './local-search/random.js';
export type { FrontierSearch } from './frontier-search.js';
export type { ProofTask, ProofTaskResult } from './proof/proof-task.js';
export { workTask } from './proof/work-task.js';
export {
  beginSearch,
  modelOf,
  searchFrontier,
  type FrontierPoint,
  type ProvenSoFar,
  type SearchProgress,
  type SearchResult,
  type SearchSettings,
  type StopSearch,
} from './search.js';
export {
  searchThreeObjectives,
  type ThreeObjectivesPoint,
  type ThreeObjectivesResult,
} from './three-objectives/search-three-objectives.js';
export { surfaceCertificate, type SurfaceCertificate } from './three-objectives/surface-certificate.js';
export { dominatedVolume, type SurfacePoint } from './three-objectives/dominated-volume.js';
export { marginalUtilities, marginalUtilityKnee } from './archive/marginal-utility-knee.js';
export { cheapestExchange, type Exchange } from './explain/cheapest-exchange.js';
export { coreIndex, type CoreIndex, type CostWindow, type Share } from './explain/core-index.js';
export { describeCollision } from './explain/describe-collision.js';
export { describeEntry, describeLoss } from './explain/describe-entry.js';
export { describeLeftOut } from './explain/describe-left-out.js';
export { describeReduction } from './explain/describe-reduction.js';
export { benefitToComeIn, priceToComeIn, type EntryThreshold } from './explain/entry-threshold.js';
export { loosen, type Loosening } from './explain/loosening.js';
export { lossWithout, type LossWithout } from './explain/loss-without.js';
export {
  robustnessOf,
  type Robustness,
  type ScenarioRegret,
  type SolvedScenario,
} from './explain/robustness.js';
export type { Rule } from './explain/rules.js';
export { costScenarios, withBenefits, withCosts, type Scenario } from './explain/scenarios.js';
export { smallestCollisions, type Collision, type CollisionSettings } from './explain/smallest-collisions.js';
export type { Point, Solve, Solved } from './explain/solve.js';
export { solveBySearch } from './explain/solve-by-search.js';
export { whyLeftOut, type LeftOut, type Obstacle } from './explain/why-left-out.js';
export { reduceProblem, type Reduced } from './reduction/reduce-problem.js';
export type { Reduction } from './reduction/reduction.js';
export { alternativesAt, type Alternatives, type AlternativesSettings } from './proof/alternatives.js';
