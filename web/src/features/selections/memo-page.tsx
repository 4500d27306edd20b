import styled from 'styled-components';
import { formatInstantInFull } from '../../lib/dates';
import { formatMoney } from '../../lib/money';
import { Mark } from '../../ui/brand';
import { Notice } from '../../ui/notice';
import { Tag } from '../../ui/tag';
import { useNarrow } from '../../ui/use-media';
import { MemoBuys } from './memo-buys';
import { MemoCautions } from './memo-cautions';
import { MemoFacts } from './memo-facts';
import { MemoLeftOut } from './memo-left-out';
import { MemoPart } from './memo-part';
import { MemoRod } from './memo-rod';
import { MemoSignatures } from './memo-signatures';
import type { SelectionMemo } from './selection-memo';
import { DECISION_WORDS, memoCode, STATE_TONES } from './selection-words';

interface MemoPageProps {
  selection: SelectionMemo;
  decisionDate: string;
  candidates: number;
}

/** The approval paper: what is asked, what it buys, why, what is left out, and the cautions. */
export function MemoPage({ selection, decisionDate, candidates }: MemoPageProps) {
  const { memo, submittedBy, submittedAt, state, comment, decidedBy } = selection;
  const cautions = memo.cautions.length;
  return (
    <Paper>
      <Mark size={34} />
      <p className="muted small">
        {`${memo.roundName} · memo ${memoCode(decisionDate, selection.number)} · prepared by ${submittedBy.name}, ${formatInstantInFull(submittedAt)}`}
        <State tone={STATE_TONES[state]}>{DECISION_WORDS[state]}</State>
      </p>
      <h1>Purchase of equipment</h1>
      {comment && (
        <Notice
          tone={state === 'DECLINED' ? 'bad' : 'info'}
          title={`${decidedBy?.name ?? ''}: ${DECISION_WORDS[state]}`}
        >
          {comment}
        </Notice>
      )}
      <Ask>
        {'We ask you to approve portfolio A: '}
        <b>{`${memo.lines.length} of ${candidates} candidates`}</b>
        {' for a capital of '}
        <b>{formatMoney(memo.capital)}</b>
        {`, which is ${formatMoney(memo.leftUnderCeiling)} under what may be spent (${formatMoney(memo.spendable)}).`}
      </Ask>
      <MemoRod memo={memo} />
      <MemoOrder
        cautions={
          <MemoPart title="Cautions" count={`${cautions}`} open>
            <MemoCautions memo={memo} />
          </MemoPart>
        }
        facts={
          <Columns>
            <MemoPart title="What it buys" count={`${memo.lines.length} candidates`}>
              <MemoBuys memo={memo} />
            </MemoPart>
            <MemoPart title="Grounds" count="why, limits, assumptions">
              <MemoFacts selection={selection} />
            </MemoPart>
          </Columns>
        }
        rest={
          <MemoPart title="Not bought this round" count={`${memo.leftOut.length} candidates`}>
            <MemoLeftOut memo={memo} />
          </MemoPart>
        }
      />
      <MemoSignatures selection={selection} />
      <Fingerprint>{`Run ${memo.runNumber} · fingerprint of this memo ${selection.fingerprint}`}</Fingerprint>
    </Paper>
  );
}

/** On a phone the cautions come first; on paper and on a desk they close the memo. */
function MemoOrder({ cautions, facts, rest }: Record<'cautions' | 'facts' | 'rest', React.ReactNode>) {
  const narrow = useNarrow();
  return narrow ? [cautions, facts, rest].map(keyed) : [facts, rest, cautions].map(keyed);
}

function keyed(part: React.ReactNode, index: number) {
  return <div key={index}>{part}</div>;
}

const Paper = styled.article`
  position: relative;
  padding: 24px 36px 28px;
  background: var(--mw-surface);
  border: 1px solid var(--mw-line);
  border-top: 2px solid var(--mw-ink);
  > svg:first-child {
    position: absolute;
    right: 36px;
    top: 26px;
  }
  h1 {
    margin: 4px 48px 12px 0;
  }
  @media (max-width: 767px) {
    padding: 16px;
    border-inline: 0;
    > svg:first-child {
      display: none;
    }
    h1 {
      margin-right: 0;
      font-size: 22px;
    }
  }
  @media print {
    padding: 0;
    border: 0;
    > svg:first-child {
      right: 0;
      top: 0;
    }
  }
`;

const State = styled(Tag)`
  margin-left: 8px;
`;

const Ask = styled.p`
  margin: 8px 0 12px;
  font-size: 16px;
  max-width: 76ch;
`;

const Columns = styled.div`
  display: grid;
  grid-template-columns: minmax(0, 1.25fr) minmax(0, 1fr);
  gap: 0 36px;
  @media (max-width: 767px) {
    grid-template-columns: minmax(0, 1fr);
  }
`;

const Fingerprint = styled.p`
  margin-top: 20px;
  font-size: 12px;
  color: var(--mw-ink-3);
  overflow-wrap: anywhere;
`;
