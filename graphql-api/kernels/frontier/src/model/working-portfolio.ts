import type { Model } from './model.js';

/**
 * One portfolio that is changed class by class, with benefit, cost and the sum of every row kept up to date. It may
 * break rows while it is being worked on.
 */
export class WorkingPortfolio {
  /** The chosen option of each class. */
  readonly chosen: Int32Array;
  private readonly rowSums: Float64Array;
  benefit = 0;
  cost = 0;
  private brokenRows = 0;
  private rowExcess = 0;

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
    const { rowMost, rowWeight } = this.model;
    const overs = rowMost.map((most) => Math.max(0, -most));
    this.brokenRows = overs.reduce((count, over) => count + (over > 0 ? 1 : 0), 0);
    this.rowExcess = overs.reduce((sum, over, row) => sum + over * rowWeight[row], 0);
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
    return this.brokenRows === 0 && this.cost <= this.model.ceiling;
  }

  /** Sum of all excesses, each by its row's weight, the cost's by the ceiling; 0 exactly when feasible. */
  excess(): number {
    const { ceiling } = this.model;
    const costExcess = this.cost > ceiling ? (this.cost - ceiling) / Math.max(1, ceiling) : 0;
    return costExcess + (this.brokenRows === 0 ? 0 : this.rowExcess);
  }

  /** Whether any piece of the item is chosen. */
  takes(item: number): boolean {
    const k = this.model.classOfItem[item];
    return k >= 0 && this.model.optionItem[this.chosen[k]] === item;
  }

  private add(option: number, sign: 1 | -1): void {
    const { optionBenefit, optionCost, termStart, termRow, termValue, rowMost, rowWeight } = this.model;
    this.benefit += sign * optionBenefit[option];
    this.cost += sign * optionCost[option];
    const end = termStart[option + 1];
    for (let term = termStart[option]; term < end; term++) {
      const row = termRow[term];
      const before = this.rowSums[row] - rowMost[row];
      const after = before + sign * termValue[term];
      this.rowSums[row] += sign * termValue[term];
      if (before <= 0 && after <= 0) continue;
      this.rowExcess += (Math.max(0, after) - Math.max(0, before)) * rowWeight[row];
      this.brokenRows += (after > 0 ? 1 : 0) - (before > 0 ? 1 : 0);
    }
  }
}

/** The portfolio as the documents write it: pieces by item id, items that are taken only. */
export function picksOf(model: Model, chosen: Int32Array): Record<string, number> {
  // without a prototype any id is a key like another, and filling it with many keys is ten times faster
  const picks = Object.create(null) as Record<string, number>;
  for (const option of chosen) {
    const item = model.optionItem[option];
    if (item >= 0) picks[model.problem.items[item].id] = model.optionPieces[option];
  }
  return picks;
}
