import type { Problem } from '../problem/problem.js';
import { dominatedVolume, type SurfacePoint } from './dominated-volume.js';
import type { ThreeObjectivesResult } from './search-three-objectives.js';

/** What the certificate of three objectives says beside that of two, and the volumes in place of the areas. */
export interface SurfaceCertificate {
  readonly surfaceBound: readonly SurfacePoint[];
  readonly provenSecondCosts: ThreeObjectivesResult['provenSecondCosts'];
  readonly hypervolume: number;
  /** That of the surface bound: the volume of the whole surface is no larger. Missing where nothing is proven. */
  readonly hypervolumeBound?: number;
  /** The corner the volumes are measured from: the ceiling, or else the dearest point, and the dearest to run. */
  readonly reference: { readonly benefit: number; readonly cost: number; readonly secondCost: number };
}

export function surfaceCertificate(problem: Problem, result: ThreeObjectivesResult): SurfaceCertificate {
  const { surfaceBound, provenSecondCosts } = result;
  const points = result.points.map(({ cost, benefit, secondCost }): SurfacePoint => [
    cost,
    benefit,
    secondCost,
  ]);
  const most = (figure: 0 | 2): number => points.reduce((high, point) => Math.max(high, point[figure]), 0);
  const reference = { benefit: 0, cost: problem.ceiling ?? most(0), secondCost: most(2) };
  return {
    surfaceBound,
    provenSecondCosts,
    hypervolume: dominatedVolume(points, reference),
    ...(surfaceBound.length > 0 ? { hypervolumeBound: dominatedVolume(surfaceBound, reference) } : {}),
    reference,
  };
}
