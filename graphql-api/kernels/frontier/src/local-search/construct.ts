import type { Model } from '../model/model.js';
import type { WorkingPortfolio } from '../model/working-portfolio.js';

/** What a greedy start weighs: benefit against a price for cost, and limits at a share of that price. */
export interface StartWeights {
  readonly price: number;
  readonly limitShare: number;
}

/**
 * Weights for the starts: prices from where nearly everything is worth its cost to where nothing is, in even ratios,
 * each with the limits in view a little, not at all, and fully. Coarse first: each price lies midway between earlier
 * ones, so that few starts already spread over the front.
 */
export function startWeights(model: Model): StartWeights[] {
  const { benefit, cost } = averageOption(model);
  const middle = benefit / Math.max(1, cost);
  const weights: StartWeights[] = [];
  for (const limitShare of [0.3, 0, 1]) {
    for (let start = 0; start < PRICES; start++) {
      const price = middle * Math.exp(-4 + (7 * bitsReversed(start)) / PRICES);
      weights.push({ price, limitShare });
    }
  }
  return weights;
}

/** Chooses in each class what is best by the weights alone; it may break links and limits. */
export function chooseGreedily(portfolio: WorkingPortfolio, weights: StartWeights): void {
  const { model } = portfolio;
  const limitPrice = limitPrices(model, weights);
  for (let k = 0; k < model.classCount; k++) {
    let best = model.optionStart[k];
    let bestWorth = -Infinity;
    for (let option = best; option < model.optionStart[k + 1]; option++) {
      const worth = worthOf(model, option, weights.price, limitPrice);
      if (worth <= bestWorth) continue;
      bestWorth = worth;
      best = option;
    }
    portfolio.choose(best);
  }
}

function worthOf(model: Model, option: number, price: number, limitPrice: Float64Array): number {
  let worth = model.optionBenefit[option] - price * model.optionCost[option];
  for (let term = model.termStart[option]; term < model.termStart[option + 1]; term++) {
    worth -= limitPrice[model.termRow[term]] * model.termValue[term];
  }
  return worth;
}

/** A whole limit is held worth as much as the whole ceiling, times the share. */
export function limitPrices(model: Model, { price, limitShare }: StartWeights): Float64Array {
  const budget = budgetOf(model);
  return Float64Array.from(model.rows, ({ kind }, row) =>
    kind === 'limit most' ? limitShare * price * budget * model.rowWeight[row] : 0,
  );
}

/** The ceiling, or without one the cost of all options together. */
export function budgetOf({ ceiling, optionCost }: Model): number {
  return ceiling < Infinity ? ceiling : optionCost.reduce((sum, cost) => sum + cost, 0);
}

function averageOption({ optionBenefit, optionCost }: Model): { benefit: number; cost: number } {
  const count = Math.max(1, optionBenefit.length);
  const sum = (figures: Float64Array): number => figures.reduce((total, figure) => total + figure, 0);
  return { benefit: sum(optionBenefit) / count, cost: sum(optionCost) / count };
}

const PRICE_BITS = 5;
const PRICES = 1 << PRICE_BITS;

function bitsReversed(number: number): number {
  let reversed = 0;
  for (let bit = 0; bit < PRICE_BITS; bit++) reversed = (reversed << 1) | ((number >> bit) & 1);
  return reversed;
}
