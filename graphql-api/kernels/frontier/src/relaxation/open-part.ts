import type { Model } from '../model/model.js';
import { ActivitySums } from './activity-sums.js';
import { buildPart } from './build-part.js';

/**
 * The part of a model that is still open somewhere in the search: which options of which classes may be chosen, for
 * portfolios whose cost lies in a stretch. Classes with one option left are settled and counted into the sums; rows
 * that nothing left can break are gone. All figures are whole numbers, so the sums are exact.
 */
export interface OpenPart {
  readonly model: Model;
  /** The stretch of cost, both ends included. */
  readonly from: number;
  readonly to: number;
  /** Bounds on the pieces of the whole portfolio. */
  readonly leastPieces: number;
  readonly mostPieces: number;

  /** The option chosen in each class of the model; -1 where the class is open. */
  readonly settled: Int32Array;
  readonly settledBenefit: number;
  readonly settledCost: number;
  readonly settledPieces: number;

  readonly classCount: number;
  /** The options of open class k are those from start[k] up to, not including, start[k + 1]. */
  readonly start: Int32Array;
  /** Index of each option in the model. */
  readonly option: Int32Array;
  readonly benefit: Float64Array;
  readonly cost: Float64Array;

  /** Index of each row in the model; MOST_PIECES or LEAST_PIECES for the bounds on pieces. */
  readonly row: Int32Array;
  /** What the open classes may add to each row at most. */
  readonly rowMost: Float64Array;
  readonly termStart: Int32Array;
  readonly termRow: Int32Array;
  readonly termValue: Float64Array;
}

export const MOST_PIECES = -1;
export const LEAST_PIECES = -2;

/** The stretch of cost and the bounds on pieces that a part is narrowed to. */
export type Range = Pick<OpenPart, 'from' | 'to' | 'leastPieces' | 'mostPieces'>;

/** Everything open, in a stretch of cost; undefined if no portfolio is possible there. */
export function wholeModel(model: Model, from: number, to: number): OpenPart | undefined {
  const { classCount, optionStart, optionBenefit, optionCost, rowMost, rows } = model;
  const range = { from, to, leastPieces: 0, mostPieces: Infinity };
  const everything: OpenPart = {
    model,
    ...range,
    settled: new Int32Array(classCount).fill(-1),
    settledBenefit: 0,
    settledCost: 0,
    settledPieces: 0,
    classCount,
    start: optionStart,
    option: Int32Array.from(optionBenefit, (_, option) => option),
    benefit: optionBenefit,
    cost: optionCost,
    row: Int32Array.from(rows, (_, row) => row),
    rowMost,
    termStart: model.termStart,
    termRow: model.termRow,
    termValue: model.termValue,
  };
  return narrow(everything, new Uint8Array(optionBenefit.length).fill(1), range);
}

/** The same part with only the options of a list of the model's options, settled ones included. */
export function partOf(model: Model, options: Int32Array, range: Range): OpenPart | undefined {
  const whole = wholeModel(model, range.from, range.to);
  if (whole === undefined) return undefined;
  const wanted = new Uint8Array(model.optionBenefit.length);
  for (const option of options) wanted[option] = 1;
  return narrow(
    whole,
    Uint8Array.from(whole.option, (option) => wanted[option]),
    range,
  );
}

/** The options of the model that are left, those of settled classes included: what `partOf` takes. */
export function optionsOf({ settled, option }: OpenPart): Int32Array {
  return Int32Array.from([...settled.filter((chosen) => chosen >= 0), ...option]);
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
