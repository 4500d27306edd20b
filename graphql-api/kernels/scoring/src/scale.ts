import { ScoringError } from './scoring-error.js';

/** Points run from 0 (as if we do not buy) to 100 (the high anchor), in whole steps. */
export const HIGHEST_POINTS = 100;

/** Assessors this far apart on one criterion should speak about it. */
export const WIDE_SPREAD_POINTS = 30;

export function checkPoints(points: number): void {
  if (!Number.isInteger(points) || points < 0 || points > HIGHEST_POINTS) {
    throw new ScoringError(`A score must be a whole number from 0 to ${HIGHEST_POINTS}, got ${points}.`);
  }
}
