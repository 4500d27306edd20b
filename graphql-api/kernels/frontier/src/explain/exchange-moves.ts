import type { Links } from '../model/links.js';
import type { WorkingPortfolio } from '../model/working-portfolio.js';

/** Options that are chosen together, and what that does to benefit and cost. */
export interface ExchangeMove {
  readonly options: readonly number[];
  readonly benefitChange: number;
  readonly costChange: number;
}

/** Every change of one class of the portfolio as it stands, alone and, where links ask for more, completed. */
export function exchangeMoves(portfolio: WorkingPortfolio, links: Links): ExchangeMove[] {
  const { optionClass } = portfolio.model;
  const moves: ExchangeMove[] = [];
  for (let option = 0; option < optionClass.length; option++) {
    if (portfolio.chosen[optionClass[option]] === option) continue;
    for (const options of waysToChoose(portfolio, links, option)) moves.push(moveOf(portfolio, options));
  }
  return moves;
}

/** The option alone; and with what its links ask for, in each way there is. */
export function waysToChoose(portfolio: WorkingPortfolio, links: Links, option: number): number[][] {
  const ways = [[option]];
  if (!links.asksForMore(portfolio, option)) return ways;
  for (let variant = 0; variant < links.variants(option); variant++) {
    const size = links.packageOf(portfolio, option, variant);
    if (size > 0) ways.push([...links.together.subarray(0, size)]);
  }
  return ways;
}

function moveOf({ model, chosen }: WorkingPortfolio, options: readonly number[]): ExchangeMove {
  let [benefitChange, costChange] = [0, 0];
  for (const option of options) {
    const before = chosen[model.optionClass[option]];
    benefitChange += model.optionBenefit[option] - model.optionBenefit[before];
    costChange += model.optionCost[option] - model.optionCost[before];
  }
  return { options, benefitChange, costChange };
}
