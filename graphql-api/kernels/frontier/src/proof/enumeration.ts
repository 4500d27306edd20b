import type { Deviations } from './deviations.js';
import type { Goal } from './goal.js';
import { Reach } from './reach.js';
import type { Stretch } from './step-line.js';

/** What an enumeration works on. Wanted portfolios go to the goal, which then wants less. */
export interface EnumerationTask {
  readonly deviations: Deviations;
  readonly prices: Float64Array;
  readonly stretch: Stretch;
  readonly goal: Goal;
}

/**
 * Runs through all portfolios of a part that lose no more than a cap at its prices, with cost in a stretch: changes of
 * the best options are added one class after the other, in order of loss, and a branch is left as soon as
 *
 * - its loss passes the cap, or what the cap has sunk to meanwhile;
 * - the changes still to come cannot bring its cost into the stretch or a broken row back within its bound, neither
 *   all together nor for the loss that is left;
 * - rows with a price stay so far unused that this, too, loses more than is left.
 *
 * A portfolio that the goal wants loses no more than the gap below the tangent. So once a cap as
 * wide as the gap has been run through, nothing in this part and stretch is missing. Depth-first with its own stack:
 * this loop is where a proof spends its time, and a call for each branch would cost more than the branch.
 */
export class Enumeration {
  /** Branches looked at in all runs. */
  branches = 0;

  private readonly reach: Reach;
  private readonly activity: Float64Array;
  private readonly isBroken: Uint8Array;
  private readonly broken: Int32Array;
  private readonly placeOfBroken: Int32Array;
  private brokenCount = 0;

  private readonly next: Int32Array;
  private readonly end: Int32Array;
  private readonly made: Int32Array;
  private readonly loss: Float64Array;
  private readonly benefit: Float64Array;
  private readonly cost: Float64Array;
  private readonly wide: Float64Array;

  constructor(private readonly task: EnumerationTask) {
    const { deviations } = task;
    const depth = deviations.classCount + 1;
    const rows = deviations.part.row.length;
    this.reach = new Reach(deviations);
    this.activity = deviations.activity.slice();
    this.isBroken = new Uint8Array(rows);
    this.broken = new Int32Array(rows);
    this.placeOfBroken = new Int32Array(rows);
    this.next = new Int32Array(depth);
    this.end = new Int32Array(depth);
    this.made = new Int32Array(depth);
    this.loss = new Float64Array(depth);
    this.benefit = new Float64Array(depth);
    this.cost = new Float64Array(depth);
    this.wide = new Float64Array(depth * deviations.wideRow.length);
    const isWide = new Uint8Array(rows);
    for (const row of deviations.wideRow) isWide[row] = 1;
    for (let row = 0; row < rows; row++) {
      if (isWide[row] === 0 && this.activity[row] > deviations.part.rowMost[row]) this.breakRow(row);
    }
  }

  /** Runs up to a cap on the loss, looking at so many branches at most; true if it got through. */
  run(cap: number, mostBranches: number): boolean {
    const { task, reach, next, made, loss, benefit, cost, wide } = this;
    const { deviations, stretch, prices } = task;
    const { start, classOf, loss: lossOf, benefitChange, costChange, wideChange, wideRow } = deviations;
    const { narrowStart, part } = deviations;
    const { width, up, down, upPerLoss, downPerLoss } = reach;
    const { from, to } = stretch;
    const wideCount = wideRow.length;
    const bound = Float64Array.from(wideRow, (row) => part.rowMost[row]);
    const price = Float64Array.from(wideRow, (row) => prices[row]);
    const changes = deviations.option.length;
    const enough = this.branches + mostBranches;
    let most = Math.min(cap, this.gap());

    loss[0] = 0;
    benefit[0] = deviations.benefit;
    cost[0] = deviations.cost;
    for (let at = 0; at < wideCount; at++) wide[at] = this.activity[wideRow[at]];
    next[0] = 0;
    if (this.offer(0, wideCount, bound)) most = Math.min(cap, this.gap());
    this.end[0] = this.endOfBranch();
    let depth = 0;
    for (;;) {
      const change = next[depth];
      if (change >= this.end[depth] || change >= changes) {
        if (depth === 0) return true;
        depth--;
        this.undoNarrow(made[depth]);
        continue;
      }
      const p = classOf[change];
      const lossNow = loss[depth] + lossOf[change];
      if (lossNow > most) {
        // what follows in this class loses more; if this is its first change, so does every later class
        if (change === start[p]) next[depth] = changes;
        else next[depth] = start[p + 1];
        continue;
      }
      next[depth] = change + 1;
      if (++this.branches > enough) {
        this.unwind(depth);
        return false;
      }
      const left = most - lossNow;
      const after = (p + 1) * width;
      const costNow = cost[depth] + costChange[change];
      if (costNow < from) {
        const need = from - costNow;
        if (need > up[after + wideCount] || need > left * upPerLoss[after + wideCount] + ROUNDING * need)
          continue;
      } else if (costNow > to) {
        const need = costNow - to;
        if (need > down[after + wideCount] || need > left * downPerLoss[after + wideCount] + ROUNDING * need)
          continue;
      }
      if (wideCount > 0) {
        const row0 = depth * wideCount;
        const row1 = row0 + wideCount;
        const entry = change * wideCount;
        let lostToSlack = 0;
        let at = 0;
        for (; at < wideCount; at++) {
          const sum = wide[row0 + at] + wideChange[entry + at];
          wide[row1 + at] = sum;
          const over = sum - bound[at];
          if (over > 0) {
            if (over > down[after + at] || over > left * downPerLoss[after + at] + ROUNDING * over) break;
          } else if (price[at] > 0 && over < 0) {
            const unused = -over - Math.min(up[after + at], left * upPerLoss[after + at]);
            if (unused > 0) {
              lostToSlack += unused * price[at];
              if (lostToSlack > left) break;
            }
          }
        }
        if (at < wideCount) continue;
      }
      if (narrowStart[change] < narrowStart[change + 1]) this.doNarrow(change);
      made[depth] = change;
      depth++;
      loss[depth] = lossNow;
      benefit[depth] = benefit[depth - 1] + benefitChange[change];
      cost[depth] = costNow;
      next[depth] = start[p + 1];
      if (this.offer(depth, wideCount, bound)) most = Math.min(cap, this.gap());
      this.end[depth] = this.endOfBranch();
    }
  }

