import type { SearchArchive } from '../archive/search-archive.js';
import type { WorkingPortfolio } from '../model/working-portfolio.js';

/**
 * Looks for members between two members of the front that lie close together, among the portfolios that choose in
 * each class as one or the other does (path relinking; Glover 1997, from memory): what two good portfolios agree on
 * is left alone, so this reaches combinations of many changes that no neighbourhood of one of them holds. Sweeps over
 * the front, first over direct neighbours, then over members ever farther apart, then anew.
 */
export class PathRelinking {
  private distance = 1;
  /** Cost of the member the sweep has come to. */
  private sweptTo = -Infinity;

  /** What is chosen in each class: at first as the one member does. Its figures are kept beside it. */
  private readonly chosen: Int32Array;
  private benefit = 0;
  private cost = 0;
  private readonly other: Int32Array;
  /** The classes in which the two differ: the option chosen, and that of the other. */
  private readonly from: number[] = [];
  private readonly to: number[] = [];

  constructor(
    private readonly portfolio: WorkingPortfolio,
    private readonly archive: SearchArchive,
  ) {
    this.chosen = new Int32Array(portfolio.chosen.length);
    this.other = new Int32Array(portfolio.chosen.length);
  }

  /** Links the next two members of the sweep that differ enough; false if the front has not got two. */
  linkNext(): boolean {
    const { front } = this.archive;
    if (front.size < 2) return false;
    for (let pair = 0; pair < PAIRS_AT_A_TIME; pair++) {
      const place = this.nextPlace();
      this.listDifferences(place, place + this.distance);
      if (this.from.length < LEAST_DIFFERENCES) continue;
      this.link(place, place + this.distance);
      break;
    }
    return true;
  }

  private nextPlace(): number {
    const { front } = this.archive;
    let place = front.placeWithin(this.sweptTo) + 1;
    if (place + this.distance >= front.size) {
      this.distance = this.distance < Math.min(MOST_DISTANCE, front.size - 1) ? this.distance + 1 : 1;
      place = 0;
    }
    this.sweptTo = front.costAt(place);
    return place;
  }

  private listDifferences(place: number, otherPlace: number): void {
    const { front } = this.archive;
    const chosen = front.choicesAt(place, this.chosen);
    const other = front.choicesAt(otherPlace, this.other);
    this.from.length = 0;
    this.to.length = 0;
    for (let k = 0; k < chosen.length; k++) {
      if (chosen[k] === other[k]) continue;
      this.from.push(chosen[k]);
      this.to.push(other[k]);
    }
  }

  private link(place: number, otherPlace: number): void {
    const { front } = this.archive;
    this.benefit = front.benefitAt(place);
    this.cost = front.costAt(place);
    const price = (front.benefitAt(otherPlace) - this.benefit) / (front.costAt(otherPlace) - this.cost);
    while (this.from.length > MOST_ENUMERATED) this.goNearer(price);
    this.enumerate();
  }

  /** Takes the step towards the other that loses least at the price. It may lead through portfolios that break rules. */
  private goNearer(price: number): void {
    const { from, to, archive } = this;
    const { optionBenefit, optionCost } = this.portfolio.model;
    let best = 0;
    let leastLoss = Infinity;
    for (let at = 0; at < from.length; at++) {
      const costChange = optionCost[to[at]] - optionCost[from[at]];
      const loss = price * costChange - (optionBenefit[to[at]] - optionBenefit[from[at]]);
      if (loss >= leastLoss) continue;
      leastLoss = loss;
      best = at;
    }
    this.chosen[this.portfolio.model.optionClass[to[best]]] = to[best];
    this.benefit += optionBenefit[to[best]] - optionBenefit[from[best]];
    this.cost += optionCost[to[best]] - optionCost[from[best]];
    from[best] = from[from.length - 1];
    to[best] = to[to.length - 1];
    from.pop();
    to.pop();
    archive.evaluations++;
    if (archive.isBeaten(this.benefit, this.cost)) return;
    this.portfolio.load(this.chosen);
    if (this.portfolio.isFeasible()) archive.offer(this.portfolio);
  }

  /** Looks at all ways to choose as the one or the other in the classes left, each a single change from the last. */
  private enumerate(): void {
    const { archive, from, to } = this;
    const { optionBenefit, optionCost } = this.portfolio.model;
    const ways = 1 << from.length;
    let { benefit, cost } = this;
    let way = 0;
    let standing = -1;
    for (let step = 1; step < ways; step++) {
      // Gray code: the way of a step differs from the one before in the lowest bit set in the step
      const at = 31 - Math.clz32(step & -step);
      const sign = (way >> at) & 1 ? -1 : 1;
      way ^= 1 << at;
      benefit += sign * (optionBenefit[to[at]] - optionBenefit[from[at]]);
      cost += sign * (optionCost[to[at]] - optionCost[from[at]]);
      if (archive.isBeaten(benefit, cost)) continue;
      if (standing < 0) this.portfolio.load(this.chosen);
      this.stand(Math.max(0, standing), way);
      standing = way;
      if (this.portfolio.isFeasible()) archive.offer(this.portfolio);
    }
    archive.evaluations += ways - 1;
  }

  /** Brings the portfolio from one way to another. */
  private stand(before: number, way: number): void {
    for (let at = 0; at < this.from.length; at++) {
      if (((before ^ way) >> at) & 1) this.portfolio.choose((way >> at) & 1 ? this.to[at] : this.from[at]);
    }
  }
}

/** With fewer differences the smallest neighbourhoods of both members hold all that lies between. */
const LEAST_DIFFERENCES = 4;
/** Of so many differences all combinations are looked at. */
const MOST_ENUMERATED = 12;
const MOST_DISTANCE = 8;
/** Pairs to compare in one go, if all differ too little. */
const PAIRS_AT_A_TIME = 64;
