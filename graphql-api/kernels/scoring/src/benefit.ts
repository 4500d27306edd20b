import { ScoringError } from './scoring-error.js';

/** Additive value Σ w·v (Goodwin and Wright ch. 3); with weights that sum to 1 it lies on the scale of the values. */
export function benefit(weights: readonly number[], values: readonly number[]): number {
  if (weights.length !== values.length) {
    throw new ScoringError(
      `There are ${weights.length} weights for ${values.length} values; expected one each.`,
    );
  }
  return weights.reduce((total, weight, i) => total + weight * values[i], 0);
}
