import { useState } from 'react';
import styled from 'styled-components';
import type { Decision } from '../../generated/graphql';
import { errorMessage } from '../../lib/error-code';
import { formatMoney } from '../../lib/money';
import type { Amount } from '../../lib/money';
import { announce } from '../../ui/announce';
import { Button } from '../../ui/button';
import { TextAreaField } from '../../ui/field';
import { useNarrow } from '../../ui/use-media';
import { useDecideSelection } from './use-decide-selection';

interface DecideFormProps {
  selection: { id: string; version: number; memo: { capital: Amount } };
  /** Called with why it was refused, with undefined once it went. */
  onRefused: (refusal: string | undefined) => void;
}

const DONE: Record<Decision, string> = {
  APPROVE: 'Approved',
  RETURN: 'Returned with your comment',
  DECLINE: 'Declined',
};
const COMMENT_NEEDED = 'Write a comment to return or decline: the preparer reads it.';

/** The signature of the finance director: approve, return with a comment, or decline with one. */
export function DecideForm({ selection, onRefused }: DecideFormProps) {
  const { decide, loading } = useDecideSelection();
  const narrow = useNarrow();
  const [comment, setComment] = useState('');
  const [commentError, setCommentError] = useState<string>();

  async function press(decision: Decision) {
    const missing = decision !== 'APPROVE' && comment.trim() === '';
    setCommentError(missing ? COMMENT_NEEDED : undefined);
    if (missing) return;
    try {
      const message = await decide(selection, decision, comment.trim());
      onRefused(message);
      if (!message) announce(DONE[decision]);
    } catch (error) {
      onRefused(errorMessage(error));
    }
  }

  return (
    <Form onSubmit={(event) => event.preventDefault()}>
      <TextAreaField
        label="Comment"
        labelAside={<span className="muted small">needed to return or decline</span>}
        rows={narrow ? 1 : 3}
        value={comment}
        error={commentError}
        maxLength={5000}
        onChange={(event) => setComment(event.target.value)}
      />
      <p className="muted small">
        By approving you sign with your name and the time. The memo and its figures are frozen.
      </p>
      <Button
        variant="primary"
        size="large"
        icon="ok"
        block
        loading={loading}
        onClick={() => void press('APPROVE')}
      >
        {`Approve ${formatMoney(selection.memo.capital)}`}
      </Button>
      <Two>
        <Button icon="back" block disabled={loading} onClick={() => void press('RETURN')}>
          Return with comment
        </Button>
        <Button variant="danger" block disabled={loading} onClick={() => void press('DECLINE')}>
          Decline
        </Button>
      </Two>
    </Form>
  );
}

const Form = styled.form`
  display: grid;
  gap: 12px;
`;

const Two = styled.div`
  display: grid;
  grid-template-columns: 1.4fr 1fr;
  gap: 8px;
`;
