import type { Box, Geometry } from './chart-geometry';
import { px } from './chart-geometry';
import { ValueBox } from './chart-marks';
import type { Portfolio } from './portfolio';
import { signedPoints } from './wording';

/** Below a mark that stands lower, the words on the rod would lie over its sign. */
const WORDS_NEED_PX = 56;

interface ChartNextStepProps {
  geometry: Geometry;
  from: Portfolio;
  to: Portfolio;
  /** One long graduation, in currency units. */
  step: number;
  /** The same in words: "100 k". */
  stepText: string;
  flag: Box;
}

/** What the next graduation of cost buys: a dotted step from A, a flag with the points, and its length on the rod. */
export function ChartNextStep({ geometry, from, to, step, stepText, flag }: ChartNextStepProps) {
  const { plot, x, y } = geometry;
  const left = x(from.cost);
  const right = Math.min(x(from.cost + step), plot.x + plot.width);
  const floor = plot.y + plot.height;
  const top = y(to.benefit);
  return (
    <g>
      <path
        d={`M${px(left)} ${px(y(from.benefit))}H${px(right)}V${px(top)}`}
        className="line"
        fill="none"
        stroke="var(--mw-ink)"
        strokeWidth="1.4"
        strokeDasharray="2 3"
      />
      <path
        d={`M${px(right)} ${px(top)}V${px(flag.y + flag.height)}`}
        className="line"
        stroke="var(--mw-ink)"
        strokeWidth="1.2"
      />
      <ValueBox box={flag} text={signedPoints(to.benefit - from.benefit)} look="flag" />
      <path
        d={`M${px(left + 3)} ${floor - 8}v5H${px(right)}v-5`}
        className="line"
        fill="none"
        stroke="var(--mw-ink)"
        strokeWidth="1.5"
      />
      {floor - y(from.benefit) > WORDS_NEED_PX &&
        ['next', stepText].map((text, line) => (
          <text
            key={line}
            x={px(left + Math.max(24, (right - left) / 2))}
            y={floor - 27 + line * 14}
            textAnchor="middle"
            className="note halo strong"
          >
            {text}
          </text>
        ))}
    </g>
  );
}
