import type { Box } from './chart-geometry';

const CLEARANCE = 12;

interface Surroundings {
  /** Labels already placed: the next keeps 12 px away. */
  taken: readonly Box[];
  /** Points of the drawing that a label had better not cover. */
  avoid: readonly (readonly [x: number, y: number])[];
  /** Where labels may stand. */
  within: Box;
}

/** The first of `choices` that meets no other label; among equals the one that covers the fewest points. */
export function placeLabel(choices: readonly Box[], surroundings: Surroundings): Box {
  const [first, ...rest] = choices;
  if (!first) throw new RangeError('A label needs at least one place to choose from.');
  return rest.reduce(
    (best, choice) => (penalty(choice, surroundings) < penalty(best, surroundings) ? choice : best),
    first,
  );
}

function penalty(box: Box, { taken, avoid, within }: Surroundings): number {
  const met = taken.reduce((sum, other) => sum + overlap(grown(box, CLEARANCE), other), 0);
  const outside = box.width * box.height - overlap(box, within);
  const covered = avoid.filter(([x, y]) => holds(grown(box, 3), x, y)).length;
  return met * 100 + outside * 1_000 + covered;
}

/** Shared area, square px. */
export function overlap(one: Box, other: Box): number {
  const width = Math.min(one.x + one.width, other.x + other.width) - Math.max(one.x, other.x);
  const height = Math.min(one.y + one.height, other.y + other.height) - Math.max(one.y, other.y);
  return Math.max(0, width) * Math.max(0, height);
}

export function grown({ x, y, width, height }: Box, by: number): Box {
  return { x: x - by, y: y - by, width: width + 2 * by, height: height + 2 * by };
}

export function holds({ x, y, width, height }: Box, atX: number, atY: number): boolean {
  return atX >= x && atX <= x + width && atY >= y && atY <= y + height;
}
