import { BestMoves } from '../local-search/best-moves.js';
import { MoveList } from '../local-search/move-list.js';
import type { Links } from '../model/links.js';
import type { WorkingPortfolio } from '../model/working-portfolio.js';
import type { Weights } from './simplex-weights.js';
import type { SurfaceArchive } from './surface-archive.js';

/** One portfolio, every single change of it with what it does to the three figures, and looks at what lies around. */
export class Neighbourhood {
  private readonly moves: MoveList;
  private secondCostChange = new Float64Array(256);
  private secondCost = 0;

  constructor(
    readonly portfolio: WorkingPortfolio,
    links: Links,
    private readonly optionSecondCost: Float64Array,
    private readonly archive: SurfaceArchive,
  ) {
    this.moves = new MoveList(portfolio, links);
  }

  /** Lists the changes of the portfolio as it stands now. */
  refresh(): void {
    const { moves, portfolio, optionSecondCost } = this;
    moves.refresh();
    if (moves.count > this.secondCostChange.length) this.secondCostChange = new Float64Array(2 * moves.count);
    this.secondCost = this.sumOfSecondCosts();
    const undo: number[] = [];
    for (let move = 0; move < moves.count; move++) {
      moves.make(move, undo);
      let change = 0;
      for (const before of undo) {
        change +=
          optionSecondCost[portfolio.chosen[portfolio.model.optionClass[before]]] - optionSecondCost[before];
      }
      this.secondCostChange[move] = change;
      moves.takeBack(undo);
    }
  }

  offerPortfolio(): void {
    this.archive.offer(this.portfolio, this.sumOfSecondCosts());
  }

  /**
   * Makes the portfolio feasible by single changes: each time those that take away most excess for the worth they give
   * up. The excess falls with every change, so it ends; false if it got stuck.
   */
  repair(weights: Weights): boolean {
    const { portfolio, moves, archive } = this;
    while (!portfolio.isFeasible()) {
      this.refresh();
      archive.evaluations += moves.count;
      const best = this.bestMends(weights);
      if (best.length === 0) return false;
      for (const move of best) {
        const excess = portfolio.excess();
        if (excess === 0) break;
        this.makeIf(move, () => portfolio.excess() < excess - LEAST_MEND);
      }
    }
    return true;
  }

  /** Improves a feasible portfolio by single changes as long as one gains; offers what it sees on the way. */
  improve(weights: Weights): void {
    for (;;) {
      this.refresh();
      const best = this.scanSingles(weights);
      if (best.length === 0) return;
      for (const move of best) this.makeIf(move, () => this.portfolio.isFeasible());
      this.offerPortfolio();
    }
  }

  /** Looks at every portfolio one change away; returns the feasible changes that gain most, none if none gains. */
  scanSingles(weights: Weights): readonly number[] {
    const { portfolio, moves, archive } = this;
    const { lookedAt } = archive;
    const best = new BestMoves(this.atATime(), LEAST_GAIN);
    for (let move = 0; move < moves.count; move++) {
      const cost = portfolio.cost + moves.costChange[move];
      if (cost > portfolio.model.ceiling) continue;
      const benefit = portfolio.benefit + moves.benefitChange[move];
      const secondCost = this.secondCost + this.secondCostChange[move];
      const number = archive.evaluations + move;
      const isSampled = number >= lookedAt.nextWanted;
      const isNew = !archive.surface.isBeaten(benefit, cost, secondCost);
      const gain = this.gainOf(move, weights);
      if (!isNew && !isSampled && gain <= best.threshold) continue;
      const feasible = this.tryMove(move, isNew, secondCost);
      if (isSampled && feasible) lookedAt.take(number, cost, benefit);
      else if (isSampled) lookedAt.skip(number);
      if (feasible) best.offer(move, gain);
    }
    archive.evaluations += moves.count;
    return best.moves;
  }

  /** Looks at every portfolio two changes away, of the changes that lose least at most so many. */
  scanPairs(weights: Weights, most: number): void {
    const { portfolio, moves, archive, secondCostChange } = this;
    const { surface } = archive;
    const { ceiling } = portfolio.model;
    const selection = this.leastLoss(weights, most);
    for (let i = 0; i < selection.length; i++) {
      const one = selection[i];
      const cost = portfolio.cost + moves.costChange[one];
      const benefit = portfolio.benefit + moves.benefitChange[one];
      const secondCost = this.secondCost + secondCostChange[one];
      for (let j = i + 1; j < selection.length; j++) {
        const other = selection[j];
        if (cost + moves.costChange[other] > ceiling) continue;
        const second = secondCost + secondCostChange[other];
        // nearly every pair ends here
        if (surface.isBeaten(benefit + moves.benefitChange[other], cost + moves.costChange[other], second)) {
          continue;
        }
        this.tryPair(one, other, second);
      }
      archive.evaluations += selection.length - 1 - i;
    }
  }

  private tryMove(move: number, isNew: boolean, secondCost: number): boolean {
    const undo: number[] = [];
    this.moves.make(move, undo);
    const feasible = this.portfolio.isFeasible();
    if (feasible && isNew) this.archive.offer(this.portfolio, secondCost);
    this.moves.takeBack(undo);
    return feasible;
  }

  private tryPair(one: number, other: number, secondCost: number): void {
    if (this.moves.overlap(one, other)) return;
    const undo: number[] = [];
    this.moves.make(one, undo);
    this.moves.make(other, undo);
    if (this.portfolio.isFeasible()) this.archive.offer(this.portfolio, secondCost);
    this.moves.takeBack(undo);
  }

  private bestMends(weights: Weights): readonly number[] {
    const { portfolio, moves } = this;
    const excess = portfolio.excess();
    const best = new BestMoves(this.atATime(), 0);
    const undo: number[] = [];
    for (let move = 0; move < moves.count; move++) {
      moves.make(move, undo);
      const mended = excess - portfolio.excess();
      moves.takeBack(undo);
      if (mended <= LEAST_MEND) continue;
      best.offer(move, mended / (Math.max(0, -this.gainOf(move, weights)) + SMALL_LOSS));
    }
    return best.moves;
  }

  /** Makes a move of a list that may be out of date, and takes it back unless the portfolio is then as wished. */
  private makeIf(move: number, asWished: () => boolean): void {
    if (this.moves.isOutOfDate(move)) return;
    const undo: number[] = [];
    this.moves.make(move, undo);
    if (!asWished()) this.moves.takeBack(undo);
  }

  private gainOf(move: number, weights: Weights): number {
    return (
      weights.benefit * this.moves.benefitChange[move] -
      weights.cost * this.moves.costChange[move] -
      weights.secondCost * this.secondCostChange[move]
    );
  }

  private leastLoss(weights: Weights, most: number): Int32Array {
    const gains = Float64Array.from({ length: this.moves.count }, (_, move) => this.gainOf(move, weights));
    const order = Int32Array.from(gains, (_, move) => move);
    return order.sort((one, other) => gains[other] - gains[one] || one - other).subarray(0, most);
  }

  /** Long lists are not scanned again for every single move. */
  private atATime(): number {
    return 1 + Math.floor(this.moves.count / 100);
  }

  private sumOfSecondCosts(): number {
    return this.portfolio.chosen.reduce((sum, option) => sum + this.optionSecondCost[option], 0);
  }
}

/** In the worth of average options. */
const LEAST_GAIN = 1e-9;
const SMALL_LOSS = 1e-2;
/** Below this a change of the excess is rounding, and could repeat for ever. */
const LEAST_MEND = 1e-12;
