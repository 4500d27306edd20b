import type { MoveList } from './move-list.js';
import type { SearchArchive } from '../archive/search-archive.js';
import type { WorkingPortfolio } from '../model/working-portfolio.js';

/**
 * Looks at every portfolio that so many changes of a selection of moves lead to, in order of the selection. It can be
 * left and taken up again; in between the portfolio and its list of moves are the scan's and must not be touched.
 */
export class CombinationScan {
  private changes = 2;
  private selection: Int32Array = new Int32Array(0);
  private benefitChange: Float64Array = new Float64Array(0);
  private costChange: Float64Array = new Float64Array(0);
  /** Places in the selection of the moves that are made; the row of the last move runs over what comes after. */
  private readonly made: number[] = [];
  private readonly undo: number[][] = [];

  constructor(
    private readonly portfolio: WorkingPortfolio,
    private readonly moves: MoveList,
    private readonly archive: SearchArchive,
  ) {}

  /** Changes in each combination. */
  get size(): number {
    return this.changes;
  }

  begin(size: number, selection: Int32Array): void {
    this.changes = size;
    this.selection = selection;
    if (this.benefitChange.length < selection.length) {
      this.benefitChange = new Float64Array(selection.length);
      this.costChange = new Float64Array(selection.length);
    }
    for (let place = 0; place < selection.length; place++) {
      this.benefitChange[place] = this.moves.benefitChange[selection[place]];
      this.costChange[place] = this.moves.costChange[selection[place]];
    }
    this.made.length = 0;
  }

  /** Goes on for about so many evaluations; true when all combinations have been looked at. */
  advance(evaluations: number): boolean {
    const enough = this.archive.evaluations + evaluations;
    while (this.archive.evaluations < enough) {
      if (!this.toNextRow()) return true;
      this.scanRow();
    }
    return false;
  }

  /** Makes the moves of the next row in lexicographic order; false when there is none. */
  private toNextRow(): boolean {
    const rowDepth = this.size - 1;
    let place = this.made.length === rowDepth ? this.unmake() + 1 : (this.made.at(-1) ?? -1) + 1;
    for (;;) {
      const stillToChoose = this.size - this.made.length;
      if (place + stillToChoose > this.selection.length) {
        if (this.made.length === 0) return false;
        place = this.unmake() + 1;
      } else if (this.moves.isOutOfDate(this.selection[place])) {
        place++;
      } else {
        this.make(place);
        if (this.made.length === rowDepth) return true;
        place++;
      }
    }
  }

  /** The hot loop: the moves made together with each move after them in the selection. */
  private scanRow(): void {
    const { archive, benefitChange, costChange } = this;
    const { front, leastCost, mostCost, bucketsPerCost, surelyBeaten } = archive;
    const { cost: costNow, benefit: benefitNow } = this.portfolio;
    const from = this.made[this.made.length - 1] + 1;
    const count = this.selection.length;
    for (let place = from; place < count; place++) {
      const cost = costNow + costChange[place];
      if (cost > mostCost) continue;
      const benefit = benefitNow + benefitChange[place];
      // moves that clash may add up to less than any portfolio costs; they are told apart below
      const bucket = cost <= leastCost ? 0 : ((cost - leastCost) * bucketsPerCost) | 0;
      if (benefit <= surelyBeaten[bucket]) continue;
      if (front.bestBenefitWithin(cost) >= benefit) continue;
      if (this.isPossible(place)) this.offerWith(place);
    }
    this.sampleRow(from);
    archive.evaluations += count - from;
  }

  /** Notes those evaluations of the row whose turn it is in the sample of what was looked at. */
  private sampleRow(from: number): void {
    const { lookedAt, evaluations, mostCost } = this.archive;
    const { portfolio } = this;
    for (;;) {
      const place = from + Math.max(0, lookedAt.nextWanted - evaluations);
      if (place >= this.selection.length) return;
      const number = evaluations + place - from;
      const cost = portfolio.cost + this.costChange[place];
      const benefit = portfolio.benefit + this.benefitChange[place];
      if (cost <= mostCost && this.isPossible(place)) lookedAt.take(number, cost, benefit);
      else lookedAt.skip(number);
    }
  }

  private isPossible(place: number): boolean {
    const move = this.selection[place];
    return !this.moves.isOutOfDate(move) && this.moves.keepsRows(move);
  }

  private offerWith(place: number): void {
    this.make(place);
    this.archive.offer(this.portfolio);
    this.unmake();
  }

  private make(place: number): void {
    const undo = (this.undo[this.made.length] ??= []);
    this.made.push(place);
    this.moves.make(this.selection[place], undo);
  }

  private unmake(): number {
    const place = this.made.pop()!;
    this.moves.takeBack(this.undo[this.made.length]);
    return place;
  }
}

/** The moves of a list that lose least at a price for cost, at most so many, least loss first. */
export function leastLoss(moves: MoveList, price: number, most: number): Int32Array {
  const { count, costChange, benefitChange } = moves;
  const loss = new Float64Array(count);
  for (let move = 0; move < count; move++) loss[move] = price * costChange[move] - benefitChange[move];
  const limit = count > most ? loss.toSorted()[most - 1] : Infinity;
  const order: number[] = [];
  for (let move = 0; move < count; move++) if (loss[move] <= limit) order.push(move);
  order.sort((one, other) => loss[one] - loss[other] || one - other);
  return Int32Array.from(order.slice(0, most));
}
