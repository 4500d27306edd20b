import { useId } from 'react';
import type { Bound } from './bound';
import { ChartBound } from './chart-bound';
import type { Box, Geometry } from './chart-geometry';
import { px, stepPath } from './chart-geometry';
import { Shield } from './chart-marks';
import { Peg } from './chart-steps';
import type { Front } from './front';
import { holds } from './place-labels';
import type { Portfolio } from './portfolio';
import { PEG_GAP, thinPegs } from './thin-pegs';
import { pointsMore } from './wording';

/** How many times larger the glass may show what lies around A, the best first. */
const POWERS = [5, 4, 3];

/** Narrower glasses leave no room for "Around A" beside the plumb line. */
const WORDS_WIDTH = 260;

interface ChartGlassProps {
  geometry: Geometry;
  glass: Box;
  portfolios: readonly Portfolio[];
  selected: Portfolio;
  bound: Bound;
  proven: Front['proven'];
  /** Points that could still be missed at A's cost, where that is known. */
  atMost: number | undefined;
  hatch: string;
}

/** The surroundings of A enlarged, with the same corner brackets here and there. */
export function ChartGlass({
  geometry,
  glass,
  portfolios,
  selected,
  bound,
  proven,
  atMost,
  hatch,
}: ChartGlassProps) {
  const clip = useId();
  const power = powerFor(glass, geometry, portfolios, selected);
  if (power === undefined) return null;
  const seen = seenThrough(glass, power, geometry, selected);
  const enlarge = ([cost, benefit]: readonly [number, number]): readonly [number, number] => [
    glass.x + (geometry.x(cost) - seen.x) * power,
    glass.y + (geometry.y(benefit) - seen.y) * power,
  ];
  const steps = portfolios.map(({ cost, benefit }) => enlarge([cost, benefit]));
  const [atX, atY] = enlarge([selected.cost, selected.benefit]);
  const shown = portfolios.filter((_, place) => holds(glass, ...steps[place]!));
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
        <ChartBound place={enlarge} {...{ bound, portfolios, proven, hatch }} />
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
      {atMost !== undefined && <AtMost glass={glass} points={pointsMore(atMost)} />}
      <text
        x={glass.x + glass.width - 10}
        y={glass.y + glass.height - 10}
        textAnchor="end"
        className="note halo"
      >
        {glass.width < WORDS_WIDTH ? '' : 'Around A, '}
        {power} times larger
      </text>
      <Brackets box={glass} length={13} />
      <Brackets box={seen} length={6} />
    </g>
  );
}

/** The greatest power at which the glass shows another portfolio beside A; undefined where it would show A alone. */
function powerFor(glass: Box, geometry: Geometry, portfolios: readonly Portfolio[], selected: Portfolio) {
  const { x, y } = geometry;
  return POWERS.find((power) => {
    const seen = seenThrough(glass, power, geometry, selected);
    return portfolios.some((each) => each !== selected && holds(seen, x(each.cost), y(each.benefit)));
  });
}

/** The part of the plot that the glass shows, in its unenlarged size: A stands a little left of the middle. */
function seenThrough(glass: Box, power: number, { x, y }: Geometry, { cost, benefit }: Portfolio): Box {
  const width = glass.width / power;
  const height = glass.height / power;
  return { x: x(cost) - width * 0.44, y: y(benefit) - height * 0.56, width, height };
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
