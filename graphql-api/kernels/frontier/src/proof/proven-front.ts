import { ParetoFront } from '../archive/pareto-front.js';
import type { Model } from '../model/model.js';

/**
 * A front that comes out the same in whatever order it is filled: of portfolios with the same benefit and cost it
 * keeps the one whose choices come first, class by class.
 */
export class ProvenFront {
  readonly front: ParetoFront;
  private readonly other: Int32Array;

  constructor(model: Model) {
    this.front = new ParetoFront(model.optionStart);
    this.other = new Int32Array(model.classCount);
  }

  offer(benefit: number, cost: number, chosen: Int32Array): void {
    const { front, other } = this;
    if (front.offer(benefit, cost, chosen) >= 0) return;
    const place = front.placeWithin(cost);
    if (front.costAt(place) !== cost || front.benefitAt(place) !== benefit) return;
    if (comesFirst(chosen, front.choicesAt(place, other))) front.rechoose(place, chosen);
  }

  /** Offers every member of another front. */
  offerAll(members: ParetoFront): void {
    const chosen = new Int32Array(this.other.length);
    for (let place = 0; place < members.size; place++) {
      this.offer(members.benefitAt(place), members.costAt(place), members.choicesAt(place, chosen));
    }
  }

  /** Takes in the points of another front that are new. Quicker, for in between: of equals the first stays. */
  offerNew(members: ParetoFront): void {
    for (let place = 0; place < members.size; place++) {
      const [benefit, cost] = [members.benefitAt(place), members.costAt(place)];
      if (this.front.bestBenefitWithin(cost) >= benefit) continue;
      this.front.offer(benefit, cost, members.choicesAt(place));
    }
  }
}

function comesFirst(one: Int32Array, other: Int32Array): boolean {
  for (let k = 0; k < one.length; k++) if (one[k] !== other[k]) return one[k] < other[k];
  return false;
}
