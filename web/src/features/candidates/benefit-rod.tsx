import styled from 'styled-components';
import { formatNumber } from '../../lib/money';

interface BenefitRodProps {
  /** 0–100 as decimal text. */
  points: string;
  /** px */
  width?: number;
}

/** A benefit score: the figure, and the same on a small rod of four quarters. */
export function BenefitRod({ points, width = 48 }: BenefitRodProps) {
  return (
    <Line>
      <Figure className="num">{formatNumber(points)}</Figure>
      <Mini style={{ width }} aria-hidden>
        <i style={{ width: `${Math.min(100, Math.max(0, Number(points)))}%` }} />
      </Mini>
    </Line>
  );
}

const Line = styled.span`
  display: inline-flex;
  align-items: center;
  gap: 8px;
`;

const Figure = styled.span`
  min-width: 1.3em;
`;

const quarter = (at: number) =>
  `transparent calc(${at - 25}% + 0px) calc(${at}% - 1px), var(--mw-surface) calc(${at}% - 1px) ${at}%`;

const Mini = styled.span`
  position: relative;
  flex: none;
  height: 9px;
  background: var(--mw-sunken);
  i {
    position: absolute;
    inset: 0 auto 0 0;
    background: var(--mw-rod);
    border-right: 2px solid var(--mw-rod-edge);
    forced-color-adjust: none;
  }
  &::after {
    content: '';
    position: absolute;
    inset: 0;
    background: linear-gradient(to right, ${quarter(25)}, ${quarter(50)}, ${quarter(75)}, transparent 75%);
  }
  @media (forced-colors: active) {
    outline: 1px solid CanvasText;
  }
`;
