import { ChoiceStore } from './choice-store.js';

/**
 * Portfolios of which none beats another, in order of cost (and so of benefit). They lie in leaves of a few dozen
 * members, the leaves in order: a member is found by bisection over the leaves and then within one, and to take one
 * in moves part of its leaf only, however many members there are. A portfolio's choices lie in a slot of their own;
 * the slot of a beaten one is used again.
 */
export class ParetoFront {
  /**
   * Leaf l has its members from home[l] on in the three arrays below: leafSize[l] of them, room for LEAF. The costs
   * in free room are Infinity.
   */
  private costs = new Float64Array(FIRST_LEAVES * LEAF).fill(Infinity);
  private benefits = new Float64Array(FIRST_LEAVES * LEAF);
  private slots = new Int32Array(FIRST_LEAVES * LEAF);

  /** In order of cost. None is empty but the first of an empty front. */
  private home = new Int32Array(FIRST_LEAVES);
  private leafSize = new Int32Array(FIRST_LEAVES);
  /** The cost of a leaf's first member, side by side for the bisection. */
  private leastCost = new Float64Array(FIRST_LEAVES);
  private leafCount = 1;
  private readonly freeHomes: number[] = [];
  private homesUsed = 1;

  private count = 0;
  private readonly classCount: number;
  private readonly choices: ChoiceStore;
  private readonly freeSlots: number[] = [];
  private slotsUsed = 0;
  private beatenCount = 0;

  /** The leaf last asked for by place and the place of its first member: a walk by place finds the next at once. */
  private walkLeaf = 0;
  private walkFrom = 0;

  /**
   * @param optionStart the options of class k are those from optionStart[k] up to optionStart[k + 1]
   * @param onBeaten told of every member that leaves
   */
  constructor(
    optionStart: Int32Array,
    private readonly onBeaten: (benefit: number, cost: number) => void = () => undefined,
  ) {
    this.classCount = optionStart.length - 1;
    this.choices = new ChoiceStore(optionStart);
  }

  get size(): number {
    return this.count;
  }

  /** Members that were in the front once and are no more. */
  get sinceBeaten(): number {
    return this.beatenCount;
  }

  costAt(place: number): number {
    return this.costs[this.memberAt(place)];
  }

  benefitAt(place: number): number {
    return this.benefits[this.memberAt(place)];
  }

  /** Stays the same as long as the member stays in the front, whereas its place shifts. */
  slotAt(place: number): number {
    return this.slots[this.memberAt(place)];
  }

  /** The chosen option of each class of a member, in an array of its own or in the one given. */
  choicesAt(place: number, into: Int32Array = new Int32Array(this.classCount)): Int32Array {
    return this.choices.get(this.slotAt(place), into);
  }

  /** Gives a member other choices of the same benefit and cost. */
  rechoose(place: number, chosen: Int32Array): void {
    this.choices.put(this.slotAt(place), chosen);
  }

  /** The place of the dearest member that costs no more; -1 if there is none. */
  placeWithin(cost: number): number {
    const leaf = this.leafOf(cost);
    while (this.walkLeaf < leaf) this.walkFrom += this.leafSize[this.walkLeaf++];
    while (this.walkLeaf > leaf) this.walkFrom -= this.leafSize[--this.walkLeaf];
    return this.walkFrom + this.memberAfter(leaf, cost) - this.home[leaf] - 1;
  }

  /** The most benefit of a member that costs no more; minus infinity if there is none. */
  bestBenefitWithin(cost: number): number {
    const leaf = this.leafOf(cost);
    const after = this.memberAfter(leaf, cost);
    return after === this.home[leaf] ? -Infinity : this.benefits[after - 1];
  }

  /**
   * Takes a portfolio in unless a member is at least as good in both figures, and drops the members it beats; of
   * equals the first stays. `chosen` holds the option of each class. Returns the slot it went to, or -1.
   */
  offer(benefit: number, cost: number, chosen: Int32Array): number {
    const leaf = this.leafOf(cost);
    const after = this.memberAfter(leaf, cost);
    const start = this.home[leaf];
    if (after > start && this.benefits[after - 1] >= benefit) return -1;
    const from = after > start && this.costs[after - 1] === cost ? after - 1 : after;
    const end = start + this.leafSize[leaf];
    let to = after;
    while (to < end && this.benefits[to] <= benefit) to++;
    this.release(from, to);
    if (to === end) this.dropBeatenLeaves(leaf + 1, benefit);
    const slot = this.freeSlots.pop() ?? this.slotsUsed++;
    this.place(leaf, from, to, benefit, cost, slot);
    this.choices.put(slot, chosen);
    this.walkLeaf = 0;
    this.walkFrom = 0;
    return slot;
  }

  /** The points as [cost, benefit], in order of cost. */
  points(): [number, number][] {
    return Array.from({ length: this.count }, (_, place) => [this.costAt(place), this.benefitAt(place)]);
  }

  /** The last leaf that begins at no more than the cost, or the first. */
  private leafOf(cost: number): number {
    const { leastCost } = this;
    let low = 0;
    let high = this.leafCount - 1;
    while (low < high) {
      const middle = (low + high + 1) >>> 1;
      if (leastCost[middle] <= cost) low = middle;
      else high = middle - 1;
    }
    return low;
  }

