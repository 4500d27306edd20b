import styled from 'styled-components';
import { formatMoney } from '../../lib/money';
import type { Memo } from './selection-memo';

/** What is not bought, each with its reason. */
export function MemoLeftOut({ memo }: { memo: Memo }) {
  if (memo.leftOut.length === 0) return <p>Everything that was asked for is bought.</p>;
  return (
    <List>
      {memo.leftOut.map(({ code, name, capital, reason }) => (
        <li key={code}>
          <span>
            {name}
            {capital && <small>{` ${formatMoney(capital)}`}</small>}
          </span>
          <span className="muted small">{reason}</span>
        </li>
      ))}
    </List>
  );
}

const List = styled.ul`
  li {
    display: grid;
    grid-template-columns: minmax(0, 1fr) minmax(0, 1.2fr);
    gap: 4px 16px;
    padding: 4px 0;
    border-bottom: 1px solid var(--mw-line);
  }
  small {
    font-size: 13px;
    color: var(--mw-ink-2);
    white-space: nowrap;
  }
  @media print {
    li {
      padding: 1px 0;
      font-size: 9pt;
    }
    small {
      font-size: inherit;
    }
  }
  @media (max-width: 767px) {
    li {
      grid-template-columns: minmax(0, 1fr);
    }
  }
`;
