import type { Links } from '../model/links.js';
import type { WorkingPortfolio } from '../model/working-portfolio.js';

/**
 * Every single change of one portfolio with what it does to benefit and cost, laid out for the scan of combinations.
 * A change is an option put in place of the chosen one; where links are concerned it stands here twice: alone, as
 * part of a combination, and completed to a package.
 */
export class MoveList {
  count = 0;
  benefitChange = new Float64Array(FIRST_CAPACITY);
  costChange = new Float64Array(FIRST_CAPACITY);

  /** The options of move m are those from optionStart[m] up to optionStart[m + 1]. */
  private optionStart = new Int32Array(FIRST_CAPACITY + 1);
  private options = new Int32Array(FIRST_CAPACITY);

  private readonly chosenAtRefresh: Int32Array;

  constructor(
    private readonly portfolio: WorkingPortfolio,
    private readonly links: Links,
  ) {
    this.chosenAtRefresh = new Int32Array(portfolio.chosen.length);
  }

  /** Lists the changes of the portfolio as it stands now. */
  refresh(): void {
    const { portfolio, links } = this;
    const { classCount, optionStart } = portfolio.model;
    this.count = 0;
    this.chosenAtRefresh.set(portfolio.chosen);
    for (let k = 0; k < classCount; k++) {
      const chosen = portfolio.chosen[k];
      for (let option = optionStart[k]; option < optionStart[k + 1]; option++) {
        if (option === chosen) continue;
        this.start();
        this.include(option);
        this.count++;
        if (links.asksForMore(portfolio, option)) this.listPackages(option);
      }
    }
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

  private listPackages(option: number): void {
    const variants = this.links.variants(option);
    for (let variant = 0; variant < variants; variant++) {
      const size = this.links.packageOf(this.portfolio, option, variant);
      if (size === 0) continue;
      this.start();
      for (let at = 0; at < size; at++) this.include(this.links.together[at]);
      this.count++;
    }
  }

  private start(): void {
    if (this.count + 1 >= this.benefitChange.length) this.grow();
    this.benefitChange[this.count] = 0;
    this.costChange[this.count] = 0;
    this.optionStart[this.count + 1] = this.optionStart[this.count];
  }

  private include(option: number): void {
    const { model, chosen } = this.portfolio;
    const before = chosen[model.optionClass[option]];
    const move = this.count;
    this.benefitChange[move] += model.optionBenefit[option] - model.optionBenefit[before];
    this.costChange[move] += model.optionCost[option] - model.optionCost[before];
    if (this.optionStart[move + 1] === this.options.length) this.options = doubled(this.options);
    this.options[this.optionStart[move + 1]++] = option;
  }

  private grow(): void {
    this.benefitChange = doubled(this.benefitChange);
    this.costChange = doubled(this.costChange);
    this.optionStart = doubled(this.optionStart);
  }
}

const FIRST_CAPACITY = 256;

function doubled<T extends Float64Array | Int32Array>(array: T): T {
  const Kind = array.constructor as new (length: number) => T;
  const larger = new Kind(2 * array.length);
  larger.set(array);
  return larger;
}
