/**
 * The place of the knee in a front: the point farthest above the straight line between its two ends, both axes
 * stretched to the same length (Das 1999, "On characterizing the knee of the Pareto curve based on normal-boundary
 * intersection"; from memory). Undefined where no point lies above the line. Points [cost, benefit] in order of cost;
 * of equally far points the cheapest.
 */
export function kneeOf(points: readonly (readonly [cost: number, benefit: number])[]): number | undefined {
  if (points.length < 3) return undefined;
  const [firstCost, firstBenefit] = points[0];
  const [lastCost, lastBenefit] = points[points.length - 1];
  let knee: number | undefined;
  let farthest = 0;
  for (const [place, [cost, benefit]] of points.entries()) {
    // after stretching the line is the diagonal of the unit square, so this is the distance times the root of two
    const above =
      (benefit - firstBenefit) / (lastBenefit - firstBenefit) - (cost - firstCost) / (lastCost - firstCost);
    if (above <= farthest) continue;
    farthest = above;
    knee = place;
  }
  return knee;
}
