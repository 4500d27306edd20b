import type { ProofNode } from './proof-task.js';

type Step = readonly [cost: number, benefit: number];

/**
 * An upper bound for every cost: no portfolio of at most that cost has more benefit. Steps [cost, benefit], rising in
 * both, from the points known and the tangents of what is still open. Where nothing is open the bound is the step line
 * of the points.
 *
 * @param points of the front, in order of cost
 * @param step what all benefits are multiples of
 * @param to the end of the axis
 */
export function boundSteps(
  points: readonly Step[],
  open: readonly ProofNode[],
  step: number,
  to: number,
): Step[] {
  const nodes = [...open].sort((one, other) => one.from - other.from);
  const edges = edgesOf(points, nodes, to);
  const bound: Step[] = [];
  let highest = -Infinity;
  let nextPoint = 0;
  let nextNode = 0;
  let covering: ProofNode[] = [];
  for (const [place, edge] of edges.entries()) {
    const last = (edges[place + 1] ?? to + 1) - 1;
    while (nextPoint < points.length && points[nextPoint][0] <= edge) {
      highest = Math.max(highest, points[nextPoint++][1]);
    }
    covering = covering.filter((node) => node.to >= edge);
    while (nextNode < nodes.length && nodes[nextNode].from <= edge) covering.push(nodes[nextNode++]);
    for (const { tangent } of covering) {
      highest = Math.max(highest, wholeSteps(tangent.height + tangent.slope * last, step));
    }
    if (highest >= 0 && highest > (bound.at(-1)?.[1] ?? -1)) bound.push([edge, highest]);
  }
  return bound;
}

/** The stretches of cost in which nothing can be missing: where the bound is the step line of the points. */
export function provenStretches(
  points: readonly Step[],
  bound: readonly Step[],
  from: number,
  to: number,
): [from: number, to: number][] {
  const stretches: [number, number][] = [];
  const edges = [...new Set([from, ...points.map(([cost]) => cost), ...bound.map(([cost]) => cost)])];
  edges.sort((one, other) => one - other);
  let point = -1;
  let step = -1;
  for (const [place, edge] of edges.entries()) {
    while (points[point + 1]?.[0] <= edge) point++;
    while (bound[step + 1]?.[0] <= edge) step++;
    if (points[point]?.[1] !== bound[step]?.[1]) continue;
    const last = (edges[place + 1] ?? to + 1) - 1;
    const before = stretches.at(-1);
    if (before && before[1] === edge - 1) before[1] = last;
    else stretches.push([edge, last]);
  }
  return stretches;
}

/** Where the bound may rise: at points, at ends of open parts, and often enough between for a rising line. */
function edgesOf(points: readonly Step[], nodes: readonly ProofNode[], to: number): number[] {
  const edges = new Set<number>(points.map(([cost]) => cost));
  for (const { from, to: end } of nodes) {
    edges.add(from);
    if (end < to) edges.add(end + 1);
    const pieces = Math.min(end - from, PIECES);
    for (let piece = 1; piece < pieces; piece++)
      edges.add(from + Math.floor(((end - from) * piece) / pieces));
  }
  return [...edges].sort((one, other) => one - other);
}

/** The highest benefit a bound in floating point allows, with room for its rounding. */
function wholeSteps(bound: number, step: number): number {
  return step * Math.floor((bound + 1e-6 * Math.max(1, Math.abs(bound) * 1e-6)) / step);
}

const PIECES = 16;
