import { EvenSample } from './even-sample.js';
import { ParetoFront } from './pareto-front.js';
import type { Model } from '../model/model.js';
import type { WorkingPortfolio } from '../model/working-portfolio.js';

/**
 * What a search has found: the front, how many portfolios were looked at, and samples of those for the chart. It
 * also answers in one table look-up that a portfolio is surely beaten, which is so for all but few.
 */
export class SearchArchive {
  readonly front: ParetoFront;
  readonly lookedAt: EvenSample;
  readonly onceKept = new EvenSample(ONCE_KEPT_CAPACITY);
  /** Portfolios of which benefit and cost were worked out. */
  evaluations = 0;

  /** No portfolio costs less. */
  readonly leastCost: number;
  /** No portfolio that counts costs more. */
  readonly mostCost: number;
  /**
   * Entry i: the most benefit of a member whose cost falls into a bucket below i. The front only ever improves, so
   * an entry stays true when it is out of date.
   */
  surelyBeaten: Float64Array = new Float64Array(1);
  bucketsPerCost = 0;

  private explored = new Uint8Array(LEAST_BUCKETS);
  private changes = 0;
  private changesInTable = 0;
  private beaten = 0;

  constructor(model: Model, lookedAtCapacity: number) {
    this.front = new ParetoFront(model.optionStart, (benefit, cost) => this.sampleBeaten(benefit, cost));
    this.lookedAt = new EvenSample(lookedAtCapacity);
    const range = costRange(model);
    this.leastCost = range.least;
    this.mostCost = Math.min(range.most, model.ceiling);
    this.refreshTable();
  }

  /** Number of times the front has changed. */
  get improvements(): number {
    return this.changes;
  }

  /** Keeps a feasible portfolio that no member beats. */
  offer(portfolio: WorkingPortfolio): boolean {
    const slot = this.front.offer(portfolio.benefit, portfolio.cost, portfolio.chosen);
    if (slot < 0) return false;
    this.setExplored(slot, 0);
    this.changes++;
    return true;
  }

  /** Takes in the members of another front. */
  offerAll(members: ParetoFront): void {
    for (let place = 0; place < members.size; place++) {
      const slot = this.front.offer(
        members.benefitAt(place),
        members.costAt(place),
        members.choicesAt(place),
      );
      if (slot < 0) continue;
      this.setExplored(slot, 0);
      this.changes++;
    }
  }

  isBeaten(benefit: number, cost: number): boolean {
    const bucket = cost <= this.leastCost ? 0 : ((cost - this.leastCost) * this.bucketsPerCost) | 0;
    return benefit <= this.surelyBeaten[bucket] || this.front.bestBenefitWithin(cost) >= benefit;
  }

  /** Brings the table up to date once enough has changed to be worth it. */
  tendTable(): void {
    if (this.changes - this.changesInTable > this.front.size / 64) this.refreshTable();
  }

  /** How far the neighbourhood of the member in a slot has been looked through. */
  exploredOf(slot: number): number {
    return this.explored[slot];
  }

  setExplored(slot: number, level: number): void {
    if (slot >= this.explored.length) {
      const larger = new Uint8Array(2 * slot);
      larger.set(this.explored);
      this.explored = larger;
    }
    this.explored[slot] = level;
  }

  private refreshTable(): void {
    const { front } = this;
    const wanted = Math.min(MOST_BUCKETS, Math.max(LEAST_BUCKETS, 4 * front.size));
    if (this.surelyBeaten.length < wanted) this.surelyBeaten = new Float64Array(2 * wanted);
    const table = this.surelyBeaten;
    this.bucketsPerCost = (table.length - 1) / Math.max(1, this.mostCost - this.leastCost);
    let best = -Infinity;
    let filled = 0;
    for (let place = 0; place < front.size; place++) {
      const bucket = ((front.costAt(place) - this.leastCost) * this.bucketsPerCost) | 0;
      if (bucket >= filled) table.fill(best, filled, bucket + 1);
      filled = Math.max(filled, bucket + 1);
      best = front.benefitAt(place);
    }
    table.fill(best, filled);
    this.changesInTable = this.changes;
  }

  private sampleBeaten(benefit: number, cost: number): void {
    const number = this.beaten++;
    if (number >= this.onceKept.nextWanted) this.onceKept.take(number, cost, benefit);
  }
}

const ONCE_KEPT_CAPACITY = 5_000;
const LEAST_BUCKETS = 1 << 11;
const MOST_BUCKETS = 1 << 18;

function costRange({ classCount, optionStart, optionCost }: Model): { least: number; most: number } {
  let least = 0;
  let most = 0;
  for (let k = 0; k < classCount; k++) {
    const costs = optionCost.subarray(optionStart[k], optionStart[k + 1]);
    least += costs.reduce((low, cost) => Math.min(low, cost), Infinity);
    most += costs.reduce((high, cost) => Math.max(high, cost), 0);
  }
  return { least, most };
}
