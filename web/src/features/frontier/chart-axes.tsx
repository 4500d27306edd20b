import { formatNumber } from '../../lib/money';
import type { Geometry } from './chart-geometry';
import { px } from './chart-geometry';

/** The figures of the benefit axis and what it shows. The cost axis is the rod. */
export function ChartAxes({
  geometry: { plot, y },
  gridValues,
}: {
  geometry: Geometry;
  gridValues: readonly number[];
}) {
  return (
    <g>
      <text x={plot.x} y={plot.y - 9} className="label">
        More benefit ↑ <tspan className="unit">points</tspan>
      </text>
      {gridValues.map((value) => (
        <text key={value} x={plot.x - 8} y={px(y(value) + 4)} textAnchor="end">
          {formatNumber(value)}
        </text>
      ))}
    </g>
  );
}
