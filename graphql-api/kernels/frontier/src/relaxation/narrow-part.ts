import type { Model } from '../model/model.js';
import { ActivitySums } from './activity-sums.js';
import { buildPart } from './build-part.js';
import type { OpenPart, Range } from './open-part.js';

/** Everything open, in a stretch of cost; undefined if no portfolio is possible there. */
export function wholeModel(model: Model, from: number, to: number): OpenPart | undefined {
  const keep = new Uint8Array(model.optionBenefit.length).fill(1);
  return narrow(everythingOpen(model), keep, { from, to, leastPieces: 0, mostPieces: Infinity });
}

/** The part with only the options of a list of the model's options, one or more for each class. */
export function partOf(model: Model, options: Int32Array, range: Range): OpenPart | undefined {
  const keep = new Uint8Array(model.optionBenefit.length);
  for (const option of options) keep[option] = 1;
  return narrow(everythingOpen(model), keep, range);
}

/**
 * Narrows a part to the options whose mark in `keep` is 1, which changes it, and to a range. Options that then can no
 * longer be part of a portfolio go too: those that pass a bound together with the least the other classes add.
 * Undefined if no portfolio is possible. O(options × entries) for each round in which something goes.
 */
export function narrow(part: OpenPart, keep: Uint8Array, range: Range): OpenPart | undefined {
  const sums = new ActivitySums(part, range);
  for (;;) {
    if (!sums.add(keep)) return undefined;
    if (!sums.dropImpossible(keep)) break;
  }
  return buildPart(part, keep, range, sums);
}

function everythingOpen(model: Model): OpenPart {
  const { classCount, optionStart, optionBenefit, optionCost, rowMost, rows } = model;
  return {
    model,
    from: 0,
    to: Infinity,
    leastPieces: 0,
    mostPieces: Infinity,
    settled: new Int32Array(classCount).fill(-1),
    settledBenefit: 0,
    settledCost: 0,
    settledPieces: 0,
    classCount,
    start: optionStart,
    option: Int32Array.from(optionBenefit.keys()),
    benefit: optionBenefit,
    cost: optionCost,
    row: Int32Array.from(rows.keys()),
    rowMost,
    termStart: model.termStart,
    termRow: model.termRow,
    termValue: model.termValue,
  };
}
