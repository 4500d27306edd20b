import type { PointerEvent } from 'react';
import type { Geometry } from './chart-geometry';
import { nearestPlace } from './chart-geometry';
import type { Portfolio } from './portfolio';

const REACH_PX = 40;

/** Press or drag in the plot: the nearest portfolio within 40 px becomes A. Fingers only tap, so that the page scrolls. */
export function useChartPointer(
  geometry: Geometry,
  portfolios: readonly Portfolio[],
  select: (place: number) => void,
) {
  function pick(event: PointerEvent<HTMLElement>) {
    const { left, top } = event.currentTarget.getBoundingClientRect();
    const places = portfolios.map(({ cost, benefit }) => [geometry.x(cost), geometry.y(benefit)] as const);
    const nearest = nearestPlace(places, [event.clientX - left, event.clientY - top], REACH_PX);
    if (nearest !== undefined) select(nearest);
  }
  return {
    onPointerDown(event: PointerEvent<HTMLElement>) {
      if (event.button !== 0) return;
      if (event.pointerType === 'mouse') event.currentTarget.setPointerCapture(event.pointerId);
      pick(event);
    },
    onPointerMove(event: PointerEvent<HTMLElement>) {
      if (event.pointerType === 'mouse' && event.buttons === 1) pick(event);
    },
  };
}
