import type { OpenPart } from './open-part.js';

/**
 * A part with every figure near one: benefit over the most benefit, each row and cost over its largest entry. Cost is
 * a row like the others, the last. Benefits are nudged by less than a ten-millionth, each by its own amount, so that
 * equal options do not send the solver round in circles.
 */
export class ScaledPart {
  readonly benefit: Float64Array;
  readonly bound: Float64Array;
  private readonly termStart: Int32Array;
  private readonly termRow: Int32Array;
  private readonly termValue: Float64Array;
  private readonly benefitScale: number;
  private readonly rowScale: Float64Array;

  constructor(private readonly part: OpenPart) {
    const { option, benefit, row, rowMost, termRow, termStart } = part;
    const figures = row.length + 1;
    this.benefitScale = 1 / Math.max(1, benefit.reduce(largerSize, 0));
    this.benefit = benefit.map((figure, place) => figure * this.benefitScale + nudge(option[place]));
    this.termStart = Int32Array.from(termStart, (start, place) => start + place);
    this.termRow = new Int32Array(termRow.length + option.length);
    this.termValue = new Float64Array(this.termRow.length);
    const largest = new Float64Array(figures);
    this.layTerms(largest);
    this.rowScale = largest.map((size) => (size > 0 ? 1 / size : 1));
    for (let term = 0; term < this.termRow.length; term++) {
      this.termValue[term] *= this.rowScale[this.termRow[term]];
    }
    this.bound = new Float64Array(figures);
    for (let place = 0; place < rowMost.length; place++)
      this.bound[place] = rowMost[place] * this.rowScale[place];
  }

  /** Sets what the whole portfolio may cost. */
  allowCost(cost: number): void {
    const last = this.bound.length - 1;
    this.bound[last] = (cost - this.part.settledCost) * this.rowScale[last];
  }

  /** From a price of the scaled part to benefit per unit, and back. */
  priceOf(scaledPrice: number, row: number): number {
    return (scaledPrice * this.rowScale[row]) / this.benefitScale;
  }

  scaledPriceOf(price: number, row: number): number {
    return (price * this.benefitScale) / this.rowScale[row];
  }

  /** Adds the entries of an option, so many times, to sums by row. */
  addEntries(sums: Float64Array, option: number, times: number): void {
    const { termStart, termRow, termValue } = this;
    for (let term = termStart[option]; term < termStart[option + 1]; term++) {
      sums[termRow[term]] += times * termValue[term];
    }
  }

  entryOf(option: number, row: number): number {
    const { termStart, termRow, termValue } = this;
    for (let term = termStart[option]; term < termStart[option + 1]; term++) {
      if (termRow[term] === row) return termValue[term];
    }
    return 0;
  }

  /** Takes off a figure of each option what its entries come to at some prices. */
  takeOffEntries(figures: Float64Array, prices: Float64Array): void {
    const { termStart, termRow, termValue } = this;
    for (let option = 0; option < figures.length; option++) {
      let figure = figures[option];
      for (let term = termStart[option]; term < termStart[option + 1]; term++) {
        figure -= prices[termRow[term]] * termValue[term];
      }
      figures[option] = figure;
    }
  }

  private layTerms(largest: Float64Array): void {
    const { part, termRow, termValue } = this;
    const costRow = part.row.length;
    let at = 0;
    const add = (row: number, value: number): void => {
      termRow[at] = row;
      termValue[at++] = value;
      largest[row] = Math.max(largest[row], Math.abs(value));
    };
    for (let option = 0; option < part.option.length; option++) {
      for (let term = part.termStart[option]; term < part.termStart[option + 1]; term++) {
        add(part.termRow[term], part.termValue[term]);
      }
      add(costRow, part.cost[option]);
    }
  }
}

function largerSize(one: number, other: number): number {
  return Math.max(one, Math.abs(other));
}

/** Between 0 and 3·10⁻⁸, the same for the same option: its number times the golden ratio, the fraction of it. */
function nudge(option: number): number {
  return 3e-8 * ((option * 0.618_033_988_75) % 1);
}
