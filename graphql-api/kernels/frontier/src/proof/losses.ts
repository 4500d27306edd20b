import type { OpenPart } from '../relaxation/open-part.js';
import type { Tangent } from './step-line.js';

/**
 * What a part looks like at given prices. A portfolio's benefit is `tangent` at its cost, less the losses of the
 * options it chooses, less the price of every row that it leaves unused: exactly, by adding up.
 */
export interface Losses {
  readonly tangent: Tangent;
  /** The best option of each class at the prices. */
  readonly best: Int32Array;
  /** By how much each option is worse at the prices than the best of its class. */
  readonly loss: Float64Array;
}

/**
 * Losses at the prices of a relaxation: benefit per unit of each row and, last, of cost. The tangent is raised by what
 * rounding may have taken from it or put on the losses: where prices or settled costs are large, that is much more than
 * what the benefits alone would let one expect, and a tangent too low would close a part that is not done.
 */
export function lossesAt(part: OpenPart, prices: Float64Array): Losses {
  const { classCount, start, row, rowMost } = part;
  const best = new Int32Array(classCount);
  const { worth: loss, size: sizeOf } = worthsAt(part, prices);
  let height = part.settledBenefit;
  let size = part.settledBenefit;
  for (let place = 0; place < row.length; place++) {
    height += prices[place] * rowMost[place];
    size += prices[place] * Math.abs(rowMost[place]);
  }
  for (let k = 0; k < classCount; k++) {
    best[k] = start[k];
    let largest = 0;
    for (let option = start[k]; option < start[k + 1]; option++) {
      if (loss[option] > loss[best[k]]) best[k] = option;
      if (sizeOf[option] > largest) largest = sizeOf[option];
    }
    const most = loss[best[k]];
    height += most;
    size += largest;
    for (let option = start[k]; option < start[k + 1]; option++) loss[option] = most - loss[option];
  }
  const slope = prices[row.length];
  // the settled cost is taken off last: before, its rounding would count again with each class
  height += ROUNDING * (size * (classCount + row.length + 8) + slope * (part.settledCost + part.to));
  return { tangent: { height: height - slope * part.settledCost, slope }, best, loss };
}

/** What each option is worth at the prices, and the size of the figures that were added up for it. */
function worthsAt(part: OpenPart, prices: Float64Array): { worth: Float64Array; size: Float64Array } {
  const { benefit, cost, row, termStart, termRow, termValue } = part;
  const priceOfCost = prices[row.length];
  const worth = new Float64Array(benefit.length);
  const size = new Float64Array(benefit.length);
  for (let option = 0; option < benefit.length; option++) {
    const paid = priceOfCost * cost[option];
    let sum = benefit[option] - paid;
    let sizes = benefit[option] + paid;
    for (let term = termStart[option]; term < termStart[option + 1]; term++) {
      const used = prices[termRow[term]] * termValue[term];
      sum -= used;
      sizes += Math.abs(used);
    }
    worth[option] = sum;
    size[option] = sizes;
  }
  return { worth, size };
}

/**
 * A sum of n figures is off by 2⁻⁵³ × n × the sum of their sizes at most. Four times that is room for the height, for
 * the losses, for their sum in an enumeration and for the tangent where it is read off.
 */
const ROUNDING = 2 ** -51;
