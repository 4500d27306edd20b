import { useId, useState } from 'react';
import type { FormEvent } from 'react';
import styled from 'styled-components';
import { announce } from '../../ui/announce';
import { Button } from '../../ui/button';
import { TextAreaField } from '../../ui/field';
import { QuoteChoice } from './quote-choice';
import type { KeptQuote } from './kept-quote';
import { useKeepQuote } from './use-keep-quote';

interface KeepQuoteFormProps {
  candidate: KeptQuote;
  /** Whether one is kept by hand already. */
  kept: boolean;
}

/** Keeps the quote in force or another one, with the reason; or gives the choice back to the rule. */
export function KeepQuoteForm({ candidate, kept }: KeepQuoteFormProps) {
  const { keep, loading } = useKeepQuote(candidate);
  const formId = useId();
  const { quotes } = candidate;
  const [choosing, setChoosing] = useState(false);
  const [chosenId, setChosenId] = useState<string>();
  const [reason, setReason] = useState(candidate.keptReason);
  const [problem, setProblem] = useState<string>();
  const chosen =
    quotes.find(({ id }) => id === chosenId) ?? quotes.find(({ inForce }) => inForce) ?? quotes[0];
  if (!chosen) return null;
  const { vendor } = chosen;

  async function settle(quoteId: string | null, why: string, done: string) {
    const refusal = await keep(quoteId, why);
    setProblem(refusal);
    if (refusal) return document.getElementById(formId)?.querySelector('textarea')?.focus();
    setReason(why);
    setChoosing(false);
    setChosenId(undefined);
    announce(done);
  }

  function submit(event: FormEvent) {
    event.preventDefault();
    const why = reason.trim();
    if (!why) return setProblem('Write in a sentence why this one; the memo shows it.');
    void settle(chosen!.id, why, `${vendor.name} kept`);
  }

  return (
    <Form id={formId} onSubmit={submit} noValidate>
      {choosing && <QuoteChoice quotes={quotes} chosenId={chosen.id} onChoose={setChosenId} />}
      <Line>
        <TextAreaField
          label="Reason"
          value={reason}
          maxLength={1000}
          error={problem}
          onChange={({ target }) => setReason(target.value)}
        />
        <Buttons>
          <Button type="submit" variant="primary" loading={loading} block>
            {`Keep ${vendor.name}`}
          </Button>
          {quotes.length > 1 && !choosing && (
            <Button block onClick={() => setChoosing(true)}>
              Choose another
            </Button>
          )}
          {kept && (
            <Button block onClick={() => void settle(null, '', 'Back to the round’s rule')}>
              Back to the rule
            </Button>
          )}
        </Buttons>
      </Line>
    </Form>
  );
}

const Form = styled.form`
  margin-top: 10px;
`;

const Line = styled.div`
  display: grid;
  grid-template-columns: minmax(0, 1fr) minmax(140px, 220px);
  gap: 12px 16px;
  @media (max-width: 767px) {
    grid-template-columns: minmax(0, 1fr);
  }
`;

const Buttons = styled.div`
  display: grid;
  gap: 8px;
  align-content: start;
  padding-top: 24px;
  button {
    height: auto;
    min-width: 0;
    min-height: 36px;
    padding-block: 6px;
  }
  button * {
    flex-shrink: 1;
    white-space: normal;
    line-height: 1.3;
  }
  @media (max-width: 767px) {
    padding-top: 0;
  }
`;
