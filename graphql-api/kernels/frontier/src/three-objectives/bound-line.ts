/** A line that rises by steps over the cost, as [cost, benefit] in order, rising in both; minus infinity before. */
export type BoundLine = readonly (readonly [cost: number, benefit: number])[];

/** A stretch of cost, ends included, in which no portfolio has more benefit than a straight line. */
export interface OpenStretch {
  readonly from: number;
  readonly to: number;
  readonly tangent: { readonly height: number; readonly slope: number };
}

/** The lower of two lines at every cost. */
export function lowerOf(one: BoundLine, other: BoundLine): BoundLine {
  const lower: [cost: number, benefit: number][] = [];
  let [i, j] = [0, 0];
  while (i < one.length || j < other.length) {
    const cost = Math.min(one[i]?.[0] ?? Infinity, other[j]?.[0] ?? Infinity);
    if (one[i]?.[0] === cost) i++;
    if (other[j]?.[0] === cost) j++;
    if (i === 0 || j === 0) continue;
    const benefit = Math.min(one[i - 1][1], other[j - 1][1]);
    if (lower.length === 0 || benefit > lower[lower.length - 1][1]) lower.push([cost, benefit]);
  }
  return lower;
}

/** The line above known points and above straight lines, each of which is followed by a few steps. */
export function lineAbove(points: BoundLine, open: readonly OpenStretch[]): BoundLine {
  const steps = open.flatMap(({ from, to, tangent: { height, slope } }) => {
    const starts = Array.from(
      { length: STEPS },
      (_, step) => from + Math.ceil(((to + 1 - from) * step) / STEPS),
    );
    return starts.map((start, step): [number, number] => {
      const end = Math.max(start, (starts[step + 1] ?? to + 1) - 1);
      // what rounding takes away must not count; benefits are whole
      return [start, Math.floor(height + slope * end + SLACK * Math.max(1, Math.abs(height)))];
    });
  });
  return risingPart([...points, ...steps]);
}

/** Those of some points that no other one matches or beats in cost and benefit, in order of cost. */
export function risingPart(
  points: readonly (readonly [cost: number, benefit: number])[],
): [number, number][] {
  const cheapestFirst = [...points].sort((one, other) => one[0] - other[0] || other[1] - one[1]);
  const rising: [number, number][] = [];
  for (const [cost, benefit] of cheapestFirst) {
    if (rising.length === 0 || benefit > rising[rising.length - 1][1]) rising.push([cost, benefit]);
  }
  return rising;
}

const STEPS = 8;
const SLACK = 1e-9;
