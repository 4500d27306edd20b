import { Edge } from './edge.js';
import { LinearSystem } from './linear-system.js';
import type { Obstacle, Step, Stop } from './obstacle.js';
import type { OpenPart } from './open-part.js';
import { ScaledPart } from './scaled-part.js';

/** Where a relaxation found its prices: a start for that of a part of the same part, or at a nearby cost. */
export interface KnownPrices {
  /** Rows of the model, or bounds on pieces, that have a price, and the prices in benefit per unit. */
  readonly rows: Int32Array;
  readonly prices: Float64Array;
  readonly priceOfCost: number;
  /** Options of the model that were chosen in shares. */
  readonly inShares: Int32Array;
}

/**
 * The linear relaxation of a part: the most benefit if options could be chosen in shares, as a function of what may be
 * spent. It is solved by its dual: a price for cost and one for each row are sought at which
 *
 *   prices × bounds + over all classes the most (benefit − prices × entries) among the class' options
 *
 * is least. At any prices of zero or more that sum is at least the benefit of every portfolio (weak duality), so a
 * run cut short, or rounding, costs sharpness and never truth.
 *
 * The way down is the dual simplex method with classes as generalised upper bounds (Dantzig and Van Slyke 1967) and
 * long steps; from memory. At a corner as many ties between options hold as there are free prices. The shares in which
 * the tied options are chosen say which of them keeps the sum from falling; along that edge the sum is piecewise
 * linear, and the step goes to its least point, past as many changes of a class' best option as it takes. The matrix
 * has one row for each tie, a handful, and is factored anew at each corner: no error builds up.
 */
export class Relaxation {
  /** Benefit per unit of each row of the part and, last, of cost. */
  readonly prices: Float64Array;
  /** The share in which each option is chosen. */
  readonly shares: Float64Array;

  private readonly scaled: ScaledPart;
  private readonly classOf: Int32Array;
  /** Scaled prices. One that is neither free nor zero is held where it is until a step moves it. */
  private readonly price: Float64Array;
  private readonly isFree: Uint8Array;
  private readonly free: number[] = [];
  /** The best option of each class at the prices, and options that are as good. */
  private readonly best: Int32Array;
  private readonly ties: number[] = [];
  private readonly isTie: Uint8Array;
  private readonly tiesInClass: Int32Array;

  private readonly worth: Float64Array;
  private stepsSinceReading = 0;
  private readonly slope: Float64Array;
  private readonly edge: Edge;
  private readonly direction: Float64Array;
  private readonly left: Float64Array;
  private readonly system = new LinearSystem();
  private readonly right: Float64Array;
  private readonly solution: Float64Array;

  constructor(
    private readonly part: OpenPart,
    known?: KnownPrices,
  ) {
    const { classCount, start } = part;
    const options = part.option.length;
    const figures = part.row.length + 1;
    this.scaled = new ScaledPart(part);
    this.prices = new Float64Array(figures);
    this.shares = new Float64Array(options);
    this.price = new Float64Array(figures);
    this.isFree = new Uint8Array(figures);
    this.best = new Int32Array(classCount);
    this.isTie = new Uint8Array(options);
    this.tiesInClass = new Int32Array(classCount);
    this.classOf = new Int32Array(options);
    for (let k = 0; k < classCount; k++) this.classOf.fill(k, start[k], start[k + 1]);
    this.worth = new Float64Array(options);
    this.slope = new Float64Array(options);
    this.direction = new Float64Array(figures);
    this.left = new Float64Array(figures);
    this.right = new Float64Array(figures);
    this.solution = new Float64Array(figures);
    const { price, direction, worth, slope, best, isTie, tiesInClass } = this;
    this.edge = new Edge(part, { price, direction, worth, slope, best, isTie, tiesInClass });
    this.startAt(known);
  }

  /**
   * Finds the prices for portfolios that cost at most so much. False: there is none, not even in shares. It goes on
   * from the prices of the last call, which for a nearby cost takes a few steps.
   */
  minimise(cost: number): boolean {
    this.scaled.allowCost(cost);
    const most = 100 + 4 * this.prices.length + this.part.classCount;
    for (let step = 0; step < most; step++) {
      this.settleCorner();
      this.readShares();
      const obstacle = this.worstObstacle();
      if (obstacle === undefined) break;
      if (obstacle.kind === 'best') {
        this.takeAsBest(obstacle.tie);
        continue;
      }
      if (this.walk(obstacle)) continue;
      const isImpossible = this.edge.fallsForEver(this.scaled.bound);
      this.takeBackBest();
      if (isImpossible) return false;
      break;
    }
    for (let row = 0; row < this.prices.length; row++) {
      const price = this.scaled.priceOf(this.price[row], row);
      // any price holds, so one that got lost in rounding may as well be nought
      this.prices[row] = Number.isFinite(price) ? price : 0;
    }
    return true;
  }

