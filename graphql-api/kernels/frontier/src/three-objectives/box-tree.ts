/** The points of a DominanceTree and the boxes they lie in: where a point goes, and how the tree stays balanced. */
export class BoxTree {
  /** Three figures per slot. A slot is the caller's number for a point. */
  figures = new Float64Array(3 * 256);

  /** Six per node: the least and then the most of each figure below it. */
  boxes = new Float64Array(6 * FIRST_NODES);
  /** Points below each node. */
  counts = new Int32Array(FIRST_NODES);
  /** Children of an inner node, side by side: left and left + 1; -1 for a leaf. */
  lefts = new Int32Array(FIRST_NODES).fill(-1);
  /** The slots in a leaf, from LEAF * node on. */
  leafSlots = new Int32Array(LEAF * FIRST_NODES);

  private cutFigure = new Uint8Array(FIRST_NODES);
  /** Left of it lie the points whose figure is lower. */
  private cutAt = new Float64Array(FIRST_NODES);
  /** Nodes come in pairs of siblings; the root stands alone in the first pair. */
  private nodesUsed = 2;
  private freePairs: number[] = [];

  constructor() {
    this.clear(ROOT);
  }

  /** Takes in a point under a slot no other has. */
  insert(slot: number, x: number, y: number, z: number): void {
    if (3 * slot + 3 > this.figures.length) this.figures = doubled(this.figures, 3 * slot + 3);
    this.figures[3 * slot] = x;
    this.figures[3 * slot + 1] = y;
    this.figures[3 * slot + 2] = z;
    let node = ROOT;
    for (;;) {
      this.stretch(node, x, y, z);
      if (this.isLopsided(node)) this.layOutAnew(node);
      if (this.lefts[node] < 0) break;
      node = this.lefts[node] + (this.figures[3 * slot + this.cutFigure[node]] < this.cutAt[node] ? 0 : 1);
    }
    this.addToLeaf(node, slot);
  }

  /** After a loss below it: an inner node takes the place of an emptied child's sibling, or its box is drawn in. */
  tighten(node: number): void {
    const { counts, lefts } = this;
    const left = lefts[node];
    if (counts[left] === 0 || counts[left + 1] === 0) {
      this.becomeCopyOf(node, counts[left] === 0 ? left + 1 : left);
      this.freePairs.push(left);
      return;
    }
    const { boxes } = this;
    const box = 6 * node;
    const one = 6 * left;
    for (let side = 0; side < 3; side++) {
      boxes[box + side] = Math.min(boxes[one + side], boxes[one + 6 + side]);
      boxes[box + 3 + side] = Math.max(boxes[one + 3 + side], boxes[one + 9 + side]);
    }
  }

  /** The slots below a node, in no order that means anything. */
  slotsBelow(node: number): Int32Array {
    const slots = new Int32Array(this.counts[node]);
    let filled = 0;
    const open = [node];
    for (let next = open.pop(); next !== undefined; next = open.pop()) {
      const left = this.lefts[next];
      if (left >= 0) {
        open.push(left, left + 1);
        continue;
      }
      const end = LEAF * next + this.counts[next];
      for (let at = LEAF * next; at < end && filled < slots.length; at++)
        slots[filled++] = this.leafSlots[at];
    }
    return slots.subarray(0, filled);
  }

  /** Makes a node an empty leaf and gives back what was below it. */
  clear(node: number): void {
    const left = this.lefts[node];
    if (left >= 0) {
      this.clear(left);
      this.clear(left + 1);
      this.freePairs.push(left);
    }
    this.lefts[node] = -1;
    this.counts[node] = 0;
    this.boxes.fill(Infinity, 6 * node, 6 * node + 3);
    this.boxes.fill(-Infinity, 6 * node + 3, 6 * node + 6);
  }

  /** Draws the point in a slot into a node's box and count. */
  stretchBy(node: number, slot: number): void {
    const point = 3 * slot;
    this.stretch(node, this.figures[point], this.figures[point + 1], this.figures[point + 2]);
  }

  private becomeCopyOf(node: number, other: number): void {
    this.boxes.copyWithin(6 * node, 6 * other, 6 * other + 6);
    this.leafSlots.copyWithin(LEAF * node, LEAF * other, LEAF * other + LEAF);
    this.counts[node] = this.counts[other];
    this.lefts[node] = this.lefts[other];
    this.cutFigure[node] = this.cutFigure[other];
    this.cutAt[node] = this.cutAt[other];
  }

  private addToLeaf(node: number, slot: number): void {
    // descending has counted the new point already
    const count = this.counts[node] - 1;
    if (count < LEAF) {
      this.leafSlots[LEAF * node + count] = slot;
      return;
    }
    const slots = new Int32Array(LEAF + 1);
    slots.set(this.leafSlots.subarray(LEAF * node, LEAF * node + LEAF));
    slots[LEAF] = slot;
    this.layOut(node, slots);
  }