  /** What is left to find, at most: the gap between the tangent and what is known. */
  private gap(): number {
    const { goal, deviations, stretch } = this.task;
    return goal.gapBelow(deviations.losses.tangent, stretch)?.gap ?? -1;
  }

  /** Offers the portfolio at a depth if it breaks nothing. */
  private offer(depth: number, wideCount: number, bound: Float64Array): boolean {
    const { stretch, goal } = this.task;
    const cost = this.cost[depth];
    if (this.brokenCount > 0 || cost > stretch.to) return false;
    const row = depth * wideCount;
    for (let at = 0; at < wideCount; at++) if (this.wide[row + at] > bound[at]) return false;
    return goal.offer(cost, this.benefit[depth], () => this.chosenAt(depth));
  }

  private chosenAt(depth: number): Int32Array {
    const { part, losses, option } = this.task.deviations;
    const chosen = part.settled.slice();
    const choose = (place: number): void => {
      chosen[part.model.optionClass[part.option[place]]] = part.option[place];
    };
    for (const place of losses.best) choose(place);
    for (let level = 0; level < depth; level++) choose(option[this.made[level]]);
    return chosen;
  }

  /** A broken narrow row has to be mended by a later change, so the next one cannot come after the last that can. */
  private endOfBranch(): number {
    const { lastLowering, start, classCount } = this.task.deviations;
    let last = classCount - 1;
    for (let at = 0; at < this.brokenCount; at++) last = Math.min(last, lastLowering[this.broken[at]]);
    return start[last + 1];
  }

  private doNarrow(change: number): void {
    this.moveNarrow(change, 1);
  }

  private undoNarrow(change: number): void {
    this.moveNarrow(change, -1);
  }

  private moveNarrow(change: number, sign: 1 | -1): void {
    const { narrowStart, narrowRow, narrowChange, part } = this.task.deviations;
    for (let entry = narrowStart[change]; entry < narrowStart[change + 1]; entry++) {
      const row = narrowRow[entry];
      this.activity[row] += sign * narrowChange[entry];
      const isOver = this.activity[row] > part.rowMost[row];
      if (isOver && this.isBroken[row] === 0) this.breakRow(row);
      else if (!isOver && this.isBroken[row] === 1) this.mendRow(row);
    }
  }

  private breakRow(row: number): void {
    this.isBroken[row] = 1;
    this.placeOfBroken[row] = this.brokenCount;
    this.broken[this.brokenCount++] = row;
  }

  private mendRow(row: number): void {
    this.isBroken[row] = 0;
    const place = this.placeOfBroken[row];
    const last = this.broken[--this.brokenCount];
    this.broken[place] = last;
    this.placeOfBroken[last] = place;
  }

  private unwind(depth: number): void {
    for (let level = depth - 1; level >= 0; level--) this.undoNarrow(this.made[level]);
  }
}

/** Quotients of figures are compared with this much room. */
const ROUNDING = 1e-9;
