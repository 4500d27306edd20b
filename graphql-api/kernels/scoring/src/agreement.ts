import { ScoringError } from './scoring-error.js';

export interface Agreement {
  /** Sum of squared distances of the items' rank sums from their mean. */
  readonly s: number;
  /** 0 no agreement, 1 the same order by all; null when every judge ranks everything alike. */
  readonly w: number | null;
  /** m(n−1)W, with n−1 degrees of freedom. */
  readonly chiSquare: number | null;
  readonly degreesOfFreedom: number;
}

/**
 * Kendall's W = 12S / (m²(n³−n) − m·ΣT), T = Σ(t³−t) over each judge's groups of t equal ranks.
 * `ranks[item][judge]`; equal items share the mean of their places (see `midRanks`).
 */
export function kendallsW(ranks: readonly (readonly number[])[]): Agreement {
  const n = ranks.length;
  const m = ranks[0]?.length ?? 0;
  checkRanks(ranks, m);
  const rankSums = ranks.map((row) => row.reduce((total, rank) => total + rank, 0));
  const mean = rankSums.reduce((total, sum) => total + sum, 0) / n;
  const s = rankSums.reduce((total, sum) => total + (sum - mean) ** 2, 0);
  const ties = Array.from({ length: m }, (_, judge) => tieTerm(ranks.map((row) => row[judge])));
  const most = m ** 2 * (n ** 3 - n) - m * ties.reduce((total, tie) => total + tie, 0);
  const w = most > 0 ? (12 * s) / most : null;
  return { s, w, chiSquare: w === null ? null : m * (n - 1) * w, degreesOfFreedom: n - 1 };
}

/** Places from scores: the highest score is 1; equal scores share the mean of the places they take up. */
export function midRanks(points: readonly number[]): number[] {
  return points.map((own) => {
    const above = points.filter((other) => other > own).length;
    const equal = points.filter((other) => other === own).length;
    return above + (equal + 1) / 2;
  });
}

function tieTerm(ranks: readonly number[]): number {
  const sizes = new Map<number, number>();
  ranks.forEach((rank) => sizes.set(rank, (sizes.get(rank) ?? 0) + 1));
  return [...sizes.values()].reduce((total, size) => total + size ** 3 - size, 0);
}

function checkRanks(ranks: readonly (readonly number[])[], judges: number): void {
  if (ranks.length < 2 || judges < 2)
    throw new ScoringError('Agreement needs at least two items and two judges.');
  if (ranks.some((row) => row.length !== judges || row.some((rank) => !Number.isFinite(rank)))) {
    throw new ScoringError('Every judge must rank every item.');
  }
}
