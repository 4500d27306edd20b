import type { OpenPart, Range } from '../relaxation/open-part.js';

/** One way on from a part: the options kept, and bounds on pieces. */
export interface Branch {
  readonly keep: Uint8Array;
  readonly pieces: Pick<Range, 'leastPieces' | 'mostPieces'>;
}

/**
 * Splits a part in two at what the relaxation chooses in shares: the option whose share is nearest to a half, taken
 * or not. Every portfolio of the part is in one of the two. Undefined if nothing is chosen in shares.
 */
export function branchAtOption(part: OpenPart, shares: Float64Array, keep: Uint8Array): Branch[] | undefined {
  const option = mostShared(shares, keep);
  if (option < 0) return undefined;
  return branchAt(part, option, keep);
}

/** Splits a part in two at the first option that may be chosen or not: where the relaxation gives no hint. */
export function branchAtFirst(part: OpenPart, keep: Uint8Array): Branch[] {
  return branchAt(part, keep.indexOf(1), keep);
}

function branchAt(part: OpenPart, option: number, keep: Uint8Array): Branch[] {
  const k = classOf(part, option);
  const taken = keep.slice();
  taken.fill(0, part.start[k], part.start[k + 1]);
  taken[option] = 1;
  const notTaken = keep.slice();
  notTaken[option] = 0;
  const { leastPieces, mostPieces } = part;
  return [taken, notTaken].map((options) => ({ keep: options, pieces: { leastPieces, mostPieces } }));
}

/**
 * Splits a part in two at the number of pieces, where the relaxation takes a broken number of them: no more, or more.
 * Where benefit hardly differs from cost by more than a constant per piece, this is what makes bounds sharp
 * (cardinality bounds: Martello and Toth 1997; from memory). Undefined if the number is whole.
 */
export function branchAtPieces(part: OpenPart, shares: Float64Array, keep: Uint8Array): Branch[] | undefined {
  let pieces = part.settledPieces;
  for (let option = 0; option < shares.length; option++) {
    pieces += shares[option] * part.model.optionPieces[part.option[option]];
  }
  const fewer = Math.floor(pieces);
  if (pieces - fewer < WHOLE || pieces - fewer > 1 - WHOLE) return undefined;
  const { leastPieces, mostPieces } = part;
  // shares of a relaxation cut short may break the part's own bounds: no branch may reach beyond them
  if (fewer < leastPieces || fewer >= mostPieces) return undefined;
  return [
    { keep: keep.slice(), pieces: { leastPieces, mostPieces: fewer } },
    { keep: keep.slice(), pieces: { leastPieces: fewer + 1, mostPieces } },
  ];
}

function mostShared(shares: Float64Array, keep: Uint8Array): number {
  let most = -1;
  let nearest = WHOLE;
  for (let option = 0; option < shares.length; option++) {
    if (keep[option] === 0) continue;
    const fromWhole = Math.min(shares[option], 1 - shares[option]);
    if (fromWhole <= nearest) continue;
    nearest = fromWhole;
    most = option;
  }
  return most;
}

function classOf({ start }: OpenPart, option: number): number {
  let k = 0;
  while (start[k + 1] <= option) k++;
  return k;
}

/** Shares this near to none or all count as whole. */
const WHOLE = 1e-6;
