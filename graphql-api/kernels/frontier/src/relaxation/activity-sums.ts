import type { OpenPart, Range } from './open-part.js';

/**
 * The least and the most that the kept options of all open classes can add up to, for each row of a part and for four
 * further figures: cost, cost negated, pieces and pieces negated, in this order behind the rows. Each has a bound it
 * may not pass, so a "least" rule is an upper bound on the negated figure.
 */
export class ActivitySums {
  readonly least: Float64Array;
  readonly most: Float64Array;
  readonly bound: Float64Array;
  private readonly width: number;
  /** What one class adds, per open class and figure. */
  private readonly classLeast: Float64Array;
  private readonly figures: Float64Array;
  private readonly highest: Float64Array;

  constructor(
    private readonly part: OpenPart,
    range: Range,
  ) {
    const rows = part.row.length;
    this.width = rows + FURTHER_FIGURES;
    this.least = new Float64Array(this.width);
    this.most = new Float64Array(this.width);
    this.bound = new Float64Array(this.width);
    this.bound.set(part.rowMost);
    this.bound[rows] = range.to - part.settledCost;
    this.bound[rows + 1] = part.settledCost - range.from;
    this.bound[rows + 2] = range.mostPieces - part.settledPieces;
    this.bound[rows + 3] = part.settledPieces - range.leastPieces;
    this.classLeast = new Float64Array(part.classCount * this.width);
    this.figures = new Float64Array(this.width);
    this.highest = new Float64Array(this.width);
  }

  /** Adds the kept options up; false if a class has none or the least passes a bound: then nothing is possible. */
  add(keep: Uint8Array): boolean {
    const { part, width, least, most, bound } = this;
    least.fill(0);
    most.fill(0);
    for (let k = 0; k < part.classCount; k++) if (!this.addClass(k, keep)) return false;
    for (let figure = 0; figure < width; figure++) if (least[figure] > bound[figure]) return false;
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
    const { part, width, least, most, classLeast, figures, highest } = this;
    const at = k * width;
    let kept = 0;
    for (let option = part.start[k]; option < part.start[k + 1]; option++) {
      if (keep[option] === 0) continue;
      this.readFigures(option);
      if (kept++ === 0) {
        classLeast.set(figures, at);
        highest.set(figures);
        continue;
      }
      for (let figure = 0; figure < width; figure++) {
        const value = figures[figure];
        if (value < classLeast[at + figure]) classLeast[at + figure] = value;
        if (value > highest[figure]) highest[figure] = value;
      }
    }
    if (kept === 0) return false;
    for (let figure = 0; figure < width; figure++) {
      least[figure] += classLeast[at + figure];
      most[figure] += highest[figure];
    }
    return true;
  }

  private isPossible(k: number, option: number): boolean {
    const { width, least, bound, classLeast, figures } = this;
    const at = k * width;
    this.readFigures(option);
    for (let figure = 0; figure < width; figure++) {
      if (least[figure] - classLeast[at + figure] + figures[figure] > bound[figure]) return false;
    }
    return true;
  }

  private readFigures(option: number): void {
    const { part, figures } = this;
    const rows = part.row.length;
    figures.fill(0);
    for (let term = part.termStart[option]; term < part.termStart[option + 1]; term++) {
      figures[part.termRow[term]] = part.termValue[term];
    }
    const pieces = part.model.optionPieces[part.option[option]];
    figures[rows] = part.cost[option];
    figures[rows + 1] = -part.cost[option];
    figures[rows + 2] = pieces;
    figures[rows + 3] = -pieces;
  }
}

const FURTHER_FIGURES = 4;
