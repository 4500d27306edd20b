import { BestMoves } from './best-moves.js';
import type { MoveList } from './move-list.js';
import type { SearchArchive } from '../archive/search-archive.js';
import { scanSingles } from './single-scan.js';
import type { WorkingPortfolio } from '../model/working-portfolio.js';

/**
 * Makes a portfolio feasible by single changes: each time those that take away most excess for the benefit they give
 * up, counted at a price for cost. The excess falls with every change, so it ends; false if it got stuck.
 */
export function repair(
  portfolio: WorkingPortfolio,
  moves: MoveList,
  archive: SearchArchive,
  price: number,
): boolean {
  while (!portfolio.isFeasible()) {
    moves.refresh();
    archive.evaluations += moves.count;
    const best = bestMends(portfolio, moves, price);
    if (best.length === 0) return false;
    for (const move of best) {
      const excess = portfolio.excess();
      if (excess === 0) break;
      makeIf(portfolio, moves, move, () => portfolio.excess() < excess - LEAST_MEND);
    }
  }
  return true;
}

/** Improves a feasible portfolio by single changes as long as one gains at a price for cost; offers what it sees. */
export function improve(
  portfolio: WorkingPortfolio,
  moves: MoveList,
  archive: SearchArchive,
  price: number,
): void {
  for (;;) {
    moves.refresh();
    const best = scanSingles(portfolio, moves, archive, price, atATime(moves));
    if (best.length === 0) return;
    for (const move of best) makeIf(portfolio, moves, move, () => portfolio.isFeasible());
    if (!archive.isBeaten(portfolio.benefit, portfolio.cost)) archive.offer(portfolio);
  }
}

/** Long lists are not scanned again for every single move. */
function atATime(moves: MoveList): number {
  return 1 + Math.floor(moves.count / 100);
}

function bestMends(portfolio: WorkingPortfolio, moves: MoveList, price: number): readonly number[] {
  const excess = portfolio.excess();
  const smallLoss = 1e-3 * Math.max(1, portfolio.benefit);
  const best = new BestMoves(atATime(moves), 0);
  const undo: number[] = [];
  for (let move = 0; move < moves.count; move++) {
    moves.make(move, undo);
    const mended = excess - portfolio.excess();
    moves.takeBack(undo);
    if (mended <= LEAST_MEND) continue;
    const loss = price * moves.costChange[move] - moves.benefitChange[move];
    best.offer(move, mended / (Math.max(0, loss) + smallLoss));
  }
  return best.moves;
}

/** Makes a move of a list that may be out of date, and takes it back unless the portfolio is then as wished. */
function makeIf(portfolio: WorkingPortfolio, moves: MoveList, move: number, asWished: () => boolean): void {
  if (moves.isOutOfDate(move)) return;
  const undo: number[] = [];
  moves.make(move, undo);
  if (!asWished()) moves.takeBack(undo);
}

/** Below this a change of the excess is rounding, and could repeat for ever. */
const LEAST_MEND = 1e-12;
