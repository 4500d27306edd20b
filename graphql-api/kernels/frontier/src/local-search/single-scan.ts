import { BestMoves } from './best-moves.js';
import type { MoveList } from './move-list.js';
import type { SearchArchive } from '../archive/search-archive.js';
import type { WorkingPortfolio } from '../model/working-portfolio.js';

/**
 * Looks at every portfolio one change away and offers the feasible ones that no member beats. Returns the feasible
 * moves that gain most by `benefit - price * cost`, at most so many; none if none gains.
 */
export function scanSingles(
  portfolio: WorkingPortfolio,
  moves: MoveList,
  archive: SearchArchive,
  price: number,
  most: number,
): readonly number[] {
  const best = new BestMoves(most, 0);
  const undo: number[] = [];
  for (let move = 0; move < moves.count; move++) {
    const cost = portfolio.cost + moves.costChange[move];
    if (cost > archive.mostCost) continue;
    const benefit = portfolio.benefit + moves.benefitChange[move];
    const gain = moves.benefitChange[move] - price * moves.costChange[move];
    const isNew = !archive.isBeaten(benefit, cost);
    const isSampled = archive.evaluations + move >= archive.lookedAt.nextWanted;
    if (!isNew && !isSampled && gain <= best.threshold) continue;
    moves.make(move, undo);
    const feasible = portfolio.isFeasible();
    if (feasible && isNew) archive.offer(portfolio);
    moves.takeBack(undo);
    if (isSampled) sample(archive, archive.evaluations + move, feasible, cost, benefit);
    if (feasible) best.offer(move, gain);
  }
  archive.evaluations += moves.count;
  return best.moves;
}

function sample(
  { lookedAt }: SearchArchive,
  number: number,
  feasible: boolean,
  cost: number,
  benefit: number,
): void {
  if (feasible) lookedAt.take(number, cost, benefit);
  else lookedAt.skip(number);
}
