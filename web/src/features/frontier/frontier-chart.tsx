import { Suspense, lazy, useId, useMemo } from 'react';
import styled from 'styled-components';
import { useNarrow } from '../../ui/use-media';
import { ChartDrawing } from './chart-drawing';
import { ChartKeys, ChartLegend } from './chart-legend';
import { benefitDomain, geometryOf } from './chart-geometry';
import { CostRod } from './cost-rod';
import type { Front } from './front';
import { costName } from './front';
import { roundValues } from './frontier-scale';
import { useChartPointer } from './use-chart-pointer';
import type { Chosen } from './use-chosen';
import type { Run } from './use-run';
import { useWidth } from './use-width';
import { ViewSwitch } from './view-switch';

const ChartPoints = lazy(() => import('./chart-points'));

interface FrontierChartProps {
  front: Front;
  run: Pick<Run, 'certificate' | 'lookedAt' | 'onceKept'>;
  chosen: Chosen;
  /** The answer sentence, as the chart's description. */
  answer: string;
}

/** Benefit against cost: the kept portfolios over everything looked at, and the rod below as the slider. */
export function FrontierChart({ front, run, chosen, answer }: FrontierChartProps) {
  const narrow = useNarrow();
  const [place, width] = useWidth<HTMLDivElement>();
  const geometry = useMemo(() => chartGeometry(front, width ?? 760, narrow), [front, width, narrow]);
  const gridValues = useMemo(
    () => roundValues(...geometry.domain.benefit, narrow ? 4 : 6),
    [geometry, narrow],
  );
  const pointer = useChartPointer(geometry, front.portfolios, chosen.select);
  const titleId = useId();
  return (
    <Figure aria-labelledby={titleId}>
      <figcaption id={titleId} className="visually-hidden">
        Benefit against {costName(front.costAxis)}. {answer}
      </figcaption>
      <Plot ref={place} style={{ height: geometry.height }} {...pointer}>
        {width !== undefined && (
          <Suspense>
            <ChartPoints {...{ geometry, gridValues }} lookedAt={run.lookedAt} onceKept={run.onceKept} />
          </Suspense>
        )}
        <ChartDrawing {...{ front, geometry, gridValues, chosen, narrow }} />
      </Plot>
      <CostRod {...{ front, geometry, chosen }} />
      <ChartLegend front={front} run={run} geometry={geometry} chosen={chosen} />
      <Foot style={{ paddingLeft: geometry.plot.x }} data-screen-only>
        <ChartKeys />
        <ViewSwitch table={false} at={chosen.a} />
      </Foot>
    </Figure>
  );
}

function chartGeometry({ portfolios, scale }: Front, width: number, narrow: boolean) {
  const sides = narrow ? { left: 38, right: 10 } : { left: 54, right: 22 };
  return geometryOf(
    { width, height: narrow ? 330 : 452 },
    { ...sides, top: 26, bottom: 0 },
    { cost: [scale.start, scale.end], benefit: benefitDomain(portfolios.map(({ benefit }) => benefit)) },
  );
}

const Figure = styled.figure`
  min-width: 0;
  padding: 8px 0 8px;
  background: var(--mw-surface);
  border: 1px solid var(--mw-line);
  border-top: 2px solid var(--mw-ink);
`;

const Foot = styled.div`
  display: flex;
  align-items: center;
  gap: 16px;
  margin-top: 4px;
  padding-right: 12px;
`;

const Plot = styled.div`
  position: relative;
  cursor: pointer;
  > * {
    position: absolute;
    inset: 0;
  }
`;
