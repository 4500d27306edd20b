import type { Model } from './model.js';

/**
 * One portfolio that is changed class by class, with benefit, cost and the slack of every row kept up to date. It may
 * break rows while it is being worked on.
 */
export class WorkingPortfolio {
  /** The chosen option of each class. */
  readonly chosen: Int32Array;
  benefit = 0;
  cost = 0;
  /** By row, what may still be added; negative where it is broken. */
  private readonly slack: Float64Array;
  private brokenRows = 0;
  private rowExcess = 0;

  constructor(readonly model: Model) {
    this.chosen = new Int32Array(model.classCount);
    this.slack = new Float64Array(model.rows.length);
    this.load(model.optionStart.subarray(0, model.classCount));
  }

  load(chosen: Int32Array): void {
    const { model, slack } = this;
    const { optionBenefit, optionCost, termStart, termRow, termValue } = model;
    this.chosen.set(chosen);
    slack.set(model.rowMost);
    this.benefit = 0;
    this.cost = 0;
    for (const option of chosen) {
      this.benefit += optionBenefit[option];
      this.cost += optionCost[option];
      for (let term = termStart[option]; term < termStart[option + 1]; term++)
        slack[termRow[term]] -= termValue[term];
    }
    this.addUpExcess();
  }

  /** Chooses an option for its class, in place of the one chosen before. */
  choose(option: number): void {
    const { optionClass, optionBenefit, optionCost } = this.model;
    const k = optionClass[option];
    const before = this.chosen[k];
    this.chosen[k] = option;
    this.benefit += optionBenefit[option] - optionBenefit[before];
    this.cost += optionCost[option] - optionCost[before];
    this.addTerms(before, -1);
    this.addTerms(option, 1);
  }

  isFeasible(): boolean {
    return this.brokenRows === 0 && this.cost <= this.model.ceiling;
  }

  /** Whether it keeps every row; the ceiling is not looked at. */
  keepsRows(): boolean {
    return this.brokenRows === 0;
  }

  /**
   * Whether every row would be kept with the option chosen in its class; the ceiling is not looked at. Changes
   * nothing, which makes it several times faster than choosing, asking and choosing back.
   */
  keepsRowsWith(option: number): boolean {
    const { optionClass, termStart, termRow, termValue } = this.model;
    const before = this.chosen[optionClass[option]];
    const endGone = termStart[before + 1];
    const endCome = termStart[option + 1];
    let gone = termStart[before];
    let come = termStart[option];
    let mended = 0;
    // the terms of an option are in order of row, so both are walked through together
    while (gone < endGone || come < endCome) {
      const rowGone = gone < endGone ? termRow[gone] : NO_ROW;
      const rowCome = come < endCome ? termRow[come] : NO_ROW;
      const row = rowGone < rowCome ? rowGone : rowCome;
      let after = this.slack[row];
      if (after < 0) mended++;
      if (rowGone === row) after += termValue[gone++];
      if (rowCome === row) after -= termValue[come++];
      if (after < 0) return false;
    }
    return mended === this.brokenRows;
  }

  /** Sum of all excesses, each by its row's weight, the cost's by the ceiling; 0 exactly when feasible. */
  excess(): number {
    return this.costExcess(this.cost) + (this.brokenRows === 0 ? 0 : this.rowExcess);
  }

  /** What the excess would be with the option chosen in its class. */
  excessWith(option: number): number {
    const { optionClass, optionCost, rowWeight, termStart, termRow, termValue } = this.model;
    const before = this.chosen[optionClass[option]];
    const endGone = termStart[before + 1];
    const endCome = termStart[option + 1];
    let gone = termStart[before];
    let come = termStart[option];
    let excess = this.rowExcess;
    while (gone < endGone || come < endCome) {
      const rowGone = gone < endGone ? termRow[gone] : NO_ROW;
      const rowCome = come < endCome ? termRow[come] : NO_ROW;
      const row = rowGone < rowCome ? rowGone : rowCome;
      const slack = this.slack[row];
      let after = slack;
      if (rowGone === row) after += termValue[gone++];
      if (rowCome === row) after -= termValue[come++];
      if (slack < 0 || after < 0) excess += (Math.min(0, slack) - Math.min(0, after)) * rowWeight[row];
    }
    return excess + this.costExcess(this.cost + optionCost[option] - optionCost[before]);
  }

  /** Whether any piece of the item is chosen. */
  takes(item: number): boolean {
    const k = this.model.classOfItem[item];
    return k >= 0 && this.model.optionItem[this.chosen[k]] === item;
  }

  private addTerms(option: number, sign: 1 | -1): void {
    const { termStart, termRow, termValue, rowWeight } = this.model;
    const { slack } = this;
    const end = termStart[option + 1];
    for (let term = termStart[option]; term < end; term++) {
      const row = termRow[term];
      const before = slack[row];
      const after = before - sign * termValue[term];
      slack[row] = after;
      if (before >= 0 && after >= 0) continue;
      this.rowExcess += (Math.min(0, before) - Math.min(0, after)) * rowWeight[row];
      this.brokenRows += (after < 0 ? 1 : 0) - (before < 0 ? 1 : 0);
    }
  }

  private addUpExcess(): void {
    const { rowWeight } = this.model;
    this.brokenRows = 0;
    this.rowExcess = 0;
    for (let row = 0; row < this.slack.length; row++) {
      if (this.slack[row] >= 0) continue;
      this.brokenRows++;
      this.rowExcess -= this.slack[row] * rowWeight[row];
    }
  }

  private costExcess(cost: number): number {
    const { ceiling } = this.model;
    return cost > ceiling ? (cost - ceiling) / Math.max(1, ceiling) : 0;
  }
}

const NO_ROW = 0x7fff_ffff;

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
