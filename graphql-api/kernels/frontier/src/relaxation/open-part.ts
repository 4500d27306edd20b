import type { Model } from '../model/model.js';

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

/** The options of the model that are left, those of settled classes included: what `partOf` takes. */
export function optionsOf({ settled, option }: OpenPart): Int32Array {
  return Int32Array.from([...settled.filter((chosen) => chosen >= 0), ...option]);
}
