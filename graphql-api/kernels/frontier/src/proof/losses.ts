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

/** Losses at the prices of a relaxation: benefit per unit of each row and, last, of cost. */
export function lossesAt(part: OpenPart, prices: Float64Array): Losses {
  const { classCount, start, row, rowMost } = part;
  const best = new Int32Array(classCount);
  const loss = worthsAt(part, prices);
  const priceOfCost = prices[row.length];
  let height = part.settledBenefit - priceOfCost * part.settledCost;
  for (let place = 0; place < row.length; place++) height += prices[place] * rowMost[place];
  for (let k = 0; k < classCount; k++) {
    best[k] = start[k];
    for (let option = start[k] + 1; option < start[k + 1]; option++)
      if (loss[option] > loss[best[k]]) best[k] = option;
    const most = loss[best[k]];
    height += most;
    for (let option = start[k]; option < start[k + 1]; option++) loss[option] = most - loss[option];
  }
  return { tangent: { height, slope: priceOfCost }, best, loss };
}

function worthsAt(part: OpenPart, prices: Float64Array): Float64Array {
  const { benefit, cost, row, termStart, termRow, termValue } = part;
  const priceOfCost = prices[row.length];
  const worth = new Float64Array(benefit.length);
  for (let option = 0; option < benefit.length; option++) {
    let sum = benefit[option] - priceOfCost * cost[option];
    for (let term = termStart[option]; term < termStart[option + 1]; term++) {
      sum -= prices[termRow[term]] * termValue[term];
    }
    worth[option] = sum;
  }
  return worth;
}
