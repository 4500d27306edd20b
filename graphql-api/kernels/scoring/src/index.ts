export type { Agreement } from './agreement.js';
export { kendallsW, midRanks } from './agreement.js';
export { benefit } from './benefit.js';
export type {
  AssessorBenefit,
  AssessorScore,
  CandidateBenefit,
  CriterionBenefit,
  WeightedCriterion,
} from './candidate-benefit.js';
export { candidateBenefit } from './candidate-benefit.js';
export type { CombinedRating } from './combine-assessors.js';
export { combineAssessors } from './combine-assessors.js';
export { HIGHEST_POINTS, WIDE_SPREAD_POINTS } from './scale.js';
export { ScoringError } from './scoring-error.js';
export { normaliseWeights, rankOrderCentroidWeights } from './weights.js';
