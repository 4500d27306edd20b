import styled from 'styled-components';
import { formatInstantInFull } from '../../lib/dates';
import { DECISION_WORDS } from './selection-words';
import type { SelectionMemo } from './selection-memo';

/** The foot of the printed memo: who prepared it, and where the decision was or is to be signed. */
export function MemoSignatures({ selection }: { selection: SelectionMemo }) {
  const { submittedBy, submittedAt, decidedBy, decidedAt, state } = selection;
  return (
    <Foot>
      <Signature when={formatInstantInFull(submittedAt)} name={submittedBy.name} part="Prepared by" />
      <Signature
        when={decidedAt ? `${DECISION_WORDS[state]} ${formatInstantInFull(decidedAt)}` : '\u00a0'}
        name={decidedBy?.name ?? '\u00a0'}
        part="Finance director"
      />
    </Foot>
  );
}

function Signature({ when, name, part }: { when: string; name: string; part: string }) {
  return (
    <div>
      <p>{when}</p>
      <b>{name}</b>
      <p>{part}</p>
    </div>
  );
}

const Foot = styled.footer`
  display: none;
  @media print {
    display: grid;
    grid-template-columns: 1fr 1fr;
    gap: 24px;
    margin-top: 28px;
    break-inside: avoid;
    b {
      display: block;
      border-top: 1px solid var(--mw-ink);
    }
  }
`;
