import type { Geometry } from './chart-geometry';
import { px, stepPath } from './chart-geometry';
import type { Portfolio } from './portfolio';

interface ChartStepsProps {
  geometry: Geometry;
  portfolios: readonly Portfolio[];
  /** Places of the portfolios that get a peg. */
  pegs: readonly number[];
}

/** The best found so far: a step line, because between two portfolios nothing lies, and a peg at each shown portfolio. */
export function ChartSteps({ geometry: { x, y }, portfolios, pegs }: ChartStepsProps) {
  return (
    <g>
      <path
        d={stepPath(portfolios.map(({ cost, benefit }) => [x(cost), y(benefit)]))}
        className="line"
        fill="none"
        stroke="var(--mw-chart-kept)"
        strokeWidth="2"
      />
      {pegs.map((place) => {
        const { cost, benefit, aboveCeiling } = portfolios[place]!;
        return <Peg key={place} x={x(cost)} y={y(benefit)} hollow={aboveCeiling} />;
      })}
    </g>
  );
}

/** Hollow where the portfolio's capital passes the ceiling. */
export function Peg({ x, y, hollow }: { x: number; y: number; hollow: boolean }) {
  const place = { x: px(x - 2.8), y: px(y - 2.8), width: 5.6, height: 5.6 };
  return hollow ? (
    <rect
      {...place}
      className="peg hollow"
      fill="var(--mw-surface)"
      stroke="var(--mw-chart-kept)"
      strokeWidth="1.4"
    />
  ) : (
    <rect {...place} className="peg" fill="var(--mw-chart-kept)" />
  );
}
