/**
 * The step line of the best points known in a stretch of cost: the most benefit seen at no more than each cost. Typed
 * arrays in order of cost; a place is found by bisection.
 */
export class StepLine {
  private costs = new Float64Array(64);
  private benefits = new Float64Array(64);
  private count = 0;

  constructor(points: readonly (readonly [cost: number, benefit: number])[]) {
    for (const [cost, benefit] of points) this.raise(cost, benefit);
  }

  /** The most benefit at no more than a cost; minus infinity if nothing costs so little. */
  at(cost: number): number {
    const place = this.placeAfter(cost);
    return place === 0 ? -Infinity : this.benefits[place - 1];
  }

  /** Whether a point is one of the line's steps. */
  has(cost: number, benefit: number): boolean {
    const place = this.placeAfter(cost) - 1;
    return place >= 0 && this.costs[place] === cost && this.benefits[place] === benefit;
  }

  /** Raises the line by a point; false if it lies on or below the line. */
  raise(cost: number, benefit: number): boolean {
    let from = this.placeAfter(cost);
    if (from > 0 && this.benefits[from - 1] >= benefit) return false;
    if (from > 0 && this.costs[from - 1] === cost) from--;
    let to = from;
    while (to < this.count && this.benefits[to] <= benefit) to++;
    if (this.count === this.costs.length) this.grow();
    this.costs.copyWithin(from + 1, to, this.count);
    this.benefits.copyWithin(from + 1, to, this.count);
    this.costs[from] = cost;
    this.benefits[from] = benefit;
    this.count += 1 - (to - from);
    return true;
  }

  points(): Point[] {
    return this.pointsBetween(0, this.count);
  }

  /** What makes up the line over a stretch: its points there, and the last one before. */
  pointsFor({ from, to }: Stretch): Point[] {
    return this.pointsBetween(Math.max(0, this.placeAfter(from) - 1), this.placeAfter(to));
  }

  /**
   * How far a straight line `height + slope × cost` lies above the least improvement of this one, at most, for the
   * costs of a stretch, and where it first and last lies above it. An improvement is more benefit by at least `step`.
   * Undefined if it lies above it nowhere, by `slack` at least.
   */
  widestGap({ height, slope }: Tangent, { from, to }: Stretch, { step, slack }: Precision): Gap | undefined {
    let gap = -slack;
    let first = Infinity;
    let last = -Infinity;
    for (let place = this.placeAfter(from) - 1; place < this.count; place++) {
      const start = place < 0 ? from : Math.max(from, this.costs[place]);
      if (start > to) break;
      const end = place + 1 < this.count ? Math.min(to, this.costs[place + 1] - 1) : to;
      const asked = place < 0 ? 0 : this.benefits[place] + step;
      const above = height + slope * end - asked;
      if (above < -slack) continue;
      gap = Math.max(gap, above);
      if (first === Infinity)
        first = slope > 0 ? Math.max(start, Math.floor((asked - slack - height) / slope)) : start;
      last = end;
    }
    return first > last ? undefined : { gap: gap + slack, from: first, to: last };
  }

  private pointsBetween(first: number, end: number): Point[] {
    return Array.from({ length: end - first }, (_, place) => [
      this.costs[first + place],
      this.benefits[first + place],
    ]);
  }

  /** Place of the first point that costs more. */
  private placeAfter(cost: number): number {
    let low = 0;
    let high = this.count;
    while (low < high) {
      const middle = (low + high) >> 1;
      if (this.costs[middle] <= cost) low = middle + 1;
      else high = middle;
    }
    return low;
  }

  private grow(): void {
    const costs = new Float64Array(2 * this.costs.length);
    const benefits = new Float64Array(2 * this.benefits.length);
    costs.set(this.costs);
    benefits.set(this.benefits);
    this.costs = costs;
    this.benefits = benefits;
  }
}

type Point = [cost: number, benefit: number];

/** A straight line above every portfolio of some part: its benefit is at most height + slope × its cost. */
export interface Tangent {
  readonly height: number;
  readonly slope: number;
}

/** Costs from one to another, both included. */
export interface Stretch {
  readonly from: number;
  readonly to: number;
}

/** A stretch in which something may lie below a tangent, and how far below it at most. */
export interface Gap extends Stretch {
  readonly gap: number;
}

export interface Precision {
  /** The least difference between two benefits: what all of them are multiples of. */
  readonly step: number;
  /** How far a figure added up in floating point may be off. */
  readonly slack: number;
}
