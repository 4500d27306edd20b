import type { Links } from '../model/links.js';
import type { WorkingPortfolio } from '../model/working-portfolio.js';

/**
 * Every single change of one portfolio with what it does to benefit and cost, laid out for the scan of combinations.
 * A change is an option put in place of the chosen one; where links are concerned it stands here twice: alone, as
 * part of a combination, and further back completed to a package.
 */
export class MoveList {
  count = 0;
  benefitChange: Float64Array;
  costChange: Float64Array;

  /** The moves before this one change one option each; the packages follow. */
  private readonly singles: number;
  /** The options of move m are those from optionStart[m] up to optionStart[m + 1]. */
  private optionStart: Int32Array;
  private options: Int32Array;

  private readonly chosenAtRefresh: Int32Array;
  private readonly undo: number[] = [];

  constructor(
    private readonly portfolio: WorkingPortfolio,
    private readonly links: Links,
  ) {
    const { classCount, optionClass } = portfolio.model;
    this.chosenAtRefresh = new Int32Array(classCount).fill(-1);
    this.singles = optionClass.length - classCount;
    const capacity = 2 * this.singles + SPARE;
    this.benefitChange = new Float64Array(capacity);
    this.costChange = new Float64Array(capacity);
    this.optionStart = Int32Array.from({ length: capacity + 1 }, (_, move) => move);
    this.options = new Int32Array(capacity);
  }

  /** Lists the changes of the portfolio as it stands now. What has not changed since the last time stays listed. */
  refresh(): void {
    const { classCount } = this.portfolio.model;
    const { chosen } = this.portfolio;
    const before = this.chosenAtRefresh;
    let isLinkedChanged = this.count === 0;
    for (let k = 0; k < classCount; k++) {
      if (chosen[k] === before[k]) continue;
      before[k] = chosen[k];
      this.listSingles(k);
      isLinkedChanged ||= this.links.concern(k);
    }
    if (isLinkedChanged) this.listPackages();
  }

  /** Makes the move on the portfolio and adds to `undo` how to take it back. */
  make(move: number, undo: number[]): void {
    const { portfolio } = this;
    for (let at = this.optionStart[move]; at < this.optionStart[move + 1]; at++) {
      undo.push(portfolio.chosen[portfolio.model.optionClass[this.options[at]]]);
      portfolio.choose(this.options[at]);
    }
  }

  takeBack(undo: number[]): void {
    for (let option = undo.pop(); option !== undefined; option = undo.pop()) this.portfolio.choose(option);
  }

  /** Whether the portfolio would keep every row with the move made; the ceiling is not looked at. */
  keepsRows(move: number): boolean {
    if (move < this.singles) return this.portfolio.keepsRowsWith(this.options[move]);
    this.make(move, this.undo);
    const keeps = this.portfolio.keepsRows();
    this.takeBack(this.undo);
    return keeps;
  }

  /** What the excess of the portfolio would be with the move made. */
  excessWith(move: number): number {
    if (move < this.singles) return this.portfolio.excessWith(this.options[move]);
    this.make(move, this.undo);
    const excess = this.portfolio.excess();
    this.takeBack(this.undo);
    return excess;
  }

  /** Whether a class the move changes has been changed since the list was made, so that its figures no longer hold. */
  isOutOfDate(move: number): boolean {
    const { chosen, model } = this.portfolio;
    for (let at = this.optionStart[move]; at < this.optionStart[move + 1]; at++) {
      const k = model.optionClass[this.options[at]];
      if (chosen[k] !== this.chosenAtRefresh[k]) return true;
    }
    return false;
  }

  /** Whether two moves change a class in common, so that they cannot be made together. */
  overlap(one: number, other: number): boolean {
    const { optionClass } = this.portfolio.model;
    for (let a = this.optionStart[one]; a < this.optionStart[one + 1]; a++) {
      const k = optionClass[this.options[a]];
      for (let b = this.optionStart[other]; b < this.optionStart[other + 1]; b++) {
        if (optionClass[this.options[b]] === k) return true;
      }
    }
    return false;
  }

  /** Each class has one option chosen and one move for each of the others, so its moves always have the same places. */
  private listSingles(k: number): void {
    const { optionStart, optionBenefit, optionCost } = this.portfolio.model;
    const before = this.portfolio.chosen[k];
    let move = optionStart[k] - k;
    for (let option = optionStart[k]; option < optionStart[k + 1]; option++) {
      if (option === before) continue;
      this.options[move] = option;
      this.benefitChange[move] = optionBenefit[option] - optionBenefit[before];
      this.costChange[move] = optionCost[option] - optionCost[before];
      move++;
    }
  }

  private listPackages(): void {
    const { portfolio, links } = this;
    this.count = this.singles;
    for (const option of links.linkedOptions) {
      if (!links.asksForMore(portfolio, option)) continue;
      const variants = links.variants(option);
      for (let variant = 0; variant < variants; variant++) {
        const size = links.packageOf(portfolio, option, variant);
        if (size > 0) this.add(size);
      }
    }
  }

  /** Adds the package that the links have put together. */
  private add(size: number): void {
    const { model, chosen } = this.portfolio;
    if (this.count + 1 >= this.benefitChange.length) this.grow();
    const move = this.count++;
    const from = this.optionStart[move];
    while (from + size > this.options.length) this.options = doubled(this.options);
    let benefit = 0;
    let cost = 0;
    for (let at = 0; at < size; at++) {
      const option = this.links.together[at];
      const before = chosen[model.optionClass[option]];
      benefit += model.optionBenefit[option] - model.optionBenefit[before];
      cost += model.optionCost[option] - model.optionCost[before];
      this.options[from + at] = option;
    }
    this.benefitChange[move] = benefit;
    this.costChange[move] = cost;
    this.optionStart[move + 1] = from + size;
  }

  private grow(): void {
    this.benefitChange = doubled(this.benefitChange);
    this.costChange = doubled(this.costChange);
    this.optionStart = doubled(this.optionStart);
  }
}

/** Room for packages beyond that for as many as there are options. */
const SPARE = 64;

function doubled<T extends Float64Array | Int32Array>(array: T): T {
  const Kind = array.constructor as new (length: number) => T;
  const larger = new Kind(2 * array.length);
  larger.set(array);
  return larger;
}
