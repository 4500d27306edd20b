import styled from 'styled-components';
import { formatNumber } from '../../lib/money';
import { Rod } from '../../ui/rod';
import { shareAt } from './bar-geometry';
import type { Axis } from './bar-geometry';

/** The rod with its numbers. Two pieces that meet at zero, so that graduations are counted from there both ways. */
export function CostAxis({ axis }: { axis: Axis }) {
  const zero = shareAt(axis, 0) * 100;
  const graduations = (length: number) => ({
    long: `${(axis.step / length) * 100}%`,
    short: `${(axis.step / 5 / length) * 100}%`,
  });
  return (
    <Scale>
      <Pieces style={{ gridTemplateColumns: `${zero}% ${100 - zero}%` }}>
        <Mirrored>{zero > 0 && <Rod thickness={12} {...graduations(-axis.from)} />}</Mirrored>
        <Rod thickness={12} {...graduations(axis.to)} />
      </Pieces>
      {axis.numbers.map((number) => (
        <Number key={number} style={{ left: `${shareAt(axis, number) * 100}%` }}>
          {formatNumber(number)}
        </Number>
      ))}
    </Scale>
  );
}

const Scale = styled.div`
  position: relative;
  height: 32px;
`;

const Pieces = styled.div`
  display: grid;
`;

const Mirrored = styled.div`
  scale: -1 1;
`;

const Number = styled.span`
  position: absolute;
  top: 14px;
  translate: -50%;
  font-size: 12px;
  white-space: nowrap;
  color: var(--mw-ink-2);
  @media (max-width: 767px) {
    &:last-child {
      translate: -100%;
    }
  }
`;