  /** What to start from in a part of this part. */
  known(): KnownPrices {
    const { part, prices, shares } = this;
    const priced = [...part.row.keys()].filter((row) => prices[row] > 0);
    const inShares = [...shares.keys()].filter((place) => shares[place] > 0 && shares[place] < 1);
    return {
      rows: Int32Array.from(priced, (row) => part.row[row]),
      prices: Float64Array.from(priced, (row) => prices[row]),
      priceOfCost: prices[part.row.length],
      inShares: Int32Array.from(inShares, (place) => part.option[place]),
    };
  }

  private startAt(known: KnownPrices | undefined): void {
    const { part, price, scaled } = this;
    if (known) {
      for (const [row, id] of part.row.entries()) {
        const at = known.rows.indexOf(id);
        if (at >= 0) price[row] = scaled.scaledPriceOf(known.prices[at], row);
      }
      price[part.row.length] = scaled.scaledPriceOf(known.priceOfCost, part.row.length);
    }
    this.readWorths();
    for (let k = 0; k < part.classCount; k++) this.best[k] = this.bestOf(k);
    if (!known) return;
    for (let option = 0; option < part.option.length; option++) {
      const best = this.best[this.classOf[option]];
      if (option === best || !known.inShares.includes(part.option[option])) continue;
      if (this.worth[best] - this.worth[option] < TIE && this.ties.length < price.length) this.addTie(option);
    }
    for (let row = 0; row < price.length; row++) if (price[row] > 0) this.setFree(row);
  }

  private bestOf(k: number): number {
    const { start } = this.part;
    let best = start[k];
    for (let option = best + 1; option < start[k + 1]; option++) {
      if (this.worth[option] > this.worth[best]) best = option;
    }
    return best;
  }

  /** After a walk that led nowhere, and on its way passed changes of the best options. */
  private takeBackBest(): void {
    for (let k = 0; k < this.part.classCount; k++)
      if (this.tiesInClass[k] === 0) this.best[k] = this.bestOf(k);
  }

  /** Factors the ties over the free prices, holding what is too much, and puts the prices where the ties meet. */
  private settleCorner(): void {
    const { system, ties, free } = this;
    for (;;) {
      this.layTies();
      system.factor(SMALLEST_PIVOT);
      if (system.rank === ties.length && system.rank === free.length) break;
      const independentTies = Array.from(system.rowOrder.subarray(0, system.rank), (row) => ties[row]);
      const independentPrices = Array.from(system.columnOrder.subarray(0, system.rank), (at) => free[at]);
      for (const tie of [...ties]) if (!independentTies.includes(tie)) this.dropTie(tie);
      for (const row of [...free]) if (!independentPrices.includes(row)) this.unsetFree(row);
    }
    this.meetTies();
    // the walk has moved the worths along; from time to time they are added up anew, so that no rounding piles up
    if (this.stepsSinceReading >= STEPS_BETWEEN_READINGS) this.readWorths();
  }

  private layTies(): void {
    const { system, ties, free, scaled, best, classOf } = this;
    system.reset(ties.length, free.length);
    const entries = this.direction;
    for (const [row, tie] of ties.entries()) {
      entries.fill(0);
      this.scaled.addEntries(entries, tie, 1);
      this.scaled.addEntries(entries, best[classOf[tie]], -1);
      for (const [column, figure] of free.entries()) system.set(row, column, entries[figure]);
      this.right[row] = scaled.benefit[tie] - scaled.benefit[best[classOf[tie]]];
      for (let figure = 0; figure < entries.length; figure++) {
        if (this.isFree[figure] === 0) this.right[row] -= entries[figure] * this.price[figure];
      }
    }
  }

  private meetTies(): void {
    if (this.ties.length === 0) return;
    this.system.solve(this.right, this.solution);
    for (const [column, figure] of this.free.entries())
      this.price[figure] = Math.max(0, this.solution[column]);
  }

  private readWorths(): void {
    this.stepsSinceReading = 0;
    this.worth.set(this.scaled.benefit);
    this.scaled.takeOffEntries(this.worth, this.price);
  }

