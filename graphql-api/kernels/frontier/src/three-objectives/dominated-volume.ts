/** A point of a three-objective front. */
export type SurfacePoint = readonly [cost: number, benefit: number, secondCost: number];

/**
 * The volume a set of points dominates: all that is worse than one of them in benefit, cost and second cost and better
 * than the reference. A plane sweeps along the second cost and keeps the area its points dominate in cost and benefit
 * (dimension sweep; Fonseca, Paquete and López-Ibáñez 2006, Beume et al. 2009; both from memory). Points in any order;
 * those beyond the reference add nothing. O(n log n), and moving steps of the staircase aside.
 */
export function dominatedVolume(
  points: readonly SurfacePoint[],
  reference: { readonly benefit: number; readonly cost: number; readonly secondCost: number },
): number {
  const within = points.filter(
    ([cost, benefit, secondCost]) =>
      cost < reference.cost && benefit > reference.benefit && secondCost < reference.secondCost,
  );
  within.sort((one, other) => one[2] - other[2]);
  const staircase = new Staircase(reference);
  let volume = 0;
  for (const [place, [cost, benefit, secondCost]] of within.entries()) {
    staircase.add(cost, benefit);
    volume += staircase.area * ((within[place + 1]?.[2] ?? reference.secondCost) - secondCost);
  }
  return volume;
}

/** Steps in order of cost, rising in benefit, and the area below them up to the reference. */
class Staircase {
  area = 0;
  private readonly steps: { cost: number; benefit: number }[] = [];

  constructor(private readonly reference: { readonly benefit: number; readonly cost: number }) {}

  add(cost: number, benefit: number): void {
    const { steps, reference } = this;
    const from = this.placeOf(cost);
    const below = from > 0 ? steps[from - 1].benefit : reference.benefit;
    if (below >= benefit || (steps[from]?.cost === cost && steps[from].benefit >= benefit)) return;
    // what the new step rises above: the ground before the next step, then each step it covers
    let to = from;
    let ground = below;
    let at = cost;
    while (to < steps.length && steps[to].benefit <= benefit) {
      this.area += (benefit - ground) * (steps[to].cost - at);
      at = steps[to].cost;
      ground = steps[to].benefit;
      to++;
    }
    this.area += (benefit - ground) * ((steps[to]?.cost ?? reference.cost) - at);
    steps.splice(from, to - from, { cost, benefit });
  }

  /** The first place whose cost is not below. */
  private placeOf(cost: number): number {
    const { steps } = this;
    let low = 0;
    let high = steps.length;
    while (low < high) {
      const middle = (low + high) >>> 1;
      if (steps[middle].cost < cost) low = middle + 1;
      else high = middle;
    }
    return low;
  }
}
