import { compileModel } from '../model/compile-model.js';
import { Links } from '../model/links.js';
import type { Model } from '../model/model.js';
import { picksOf, WorkingPortfolio } from '../model/working-portfolio.js';
import { totalsOf, type Picks } from '../problem/feasible.js';
import type { Problem } from '../problem/problem.js';
import { exchangeMoves, waysToChoose, type ExchangeMove } from './exchange-moves.js';

/** How a portfolio changes so that an item comes in. */
export interface Exchange {
  /** The portfolio after it. */
  readonly picks: Picks;
  /** Pieces of each item that changes, in the order of the problem's items. */
  readonly changes: readonly { readonly item: string; readonly before: number; readonly after: number }[];
  /** What it adds to the portfolio's benefit, cost and use of each limit; negative where it takes away. */
  readonly benefit: number;
  readonly cost: number;
  readonly uses: readonly number[];
}

/**
 * The exchange that brings an item into a feasible portfolio, keeps every rule and costs at most `mostCost` altogether,
 * at the least loss of benefit; of equals the one that costs least, then the one with the fewest changes. Looked
 * through are: the item in any number of pieces, alone or with the partners it needs and without what excludes it; and
 * with it up to two further changes, each of another item or group dropped, taken or replaced, again alone or
 * with what its links ask for. Undefined where none of these will do; a larger exchange may still exist.
 */
export function cheapestExchange(
  problem: Problem,
  picks: Picks,
  item: string,
  mostCost: number,
): Exchange | undefined {
  const model = compileModel(problem);
  const index = problem.items.findIndex(({ id }) => id === item);
  if (model === undefined || index < 0 || model.classOfItem[index] < 0) return undefined;
  const search = new ExchangeSearch(model, chosenOptions(model, picks), index, mostCost);
  const best = search.run();
  return best && exchangeTo(problem, picks, picksOf(model, best));
}

interface Found {
  readonly chosen: Int32Array;
  readonly benefit: number;
  readonly cost: number;
  readonly changes: number;
}

class ExchangeSearch {
  private readonly portfolio: WorkingPortfolio;
  private readonly links: Links;
  private best: Found | undefined;

  constructor(
    private readonly model: Model,
    private readonly start: Int32Array,
    private readonly item: number,
    private readonly mostCost: number,
  ) {
    this.portfolio = new WorkingPortfolio(model);
    this.links = new Links(model);
  }

  run(): Int32Array | undefined {
    const { model, item, start, portfolio, links } = this;
    const k = model.classOfItem[item];
    portfolio.load(start);
    for (let option = model.optionStart[k]; option < model.optionStart[k + 1]; option++) {
      if (model.optionItem[option] !== item) continue;
      for (const options of waysToChoose(portfolio, links, option)) {
        const before = this.make(options);
        this.lookAround();
        this.make(before);
      }
    }
    return this.best?.chosen;
  }

  /** The portfolio as it stands, then with every further change, then with every two of them. */
  private lookAround(): void {
    this.consider(0);
    const moves = exchangeMoves(this.portfolio, this.links);
    for (const [place, { options }] of moves.entries()) {
      const before = this.make(options);
      this.consider(1);
      this.lookAtPairs(moves, place);
      this.make(before);
    }
  }

  /** The hot loop: a pair is judged by two additions, and made only if it would be the best so far. */
  private lookAtPairs(moves: readonly ExchangeMove[], first: number): void {
    const { mostCost } = this;
    const { cost: costNow, benefit: benefitNow } = this.portfolio;
    for (let second = first + 1; second < moves.length; second++) {
      const { options, benefitChange, costChange } = moves[second];
      const cost = costNow + costChange;
      if (cost > mostCost || !this.wouldBeBest(benefitNow + benefitChange, cost, 2)) continue;
      const before = this.make(options);
      this.consider(2);
      this.make(before);
    }
  }

  /** Chooses the options and returns those they replace, in the order in which to choose them again. */
  private make(options: readonly number[]): number[] {
    const { portfolio, model } = this;
    const before: number[] = [];
    for (const option of options) {
      before.unshift(portfolio.chosen[model.optionClass[option]]);
      portfolio.choose(option);
    }
    return before;
  }

  private consider(changes: number): void {
    const { portfolio, item, mostCost } = this;
    const { benefit, cost } = portfolio;
    if (cost > mostCost || !portfolio.isFeasible() || !portfolio.takes(item)) return;
    if (!this.wouldBeBest(benefit, cost, changes)) return;
    this.best = { chosen: portfolio.chosen.slice(), benefit, cost, changes };
  }

  private wouldBeBest(benefit: number, cost: number, changes: number): boolean {
    const { best } = this;
    if (best === undefined || benefit !== best.benefit) return best === undefined || benefit > best.benefit;
    return cost < best.cost || (cost === best.cost && changes < best.changes);
  }
}

/** The option of each class that the picks take. */
function chosenOptions(model: Model, picks: Picks): Int32Array {
  const chosen = model.optionStart.slice(0, model.classCount);
  const taken = new Set(Object.keys(picks).filter((id) => picks[id] > 0));
  for (let option = 0; option < model.optionItem.length; option++) {
    if (model.optionItem[option] < 0) continue;
    const { id } = model.problem.items[model.optionItem[option]];
    if (picks[id] !== model.optionPieces[option]) continue;
    chosen[model.optionClass[option]] = option;
    taken.delete(id);
  }
  if (taken.size === 0) return chosen;
  throw new RangeError(`The portfolio is not feasible: it takes ${[...taken].join(', ')}.`);
}

function exchangeTo(problem: Problem, picks: Picks, after: Picks): Exchange {
  const [old, now] = [totalsOf(problem, picks), totalsOf(problem, after)];
  const changes = problem.items
    .map(({ id }) => ({ item: id, before: picks[id] ?? 0, after: after[id] ?? 0 }))
    .filter((change) => change.before !== change.after);
  return {
    picks: after,
    changes,
    benefit: now.benefit - old.benefit,
    cost: now.cost - old.cost,
    uses: now.uses.map((use, limit) => use - old.uses[limit]),
  };
}
