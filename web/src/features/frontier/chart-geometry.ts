export interface Box {
  x: number;
  y: number;
  width: number;
  height: number;
}

/** The plot and its two scales. Cost in currency units, benefit in points, places in px from the drawing's corner. */
export interface Geometry {
  width: number;
  height: number;
  plot: Box;
  domain: { cost: readonly [number, number]; benefit: readonly [number, number] };
  x: (cost: number) => number;
  y: (benefit: number) => number;
  costAt: (x: number) => number;
}

interface Sides {
  left: number;
  right: number;
  top: number;
  bottom: number;
}

export function geometryOf(
  size: { width: number; height: number },
  sides: Sides,
  domain: Geometry['domain'],
): Geometry {
  const plot = {
    x: sides.left,
    y: sides.top,
    width: Math.max(1, size.width - sides.left - sides.right),
    height: Math.max(1, size.height - sides.top - sides.bottom),
  };
  const [cheapest, dearest] = domain.cost;
  const [least, most] = domain.benefit;
  return {
    ...size,
    plot,
    domain,
    x: (cost) => plot.x + ((cost - cheapest) / (dearest - cheapest)) * plot.width,
    y: (benefit) => plot.y + plot.height - ((benefit - least) / (most - least)) * plot.height,
    costAt: (x) => cheapest + ((x - plot.x) / plot.width) * (dearest - cheapest),
  };
}

/** Room around the kept portfolios' benefits: above for the labels of the best, below so that no peg touches the rod. */
export function benefitDomain(benefits: readonly number[]): readonly [number, number] {
  const least = Math.min(...benefits);
  const most = Math.max(...benefits);
  const room = most > least ? most - least : Math.max(1, most);
  return [least - room * 0.06, most + room * 0.13];
}

/** A line that runs level from each point to the next cost and then rises: between two portfolios nothing lies. */
export function stepPath(points: readonly (readonly [x: number, y: number])[]): string {
  const [first, ...rest] = points;
  if (!first) return '';
  return rest.reduce((path, [x, y]) => `${path}H${px(x)}V${px(y)}`, `M${px(first[0])} ${px(first[1])}`);
}

/** The reverse: it rises first and then runs level, so that it never lies below a bound given at the step's end. */
export function upperStepPath(points: readonly (readonly [x: number, y: number])[]): string {
  const [first, ...rest] = points;
  if (!first) return '';
  return rest.reduce((path, [x, y]) => `${path}V${px(y)}H${px(x)}`, `M${px(first[0])} ${px(first[1])}`);
}

/** Index of the point nearest to `at` and not farther than `reach` px; undefined when none is that near. O(n). */
export function nearestPlace(
  places: readonly (readonly [x: number, y: number])[],
  at: readonly [x: number, y: number],
  reach: number,
): number | undefined {
  let nearest: number | undefined;
  let least = reach;
  for (const [index, place] of places.entries()) {
    const distance = Math.hypot(place[0] - at[0], place[1] - at[1]);
    if (distance > least) continue;
    least = distance;
    nearest = index;
  }
  return nearest;
}

/** One decimal is finer than any screen, and keeps long paths short. */
export function px(value: number): string {
  return String(Math.round(value * 10) / 10);
}
