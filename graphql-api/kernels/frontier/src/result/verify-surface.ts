import { dominatedVolume, type SurfacePoint } from '../three-objectives/dominated-volume.js';
import type { ClaimedFrontier } from './parse-frontier.js';
import { Staircase } from './staircase.js';
import type { Finding } from './verify-frontier.js';

/** What the certificate says of a second cost: the surface bound, intervals of second cost, volumes. O(n log n). */
export function* surfaceFindings(claimed: ClaimedFrontier, hasSecondCost: boolean): Generator<Finding> {
  const { surfaceBound, provenSecondCosts } = claimed.certificate;
  if (!hasSecondCost) {
    for (const key of ['surfaceBound', 'provenSecondCosts'] as const) {
      if (claimed.certificate[key] === undefined) continue;
      yield { path: `certificate.${key}`, sentence: 'The problem knows no second cost.' };
    }
    return;
  }
  const points = claimed.points.map(({ cost, benefit, secondCost = 0 }): SurfacePoint => [
    cost,
    benefit,
    secondCost,
  ]);
  for (const [index, [from, to]] of (provenSecondCosts ?? []).entries()) {
    const path = `certificate.provenSecondCosts[${index}]`;
    if (from > to) yield { path, sentence: `It ends at ${to}, before it begins at ${from}.` };
    const above = provenSecondCosts?.[index - 1];
    if (above && to >= above[0]) {
      yield {
        path,
        sentence: `Intervals go from the highest down and lie apart; the one before begins at ${above[0]}.`,
      };
    }
  }
  if (surfaceBound !== undefined && surfaceBound.length > 0) yield* pointsAbove(points, surfaceBound);
  if (claimed.certificate.status === 'complete') yield* looseSurface(points, surfaceBound ?? []);
  yield* volumeFindings(claimed, points);
}

function* pointsAbove(points: readonly SurfacePoint[], bound: readonly SurfacePoint[]): Generator<Finding> {
  const waiting = [...bound].sort(([one], [other]) => other - one);
  // of all of the bound that costs no more: the most benefit at no more than a second cost
  const cheaper = new Staircase();
  for (const [cost, index] of points
    .map(([each], place) => [each, place])
    .sort(([one], [other]) => one - other)) {
    while (waiting.length > 0 && waiting[waiting.length - 1][0] <= cost) {
      const [, benefit, secondCost] = waiting.pop()!;
      cheaper.raise(secondCost, benefit);
    }
    const [, benefit, secondCost] = points[index];
    if (cheaper.at(secondCost) >= benefit) continue;
    const sentence =
      'It lies beyond the surface bound: nothing there is as good in benefit, cost and second cost.';
    yield { path: `points[${index}]`, sentence };
  }
}

function* looseSurface(points: readonly SurfacePoint[], bound: readonly SurfacePoint[]): Generator<Finding> {
  const known = new Set(points.map(String));
  const stray = bound.find((each) => !known.has(String(each)));
  if (stray === undefined && bound.length === points.length) return;
  const detail = stray ? `[${stray.join(', ')}] is not one` : `it has ${bound.length} of ${points.length}`;
  const sentence = `The surface bound of a complete frontier is its points, but ${detail}.`;
  yield { path: 'certificate.surfaceBound', sentence };
}

function* volumeFindings(
  { certificate }: ClaimedFrontier,
  points: readonly SurfacePoint[],
): Generator<Finding> {
  const { reference, surfaceBound } = certificate;
  if (reference?.secondCost === undefined) return;
  const corner = { ...reference, secondCost: reference.secondCost };
  const volumes = [
    ['hypervolume', certificate.hypervolume, points],
    ['hypervolumeBound', certificate.hypervolumeBound, surfaceBound ?? []],
  ] as const;
  for (const [key, claimed, set] of volumes) {
    if (claimed === undefined) continue;
    const volume = dominatedVolume(set, corner);
    if (Math.abs(claimed - volume) <= 1e-9 * volume) continue;
    yield { path: `certificate.${key}`, sentence: `It says ${claimed}, but the set gives ${volume}.` };
  }
}
