import type { Geometry } from './chart-geometry';
import type { Layout } from './chart-layout';
import { layoutLabels } from './chart-layout';
import { valueText } from './chart-selection';
import type { Front } from './front';
import type { Exchange } from './marginal-gain';
import type { Portfolio } from './portfolio';
import { PEG_GAP, thinPegs } from './thin-pegs';
import type { Chosen } from './use-chosen';
import { signedPoints } from './wording';

export type Places = readonly (readonly [x: number, y: number])[];

export function placesOf(portfolios: readonly Portfolio[], { x, y }: Geometry): Places {
  return portfolios.map(({ cost, benefit }) => [x(cost), y(benefit)] as const);
}

/** Places of the portfolios that get a peg: thinned by pixels, the chosen ones and the knee always among them. */
export function pegPlaces({ knee }: Front, places: Places, { a, b }: Pick<Chosen, 'a' | 'b'>): number[] {
  const always = [a, b, knee].filter((place) => place !== undefined);
  return thinPegs(places, PEG_GAP, new Set(always));
}

interface DrawingParts {
  front: Front;
  geometry: Geometry;
  places: Places;
  selected: Portfolio;
  compared: Portfolio | undefined;
  next: Exchange | undefined;
  withGlass: boolean;
}

export function layoutOf({
  front,
  geometry,
  places,
  selected,
  compared,
  next,
  withGlass,
}: DrawingParts): Layout {
  const { portfolios, scale, knee, costAxis, ceiling } = front;
  const markAt = (portfolio: Portfolio) => {
    const [x, y] = places[portfolio.index]!;
    return { x, y, text: valueText(portfolio, knee) };
  };
  const kneeIsFree = knee !== undefined && knee !== selected.index && knee !== compared?.index;
  return layoutLabels({
    geometry,
    line: places,
    a: markAt(selected),
    b: compared && markAt(compared),
    next: next && {
      x: Math.min(geometry.x(selected.cost + scale.long), geometry.plot.x + geometry.plot.width),
      y: geometry.y(portfolios[next.to]!.benefit),
      text: signedPoints(next.gain),
    },
    // The mark of A or B would lie over the square, so its box names the knee instead.
    knee: kneeIsFree ? markAt(portfolios[knee]!) : undefined,
    ceilingX: costAxis === 'CAPITAL' ? geometry.x(Number(ceiling.amount)) : undefined,
    withGlass,
  });
}