  /** Whether one side of a node holds nearly all that is below it. */
  private isLopsided(node: number): boolean {
    if (this.lefts[node] < 0) return false;
    const count = this.counts[node];
    const left = this.counts[this.lefts[node]];
    return count > LEAST_TO_LAY_OUT && (left > 0.8 * count || left < 0.2 * count);
  }

  private layOutAnew(node: number): void {
    const { boxes, counts } = this;
    const box = boxes.slice(6 * node, 6 * node + 6);
    const count = counts[node];
    this.layOut(node, this.slotsBelow(node));
    // the point on its way down is in the box and the count already
    this.boxes.set(box, 6 * node);
    this.counts[node] = count;
  }

  /** Makes a node the root of a balanced tree over the given points. */
  private layOut(node: number, slots: Int32Array): void {
    this.clear(node);
    for (const slot of slots) this.stretchBy(node, slot);
    if (slots.length <= LEAF) {
      this.leafSlots.set(slots, LEAF * node);
      return;
    }
    const { figure, at: cutAt } = this.bestCut(node, slots);
    const isLeft = (slot: number): boolean => this.figures[3 * slot + figure] < cutAt;
    const left = this.takePair();
    this.lefts[node] = left;
    this.cutFigure[node] = figure;
    this.cutAt[node] = cutAt;
    this.layOut(left, slots.filter(isLeft));
    this.layOut(
      left + 1,
      slots.filter((slot) => !isLeft(slot)),
    );
  }

  /**
   * Across the side that is longest beside the whole, unless ties would make it one-sided: of points that share one
   * figure and do not cover each other no two share another, so some side always cuts well.
   */
  private bestCut(node: number, slots: Int32Array): { figure: number; at: number } {
    const { boxes } = this;
    const length = (box: number, side: number): number => boxes[box + 3 + side] - boxes[box + side];
    const share = [0, 1, 2].map((side) => length(6 * node, side) / (length(6 * ROOT, side) || 1));
    const sides = [0, 1, 2].sort((one, other) => share[other] - share[one]);
    const cuts = sides.map((side) => this.cutInMiddle(slots, side));
    return cuts.find(({ lower }) => lower >= 0.25 && lower <= 0.75) ?? cuts.find(({ lower }) => lower > 0)!;
  }

  /** The cut nearest to the middle of a figure's sorted values, and the share of the points below it. */
  private cutInMiddle(slots: Int32Array, figure: number): { figure: number; at: number; lower: number } {
    const sorted = Float64Array.from(slots, (slot) => this.figures[3 * slot + figure]).sort();
    const middle = sorted.length >> 1;
    let from = middle;
    let to = middle;
    while (from > 0 && sorted[from - 1] === sorted[middle]) from--;
    while (to < sorted.length && sorted[to] === sorted[middle]) to++;
    const cut = to < sorted.length && (from === 0 || to - middle < middle - from) ? to : from;
    return { figure, at: sorted[cut], lower: cut / sorted.length };
  }

  /** Draws a point into a node's box and count. */
  private stretch(node: number, x: number, y: number, z: number): void {
    const { boxes } = this;
    const box = 6 * node;
    if (x < boxes[box]) boxes[box] = x;
    if (y < boxes[box + 1]) boxes[box + 1] = y;
    if (z < boxes[box + 2]) boxes[box + 2] = z;
    if (x > boxes[box + 3]) boxes[box + 3] = x;
    if (y > boxes[box + 4]) boxes[box + 4] = y;
    if (z > boxes[box + 5]) boxes[box + 5] = z;
    this.counts[node]++;
  }

  /** Two nodes side by side; what they held before means nothing. */
  private takePair(): number {
    const pair = this.freePairs.pop() ?? this.nodesUsed;
    if (pair === this.nodesUsed) this.nodesUsed += 2;
    if (this.nodesUsed > this.counts.length) {
      this.boxes = doubled(this.boxes);
      this.counts = doubled(this.counts);
      this.lefts = doubled(this.lefts);
      this.cutFigure = doubled(this.cutFigure);
      this.cutAt = doubled(this.cutAt);
      this.leafSlots = doubled(this.leafSlots);
    }
    this.lefts.fill(-1, pair, pair + 2);
    return pair;
  }
}

export const ROOT = 0;
/** Points in a leaf at most. */
export const LEAF = 16;
const FIRST_NODES = 64;
const LEAST_TO_LAY_OUT = 8 * LEAF;

function doubled<T extends Float64Array | Int32Array | Uint8Array>(array: T, least = 0): T {
  const Kind = array.constructor as new (length: number) => T;
  const larger = new Kind(Math.max(2 * array.length, least));
  larger.set(array);
  return larger;
}
