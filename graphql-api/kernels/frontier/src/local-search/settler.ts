import { BestMoves } from './best-moves.js';
import type { MoveList } from './move-list.js';
import type { SearchArchive } from '../archive/search-archive.js';
import type { WorkingPortfolio } from '../model/working-portfolio.js';

/** Brings a portfolio into order by single changes, at a price for cost, and offers what it comes by. */
export class Settler {
  private readonly best = new BestMoves(1, 0);
  private readonly undo: number[] = [];

  constructor(
    private readonly portfolio: WorkingPortfolio,
    private readonly moves: MoveList,
    private readonly archive: SearchArchive,
  ) {}

  /**
   * Makes the portfolio feasible: each time by the changes that take away most excess for the benefit they give up.
   * The excess falls with every change, so it ends; false if it got stuck.
   */
  repair(price: number): boolean {
    const { portfolio, moves, archive } = this;
    while (!portfolio.isFeasible()) {
      moves.refresh();
      archive.evaluations += moves.count;
      const best = this.bestMends(price);
      if (best.length === 0) return false;
      for (const move of best) {
        const excess = portfolio.excess();
        if (excess === 0) break;
        if (!moves.isOutOfDate(move) && excess - moves.excessWith(move) > LEAST_MEND) this.make(move);
      }
    }
    return true;
  }

  /** Improves a feasible portfolio as long as a change gains. */
  improve(price: number): void {
    const { portfolio, moves, archive } = this;
    for (;;) {
      moves.refresh();
      const best = this.scanSingles(price, atATime(moves));
      if (best.length === 0) return;
      for (const move of best) {
        const isAffordable = portfolio.cost + moves.costChange[move] <= archive.mostCost;
        if (isAffordable && !moves.isOutOfDate(move) && moves.keepsRows(move)) this.make(move);
      }
      if (!archive.isBeaten(portfolio.benefit, portfolio.cost)) archive.offer(portfolio);
    }
  }

  /**
   * Looks at every feasible portfolio one listed change away and offers those that no member beats. Returns the
   * changes that gain most by `benefit - price * cost`, at most so many; none if none gains. Valid until the next
   * call of the settler.
   */
  scanSingles(price: number, most: number): readonly number[] {
    const { portfolio, moves, archive, best } = this;
    const { count, benefitChange, costChange } = moves;
    const { mostCost } = archive;
    const { cost: costNow, benefit: benefitNow } = portfolio;
    best.clear(most, 0);
    for (let move = 0; move < count; move++) {
      const cost = costNow + costChange[move];
      if (cost > mostCost) continue;
      const gain = benefitChange[move] - price * costChange[move];
      const isNew = !archive.isBeaten(benefitNow + benefitChange[move], cost);
      if (!isNew && gain <= best.threshold) continue;
      if (!moves.keepsRows(move)) continue;
      if (isNew) this.offerWith(move);
      best.offer(move, gain);
    }
    this.sampleSingles();
    archive.evaluations += count;
    return best.moves;
  }

  private bestMends(price: number): readonly number[] {
    const { moves, best } = this;
    const excess = this.portfolio.excess();
    const smallLoss = 1e-3 * Math.max(1, this.portfolio.benefit);
    best.clear(atATime(moves), 0);
    for (let move = 0; move < moves.count; move++) {
      const mended = excess - moves.excessWith(move);
      if (mended <= LEAST_MEND) continue;
      const loss = price * moves.costChange[move] - moves.benefitChange[move];
      best.offer(move, mended / (Math.max(0, loss) + smallLoss));
    }
    return best.moves;
  }

  private make(move: number): void {
    this.moves.make(move, this.undo);
    this.undo.length = 0;
  }

  private offerWith(move: number): void {
    this.moves.make(move, this.undo);
    this.archive.offer(this.portfolio);
    this.moves.takeBack(this.undo);
  }

  /** Notes those evaluations of a scan whose turn it is in the sample of what was looked at. */
  private sampleSingles(): void {
    const { portfolio, moves } = this;
    const { lookedAt, evaluations, mostCost } = this.archive;
    for (;;) {
      const move = Math.max(0, lookedAt.nextWanted - evaluations);
      if (move >= moves.count) return;
      const cost = portfolio.cost + moves.costChange[move];
      const benefit = portfolio.benefit + moves.benefitChange[move];
      if (cost <= mostCost && moves.keepsRows(move)) lookedAt.take(evaluations + move, cost, benefit);
      else lookedAt.skip(evaluations + move);
    }
  }
}

/** Long lists are not scanned again for every single move. */
function atATime(moves: MoveList): number {
  return 1 + Math.floor(moves.count / 100);
}

/** Below this a change of the excess is rounding, and could repeat for ever. */
const LEAST_MEND = 1e-12;