  /**
   * Index into the arrays of the first member of a leaf that costs more, or of the end of the leaf. It counts what
   * costs no more, first in strides and then within one: no step waits for the one before, whereas a bisection waits
   * for memory or a wrongly guessed branch at nearly every step.
   */
  private memberAfter(leaf: number, cost: number): number {
    const { costs } = this;
    const start = this.home[leaf];
    let strides = 0;
    for (let at = start + STRIDE; at < start + LEAF; at += STRIDE) strides += Number(costs[at] <= cost);
    const from = start + strides * STRIDE;
    let after = from;
    for (let at = from; at < from + STRIDE; at++) after += Number(costs[at] <= cost);
    // beyond the last member stands Infinity, which is no more than an infinite cost
    return Math.min(after, start + this.leafSize[leaf]);
  }

  /** Index into the arrays of the member at a place; goes there leaf by leaf from where it last was. */
  private memberAt(place: number): number {
    if (place < 0 || place >= this.count) return NOWHERE;
    const { leafSize } = this;
    while (place < this.walkFrom) this.walkFrom -= leafSize[--this.walkLeaf];
    while (place >= this.walkFrom + leafSize[this.walkLeaf]) this.walkFrom += leafSize[this.walkLeaf++];
    return this.home[this.walkLeaf] + place - this.walkFrom;
  }

  private release(from: number, to: number): void {
    for (let member = from; member < to; member++) {
      this.freeSlots.push(this.slots[member]);
      this.onBeaten(this.benefits[member], this.costs[member]);
    }
    this.beatenCount += to - from;
    this.count -= to - from;
  }

  /** Drops from the leaf on, which follows the newcomer's, all members it beats; they come first. */
  private dropBeatenLeaves(leaf: number, benefit: number): void {
    while (leaf < this.leafCount) {
      const start = this.home[leaf];
      const end = start + this.leafSize[leaf];
      let to = start;
      while (to < end && this.benefits[to] <= benefit) to++;
      this.release(start, to);
      if (to < end) {
        this.move(to, end, start);
        this.setLeafSize(leaf, end - to);
        this.leastCost[leaf] = this.costs[start];
        return;
      }
      this.setLeafSize(leaf, 0);
      this.freeHomes.push(start);
      this.leafCount--;
      this.shiftLeaves(leaf + 1, this.leafCount + 1, leaf);
    }
  }

  /** Puts a member in the place of those from..to of a leaf. */
  private place(leaf: number, from: number, to: number, benefit: number, cost: number, slot: number): void {
    if (from === to && this.leafSize[leaf] === LEAF) {
      const beyond = from - this.home[leaf] - this.split(leaf, from);
      if (beyond >= 0) from = to = this.home[++leaf] + beyond;
    }
    if (to !== from + 1) this.move(to, this.home[leaf] + this.leafSize[leaf], from + 1);
    this.setLeafSize(leaf, this.leafSize[leaf] + from + 1 - to);
    this.count++;
    this.costs[from] = cost;
    this.benefits[from] = benefit;
    this.slots[from] = slot;
    this.leastCost[leaf] = this.costs[this.home[leaf]];
  }

  /**
   * Gives the upper half of a full leaf to a new one after it; nothing where the newcomer goes to the very end, so
   * that a front filled in order of cost has full leaves. Returns how many members stay.
   */
  private split(leaf: number, newcomer: number): number {
    const end = this.home[leaf] + LEAF;
    const kept = newcomer === end && leaf === this.leafCount - 1 ? LEAF : LEAF >> 1;
    const home = this.freeHomes.pop() ?? this.newHome();
    if (this.leafCount === this.home.length) this.growLeaves();
    this.shiftLeaves(leaf + 1, this.leafCount, leaf + 2);
    this.leafCount++;
    this.move(this.home[leaf] + kept, end, home);
    this.home[leaf + 1] = home;
    this.leafSize[leaf + 1] = LEAF - kept;
    this.leastCost[leaf + 1] = this.costs[home];
    this.setLeafSize(leaf, kept);
    return kept;
  }

  private setLeafSize(leaf: number, size: number): void {
    const before = this.leafSize[leaf];
    this.leafSize[leaf] = size;
    if (size < before) this.costs.fill(Infinity, this.home[leaf] + size, this.home[leaf] + before);
  }

  private move(from: number, to: number, target: number): void {
    this.costs.copyWithin(target, from, to);
    this.benefits.copyWithin(target, from, to);
    this.slots.copyWithin(target, from, to);
  }

  private shiftLeaves(from: number, to: number, target: number): void {
    this.home.copyWithin(target, from, to);
    this.leafSize.copyWithin(target, from, to);
    this.leastCost.copyWithin(target, from, to);
  }

  private newHome(): number {
    const home = this.homesUsed++ * LEAF;
    if (home === this.costs.length) {
      this.costs = lengthened(this.costs, new Float64Array(2 * home).fill(Infinity));
      this.benefits = lengthened(this.benefits, new Float64Array(2 * home));
      this.slots = lengthened(this.slots, new Int32Array(2 * home));
    }
    return home;
  }

  private growLeaves(): void {
    const room = 2 * this.leafCount;
    this.home = lengthened(this.home, new Int32Array(room));
    this.leafSize = lengthened(this.leafSize, new Int32Array(room));
    this.leastCost = lengthened(this.leastCost, new Float64Array(room));
  }
}

const LEAF = 64;
const STRIDE = 8;
const FIRST_LEAVES = 8;
/** No index: what is read there is undefined. */
const NOWHERE = -1;

function lengthened<T extends Float64Array | Int32Array>(array: T, longer: T): T {
  longer.set(array);
  return longer;
}
