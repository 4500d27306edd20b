import type { KeyboardEvent, PointerEvent } from 'react';
import styled from 'styled-components';
import { currencySign, formatMoneyWhole, shortMoney } from '../../lib/money';
import { Rod } from '../../ui/rod';
import type { Geometry } from './chart-geometry';
import type { Front } from './front';
import { costName } from './front';
import { numberedGraduations } from './frontier-scale';
import { nearestByCost } from './portfolio';
import { ProvenNote } from './proven-note';
import { portfolioAfterKey } from './slider-keys';
import type { Chosen } from './use-chosen';
import { points } from './wording';

const NUMBER_GAP_PX = 84;

interface CostRodProps {
  front: Front;
  geometry: Geometry;
  chosen: Chosen;
}

/** The cost axis: a rod that is also the slider of portfolio A. */
export function CostRod({ front, geometry, chosen }: CostRodProps) {
  const { portfolios, scale, knee, proven, costAxis, ceiling } = front;
  const { plot, domain } = geometry;
  const selected = portfolios[chosen.a]!;
  const share = (cost: number) => (cost - domain.cost[0]) / (domain.cost[1] - domain.cost[0]);
  const percent = (cost: number) => `${share(cost) * 100}%`;
  const length = (cost: number) => `${(cost / (scale.end - scale.start)) * 100}%`;
  const numbers = numberedGraduations(scale, plot.width / (scale.end - scale.start), NUMBER_GAP_PX);

  function keyDown(event: KeyboardEvent) {
    if (event.ctrlKey || event.metaKey || event.altKey) return;
    if (event.key.toLowerCase() === 'c') return chosen.compare();
    const place = portfolioAfterKey(event.key, { portfolios, at: chosen.a, step: scale.long, knee });
    if (place === undefined) return;
    event.preventDefault();
    chosen.select(place);
  }
  function pick(event: PointerEvent<HTMLElement>) {
    const { left } = event.currentTarget.getBoundingClientRect();
    chosen.select(nearestByCost(portfolios, geometry.costAt(plot.x + event.clientX - left)));
  }

  return (
    <Place style={{ marginLeft: plot.x, width: plot.width }}>
      <Slider
        role="slider"
        tabIndex={0}
        aria-label={`Portfolio A by ${costName(costAxis)}`}
        aria-valuemin={0}
        aria-valuemax={portfolios.length - 1}
        aria-valuenow={chosen.a}
        aria-valuetext={`Portfolio A, ${formatMoneyWhole(selected.exact.cost)}, ${points(selected.benefit)} points`}
        aria-keyshortcuts="K C"
        onKeyDown={keyDown}
        onPointerDown={(event) => {
          event.currentTarget.setPointerCapture(event.pointerId);
          pick(event);
        }}
        onPointerMove={(event) => event.buttons === 1 && pick(event)}
      >
        <Open>
          <Rod thickness={22} filled={0} open={1} long={length(scale.long)} short={length(scale.short)} />
        </Open>
        {proven.map(([from, to]) => (
          <Proven key={from} style={{ clipPath: `inset(0 ${100 - share(to) * 100}% 0 ${percent(from)})` }}>
            <Rod thickness={22} long={length(scale.long)} short={length(scale.short)} />
          </Proven>
        ))}
        <Cursor style={{ left: percent(selected.cost) }} />
      </Slider>
      <Numbers aria-hidden>
        {numbers.map((cost) => (
          <span key={cost} style={{ left: percent(cost) }}>
            {shortMoney(cost)}
          </span>
        ))}
      </Numbers>
      <Below>
        <ProvenNote front={front} />
        <span>
          <b>More cost →</b> {costName(costAxis)}, {currencySign(ceiling.currency)}
        </span>
      </Below>
    </Place>
  );
}

const Place = styled.div`
  margin-top: 10px;
`;

const Slider = styled.div`
  position: relative;
  cursor: ew-resize;
  touch-action: pan-y;
  @media (pointer: coarse) {
    padding-block: 11px;
    margin-block: -11px;
  }
`;

// Graduations on pale wood are drawn in text ink, which shows up on it in the dark too.
const Open = styled.div`
  --mw-rod-ink: var(--mw-ink-2);
`;

const Proven = styled.div`
  position: absolute;
  inset: 0;
  pointer-events: none;
  @media (pointer: coarse) {
    inset-block: 11px;
  }
`;

const Cursor = styled.i`
  position: absolute;
  top: 50%;
  width: 18px;
  height: 32px;
  translate: -50% -50%;
  border: 2.4px solid var(--mw-action);
  border-radius: 2px;
  background:
    linear-gradient(var(--mw-action) 0 0) center / 1.6px 100% no-repeat,
    color-mix(in srgb, var(--mw-action) 18%, transparent);
  transition: left 160ms;
  pointer-events: none;
  @media (prefers-reduced-motion: reduce) {
    transition: none;
  }
  @media (forced-colors: active) {
    border-color: Highlight;
  }
`;

const Numbers = styled.div`
  position: relative;
  height: 18px;
  margin-top: 4px;
  font-size: 12px;
  color: var(--mw-ink-2);
  span {
    position: absolute;
    translate: -50%;
    white-space: nowrap;
  }
`;

const Below = styled.div`
  display: flex;
  justify-content: space-between;
  flex-wrap: wrap;
  gap: 0 16px;
  font-size: 12px;
  color: var(--mw-ink-2);
  > :last-child {
    margin-left: auto;
  }
  b {
    font-weight: 700;
    color: var(--mw-ink);
  }
`;
