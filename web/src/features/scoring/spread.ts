import type { SheetScore } from './sheet-parts';

/** How all assessors scored one candidate on one criterion. */
interface Spread {
  mean: number;
  lowest: number;
  highest: number;
  /** 30 points or more apart: worth talking about. */
  wide: boolean;
}

const WIDE_SPREAD_POINTS = 30;

/** Undefined when nobody gave points. */
export function spreadOf(scores: readonly SheetScore[]): Spread | undefined {
  const points = scores.flatMap(({ points: given }) => (given == null ? [] : [given]));
  if (points.length === 0) return undefined;
  const lowest = Math.min(...points);
  const highest = Math.max(...points);
  const mean = points.reduce((sum, each) => sum + each, 0) / points.length;
  return { mean, lowest, highest, wide: highest - lowest >= WIDE_SPREAD_POINTS };
}
