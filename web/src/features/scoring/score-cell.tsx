import type { FocusEvent, KeyboardEvent, Ref } from 'react';
import styled from 'styled-components';
import type { OwnScore } from './use-own-scores';

interface ScoreCellProps {
  score: OwnScore | undefined;
  /** What is being typed, not yet saved. */
  draft: string | undefined;
  /** The one cell of the grid in the tab order. */
  current: boolean;
  label: string;
  onKeyDown: (event: KeyboardEvent) => void;
  onFocus: () => void;
  onBlur: (event: FocusEvent) => void;
  ref?: Ref<HTMLTableCellElement>;
}

/** One score on the sheet: the points, "cannot judge", or an empty place to type into. */
export function ScoreCell({ score, draft, current, label, ...handlers }: ScoreCellProps) {
  const text = draft ?? wordsOf(score);
  return (
    <Cell
      role="gridcell"
      tabIndex={current ? 0 : -1}
      aria-label={`${label}: ${text || 'no score'}`}
      data-failed={score?.state === 'failed' || undefined}
      {...handlers}
    >
      {text ? (
        <Points $draft={draft !== undefined} $saving={score?.state === 'saving'}>
          {text}
          {score?.points != null && draft === undefined && <Rule points={score.points} />}
        </Points>
      ) : (
        <Blank aria-hidden />
      )}
    </Cell>
  );
}

function wordsOf(score: OwnScore | undefined): string {
  if (!score) return '';
  return score.cannotJudge ? 'n/a' : String(score.points);
}

/** Where the points lie between the two anchors. */
function Rule({ points }: { points: number }) {
  return (
    <svg width="52" height="14" aria-hidden>
      <path d="M0 7h52" stroke="var(--mw-line-strong)" />
      <path d={`M${1 + points * 0.5} 0v14`} stroke="var(--mw-ink)" strokeWidth="2.5" />
    </svg>
  );
}

const Cell = styled.td`
  cursor: cell;
  &:focus-visible {
    outline: 3px solid var(--mw-focus);
    outline-offset: -3px;
    background: var(--mw-raised);
  }
  &[data-failed] {
    box-shadow: inset 3px 0 0 var(--mw-bad);
  }
`;

const Points = styled.span<{ $draft: boolean; $saving: boolean }>`
  display: flex;
  align-items: center;
  gap: 10px;
  min-height: 24px;
  font-weight: ${({ $draft }) => ($draft ? 700 : 500)};
  opacity: ${({ $saving }) => ($saving ? 0.6 : 1)};
  > svg {
    margin-left: auto;
  }
`;

const Blank = styled.span`
  display: block;
  height: 24px;
  border: 1px dashed var(--mw-line-strong);
`;
