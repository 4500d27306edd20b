import { useId } from 'react';
import styled from 'styled-components';
import { ChartAxes } from './chart-axes';
import { ChartBound } from './chart-bound';
import { ChartCeiling } from './chart-ceiling';
import type { Geometry } from './chart-geometry';
import { ChartGlass } from './chart-glass';
import { Hatches } from './chart-hatches';
import { ChartKnee } from './chart-knee';
import { layoutOf, pegPlaces, placesOf } from './chart-drawing-layout';
import { ChartNextStep } from './chart-next-step';
import { ChartSelection, valueText } from './chart-selection';
import { ChartSteps } from './chart-steps';
import type { Front } from './front';
import { gainForMore } from './marginal-gain';
import type { Chosen } from './use-chosen';
import { shortMoney } from '../../lib/money';

interface ChartDrawingProps {
  front: Front;
  geometry: Geometry;
  gridValues: readonly number[];
  chosen: Chosen;
  narrow: boolean;
}

/** Everything above the points, back to front. It says nothing to a screen reader: the rod and the table do. */
export function ChartDrawing({ front, geometry, gridValues, chosen, narrow }: ChartDrawingProps) {
  const id = useId();
  const hatch = { gap: `${id}gap`, ceiling: `${id}ceiling` };
  const { portfolios, bound, proven, scale, knee } = front;
  const selected = portfolios[chosen.a]!;
  const compared = chosen.b === undefined || chosen.b === chosen.a ? undefined : portfolios[chosen.b];
  const next = gainForMore(portfolios, chosen.a, scale.long);
  const places = placesOf(portfolios, geometry);
  const layout = layoutOf({
    front,
    geometry,
    places,
    selected,
    compared,
    next,
    withGlass: !narrow && front.status !== 'COMPLETE',
  });
  const step = shortMoney(scale.long);
  const atKnee = knee === undefined ? undefined : portfolios[knee];
  return (
    <Drawing width={geometry.width} height={geometry.height + 10} aria-hidden>
      <Hatches {...hatch} />
      <ChartAxes {...{ geometry, gridValues }} />
      {front.costAxis === 'CAPITAL' && (
        <ChartCeiling geometry={geometry} ceiling={Number(front.ceiling.amount)} hatch={hatch.ceiling} />
      )}
      <ChartBound
        place={([cost, benefit]) => [geometry.x(cost), geometry.y(benefit)]}
        {...{ bound, portfolios, proven }}
        hatch={hatch.gap}
      />
      <ChartSteps {...{ geometry, portfolios }} pegs={pegPlaces(front, places, chosen)} />
      {atKnee && layout.knee && (
        <ChartKnee
          at={{ x: geometry.x(atKnee.cost), y: geometry.y(atKnee.benefit) }}
          cost={atKnee.cost}
          step={step}
          label={layout.knee}
        />
      )}
      {layout.glass && (
        <ChartGlass
          {...{ geometry, portfolios, selected, bound, proven }}
          glass={layout.glass}
          atMost={selected.atMostMore || undefined}
          hatch={hatch.gap}
        />
      )}
      {next && layout.next && (
        <ChartNextStep
          geometry={geometry}
          from={selected}
          to={portfolios[next.to]!}
          step={scale.long}
          stepText={step}
          flag={layout.next}
        />
      )}
      {compared && layout.b && (
        <ChartSelection
          geometry={geometry}
          portfolio={compared}
          label={layout.b}
          text={valueText(compared, knee)}
          letter="B"
        />
      )}
      <ChartSelection
        geometry={geometry}
        portfolio={selected}
        label={layout.a}
        text={valueText(selected, knee)}
        letter="A"
      />
    </Drawing>
  );
}

const Drawing = styled.svg`
  display: block;
  overflow: visible;
  pointer-events: none;
  font-family: var(--mw-font);
  text {
    font-size: 12px;
    fill: var(--mw-ink-2);
  }
  text.label {
    font-size: 12.5px;
    font-weight: 700;
    fill: var(--mw-ink);
  }
  text.letter {
    font-size: 12.5px;
    font-weight: 800;
  }
  .strong {
    font-weight: 600;
    fill: var(--mw-ink);
  }
  .halo {
    paint-order: stroke;
    stroke: var(--mw-surface);
    stroke-width: 4px;
  }
  .mark path {
    paint-order: stroke;
  }
  @media (forced-colors: active) {
    forced-color-adjust: none;
    text {
      fill: CanvasText !important;
    }
    .halo {
      stroke: Canvas;
    }
    .line,
    .box rect {
      stroke: CanvasText;
    }
    .peg {
      fill: CanvasText;
      stroke: CanvasText;
    }
    .peg.hollow,
    .mark path,
    .box rect {
      fill: Canvas;
      stroke: CanvasText;
    }
  }
`;