  /** The shares of the tied options that use up the rows with free prices, and what is left of each row. */
  private readShares(): void {
    const { part, shares, best, ties, free, left, system, right, solution, classOf } = this;
    left.set(this.scaled.bound);
    shares.fill(0);
    for (let k = 0; k < part.classCount; k++) {
      shares[best[k]] = 1;
      this.scaled.addEntries(left, best[k], -1);
    }
    if (ties.length === 0) return;
    for (const [column, figure] of free.entries()) right[column] = left[figure];
    system.solveTransposed(right, solution);
    for (const [row, tie] of ties.entries()) {
      const share = solution[row];
      const rival = best[classOf[tie]];
      shares[tie] = share;
      shares[rival] -= share;
      this.scaled.addEntries(left, tie, -share);
      this.scaled.addEntries(left, rival, share);
    }
  }

  /** What is furthest from allowed: a share below nought, or a row that its price should be moved for. */
  private worstObstacle(): Obstacle | undefined {
    const { shares, ties, best, classOf, left, price, isFree } = this;
    let worst: Obstacle | undefined;
    let worstBy = ALLOWED;
    for (const tie of ties) {
      if (-shares[tie] > worstBy) {
        worstBy = -shares[tie];
        worst = { kind: 'tie', tie, rate: shares[tie] };
      }
      const rival = best[classOf[tie]];
      if (-shares[rival] > worstBy) {
        worstBy = -shares[rival];
        worst = { kind: 'best', tie };
      }
    }
    for (let row = 0; row < left.length; row++) {
      if (isFree[row] === 1) continue;
      const by = price[row] > 0 ? Math.abs(left[row]) : -left[row];
      if (by <= worstBy) continue;
      worstBy = by;
      worst = { kind: 'row', row, sign: left[row] < 0 ? 1 : -1, rate: -by };
    }
    return worst;
  }

  /** Makes a tied option the best of its class, and the one that was best a tie: they are as good. */
  private takeAsBest(tie: number): void {
    const k = this.classOf[tie];
    const before = this.best[k];
    this.dropTie(tie);
    this.best[k] = tie;
    this.addTie(before);
  }

  /** Goes along the edge that an obstacle opens, to the least point; false if there is none. */
  private walk(obstacle: Step): boolean {
    this.point(obstacle);
    if (obstacle.kind === 'tie') this.dropTie(obstacle.tie);
    const stop = this.edge.leastPoint(obstacle.rate);
    if (stop === undefined) return false;
    const { price, direction } = this;
    for (let row = 0; row < price.length; row++) {
      if (direction[row] !== 0) price[row] = Math.max(0, price[row] + stop.distance * direction[row]);
    }
    if (stop.kind === 'zero') price[stop.row] = 0;
    const { worth, slope } = this;
    for (let option = 0; option < worth.length; option++) worth[option] += stop.distance * slope[option];
    this.stepsSinceReading++;
    this.exchange(obstacle, stop);
    return true;
  }

  private exchange(obstacle: Step, stop: Stop): void {
    if (stop.kind === 'tie') {
      if (obstacle.kind === 'row') this.setFree(obstacle.row);
      this.addTie(stop.option);
      return;
    }
    if (obstacle.kind === 'tie') this.unsetFree(stop.row);
    else if (stop.row !== obstacle.row) {
      this.unsetFree(stop.row);
      this.setFree(obstacle.row);
    }
  }

  /** The direction of all prices in which one tie loosens, or one price moves, while the other ties hold. */
  private point(obstacle: Step): void {
    const { system, ties, free, right, solution, direction, best, classOf, scaled } = this;
    for (const [row, tie] of ties.entries()) {
      right[row] =
        obstacle.kind === 'tie'
          ? Number(tie === obstacle.tie)
          : obstacle.sign *
            (this.scaled.entryOf(best[classOf[tie]], obstacle.row) - this.scaled.entryOf(tie, obstacle.row));
    }
    direction.fill(0);
    if (ties.length > 0) {
      system.solve(right, solution);
      for (const [column, figure] of free.entries()) direction[figure] = solution[column];
    }
    if (obstacle.kind === 'row') direction[obstacle.row] = obstacle.sign;
    this.slope.fill(0);
    scaled.takeOffEntries(this.slope, direction);
  }

  private addTie(option: number): void {
    this.ties.push(option);
    this.isTie[option] = 1;
    this.tiesInClass[this.classOf[option]]++;
  }

  private dropTie(option: number): void {
    this.ties.splice(this.ties.indexOf(option), 1);
    this.isTie[option] = 0;
    this.tiesInClass[this.classOf[option]]--;
  }

  private setFree(row: number): void {
    this.free.push(row);
    this.isFree[row] = 1;
  }

  private unsetFree(row: number): void {
    this.free.splice(this.free.indexOf(row), 1);
    this.isFree[row] = 0;
  }
}

/** All figures are near one: these tell a difference from rounding. */
const SMALLEST_PIVOT = 1e-9;
const ALLOWED = 1e-9;
const TIE = 1e-9;
const STEPS_BETWEEN_READINGS = 16;
