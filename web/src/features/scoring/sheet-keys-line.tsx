import styled from 'styled-components';
import { formatInstant } from '../../lib/dates';

const KEYS = [
  ['←', '↑', '↓', '→', 'move'],
  ['0', '9', 'type a score'],
  ['Enter', 'next candidate'],
  ['N', 'reason'],
  ['X', 'cannot judge'],
  ['Esc', 'restore'],
] as const;

/** The keys of the sheet, and when it was saved last. */
export function SheetKeys({ savedAt }: { savedAt: Date | undefined }) {
  return (
    <Line>
      {KEYS.map((entry) => (
        <span key={entry.at(-1)}>
          {entry.slice(0, -1).map((key) => (
            <kbd key={key}>{key}</kbd>
          ))}
          {entry.at(-1)}
        </span>
      ))}
      <output>{savedAt ? `Saved, ${formatInstant(savedAt.toISOString())}` : 'Saved as you go'}</output>
    </Line>
  );
}

const Line = styled.p`
  display: flex;
  flex-wrap: wrap;
  gap: 8px 18px;
  padding: 12px 16px;
  font-size: 13px;
  color: var(--mw-ink-2);
  span {
    display: inline-flex;
    align-items: center;
    gap: 4px;
  }
  kbd {
    display: inline-grid;
    place-items: center;
    min-width: 20px;
    height: 20px;
    padding: 0 5px;
    border: 1px solid var(--mw-line-strong);
    border-bottom-width: 2px;
    border-radius: 2px;
    font: 600 11px/1 var(--mw-font);
    background: var(--mw-raised);
  }
  output {
    margin-left: auto;
  }
`;
