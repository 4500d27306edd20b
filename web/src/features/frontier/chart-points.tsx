import { ScatterPlotCanvas } from '@nivo/scatterplot';
import type { ScatterPlotNodeData } from '@nivo/scatterplot';
import { memo, useMemo } from 'react';
import type { Geometry } from './chart-geometry';
import { useChartColours } from './use-chart-colours';

interface Dot {
  x: number;
  y: number;
}
interface Pairs {
  costs: readonly number[];
  benefits: readonly number[];
}

interface ChartPointsProps {
  geometry: Geometry;
  lookedAt: Pairs;
  onceKept: Pairs;
  gridValues: number[];
}

const ONCE_KEPT = 'once kept';

/** The thousands of points behind the chart, and its grid, on a canvas that pointing never redraws. */
export default memo(function ChartPoints({ geometry, lookedAt, onceKept, gridValues }: ChartPointsProps) {
  const colours = useChartColours();
  const { cost, benefit } = geometry.domain;
  const data = useMemo(
    () => [
      { id: 'looked at', data: dotsWithin(lookedAt, { cost, benefit }) },
      { id: ONCE_KEPT, data: dotsWithin(onceKept, { cost, benefit }) },
    ],
    [lookedAt, onceKept, cost, benefit],
  );
  return (
    <ScatterPlotCanvas<Dot>
      data={data}
      width={geometry.width}
      height={geometry.height}
      margin={marginOf(geometry)}
      xScale={{ type: 'linear', min: cost[0], max: cost[1], nice: false }}
      yScale={{ type: 'linear', min: benefit[0], max: benefit[1], nice: false }}
      layers={LAYERS}
      enableGridX={false}
      gridYValues={gridValues}
      axisLeft={null}
      axisBottom={null}
      colors={[colours.lookedAt, colours.onceKept]}
      renderNode={drawNode}
      theme={{ grid: { line: { stroke: colours.grid } } }}
      isInteractive={false}
      role="presentation"
    />
  );
});

const LAYERS: ('grid' | 'nodes')[] = ['grid', 'nodes'];

function dotsWithin({ costs, benefits }: Pairs, domain: Geometry['domain']): Dot[] {
  return costs
    .map((x, index) => ({ x, y: benefits[index]! }))
    .filter(({ x, y }) => isWithin(x, domain.cost) && isWithin(y, domain.benefit));
}

function isWithin(value: number, [least, most]: readonly [number, number]): boolean {
  return value >= least && value <= most;
}

function marginOf({ width, height, plot }: Geometry) {
  const right = width - plot.x - plot.width;
  const bottom = height - plot.y - plot.height;
  return { left: plot.x, top: plot.y, right, bottom };
}

function drawNode(ctx: CanvasRenderingContext2D, { serieId, x, y, color }: ScatterPlotNodeData<Dot>) {
  if (serieId === ONCE_KEPT) drawCross(ctx, x, y, color);
  else drawDot(ctx, x, y, color);
}

function drawDot(ctx: CanvasRenderingContext2D, x: number, y: number, colour: string) {
  ctx.globalAlpha = 0.5;
  ctx.fillStyle = colour;
  ctx.beginPath();
  ctx.arc(x, y, 1.3, 0, 2 * Math.PI);
  ctx.fill();
  ctx.globalAlpha = 1;
}

function drawCross(ctx: CanvasRenderingContext2D, x: number, y: number, colour: string) {
  ctx.strokeStyle = colour;
  ctx.lineWidth = 1.3;
  ctx.beginPath();
  ctx.moveTo(x - 3.2, y);
  ctx.lineTo(x + 3.2, y);
  ctx.moveTo(x, y - 3.2);
  ctx.lineTo(x, y + 3.2);
  ctx.stroke();
}
