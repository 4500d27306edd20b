import type { Geometry } from './chart-geometry';
import { px } from './chart-geometry';
import { shortCost } from './wording';

interface ChartCeilingProps {
  geometry: Geometry;
  /** On capital, in currency units. */
  ceiling: number;
  /** Id of the counter-hatch to the right of the line. */
  hatch: string;
}

/** The budget ceiling, for the capital axis: double line, label on top, counter-hatch to its right. */
export function ChartCeiling({ geometry: { plot, domain, x }, ceiling, hatch }: ChartCeilingProps) {
  if (ceiling < domain.cost[0] || ceiling > domain.cost[1]) return null;
  const at = x(ceiling);
  const right = plot.x + plot.width;
  const half = CEILING_LABEL_WIDTH / 2;
  return (
    <g>
      <rect x={px(at)} y={plot.y} width={px(right - at)} height={plot.height} fill={`url(#${hatch})`} />
      <path
        d={`M${px(at)} ${plot.y - 4}V${plot.y + plot.height}M${px(at + 3.5)} ${plot.y - 4}V${plot.y + plot.height}`}
        className="line"
        stroke="var(--mw-chart-ceiling)"
        strokeWidth="1.2"
      />
      <text x={px(Math.min(at, right - half))} y={plot.y - 9} textAnchor="middle" className="label">
        Budget ceiling {shortCost(ceiling)}
      </text>
    </g>
  );
}

const CEILING_LABEL_WIDTH = 140;
