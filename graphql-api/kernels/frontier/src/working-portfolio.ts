import type { Model } from './model.js';

/**
 * One portfolio that is changed class by class, with benefit, cost and the sum of every row kept up to date. It may
 * break rows while it is being worked on.
 */
export class WorkingPortfolio {
  /** The chosen option of each class. */
  readonly chosen: Int32Array;
  readonly rowSums: Float64Array;
  benefit = 0;
  cost = 0;

  constructor(readonly model: Model) {
    this.chosen = new Int32Array(model.classCount);
    this.rowSums = new Float64Array(model.rows.length);
    this.load(model.optionStart.subarray(0, model.classCount));
  }

  load(chosen: Int32Array): void {
    this.chosen.set(chosen);
    this.rowSums.fill(0);
    this.benefit = 0;
    this.cost = 0;
    for (let k = 0; k < chosen.length; k++) this.add(chosen[k], 1);
  }

  /** Chooses an option for its class, in place of the one chosen before. */
  choose(option: number): void {
    const k = this.model.optionClass[option];
    this.add(this.chosen[k], -1);
    this.chosen[k] = option;
    this.add(option, 1);
  }

  isFeasible(): boolean {
    const { rowMost, ceiling } = this.model;
    if (this.cost > ceiling) return false;
    for (let row = 0; row < rowMost.length; row++) if (this.rowSums[row] > rowMost[row]) return false;
    return true;
  }

  /** Sum of all excesses, each in units of its row's scale; 0 exactly when feasible. */
  excess(): number {
    const { rowMost, rowScale, ceiling } = this.model;
    let total = this.cost > ceiling ? (this.cost - ceiling) / Math.max(1, ceiling) : 0;
    for (let row = 0; row < rowMost.length; row++) {
      const over = this.rowSums[row] - rowMost[row];
      if (over > 0) total += over / rowScale[row];
    }
    return total;
  }

  /** Whether any piece of the item is chosen. */
  takes(item: number): boolean {
    const k = this.model.classOfItem[item];
    return k >= 0 && this.model.optionItem[this.chosen[k]] === item;
  }

  private add(option: number, sign: 1 | -1): void {
    const { optionBenefit, optionCost, termStart, termRow, termValue } = this.model;
    this.benefit += sign * optionBenefit[option];
    this.cost += sign * optionCost[option];
    const end = termStart[option + 1];
    for (let term = termStart[option]; term < end; term++)
      this.rowSums[termRow[term]] += sign * termValue[term];
  }
}

/** The portfolio as the documents write it: pieces by item id, items that are taken only. */
export function picksOf(model: Model, chosen: Int32Array): Record<string, number> {
  const taken: [string, number][] = [];
  for (const option of chosen) {
    const item = model.optionItem[option];
    if (item >= 0) taken.push([model.problem.items[item].id, model.optionPieces[option]]);
  }
  return Object.fromEntries(taken);
}
