import { checkPoints, WIDE_SPREAD_POINTS } from './scale.js';
import { ScoringError } from './scoring-error.js';

export interface CombinedRating {
  /** Null when nobody gave a score. */
  readonly mean: number | null;
  readonly sum: number;
  readonly counted: number;
  readonly missing: number;
  readonly lowest: number | null;
  readonly highest: number | null;
  readonly spread: number;
  /** The assessors are 30 points or more apart. */
  readonly wide: boolean;
}

/** Combines what several assessors gave on one criterion. A null is left out of the mean and counted as missing. */
export function combineAssessors(ratings: readonly (number | null)[], rule: 'mean'): CombinedRating {
  if (rule !== 'mean')
    throw new ScoringError(`Ratings can only be combined by their mean, got ${String(rule)}.`);
  const given = ratings.filter((rating) => rating !== null);
  given.forEach(checkPoints);
  const sum = given.reduce((total, points) => total + points, 0);
  const [lowest, highest] = given.length ? [Math.min(...given), Math.max(...given)] : [null, null];
  const spread = (highest ?? 0) - (lowest ?? 0);
  return {
    mean: given.length ? sum / given.length : null,
    sum,
    counted: given.length,
    missing: ratings.length - given.length,
    lowest,
    highest,
    spread,
    wide: spread >= WIDE_SPREAD_POINTS,
  };
}
