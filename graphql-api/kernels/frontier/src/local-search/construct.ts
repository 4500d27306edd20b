import type { Model } from '../model/model.js';
import type { WorkingPortfolio } from '../model/working-portfolio.js';

/** What a greedy start weighs: benefit against a price for cost, and limits at a share of that price. */
export interface StartWeights {
  readonly price: number;
  readonly limitShare: number;
}

/**
 * Weights for the starts: prices from where nearly everything is worth its cost to where nothing is, in even ratios,
 * each without and with the limits in view.
 */
export function startWeights(model: Model, priceCount: number): StartWeights[] {
  const { benefit, cost } = averageOption(model);
  const middle = benefit / Math.max(1, cost);
  const weights: StartWeights[] = [];
  for (let step = 0; step < priceCount; step++) {
    const price = middle * Math.exp(-4 + (7 * step) / (priceCount - 1));
    for (const limitShare of [0, 0.3, 1]) weights.push({ price, limitShare });
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
function limitPrices(model: Model, { price, limitShare }: StartWeights): Float64Array {
  const budget =
    model.ceiling < Infinity ? model.ceiling : model.optionCost.reduce((sum, cost) => sum + cost, 0);
  return Float64Array.from(model.rows, ({ kind }, row) =>
    kind === 'limit most' ? limitShare * price * budget * model.rowWeight[row] : 0,
  );
}

function averageOption({ optionBenefit, optionCost }: Model): { benefit: number; cost: number } {
  const count = Math.max(1, optionBenefit.length);
  const sum = (figures: Float64Array): number => figures.reduce((total, figure) => total + figure, 0);
  return { benefit: sum(optionBenefit) / count, cost: sum(optionCost) / count };
}
