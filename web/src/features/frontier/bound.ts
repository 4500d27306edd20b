/** An upper bound on benefit over cost: rising steps as [cost, most benefit at that cost]. Empty while nothing is proven. */
export type Bound = readonly (readonly [cost: number, benefit: number])[];

export function toBound({
  costs,
  benefits,
}: {
  costs: readonly number[];
  benefits: readonly number[];
}): Bound {
  return costs.map((cost, index) => [cost, benefits[index]!] as const);
}

/** What of the stretch of the bound is not proven complete. `proven` rises and does not overlap. */
export function openStretches(
  bound: Bound,
  proven: readonly (readonly [from: number, to: number])[],
): (readonly [from: number, to: number])[] {
  const starts = [bound[0]![0], ...proven.map(([, to]) => to)];
  const ends = [...proven.map(([from]) => from), bound.at(-1)![0]];
  return starts.map((from, place) => [from, ends[place]!] as const).filter(([from, to]) => from < to);
}

/** The most benefit possible at `cost`: the bound given at the nearest cost not below it. Undefined outside the bound. */
export function boundAt(bound: Bound, cost: number): number | undefined {
  const [first] = bound;
  if (!first || cost < first[0]) return undefined;
  return bound.find(([at]) => at >= cost)?.[1];
}
