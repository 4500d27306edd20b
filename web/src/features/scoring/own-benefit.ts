import type { OwnScores } from './use-own-scores';
import type { SheetCriterion } from './sheet-parts';

/**
 * Weighted additive value of the viewer's own scores, 0–100; undefined until each criterion is scored or named as one
 * that cannot be judged. Criteria that cannot be judged are left out and the weights of the others made whole again.
 */
export function ownBenefit(
  scores: OwnScores,
  candidateId: string,
  criteria: readonly SheetCriterion[],
): number | undefined {
  let weights = 0;
  let sum = 0;
  for (const { id, weight } of criteria) {
    const score = scores.at(candidateId, id);
    if (!score) return undefined;
    if (score.points === null) continue;
    weights += Number(weight);
    sum += Number(weight) * score.points;
  }
  return weights > 0 ? sum / weights : undefined;
}
