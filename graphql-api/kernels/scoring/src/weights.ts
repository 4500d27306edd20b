import { ScoringError } from './scoring-error.js';

/** Raw swing weights (best swing 100, others against it) divided by their sum. */
export function normaliseWeights(rawSwingWeights: readonly number[]): number[] {
  const sum = rawSwingWeights.reduce((total, weight) => total + weight, 0);
  if (rawSwingWeights.some((weight) => !Number.isFinite(weight) || weight < 0) || !(sum > 0)) {
    throw new ScoringError('Weights must be numbers of zero or more, at least one above zero.');
  }
  return rawSwingWeights.map((weight) => weight / sum);
}

/** w_k = (1/n) Σ_{i=k..n} 1/i, most important first: the centre of all weights in that order (Edwards and Barron 1994). */
export function rankOrderCentroidWeights(count: number): number[] {
  if (!Number.isInteger(count) || count < 1) {
    throw new ScoringError(`The number of criteria must be a whole number of at least 1, got ${count}.`);
  }
  const weights: number[] = [];
  let tail = 0;
  for (let rank = count; rank >= 1; rank -= 1) {
    tail += 1 / rank;
    weights.unshift(tail / count);
  }
  return weights;
}
