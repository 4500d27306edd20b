/** px between two pegs: their own 5.6 and a little air. */
export const PEG_GAP = 9;

/**
 * Places of the pegs to draw so that neighbours stand at least `gap` px apart, measured along the greater of the two
 * axes. The first, the last and every place in `always` are drawn whatever stands beside them. One pass, O(n).
 */
export function thinPegs(
  places: readonly (readonly [x: number, y: number])[],
  gap: number,
  always: ReadonlySet<number> = new Set(),
): number[] {
  const drawn: number[] = [];
  let last: readonly [number, number] | undefined;
  for (const [index, place] of places.entries()) {
    const forced = index === 0 || index === places.length - 1 || always.has(index);
    if (!forced && last && distance(last, place) < gap) continue;
    drawn.push(index);
    last = place;
  }
  return drawn;
}

function distance(one: readonly [number, number], other: readonly [number, number]): number {
  return Math.max(Math.abs(one[0] - other[0]), Math.abs(one[1] - other[1]));
}
