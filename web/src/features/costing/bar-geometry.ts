import type { CostLineId } from './cost-lines';

interface LineValue {
  id: CostLineId;
  /** Present value in major units. */
  value: number;
}

export interface Piece {
  id: CostLineId;
  from: number;
  to: number;
}

/** A bar in major units: it begins left of zero by what is given back, so that its right end is the life-cycle cost. */
export interface Bar {
  pieces: Piece[];
  /** Zero or below: where the bar begins. */
  start: number;
  end: number;
}

export function barOf(lines: readonly LineValue[]): Bar {
  const start = lines.reduce((sum, { value }) => sum + Math.min(0, value), 0);
  const pieces: Piece[] = [];
  let at = start;
  for (const { id, value } of lines) {
    if (value <= 0) continue;
    pieces.push({ id, from: at, to: at + value });
    at += value;
  }
  return { pieces, start, end: at };
}

/** The rod below the bars, in major units. `step` lies between two numbers, five short graduations make one step. */
export interface Axis {
  from: number;
  to: number;
  step: number;
  numbers: number[];
}

/** An axis that starts just left of the lowest start and ends on a number; `about` numbers, give or take. */
export function axisOf(bars: readonly Pick<Bar, 'start' | 'end'>[], about: number): Axis {
  const lowest = Math.min(0, ...bars.map(({ start }) => start));
  const highest = Math.max(0, ...bars.map(({ end }) => end));
  const step = niceStep((highest || 1) / about);
  const last = Math.max(1, Math.ceil(highest / step));
  const graduation = step / 5;
  return {
    from: lowest < 0 ? (Math.floor(lowest / graduation) - 1) * graduation : 0,
    to: last * step,
    step,
    numbers: Array.from({ length: last + 1 }, (_, i) => i * step),
  };
}

/** Share 0–1 of the axis' length at which `value` stands. */
export function shareAt({ from, to }: Axis, value: number): number {
  return (value - from) / (to - from);
}

/** The smallest of 1, 2, 2.5, 5 times a power of ten that is not below `least`. */
export function niceStep(least: number): number {
  const power = 10 ** Math.floor(Math.log10(least));
  const step = [1, 2, 2.5, 5, 10].find((factor) => factor * power >= least * (1 - 1e-9)) ?? 10;
  return step * power;
}
