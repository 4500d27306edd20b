import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import styled from 'styled-components';
import { formatMoney, formatNumber } from '../../lib/money';
import { paths } from '../../lib/paths';
import { announce } from '../../ui/announce';
import { Button } from '../../ui/button';
import { Dialog } from '../../ui/dialog';
import { TextAreaField } from '../../ui/field';
import { Notice } from '../../ui/notice';
import type { Front } from './front';
import type { Portfolio } from './portfolio';
import type { Run } from './use-run';
import { useSubmitSelection } from './use-submit-selection';

interface SendDialogProps {
  run: Run;
  front: Front;
  selected: Portfolio;
  roundId: string;
  onClose: () => void;
}

/** Shows once more what is sent, asks for the reason, and sends it. */
export function SendDialog({ run, front, selected, roundId, onClose }: SendDialogProps) {
  const navigate = useNavigate();
  const { submit, loading, refusal } = useSubmitSelection();
  const [reason, setReason] = useState('');
  const [asked, setAsked] = useState(false);
  const missing = asked && reason.trim() === '';
  async function send() {
    setAsked(true);
    if (reason.trim() === '') return;
    if (!(await submit({ runId: run.id, pointIndex: selected.index, reason: reason.trim() }))) return;
    announce('Sent for approval');
    await navigate(paths.approval(roundId));
  }
  return (
    <Dialog
      title="Send A for approval"
      sub={`Portfolio of run ${run.number}. Quotes, scores and limits are frozen with it.`}
      onClose={onClose}
      footer={
        <>
          <Button variant="primary" loading={loading} onClick={() => void send()}>
            Send for approval
          </Button>
          <Button onClick={onClose}>Cancel</Button>
        </>
      }
    >
      <Content>
        {refusal && (
          <Notice tone="bad" title={refusal} alert>
            Nothing was sent.
          </Notice>
        )}
        <Review>
          {reviewOf(front, selected).map(([name, figure]) => (
            <div key={name}>
              <dt>{name}</dt>
              <dd className="num">{figure}</dd>
            </div>
          ))}
        </Review>
        <TextAreaField
          label="Reason for this choice"
          help="The approver reads it in the memo."
          error={missing ? 'Write why this portfolio is the one to buy.' : undefined}
          value={reason}
          required
          onChange={(event) => setReason(event.target.value)}
        />
      </Content>
    </Dialog>
  );
}

function reviewOf(
  { costAxis, candidates }: Front,
  { exact, picks }: Portfolio,
): [name: string, figure: string][] {
  const lifeCycle: [string, string][] =
    costAxis === 'LIFE_CYCLE' ? [['Life-cycle cost', formatMoney(exact.cost)]] : [];
  return [
    ['Benefit points', formatNumber(exact.benefit, 4)],
    ['Capital', formatMoney(exact.capital)],
    ...lifeCycle,
    ['Candidates', `${picks.length} of ${candidates}`],
  ];
}

const Content = styled.div`
  display: grid;
  gap: 16px;
`;

const Review = styled.dl`
  display: grid;
  gap: 4px;
  > div {
    display: flex;
    justify-content: space-between;
    gap: 16px;
    padding-bottom: 4px;
    border-bottom: 1px solid var(--mw-line);
  }
  dt {
    color: var(--mw-ink-2);
  }
  dd {
    font-weight: 600;
  }
`;
