import type { SurfacePoint } from './dominated-volume.js';
import { ParetoSurface } from './pareto-surface.js';
import { lowerOf, type BoundLine } from './bound-line.js';

/**
 * What is proven of the portfolios whose second cost lies between `least` and `most`. From `exactFrom` on every point
 * is known; below it `line` holds: of the portfolios with a second cost of `most` or less, none has more benefit at
 * any cost.
 */
export interface Layer {
  readonly least: number;
  readonly most: number;
  /** `most + 1` if nothing is known exactly. */
  readonly exactFrom: number;
  readonly line: BoundLine;
}

/**
 * The bound set that layers and known points amount to: every feasible portfolio is matched or beaten in all three
 * figures by one of its points, which are ideal ones but where something is known exactly. Layers from the highest
 * second cost down, without gaps. In order of cost.
 */
export function boundOf(layers: readonly Layer[], known: readonly SurfacePoint[]): SurfacePoint[] {
  const bound = new ParetoSurface(Int32Array.of(0));
  const add = ([cost, benefit, secondCost]: SurfacePoint): void => {
    bound.offer(benefit, cost, secondCost, NO_CHOICES);
  };
  let line: BoundLine | undefined;
  for (const layer of layers) {
    // a line holds for all lower second costs too
    line = line === undefined ? layer.line : lowerOf(line, layer.line);
    if (layer.exactFrom > layer.least) for (const [cost, benefit] of line) add([cost, benefit, layer.least]);
    for (const point of known) if (point[2] >= layer.exactFrom && point[2] <= layer.most) add(point);
  }
  return Array.from(bound.slots(), (slot) => [
    bound.costOf(slot),
    bound.benefitOf(slot),
    bound.secondCostOf(slot),
  ]);
}

const NO_CHOICES = new Int32Array(0);
