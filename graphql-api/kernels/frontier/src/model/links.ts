import type { Model } from './model.js';
import type { WorkingPortfolio } from './working-portfolio.js';

/**
 * Completes a change with what the links ask for: taking an item brings a partner it needs and drops what excludes
 * it; dropping an item drops what needed it. So candidates that only make sense together move together.
 */
export class Links {
  private readonly needs: readonly (readonly number[])[][];
  private readonly variantsOfItem: readonly number[];
  private readonly neededBy: readonly { item: number; anyOf: readonly number[] }[][];
  private readonly excludes: readonly number[][];
  private readonly linkedClass: Uint8Array;
  /** The options of all classes that a link concerns. */
  readonly linkedOptions: Int32Array;
  private readonly changedIn: Int32Array;
  private round = 0;
  /** The options of the last package, as many as packageOf answered. */
  readonly together: Int32Array;
  private readonly replaced: Int32Array;
  private size = 0;

  constructor(private readonly model: Model) {
    const { items, eitherOr = [] } = model.problem;
    const indexOf = new Map(items.map((item, index) => [item.id, index]));
    const canBeTaken = (item: number): boolean => model.classOfItem[item] >= 0;
    const indices = (ids: readonly string[]): number[] =>
      ids.map((id) => indexOf.get(id)!).filter(canBeTaken);

    this.needs = items.map(({ needs = [] }) => needs.map(indices));
    this.variantsOfItem = this.needs.map((lists) => Math.max(1, ...lists.map((anyOf) => anyOf.length)));
    const neededBy: { item: number; anyOf: readonly number[] }[][] = items.map(() => []);
    for (const [item, lists] of this.needs.entries()) {
      for (const anyOf of lists) for (const other of anyOf) neededBy[other].push({ item, anyOf });
    }
    this.neededBy = neededBy;
    const excludes = items.map(() => new Set<number>());
    for (const exclusive of eitherOr.map(indices)) {
      for (const item of exclusive)
        for (const other of exclusive) if (item !== other) excludes[item].add(other);
    }
    this.excludes = excludes.map((others) => [...others]);
    this.linkedClass = Uint8Array.from({ length: model.classCount }, (_, k) => (this.isLinked(k) ? 1 : 0));
    this.linkedOptions = Int32Array.from(model.optionClass.keys()).filter((option) =>
      this.concern(model.optionClass[option]),
    );
    this.changedIn = new Int32Array(model.classCount);
    this.together = new Int32Array(model.classCount);
    this.replaced = new Int32Array(model.classCount);
  }

  /** Whether a link concerns an item of the class. */
  concern(k: number): boolean {
    return this.linkedClass[k] === 1;
  }

  /** Whether choosing the option alone would newly break a link. */
  asksForMore(portfolio: WorkingPortfolio, option: number): boolean {
    const { model } = this;
    const k = model.optionClass[option];
    if (this.linkedClass[k] === 0) return false;
    const item = model.optionItem[option];
    const before = model.optionItem[portfolio.chosen[k]];
    if (item === before) return false;
    return (
      (item >= 0 && this.lacksPartnerOrRoom(portfolio, item)) ||
      (before >= 0 && this.isLeant(portfolio, before, item))
    );
  }

  /** How many ways there are to choose among partners of which any will do. */
  variants(option: number): number {
    const item = this.model.optionItem[option];
    return item < 0 ? 1 : this.variantsOfItem[item];
  }

  /**
   * Finds the options to choose together so that choosing `option` leaves no link newly broken, and puts them into
   * `together`. Returns how many there are; 0 if there is no way. `variant` picks among partners of which any will
   * do. The portfolio is the same afterwards as before.
   */
  packageOf(portfolio: WorkingPortfolio, option: number, variant: number): number {
    this.round++;
    this.size = 0;
    let complete = this.choose(portfolio, option);
    for (let at = 0; complete && at < this.size; at++) {
      const item = this.model.optionItem[this.together[at]];
      const before = this.model.optionItem[this.replaced[at]];
      if (item === before) continue;
      complete =
        (item < 0 || (this.dropExcluded(portfolio, item) && this.takePartners(portfolio, item, variant))) &&
        (before < 0 || this.dropStranded(portfolio, before));
    }
    for (let at = 0; at < this.size; at++) {
      portfolio.chosen[this.model.optionClass[this.replaced[at]]] = this.replaced[at];
    }
    return complete ? this.size : 0;
  }

  /**
   * Adds a choice to the package; false if the package has changed that class already. While a package is put
   * together only the list of the chosen matters; the sums of the portfolio are left as they are, which is faster.
   */
  private choose(portfolio: WorkingPortfolio, option: number): boolean {
    const k = this.model.optionClass[option];
    if (this.changedIn[k] === this.round) return false;
    this.changedIn[k] = this.round;
    this.replaced[this.size] = portfolio.chosen[k];
    this.together[this.size++] = option;
    portfolio.chosen[k] = option;
    return true;
  }

  private dropExcluded(portfolio: WorkingPortfolio, item: number): boolean {
    for (const other of this.excludes[item]) {
      if (portfolio.takes(other) && !this.drop(portfolio, other)) return false;
    }
    return true;
  }

  private takePartners(portfolio: WorkingPortfolio, item: number, variant: number): boolean {
    for (const anyOf of this.needs[item]) {
      if (takesAny(portfolio, anyOf)) continue;
      if (anyOf.length === 0) return false;
      if (!this.choose(portfolio, this.onePieceOf(anyOf[variant % anyOf.length]))) return false;
    }
    return true;
  }

  /** Drops what needed the item and has no other partner. */
  private dropStranded(portfolio: WorkingPortfolio, item: number): boolean {
    for (const { item: dependent, anyOf } of this.neededBy[item]) {
      if (!portfolio.takes(dependent) || takesAny(portfolio, anyOf)) continue;
      if (!this.drop(portfolio, dependent)) return false;
    }
    return true;
  }

  private drop(portfolio: WorkingPortfolio, item: number): boolean {
    const nothing = this.model.optionStart[this.model.classOfItem[item]];
    return this.model.optionItem[nothing] < 0 && this.choose(portfolio, nothing);
  }

  private lacksPartnerOrRoom(portfolio: WorkingPortfolio, item: number): boolean {
    for (const other of this.excludes[item]) if (portfolio.takes(other)) return true;
    for (const anyOf of this.needs[item]) if (!takesAny(portfolio, anyOf)) return true;
    return false;
  }

  /** Whether something taken needs this item, and neither another one taken nor its replacement will do instead. */
  private isLeant(portfolio: WorkingPortfolio, item: number, replacement: number): boolean {
    for (const { item: dependent, anyOf } of this.neededBy[item]) {
      if (!portfolio.takes(dependent)) continue;
      let held = false;
      for (const other of anyOf) held ||= other === replacement || (other !== item && portfolio.takes(other));
      if (!held) return true;
    }
    return false;
  }

  private onePieceOf(item: number): number {
    let option = this.model.optionStart[this.model.classOfItem[item]];
    while (this.model.optionItem[option] !== item) option++;
    return option;
  }

  private isLinked(k: number): boolean {
    for (let option = this.model.optionStart[k]; option < this.model.optionStart[k + 1]; option++) {
      const item = this.model.optionItem[option];
      if (item < 0) continue;
      if (this.needs[item].length + this.neededBy[item].length + this.excludes[item].length > 0) return true;
    }
    return false;
  }
}

function takesAny(portfolio: WorkingPortfolio, anyOf: readonly number[]): boolean {
  for (const item of anyOf) if (portfolio.takes(item)) return true;
  return false;
}
