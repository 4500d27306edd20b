/**
 * The area a front dominates: that between its step line and a reference point of least benefit and most cost, in
 * benefit times cost. Points [cost, benefit] in order of cost, rising in both; those beyond the reference add nothing.
 */
export function hypervolume(
  points: readonly (readonly [cost: number, benefit: number])[],
  reference: { readonly benefit: number; readonly cost: number },
): number {
  let area = 0;
  for (const [place, [cost, benefit]] of points.entries()) {
    const nextCost = Math.min(points[place + 1]?.[0] ?? reference.cost, reference.cost);
    if (nextCost > cost && benefit > reference.benefit)
      area += (benefit - reference.benefit) * (nextCost - cost);
  }
  return area;
}
