import type { Violation } from '../problem/feasible.js';
import type { Problem } from '../problem/problem.js';

/**
 * A problem laid out for search. Its items fall into classes, of each of which exactly one option is chosen: a
 * `oneOf` group is a class, every other item one of its own. An option is "so many pieces of this item" or nothing.
 * Everything else but the cost is a row: a sum over the chosen options that may be at most a bound.
 */
export interface Model {
  readonly problem: Problem;
  readonly ceiling: number;

  readonly classCount: number;
  /** The options of class k are those from optionStart[k] up to, not including, optionStart[k + 1]. */
  readonly optionStart: Int32Array;
  readonly optionClass: Int32Array;
  /** Index into problem.items; -1 for nothing. */
  readonly optionItem: Int32Array;
  readonly optionPieces: Int32Array;
  readonly optionBenefit: Float64Array;
  readonly optionCost: Float64Array;

  readonly rows: readonly Row[];
  readonly rowMost: Float64Array;
  /** By what an excess counts when excesses of different rows are added up: about one over the row's bound. */
  readonly rowWeight: Float64Array;
  /** The entries of an option are those from termStart[option] up to termStart[option + 1]. */
  readonly termStart: Int32Array;
  readonly termRow: Int32Array;
  readonly termValue: Float64Array;

  /** Class of an item; -1 if it cannot be taken. */
  readonly classOfItem: Int32Array;
}

/** Where a row comes from. A "least" rule is kept as the negated row, its bound negated too. */
export interface Row {
  readonly kind: Violation['kind'];
  readonly name: string;
  /** 1, or -1 where the row is negated. */
  readonly sign: 1 | -1;
}

/** The part of the model that the rows are built on. */
export type OptionList = Pick<
  Model,
  'classCount' | 'optionStart' | 'optionClass' | 'optionItem' | 'optionPieces' | 'classOfItem'
>;
