import type { Model } from '../model/model.js';

/** By what benefit, cost and second cost count when they are added up to one figure; none is negative. */
export interface Weights {
  readonly benefit: number;
  readonly cost: number;
  readonly secondCost: number;
}

/** The second cost of each option, in the model's order. */
export function secondCosts({ problem, optionItem, optionPieces }: Model): Float64Array {
  return Float64Array.from(optionItem, (item, option) =>
    item < 0 ? 0 : (problem.items[item].secondCost ?? 0) * optionPieces[option],
  );
}

/**
 * An even grid on the simplex, corners included: (steps + 1)(steps + 2) / 2 weights. The average option weighs the
 * same in each objective.
 */
export function simplexWeights(model: Model, optionSecondCost: Float64Array, steps: number): Weights[] {
  const unit = {
    benefit: 1 / average(model.optionBenefit),
    cost: 1 / average(model.optionCost),
    secondCost: 1 / average(optionSecondCost),
  };
  const weights: Weights[] = [];
  for (let first = 0; first <= steps; first++) {
    for (let second = 0; first + second <= steps; second++) {
      weights.push({
        benefit: (unit.benefit * first) / steps,
        cost: (unit.cost * second) / steps,
        secondCost: (unit.secondCost * (steps - first - second)) / steps,
      });
    }
  }
  return weights;
}

function average(figures: Float64Array): number {
  return (
    Math.max(
      1,
      figures.reduce((sum, figure) => sum + figure, 0),
    ) / Math.max(1, figures.length)
  );
}
