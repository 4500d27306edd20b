import { useId } from 'react';
import type { Bound } from './bound';
import { ChartBound } from './chart-bound';
import type { Box, Geometry } from './chart-geometry';
import { px, stepPath } from './chart-geometry';
import { Shield } from './chart-marks';
import { Peg } from './chart-steps';
import type { Portfolio } from './portfolio';
import { PEG_GAP, thinPegs } from './thin-pegs';
import { points } from './wording';

/** How many times larger the glass shows what lies around A. */
const GLASS_POWER = 5;

interface ChartGlassProps {
  geometry: Geometry;
  glass: Box;
  portfolios: readonly Portfolio[];
  selected: Portfolio;
  bound: Bound;
  /** Points that could still be missed at A's cost, where that is known. */
  atMost: number | undefined;
  hatch: string;
}

/** The surroundings of A enlarged, with the same corner brackets here and there. */
export function ChartGlass({ geometry, glass, portfolios, selected, bound, atMost, hatch }: ChartGlassProps) {
  const clip = useId();
  const seen = seenThrough(glass, geometry, selected);
  const enlarge = ([cost, benefit]: readonly [number, number]): readonly [number, number] => [
    glass.x + (geometry.x(cost) - seen.x) * GLASS_POWER,
    glass.y + (geometry.y(benefit) - seen.y) * GLASS_POWER,
  ];
  const steps = portfolios.map(({ cost, benefit }) => enlarge([cost, benefit]));
  const [atX, atY] = enlarge([selected.cost, selected.benefit]);
  const shown = portfolios.filter((_, place) => Math.abs(steps[place]![0] - atX) <= glass.width / 2);
  const pegs = thinPegs(
    shown.map(({ index }) => steps[index]!),
    PEG_GAP,
    new Set([shown.indexOf(selected)]),
  ).map((place) => shown[place]!);
  return (
    <g>
      <rect {...glass} fill="var(--mw-raised)" />
      <clipPath id={clip}>
        <rect {...glass} />
      </clipPath>
      <g clipPath={`url(#${clip})`}>
        <ChartBound place={enlarge} {...{ bound, portfolios, hatch }} />
        <path
          d={stepPath(steps)}
          className="line"
          fill="none"
          stroke="var(--mw-chart-kept)"
          strokeWidth="2.2"
        />
        {pegs.map(({ index, aboveCeiling }) => (
          <Peg key={index} x={steps[index]![0]} y={steps[index]![1]} hollow={aboveCeiling} />
        ))}
        <path
          d={`M${px(atX)} ${px(atY)}V${glass.y + glass.height}`}
          className="line"
          stroke="var(--mw-chart-sel)"
          strokeWidth="1.6"
        />
        <Shield x={atX} y={atY} />
      </g>
      {atMost !== undefined && <AtMost glass={glass} points={points(atMost)} />}
      <text
        x={glass.x + glass.width - 10}
        y={glass.y + glass.height - 10}
        textAnchor="end"
        className="note halo"
      >
        Around A, {GLASS_POWER} times larger
      </text>
      <Brackets box={glass} length={13} />
      <Brackets box={seen} length={6} />
    </g>
  );
}

/** The part of the plot that the glass shows, in its unenlarged size: A stands in the middle. */
function seenThrough(glass: Box, { x, y }: Geometry, { cost, benefit }: Portfolio): Box {
  const width = glass.width / GLASS_POWER;
  const height = glass.height / GLASS_POWER;
  return { x: x(cost) - width / 2, y: y(benefit) - height * 0.56, width, height };
}

function AtMost({ glass, points: most }: { glass: Box; points: string }) {
  return (
    <>
      <text x={glass.x + 12} y={glass.y + 24} className="label halo">
        at most {most}
      </text>
      <text x={glass.x + 12} y={glass.y + 39} className="note halo">
        points more
      </text>
    </>
  );
}

function Brackets({ box: { x, y, width, height }, length }: { box: Box; length: number }) {
  const right = x + width;
  const foot = y + height;
  const corners = [
    `M${px(x)} ${px(y + length)}V${px(y)}h${length}`,
    `M${px(right - length)} ${px(y)}h${length}v${length}`,
    `M${px(x)} ${px(foot - length)}V${px(foot)}h${length}`,
    `M${px(right - length)} ${px(foot)}h${length}v${-length}`,
  ];
  return <path d={corners.join('')} className="line" fill="none" stroke="var(--mw-ink)" strokeWidth="1.8" />;
}
