import { BoxTree, LEAF, ROOT } from './box-tree.js';

/**
 * Points of three figures, all better when lower, of which none is matched or beaten by another. They lie in the
 * leaves of a binary tree whose nodes know the box around what is below them, and a question goes only where a box
 * leaves the answer open: a whole branch is passed over, or decided, by its best and its worst corner (the rules of
 * the ND-tree: Jaszkiewicz and Lust 2018, "ND-Tree-based update: a fast algorithm for the dynamic nondominance
 * problem"; from memory). Unlike there, a full leaf is cut in two at the median of its longest side, boxes are
 * tightened when points leave, and a branch that has grown one-sided is laid out anew, so that points offered in any
 * order keep the depth logarithmic.
 */
export class DominanceTree {
  private readonly tree = new BoxTree();
  /** Nodes still to be looked at, kept between questions. */
  private readonly open: number[] = [];
  /** The point that last answered a question. It may have left since: what beat it then answers for it. */
  private readonly last = Float64Array.of(Infinity, Infinity, Infinity);

  /** @param onCovered told the slot of every point that leaves */
  constructor(private readonly onCovered: (slot: number) => void) {}

  get size(): number {
    return this.tree.counts[ROOT];
  }

  /** Figure 0, 1 or 2 of the point in a slot. */
  figureOf(slot: number, figure: number): number {
    return this.tree.figures[3 * slot + figure];
  }

  /** The least of a figure among all points; infinity if there are none. */
  least(figure: number): number {
    return this.tree.boxes[6 * ROOT + figure];
  }

  /** The most of a figure among all points; minus infinity if there are none. */
  most(figure: number): number {
    return this.tree.boxes[6 * ROOT + 3 + figure];
  }

  /** Whether some point is as low or lower in all three figures. */
  covers(x: number, y: number, z: number): boolean {
    const { last, open } = this;
    const { boxes, lefts, counts } = this.tree;
    if (last[0] <= x && last[1] <= y && last[2] <= z) return true;
    if (counts[ROOT] === 0) return false;
    open.length = 0;
    open.push(ROOT);
    for (let node = open.pop(); node !== undefined; node = open.pop()) {
      const box = 6 * node;
      if (boxes[box] > x || boxes[box + 1] > y || boxes[box + 2] > z) continue;
      const left = lefts[node];
      if (left < 0) {
        if (this.leafCovers(node, x, y, z)) return true;
        continue;
      }
      if (boxes[box + 3] <= x && boxes[box + 4] <= y && boxes[box + 5] <= z) return true;
      open.push(left, left + 1);
    }
    return false;
  }

  /** Whether figures as low as these would cover some point. */
  wouldCover(x: number, y: number, z: number): boolean {
    const { boxes, lefts, counts, figures, leafSlots } = this.tree;
    const open = [ROOT];
    for (let node = open.pop(); node !== undefined; node = open.pop()) {
      const box = 6 * node;
      if (boxes[box + 3] < x || boxes[box + 4] < y || boxes[box + 5] < z) continue;
      if (boxes[box] >= x && boxes[box + 1] >= y && boxes[box + 2] >= z) return counts[node] > 0;
      if (lefts[node] >= 0) {
        open.push(lefts[node], lefts[node] + 1);
        continue;
      }
      for (let at = LEAF * node; at < LEAF * node + counts[node]; at++) {
        const point = 3 * leafSlots[at];
        if (figures[point] >= x && figures[point + 1] >= y && figures[point + 2] >= z) return true;
      }
    }
    return false;
  }

  /** The slots of all points that are as low or lower in all three figures. */
  slotsCovering(x: number, y: number, z: number): number[] {
    const { boxes, lefts, counts, figures, leafSlots } = this.tree;
    const covering: number[] = [];
    const open = [ROOT];
    for (let node = open.pop(); node !== undefined; node = open.pop()) {
      const box = 6 * node;
      if (boxes[box] > x || boxes[box + 1] > y || boxes[box + 2] > z) continue;
      if (lefts[node] >= 0) {
        open.push(lefts[node], lefts[node] + 1);
        continue;
      }
      for (let at = LEAF * node; at < LEAF * node + counts[node]; at++) {
        const point = 3 * leafSlots[at];
        if (figures[point] <= x && figures[point + 1] <= y && figures[point + 2] <= z) {
          covering.push(leafSlots[at]);
        }
      }
    }
    return covering;
  }

  /** Takes in a point that none covers, under a slot no other has, and drops those that it covers. */
  insert(slot: number, x: number, y: number, z: number): void {
    this.dropCovered(ROOT, x, y, z);
    this.tree.insert(slot, x, y, z);
  }

  /** The slots of all points, in no order that means anything. */
  slots(): Int32Array {
    return this.tree.slotsBelow(ROOT);
  }

  private leafCovers(node: number, x: number, y: number, z: number): boolean {
    const { last } = this;
    const { figures, leafSlots, counts } = this.tree;
    const end = LEAF * node + counts[node];
    for (let at = LEAF * node; at < end; at++) {
      const point = 3 * leafSlots[at];
      if (figures[point] > x || figures[point + 1] > y || figures[point + 2] > z) continue;
      last[0] = figures[point];
      last[1] = figures[point + 1];
      last[2] = figures[point + 2];
      return true;
    }
    return false;
  }

  /** Drops the points below a node that a new one covers; its box and count are true afterwards. */
  private dropCovered(node: number, x: number, y: number, z: number): void {
    const { tree } = this;
    const { boxes, counts } = tree;
    const box = 6 * node;
    if (counts[node] === 0 || boxes[box + 3] < x || boxes[box + 4] < y || boxes[box + 5] < z) return;
    if (boxes[box] >= x && boxes[box + 1] >= y && boxes[box + 2] >= z) {
      for (const slot of tree.slotsBelow(node)) this.onCovered(slot);
      tree.clear(node);
      return;
    }
    const left = tree.lefts[node];
    if (left < 0) {
      this.dropFromLeaf(node, x, y, z);
      return;
    }
    const before = counts[node];
    this.dropCovered(left, x, y, z);
    this.dropCovered(left + 1, x, y, z);
    counts[node] = counts[left] + counts[left + 1];
    if (counts[node] < before) tree.tighten(node);
  }

  private dropFromLeaf(node: number, x: number, y: number, z: number): void {
    const { tree } = this;
    const { figures, leafSlots, counts } = tree;
    const start = LEAF * node;
    let kept = 0;
    for (let at = start; at < start + counts[node]; at++) {
      const slot = leafSlots[at];
      const point = 3 * slot;
      if (figures[point] >= x && figures[point + 1] >= y && figures[point + 2] >= z) this.onCovered(slot);
      else leafSlots[start + kept++] = slot;
    }
    if (kept === counts[node]) return;
    tree.clear(node);
    for (let at = start; at < start + kept; at++) tree.stretchBy(node, leafSlots[at]);
  }
}
