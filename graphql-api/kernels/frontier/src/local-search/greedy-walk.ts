import { limitPrices } from './construct.js';
import type { SearchArchive } from '../archive/search-archive.js';
import type { Links } from '../model/links.js';
import type { WorkingPortfolio } from '../model/working-portfolio.js';

/**
 * Walks up from a feasible portfolio, class by class to options of more benefit, the most benefit per weighted cost
 * first; what would break a rule is passed over. All that is met on the way is offered, so that one walk of hardly
 * more steps than there are options gives a rough front over all costs. The order is that of the greedy method for
 * knapsacks with classes (Sinha and Zoltners 1979; from memory): only options on a class's upper hull are gone to.
 *
 * @param limitShare what a whole limit is held worth, measured by the whole ceiling
 */
export function walkUp(
  portfolio: WorkingPortfolio,
  links: Links,
  archive: SearchArchive,
  limitShare: number,
): void {
  const { model } = portfolio;
  const { ways, slopes } = upwardSteps(portfolio, limitPrices(model, { price: 1, limitShare }));
  const order = Array.from(ways.keys()).sort((one, other) => slopes[other] - slopes[one] || one - other);
  for (const place of order) {
    const option = ways[place];
    const before = portfolio.chosen[model.optionClass[option]];
    if (model.optionBenefit[before] >= model.optionBenefit[option]) continue;
    archive.evaluations++;
    if (!goTo(option, portfolio, links, archive.mostCost)) continue;
    if (!archive.isBeaten(portfolio.benefit, portfolio.cost)) archive.offer(portfolio);
  }
}

/** Chooses the option, with what it needs, if that keeps every rule. */
function goTo(option: number, portfolio: WorkingPortfolio, links: Links, mostCost: number): boolean {
  const { model, chosen } = portfolio;
  if (!links.asksForMore(portfolio, option)) {
    const change = model.optionCost[option] - model.optionCost[chosen[model.optionClass[option]]];
    if (portfolio.cost + change > mostCost || !portfolio.keepsRowsWith(option)) return false;
    portfolio.choose(option);
    return true;
  }
  const together = links.together.slice(0, links.packageOf(portfolio, option, 0));
  const replaced = together.map((one) => chosen[model.optionClass[one]]);
  for (const one of together) portfolio.choose(one);
  if (together.length > 0 && portfolio.isFeasible()) return true;
  for (const one of replaced) portfolio.choose(one);
  return false;
}

/** Of every class the options on the upper hull from the chosen one on, with the benefit per weight on the way there. */
function upwardSteps(
  portfolio: WorkingPortfolio,
  limitPrice: Float64Array,
): { ways: number[]; slopes: number[] } {
  const { model, chosen } = portfolio;
  const { classCount, optionStart, optionBenefit } = model;
  const weight = weightsOf(portfolio, limitPrice);
  const ways: number[] = [];
  const slopes: number[] = [];
  for (let k = 0; k < classCount; k++) {
    let at = chosen[k];
    for (;;) {
      let next = -1;
      let steepest = 0;
      for (let option = optionStart[k]; option < optionStart[k + 1]; option++) {
        const gain = optionBenefit[option] - optionBenefit[at];
        if (gain <= 0) continue;
        const slope = gain / Math.max(LEAST_WEIGHT, weight[option] - weight[at]);
        if (slope <= steepest) continue;
        steepest = slope;
        next = option;
      }
      if (next < 0) break;
      ways.push(next);
      slopes.push(steepest);
      at = next;
    }
  }
  return { ways, slopes };
}

function weightsOf({ model }: WorkingPortfolio, limitPrice: Float64Array): Float64Array {
  return model.optionCost.map((cost, option) => {
    let weight = cost;
    for (let term = model.termStart[option]; term < model.termStart[option + 1]; term++)
      weight += limitPrice[model.termRow[term]] * model.termValue[term];
    return weight;
  });
}

/** What costs nothing is gone to first. */
const LEAST_WEIGHT = 1e-9;
