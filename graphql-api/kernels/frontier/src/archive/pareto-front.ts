/**
 * Portfolios of which none beats another, in order of cost (and so of benefit). Costs, benefits and slots stand in
 * typed arrays: a place is found by bisection in O(log n), then the tail moves in one copy. A portfolio's choices
 * lie in a slot of their own; the slot of a beaten one is used again.
 */
export class ParetoFront {
  private costs = new Float64Array(FIRST_CAPACITY);
  private benefits = new Float64Array(FIRST_CAPACITY);
  private slots = new Int32Array(FIRST_CAPACITY);
  private count = 0;

  private choices: Int32Array;
  private freeSlots: number[] = [];
  private slotsUsed = 0;
  private beatenCount = 0;

  /**
   * @param choicesLength figures that describe one portfolio
   * @param onBeaten told of every member that leaves
   */
  constructor(
    private readonly choicesLength: number,
    private readonly onBeaten: (benefit: number, cost: number) => void = () => undefined,
  ) {
    this.choices = new Int32Array(FIRST_CAPACITY * choicesLength);
  }

  get size(): number {
    return this.count;
  }

  /** Members that were in the front once and are no more. */
  get sinceBeaten(): number {
    return this.beatenCount;
  }

  costAt(place: number): number {
    return this.costs[place];
  }

  benefitAt(place: number): number {
    return this.benefits[place];
  }

  /** Stays the same as long as the member stays in the front, whereas its place shifts. */
  slotAt(place: number): number {
    return this.slots[place];
  }

  /** The choices of a member, as a view: valid until the next offer. */
  choicesAt(place: number): Int32Array {
    const start = this.slots[place] * this.choicesLength;
    return this.choices.subarray(start, start + this.choicesLength);
  }

  /** The most benefit of a member that costs no more; minus infinity if there is none. */
  bestBenefitWithin(cost: number): number {
    const place = this.placeAfter(cost);
    return place === 0 ? -Infinity : this.benefits[place - 1];
  }

  /**
   * Takes a portfolio in unless a member is at least as good in both figures, and drops the members it beats; of
   * equals the first stays. Returns the slot it went to, or -1.
   */
  offer(benefit: number, cost: number, choices: Int32Array): number {
    const after = this.placeAfter(cost);
    if (after > 0 && this.benefits[after - 1] >= benefit) return -1;
    const from = after > 0 && this.costs[after - 1] === cost ? after - 1 : after;
    let to = after;
    while (to < this.count && this.benefits[to] <= benefit) to++;
    this.release(from, to);
    this.makeRoom(from, to);
    const slot = this.takeSlot();
    this.costs[from] = cost;
    this.benefits[from] = benefit;
    this.slots[from] = slot;
    this.choices.set(choices, slot * this.choicesLength);
    return slot;
  }

  /** The points as [cost, benefit], in order of cost. */
  points(): [number, number][] {
    return Array.from({ length: this.count }, (_, place) => [this.costs[place], this.benefits[place]]);
  }

  /** The first place whose cost is above the given one. */
  private placeAfter(cost: number): number {
    const costs = this.costs;
    let low = 0;
    let high = this.count;
    while (low < high) {
      const middle = (low + high) >>> 1;
      if (costs[middle] <= cost) low = middle + 1;
      else high = middle;
    }
    return low;
  }

  private release(from: number, to: number): void {
    for (let place = from; place < to; place++) {
      this.freeSlots.push(this.slots[place]);
      this.onBeaten(this.benefits[place], this.costs[place]);
    }
    this.beatenCount += to - from;
  }

  /** Shifts the tail so that the places from..to become exactly one. */
  private makeRoom(from: number, to: number): void {
    if (this.count + 1 > this.costs.length) this.grow();
    if (to !== from + 1) {
      this.costs.copyWithin(from + 1, to, this.count);
      this.benefits.copyWithin(from + 1, to, this.count);
      this.slots.copyWithin(from + 1, to, this.count);
    }
    this.count += from + 1 - to;
  }

  private takeSlot(): number {
    const freed = this.freeSlots.pop();
    if (freed !== undefined) return freed;
    const slot = this.slotsUsed++;
    if (this.slotsUsed * this.choicesLength > this.choices.length) {
      const larger = new Int32Array(2 * this.slotsUsed * this.choicesLength);
      larger.set(this.choices);
      this.choices = larger;
    }
    return slot;
  }

  private grow(): void {
    const capacity = 2 * this.costs.length;
    const [costs, benefits, slots] = [this.costs, this.benefits, this.slots];
    this.costs = new Float64Array(capacity);
    this.costs.set(costs);
    this.benefits = new Float64Array(capacity);
    this.benefits.set(benefits);
    this.slots = new Int32Array(capacity);
    this.slots.set(slots);
  }
}

const FIRST_CAPACITY = 256;
