import { useId } from 'react';
import type { ReactNode } from 'react';
import styled from 'styled-components';
import { formatNumber } from '../../lib/money';
import { pegPlaces, placesOf } from './chart-drawing-layout';
import type { Geometry } from './chart-geometry';
import { GapHatch } from './chart-hatches';
import type { Front } from './front';
import type { Chosen } from './use-chosen';
import type { Run } from './use-run';

interface ChartLegendProps {
  front: Front;
  run: Pick<Run, 'certificate' | 'lookedAt' | 'onceKept'>;
  geometry: Geometry;
  chosen: Chosen;
}

/** The signs of the chart in words; only those that are there. */
export function ChartLegend({ front, run, geometry, chosen }: ChartLegendProps) {
  const hatch = useId();
  const { portfolios } = front;
  const pegs = pegPlaces(front, placesOf(portfolios, geometry), chosen).length;
  const thinned = pegs < portfolios.length;
  return (
    <Signs style={{ paddingLeft: geometry.plot.x }}>
      <Sign drawing={BEST}>
        {run.certificate.status === 'COMPLETE' ? 'Nothing beats these' : 'Best found so far'}
        {thinned && `, ${formatNumber(pegs)} of ${formatNumber(portfolios.length)} shown`}
      </Sign>
      {portfolios.some(({ aboveCeiling }) => aboveCeiling) && <Sign drawing={ABOVE}>Above the ceiling</Sign>}
      {run.onceKept.costs.length > 0 && <Sign drawing={ONCE_KEPT}>Once kept, since beaten</Sign>}
      {run.lookedAt.costs.length > 0 && <Sign drawing={LOOKED_AT}>Looked at</Sign>}
      {front.bound.length > 1 && (
        <Sign
          drawing={
            <>
              <GapHatch id={hatch} />
              <rect x="1" y="4" width="24" height="9" fill={`url(#${hatch})`} />
              <path d="M1 3h24" stroke="var(--mw-chart-bound)" strokeWidth="2" strokeDasharray="7 3" />
            </>
          }
        >
          Gap still open under the bound
        </Sign>
      )}
    </Signs>
  );
}

/** What the keys do on the rod. */
export function ChartKeys() {
  return (
    <Keys>
      <kbd>←</kbd>
      <kbd>→</kbd> move A <kbd>K</kbd> to the knee <kbd>C</kbd> put B on A
    </Keys>
  );
}

function Sign({ drawing, children }: { drawing: ReactNode; children: ReactNode }) {
  return (
    <li>
      <svg width="26" height="14" viewBox="0 0 26 14" aria-hidden>
        {drawing}
      </svg>
      <span>{children}</span>
    </li>
  );
}

const BEST = (
  <>
    <path d="M2 11H9V7H17V3H24" fill="none" stroke="var(--mw-chart-kept)" strokeWidth="2" />
    <rect x="6.2" y="4.2" width="5.6" height="5.6" fill="var(--mw-chart-kept)" />
    <rect x="14.2" y="0.4" width="5.6" height="5.6" fill="var(--mw-chart-kept)" />
  </>
);
const ABOVE = (
  <rect x="10" y="4" width="6" height="6" fill="none" stroke="var(--mw-chart-kept)" strokeWidth="1.4" />
);
const ONCE_KEPT = <path d="M10 7h7M13.5 3.5v7" stroke="var(--mw-chart-displaced)" strokeWidth="1.4" />;
const LOOKED_AT = (
  <g fill="var(--mw-chart-visited)">
    <circle cx="5" cy="9" r="1.4" />
    <circle cx="12" cy="5" r="1.4" />
    <circle cx="18" cy="10" r="1.4" />
    <circle cx="22" cy="6" r="1.4" />
  </g>
);

const Signs = styled.ul`
  display: flex;
  flex-wrap: wrap;
  gap: 4px 16px;
  margin-top: 10px;
  padding-right: 12px;
  font-size: 12px;
  color: var(--mw-ink-2);
  li {
    display: flex;
    align-items: center;
    gap: 5px;
  }
`;

const Keys = styled.p`
  font-size: 12px;
  color: var(--mw-ink-2);
  kbd {
    min-width: 22px;
    padding: 0 5px;
    border: 1px solid var(--mw-line-strong);
    border-radius: var(--mw-r-1);
    background: var(--mw-raised);
    font: inherit;
    text-align: center;
  }
  @media (pointer: coarse), (max-width: 767px) {
    display: none;
  }
`;
