import styled from 'styled-components';
import { formatInstant } from '../../lib/dates';
import { Icon } from '../../ui/icon';
import { Section } from '../../ui/section';
import { DECISION_WORDS } from './selection-words';
import type { SelectionMemoFragment } from './selection-memo.generated';

interface SignaturesProps {
  selection: Pick<SelectionMemoFragment, 'state' | 'submittedBy' | 'submittedAt' | 'decidedBy' | 'decidedAt'>;
  /** Whose signature is awaited, where it is the reader's own. */
  awaited: string | undefined;
}

/** Who prepared it and who decided, four eyes one below the other. */
export function Signatures({ selection, awaited }: SignaturesProps) {
  const { submittedBy, submittedAt, decidedBy, decidedAt, state } = selection;
  return (
    <Section title="Signatures" padded>
      <Steps>
        <li>
          <Mark $done aria-hidden>
            <Icon name="ok" />
          </Mark>
          <Who>
            <b>{submittedBy.name}</b>
            <small>Prepared by</small>
          </Who>
          <When>{formatInstant(submittedAt)}</When>
        </li>
        <li>
          <Mark $done={state !== 'SUBMITTED'} aria-hidden>
            {state === 'SUBMITTED' ? '2' : <Icon name={state === 'APPROVED' ? 'ok' : 'back'} />}
          </Mark>
          <Who>
            <b>{decidedBy?.name ?? awaited ?? 'A finance director'}</b>
            <small>{decidedBy || awaited ? 'Finance director' : 'Decides; never the preparer'}</small>
          </Who>
          <When>{decidedAt ? `${DECISION_WORDS[state]} ${formatInstant(decidedAt)}` : 'Not yet signed'}</When>
        </li>
      </Steps>
    </Section>
  );
}

const Steps = styled.ol`
  display: grid;
  gap: 14px;
  li {
    position: relative;
    display: grid;
    grid-template-columns: 26px minmax(0, 1fr) auto;
    gap: 10px;
    align-items: center;
  }
  li + li::before {
    content: '';
    position: absolute;
    left: 12px;
    top: -14px;
    height: 12px;
    border-left: 2px solid var(--mw-line-strong);
  }
`;

const Mark = styled.span<{ $done: boolean }>`
  display: grid;
  place-items: center;
  width: 26px;
  height: 26px;
  border: 1px solid ${({ $done }) => ($done ? 'var(--mw-rod-edge)' : 'var(--mw-line-strong)')};
  background: ${({ $done }) => ($done ? 'var(--mw-rod)' : 'var(--mw-raised)')};
  color: ${({ $done }) => ($done ? 'var(--mw-rod-ink)' : 'var(--mw-ink)')};
  font-size: 13px;
  font-weight: 700;
`;

const Who = styled.span`
  line-height: 1.3;
  small {
    display: block;
    font-size: 13px;
    color: var(--mw-ink-2);
  }
`;

const When = styled.span`
  max-width: 130px;
  text-align: right;
  font-size: 13px;
  color: var(--mw-ink-2);
`;
