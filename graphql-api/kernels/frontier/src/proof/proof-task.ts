import { optionsOf, type OpenPart } from '../relaxation/open-part.js';
import type { KnownPrices } from '../relaxation/relaxation.js';
import type { Tangent } from './step-line.js';

/**
 * A piece of a proof as plain data, to be worked on anywhere: parts of the problem that are still open, and the points
 * known in their stretch of cost. What comes out depends on the task alone.
 */
export interface ProofTask {
  /** Numbers from the first task down to this one: 2.0.1 is the second piece left over from the first of the third. */
  readonly id: string;
  readonly nodes: readonly ProofNode[];
  /** Points [cost, benefit] known in the stretches of the nodes, and the last one before. */
  readonly known: readonly (readonly [cost: number, benefit: number])[];
  /** Whether to look for good portfolios below each node first. */
  readonly dives: boolean;
  /** About how much work to do before the rest is handed back: branches of the enumeration, or as much time. */
  readonly effort: number;
}

/** A part of the problem in which improvements may still lie. */
export interface ProofNode {
  readonly from: number;
  readonly to: number;
  readonly leastPieces: number;
  /** Undefined where any number will do. */
  readonly mostPieces?: number;
  /** The model's options that may be chosen, those of settled classes included. */
  readonly options: Int32Array;
  /** No portfolio of the part lies above it. */
  readonly tangent: Tangent;
  /** Prices that a relaxation of the part may start from. */
  readonly known?: KnownPrices;
}

export interface ProofTaskResult {
  readonly id: string;
  /** Portfolios better than what was known, by the option chosen in each class. */
  readonly found: readonly FoundPortfolio[];
  /** What is still open. Nothing else of the task's nodes can hold an improvement. */
  readonly open: readonly ProofNode[];
  readonly effort: number;
}

/** A portfolio with the option of the model chosen in each class. */
export interface FoundPortfolio {
  readonly cost: number;
  readonly benefit: number;
  readonly chosen: Int32Array;
}

export function nodeOf(part: OpenPart, tangent: Tangent, known?: KnownPrices): ProofNode {
  const { from, to, leastPieces, mostPieces } = part;
  const most = mostPieces < Infinity ? { mostPieces } : {};
  return { from, to, leastPieces, ...most, options: optionsOf(part), tangent, ...(known ? { known } : {}) };
}
