import type { ReactNode } from 'react';
import styled from 'styled-components';
import { useNarrow } from '../../ui/use-media';

interface MemoPartProps {
  title: string;
  /** Quiet count at the right, on a phone only. */
  count?: string;
  /** Unfolded at first on a phone. */
  open?: boolean;
  children: ReactNode;
}

/** A part of the memo: a heading with its text; on a phone it folds. */
export function MemoPart({ title, count, open = false, children }: MemoPartProps) {
  const narrow = useNarrow();
  if (!narrow) {
    return (
      <Part>
        <h2>{title}</h2>
        {children}
      </Part>
    );
  }
  return (
    <Fold open={open}>
      <summary>
        <h2>{title}</h2>
        {count && <span className="muted">{count}</span>}
      </summary>
      {children}
    </Fold>
  );
}

const Part = styled.div`
  margin-top: 20px;
  h2 {
    margin-bottom: 6px;
    font-size: var(--mw-t-14);
  }
`;

const Fold = styled.details`
  border-top: 1px solid var(--mw-line);
  padding: 4px 0;
  summary {
    display: flex;
    align-items: center;
    justify-content: space-between;
    min-height: 44px;
    cursor: pointer;
  }
  summary h2 {
    font-size: var(--mw-t-14);
  }
  summary::after {
    content: '';
    width: 8px;
    height: 8px;
    margin-left: 12px;
    border: solid currentColor;
    border-width: 0 2px 2px 0;
    rotate: 45deg;
  }
  summary > span {
    margin-left: auto;
  }
  &[open] summary::after {
    rotate: 225deg;
  }
  @media print {
    &::details-content {
      content-visibility: visible;
    }
  }
`;
