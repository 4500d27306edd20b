import { ChoiceStore } from '../archive/choice-store.js';
import { risingPart } from './bound-line.js';
import { DominanceTree } from './dominance-tree.js';

/**
 * Portfolios of which none is matched or beaten by another in benefit, cost and second cost together. A member keeps
 * its slot as long as it stays; the slot of a beaten one is used again.
 */
export class ParetoSurface {
  private readonly tree = new DominanceTree((slot) => this.release(slot));
  private readonly choices: ChoiceStore;
  private readonly classCount: number;
  private readonly freeSlots: number[] = [];
  private slotsUsed = 0;
  private member = new Uint8Array(256);
  private beatenCount = 0;

  /**
   * @param optionStart the options of class k are those from optionStart[k] up to optionStart[k + 1]
   * @param onBeaten told of every member that leaves
   */
  constructor(
    optionStart: Int32Array,
    private readonly onBeaten: (benefit: number, cost: number) => void = () => undefined,
  ) {
    this.choices = new ChoiceStore(optionStart);
    this.classCount = optionStart.length - 1;
  }

  get size(): number {
    return this.tree.size;
  }

  /** Members that were in the surface once and are no more. */
  get sinceBeaten(): number {
    return this.beatenCount;
  }

  benefitOf(slot: number): number {
    return -this.tree.figureOf(slot, 0);
  }

  costOf(slot: number): number {
    return this.tree.figureOf(slot, 1);
  }

  secondCostOf(slot: number): number {
    return this.tree.figureOf(slot, 2);
  }

  /** The most benefit of a member; undefined if there is none. */
  get mostBenefit(): number | undefined {
    return this.size > 0 ? -this.tree.least(0) : undefined;
  }

  /** How far apart the members lie in each objective. */
  spread(): { benefit: number; cost: number; secondCost: number } {
    const [benefit, cost, secondCost] = [0, 1, 2].map((figure) => {
      return Math.max(0, this.tree.most(figure) - this.tree.least(figure));
    });
    return { benefit, cost, secondCost };
  }

  /** Slots that have ever been used: from 0 up to, not including, this. */
  get slotsEver(): number {
    return this.slotsUsed;
  }

  isMember(slot: number): boolean {
    return this.member[slot] === 1;
  }

  /** The chosen option of each class of a member, as an array of its own. */
  choicesOf(slot: number): Int32Array {
    return this.choices.get(slot, new Int32Array(this.classCount));
  }

  /** Whether a member is at least as good in all three figures. */
  isBeaten(benefit: number, cost: number, secondCost: number): boolean {
    return this.tree.covers(-benefit, cost, secondCost);
  }

  /** Whether a portfolio of these figures would beat or match a member. */
  wouldBeat(benefit: number, cost: number, secondCost: number): boolean {
    return this.tree.wouldCover(-benefit, cost, secondCost);
  }

  /** The least second cost of a member that is at least as good in benefit and cost; infinity if there is none. */
  leastSecondCost(benefit: number, cost: number): number {
    const slots = this.tree.slotsCovering(-benefit, cost, Infinity);
    return slots.reduce((least, slot) => Math.min(least, this.secondCostOf(slot)), Infinity);
  }

  /** The front in benefit and cost of the members at least as good as these figures, in order of cost. */
  frontWithin(benefit: number, cost: number, secondCost: number): [cost: number, benefit: number][] {
    const slots = this.tree.slotsCovering(-benefit, cost, secondCost);
    const points = slots.map((slot): [number, number] => [this.costOf(slot), this.benefitOf(slot)]);
    return risingPart(points);
  }

  /**
   * Takes a portfolio in unless a member is at least as good in all three figures, and drops the members it beats; of
   * equals the first stays. Returns the slot it went to, or -1.
   */
  offer(benefit: number, cost: number, secondCost: number, chosen: Int32Array): number {
    if (this.isBeaten(benefit, cost, secondCost)) return -1;
    const slot = this.freeSlots.pop() ?? this.slotsUsed++;
    this.tree.insert(slot, -benefit, cost, secondCost);
    this.choices.put(slot, chosen);
    this.markMember(slot);
    return slot;
  }

  /** The slots of all members in order of cost, of equal ones in order of second cost. */
  slots(): Int32Array {
    const { tree } = this;
    return tree.slots().sort((one, other) => {
      return (
        tree.figureOf(one, 1) - tree.figureOf(other, 1) || tree.figureOf(one, 2) - tree.figureOf(other, 2)
      );
    });
  }

  private markMember(slot: number): void {
    if (slot >= this.member.length) {
      const larger = new Uint8Array(2 * slot);
      larger.set(this.member);
      this.member = larger;
    }
    this.member[slot] = 1;
  }

  private release(slot: number): void {
    this.member[slot] = 0;
    this.freeSlots.push(slot);
    this.beatenCount++;
    this.onBeaten(this.benefitOf(slot), this.costOf(slot));
  }
}
