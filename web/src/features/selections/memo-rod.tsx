import styled from 'styled-components';
import { shortMoney } from '../../lib/money';
import { Rod } from '../../ui/rod';
import type { Memo } from './selection-memo';

/** What the portfolio costs laid along the ceiling: filled is spent, pale is left up to the ceiling. */
export function MemoRod({ memo }: { memo: Memo }) {
  const ceiling = Number(memo.ceiling.amount);
  const capital = Number(memo.capital.amount);
  const length = Math.max(ceiling, capital) * 1.08 || 1;
  const spent = capital / length;
  return (
    <Place>
      <Label style={{ right: `${(1 - ceiling / length) * 100}%` }} $above>
        {`ceiling ${shortMoney(memo.ceiling.amount)}`}
      </Label>
      <Rod thickness={20} filled={spent} open={1} ceiling={ceiling / length} long="5.5%" short="1.1%" />
      <Label style={{ right: `${(1 - spent) * 100}%` }}>{`A · ${shortMoney(memo.capital.amount)}`}</Label>
    </Place>
  );
}

const Place = styled.div`
  position: relative;
  padding: 26px 0;
`;

const Label = styled.span<{ $above?: boolean }>`
  position: absolute;
  ${({ $above }) => ($above ? 'top: 0;' : 'bottom: 0;')}
  font-size: 13px;
  font-weight: 600;
  white-space: nowrap;
`;
