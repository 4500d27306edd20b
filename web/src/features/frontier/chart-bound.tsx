import { useId } from 'react';
import type { Bound } from './bound';
import { boundAt, openStretches } from './bound';
import { stepPath, upperStepPath } from './chart-geometry';
import type { Front } from './front';
import type { Portfolio } from './portfolio';
import { dearestWithin } from './portfolio';

/** Beyond the drawing above and below, enlarged too. */
const FAR_PX = 100_000;

interface ChartBoundProps {
  /** Where a cost and a benefit stand, in px. */
  place: (figures: readonly [cost: number, benefit: number]) => readonly [x: number, y: number];
  bound: Bound;
  portfolios: readonly Portfolio[];
  /** Stretches of cost where the bound is the front itself, and is not drawn. */
  proven: Front['proven'];
  /** Id of the hatch that marks the gap. */
  hatch: string;
}

/** How much could still be missed: the proven upper bound, dashed, and the gap below it, hatched. Nothing while unproven, nor where nothing is missing. */
export function ChartBound({ place, bound, portfolios, proven, hatch }: ChartBoundProps) {
  const clip = useId();
  if (bound.length < 2) return null;
  const upper = bound.map(place);
  const lower = kept(bound, portfolios).map(place);
  const back = stepPath(lower).replace(/^M/u, 'L');
  return (
    <g clipPath={`url(#${clip})`}>
      <clipPath id={clip}>
        {openStretches(bound, proven).map(([from, to]) => {
          const [[left], [right]] = [place([from, 0]), place([to, 0])];
          return <rect key={from} x={left} width={right - left} y={-FAR_PX} height={2 * FAR_PX} />;
        })}
      </clipPath>
      <path d={`${reversedUpper(upper)}${back}Z`} fill={`url(#${hatch})`} />
      <path
        d={upperStepPath(upper)}
        className="line"
        fill="none"
        stroke="var(--mw-chart-bound)"
        strokeWidth="2"
        strokeDasharray="7 3"
      />
    </g>
  );
}

/** The best found so far over the stretch of the bound. */
function kept(bound: Bound, portfolios: readonly Portfolio[]): [number, number][] {
  const from = bound[0]![0];
  const to = bound.at(-1)![0];
  const benefitAt = (cost: number) => portfolios[Math.max(0, dearestWithin(portfolios, cost))]!.benefit;
  const between = portfolios.filter(({ cost }) => cost > from && cost < to);
  return [
    [from, Math.min(benefitAt(from), boundAt(bound, from)!)],
    ...between.map(({ cost, benefit }): [number, number] => [cost, benefit]),
    [to, benefitAt(to)],
  ];
}

/** The bound from its dear end to its cheap one, so that the way back along the kept portfolios closes the area. */
function reversedUpper(upper: readonly (readonly [x: number, y: number])[]): string {
  return stepPath(upper.toReversed());
}
