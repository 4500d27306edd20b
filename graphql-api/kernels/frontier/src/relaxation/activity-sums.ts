import type { OpenPart, Range } from './open-part.js';

/**
 * The least and the most that the kept options of all open classes can add up to, for each row of a part and for four
 * further figures: cost, cost negated, pieces and pieces negated, in this order behind the rows. Each has a bound it
 * may not pass, so a "least" rule is an upper bound on the negated figure. Entries are few for each option, so only
 * the figures that a class touches at all are worked with. O(entries) for each pass.
 */
export class ActivitySums {
  readonly least: Float64Array;
  readonly most: Float64Array;
  readonly bound: Float64Array;

  /** The figures that class k touches, and the least it adds to each: from touchedStart[k] up to touchedStart[k + 1]. */
  private readonly touchedStart: Int32Array;
  private readonly touched: number[] = [];
  private readonly touchedLeast: number[] = [];

  /** Scratch, by figure: of one class, and of one option. */
  private readonly lowest: Float64Array;
  private readonly highest: Float64Array;
  private readonly timesTouched: Int32Array;
  private readonly entry: Float64Array;

  constructor(
    private readonly part: OpenPart,
    range: Range,
  ) {
    const rows = part.row.length;
    const figures = (): Float64Array => new Float64Array(rows + FURTHER_FIGURES);
    this.least = figures();
    this.most = figures();
    this.bound = figures();
    this.bound.set(part.rowMost);
    this.bound[rows] = range.to - part.settledCost;
    this.bound[rows + 1] = part.settledCost - range.from;
    this.bound[rows + 2] = range.mostPieces - part.settledPieces;
    this.bound[rows + 3] = part.settledPieces - range.leastPieces;
    this.touchedStart = new Int32Array(part.classCount + 1);
    this.lowest = figures();
    this.highest = figures();
    this.timesTouched = new Int32Array(rows + FURTHER_FIGURES);
    this.entry = figures();
  }

  /** Adds the kept options up; false if a class has none or the least passes a bound: then nothing is possible. */
  add(keep: Uint8Array): boolean {
    const { part, least, most, bound } = this;
    least.fill(0);
    most.fill(0);
    this.touched.length = 0;
    this.touchedLeast.length = 0;
    for (let k = 0; k < part.classCount; k++) if (!this.addClass(k, keep)) return false;
    for (let figure = 0; figure < bound.length; figure++) if (least[figure] > bound[figure]) return false;
    return true;
  }

  /** Unmarks the options that pass a bound even with the least of all other classes; true if there were any. */
  dropImpossible(keep: Uint8Array): boolean {
    const { part } = this;
    let dropped = false;
    for (let k = 0; k < part.classCount; k++) {
      for (let option = part.start[k]; option < part.start[k + 1]; option++) {
        if (keep[option] === 0 || this.isPossible(k, option)) continue;
        keep[option] = 0;
        dropped = true;
      }
    }
    return dropped;
  }

  private addClass(k: number, keep: Uint8Array): boolean {
    const { part, least, most, touched, touchedLeast, timesTouched, lowest, highest } = this;
    let kept = 0;
    const from = touched.length;
    for (let option = part.start[k]; option < part.start[k + 1]; option++) {
      if (keep[option] === 0) continue;
      kept++;
      this.touchAll(option);
    }
    for (let at = from; at < touched.length; at++) {
      const figure = touched[at];
      // an option that does not touch a figure adds nought to it
      const isTouchedByAll = timesTouched[figure] === kept;
      const low = isTouchedByAll ? lowest[figure] : Math.min(0, lowest[figure]);
      touchedLeast.push(low);
      least[figure] += low;
      most[figure] += isTouchedByAll ? highest[figure] : Math.max(0, highest[figure]);
      timesTouched[figure] = 0;
    }
    this.touchedStart[k + 1] = touched.length;
    return kept > 0;
  }

  private touchAll(option: number): void {
    const { part } = this;
    const rows = part.row.length;
    for (let term = part.termStart[option]; term < part.termStart[option + 1]; term++) {
      this.touch(part.termRow[term], part.termValue[term]);
    }
    const pieces = part.model.optionPieces[part.option[option]];
    this.touch(rows, part.cost[option]);
    this.touch(rows + 1, -part.cost[option]);
    this.touch(rows + 2, pieces);
    this.touch(rows + 3, -pieces);
  }

  private touch(figure: number, value: number): void {
    if (this.timesTouched[figure]++ === 0) {
      this.touched.push(figure);
      this.lowest[figure] = value;
      this.highest[figure] = value;
      return;
    }
    if (value < this.lowest[figure]) this.lowest[figure] = value;
    if (value > this.highest[figure]) this.highest[figure] = value;
  }

  private isPossible(k: number, option: number): boolean {
    const { least, bound, touched, touchedLeast, touchedStart, entry } = this;
    this.readEntries(option, 1);
    let isPossible = true;
    for (let at = touchedStart[k]; at < touchedStart[k + 1] && isPossible; at++) {
      const figure = touched[at];
      isPossible = least[figure] - touchedLeast[at] + entry[figure] <= bound[figure];
    }
    this.readEntries(option, 0);
    return isPossible;
  }

  /** Writes an option's entries into the scratch, or noughts over them. */
  private readEntries(option: number, times: 1 | 0): void {
    const { part, entry } = this;
    const rows = part.row.length;
    for (let term = part.termStart[option]; term < part.termStart[option + 1]; term++) {
      entry[part.termRow[term]] = times * part.termValue[term];
    }
    const pieces = part.model.optionPieces[part.option[option]];
    entry[rows] = times * part.cost[option];
    entry[rows + 1] = -times * part.cost[option];
    entry[rows + 2] = times * pieces;
    entry[rows + 3] = -times * pieces;
  }
}

const FURTHER_FIGURES = 4;
