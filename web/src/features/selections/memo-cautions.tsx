import styled from 'styled-components';
import { Icon } from '../../ui/icon';
import type { Memo } from './selection-memo';

export function MemoCautions({ memo }: { memo: Memo }) {
  return (
    <List>
      {memo.cautions.map(({ title, text }) => (
        <li key={title}>
          <Icon name="warn" />
          <span>
            <b>{title}</b> {text}
          </span>
        </li>
      ))}
    </List>
  );
}

const List = styled.ul`
  li {
    display: grid;
    grid-template-columns: 16px minmax(0, 1fr);
    gap: 10px;
    padding: 8px 0;
    border-top: 1px solid var(--mw-line);
  }
  svg {
    margin-top: 2px;
    color: var(--mw-caution);
  }
  @media print {
    li {
      padding: 3px 0;
      font-size: 9pt;
    }
  }
`;
