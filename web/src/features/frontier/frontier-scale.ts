/** The rod under the chart, in currency units. It begins and ends on a graduation. */
export interface RodScale {
  start: number;
  end: number;
  /** Between two long graduations: 1, 2 or 5 times a power of ten. Also "the next step" of the marginal gain. */
  long: number;
  /** Between two short ones: a fifth of `long`. */
  short: number;
}

const MOST_LONG_GRADUATIONS = 30;

/**
 * A rod that holds `from` to `to` and half a long graduation more: the finest graduation of 1, 2 or 5 times a power of ten that leaves at most thirty
 * long ones between the two. More than twelve result, because neighbours in that series differ by 2.5 at most.
 */
export function rodScale(from: number, to: number): RodScale {
  const long = roundStep((to - from) / MOST_LONG_GRADUATIONS);
  const short = long / 5;
  const start = Math.floor(from / long) * long;
  const end = Math.ceil((to + long / 2) / short) * short;
  return { start, end, long, short };
}

/** The least number of the series 1, 2, 5, 10, 20, 50 … that is not below `least`, and never below 1. */
export function roundStep(least: number): number {
  const power = 10 ** Math.floor(Math.log10(Math.max(least, 1)));
  const factor = [1, 2, 5, 10].find((each) => each * power >= least * (1 - 1e-9)) ?? 10;
  return factor * power;
}

/** Every long graduation that gets a number, so that two numbers stand at least `gap` apart. Takes px per unit. */
export function numberedGraduations(
  { start, end, long }: RodScale,
  pxPerUnit: number,
  gap: number,
): number[] {
  const every = [1, 2, 5, 10, 20, 50].find((count) => count * long * pxPerUnit >= gap) ?? 100;
  const step = every * long;
  const first = Math.ceil(start / step) * step;
  const numbers: number[] = [];
  for (let at = first; at <= end; at += step) numbers.push(at);
  return numbers;
}

/** Round values inside `from` to `to` for the benefit axis, about `count` of them. */
export function roundValues(from: number, to: number, count: number): number[] {
  const step = roundStep((to - from) / count);
  const values: number[] = [];
  for (let at = Math.ceil(from / step) * step; at <= to; at += step) values.push(at);
  return values;
}
