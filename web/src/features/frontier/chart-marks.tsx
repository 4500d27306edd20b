import type { Box } from './chart-geometry';
import { px } from './chart-geometry';

interface Place {
  x: number;
  y: number;
}

/** A: a shield with its letter, tip on the portfolio. */
export function Shield({ x, y }: Place) {
  return (
    <g transform={`translate(${px(x - 12)} ${px(y - 24)})`} className="mark">
      <path
        d="M1 0h22v15l-11 10L1 15z"
        fill="var(--mw-chart-sel)"
        stroke="var(--mw-surface)"
        strokeWidth="2"
      />
      <text x="12" y="15" textAnchor="middle" className="letter" style={{ fill: 'var(--mw-on-action)' }}>
        A
      </text>
    </g>
  );
}

/** B: a diamond with its letter, centred on the portfolio. */
export function Diamond({ x, y }: Place) {
  return (
    <g transform={`translate(${px(x - 12)} ${px(y - 12)})`} className="mark">
      <path
        d="M12 0 24 12 12 24 0 12z"
        fill="var(--mw-chart-cmp)"
        stroke="var(--mw-surface)"
        strokeWidth="2"
      />
      <text x="12" y="16.2" textAnchor="middle" className="letter" style={{ fill: 'var(--mw-on-sea)' }}>
        B
      </text>
    </g>
  );
}

interface ValueBoxProps {
  box: Box;
  text: string;
  /** Filled for A, outlined for what A is compared with and for flags. */
  look: 'filled' | 'compared' | 'flag';
}

const LOOKS = {
  filled: { fill: 'var(--mw-action)', stroke: 'var(--mw-action)', ink: 'var(--mw-on-action)' },
  compared: { fill: 'var(--mw-raised)', stroke: 'var(--mw-chart-cmp)', ink: 'var(--mw-sea)' },
  flag: { fill: 'var(--mw-raised)', stroke: 'var(--mw-ink)', ink: 'var(--mw-ink)' },
};

export function ValueBox({ box, text, look }: ValueBoxProps) {
  const { fill, stroke, ink } = LOOKS[look];
  return (
    <g className={`box ${look}`}>
      <rect
        x={px(box.x)}
        y={px(box.y)}
        width={px(box.width)}
        height={box.height}
        fill={fill}
        stroke={stroke}
      />
      <text
        x={px(box.x + box.width / 2)}
        y={px(box.y + box.height / 2 + 4.5)}
        textAnchor="middle"
        className="label"
        style={{ fill: ink }}
      >
        {text}
      </text>
    </g>
  );
}
