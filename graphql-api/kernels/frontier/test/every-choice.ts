import type { Model } from '../src/model/model.js';
import type { FoundPortfolio } from '../src/proof/proof-task.js';

/** Every portfolio of a model that keeps its rows and its ceiling, each combination of options tried. For small models. */
export function everyChoice(model: Model): FoundPortfolio[] {
  const { classCount, optionStart, optionBenefit, optionCost, rows } = model;
  const { rowMost, termStart, termRow, termValue, ceiling } = model;
  const chosen = new Int32Array(classCount);
  const activity = rows.map(() => 0);
  const found: FoundPortfolio[] = [];
  const count = (option: number, times: 1 | -1): void => {
    for (let term = termStart[option]; term < termStart[option + 1]; term++) {
      activity[termRow[term]] += times * termValue[term];
    }
  };
  const tryFrom = (k: number, cost: number, benefit: number): void => {
    if (cost > ceiling) return;
    if (k === classCount) {
      if (activity.every((sum, row) => sum <= rowMost[row])) {
        found.push({ cost, benefit, chosen: chosen.slice() });
      }
      return;
    }
    for (let option = optionStart[k]; option < optionStart[k + 1]; option++) {
      chosen[k] = option;
      count(option, 1);
      tryFrom(k + 1, cost + optionCost[option], benefit + optionBenefit[option]);
      count(option, -1);
    }
  };
  tryFrom(0, 0, 0);
  return found;
}

/** The most that a portfolio of a model could cost. */
export function mostCost({ classCount, optionStart, optionCost, ceiling }: Model): number {
  let sum = 0;
  for (let k = 0; k < classCount; k++) {
    sum += Math.max(...optionCost.subarray(optionStart[k], optionStart[k + 1]));
  }
  return Math.min(sum, ceiling);
}

/** The points that nothing beats, in order of cost. */
export function frontOf(portfolios: readonly FoundPortfolio[]): [cost: number, benefit: number][] {
  const front: [number, number][] = [];
  const sorted = [...portfolios].sort((one, other) => one.cost - other.cost || other.benefit - one.benefit);
  for (const { cost, benefit } of sorted) {
    if (benefit > (front.at(-1)?.[1] ?? -1)) front.push([cost, benefit]);
  }
  return front;
}
