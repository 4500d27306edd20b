import type { Box } from './chart-geometry';
import { px } from './chart-geometry';
import { KNEE_FULL_HEIGHT } from './chart-layout';
import { shortCost } from './wording';

interface ChartKneeProps {
  /** The portfolio at the knee. */
  at: { x: number; y: number };
  cost: number;
  /** "100 k": one long graduation. */
  step: string;
  label: Box;
}

/** The knee: a carpenter's square that rests at the corner, and what it means. */
export function ChartKnee({ at, cost, step, label }: ChartKneeProps) {
  const x = at.x - 7;
  const y = at.y - 7;
  const right = label.x + label.width;
  return (
    <g>
      <path
        d={`M${px(x)} ${px(y - 26)}V${px(y)}H${px(x - 26)}`}
        className="line"
        fill="none"
        stroke="var(--mw-ink)"
        strokeWidth="2"
      />
      <text x={px(right)} y={px(label.y + 12)} textAnchor="end" className="label halo">
        Knee {shortCost(cost)}
      </text>
      {label.height >= KNEE_FULL_HEIGHT && (
        <text x={px(right)} y={px(label.y + 27)} textAnchor="end" className="note halo">
          beyond it, each {step} buys less
        </text>
      )}
    </g>
  );
}
