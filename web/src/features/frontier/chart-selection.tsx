import type { Box, Geometry } from './chart-geometry';
import { px } from './chart-geometry';
import { Diamond, Shield, ValueBox } from './chart-marks';
import type { Portfolio } from './portfolio';
import { points, shortCost } from './wording';

interface ChartSelectionProps {
  geometry: Geometry;
  portfolio: Portfolio;
  label: Box;
  /** The words in the box. */
  text: string;
  letter: 'A' | 'B';
}

/** A portfolio somebody has chosen: its mark, the plumb line down to the rod, and its figures in a box. */
export function ChartSelection({
  geometry: { plot, x, y },
  portfolio,
  label,
  text,
  letter,
}: ChartSelectionProps) {
  const at = { x: x(portfolio.cost), y: y(portfolio.benefit) };
  const selected = letter === 'A';
  return (
    <g>
      <path
        d={`M${px(at.x)} ${px(at.y)}V${plot.y + plot.height + 10}`}
        className="line"
        stroke={selected ? 'var(--mw-chart-sel)' : 'var(--mw-chart-cmp)'}
        strokeWidth={selected ? 1.6 : 1.4}
        strokeDasharray={selected ? undefined : '1.5 3'}
      />
      {selected ? <Shield {...at} /> : <Diamond {...at} />}
      <ValueBox box={label} text={text} look={selected ? 'filled' : 'compared'} />
    </g>
  );
}

/** "2.30 M · 818.7": the figures beside a mark, which says too that it stands at the knee. */
export function valueText({ index, cost, benefit }: Portfolio, knee: number | undefined): string {
  return `${shortCost(cost)} · ${points(benefit)}${index === knee ? ' · knee' : ''}`;
}
