import styled from 'styled-components';
import { useCan } from '../../lib/use-can';
import { Section } from '../../ui/section';
import { KeepQuoteForm } from './keep-quote-form';
import { keptState } from './kept-quote';
import type { KeptQuote, KeptState } from './kept-quote';

interface WhyThisQuoteProps {
  candidate: KeptQuote;
  /** Once a portfolio is submitted nothing of the quotes changes. */
  frozen: boolean;
}

/** By which quote the candidate counts and why; for those who may, keeping another one. */
export function WhyThisQuote({ candidate, frozen }: WhyThisQuoteProps) {
  const can = useCan();
  const state = keptState(candidate);
  return (
    <Section>
      <Columns>
        <div>
          <h2>Why this quote</h2>
          <p className="small muted">Shown in the approval memo.</p>
        </div>
        <div>
          <p>{WORDS[state.kind](state)}</p>
          {can('keepQuote') && !frozen ? (
            <KeepQuoteForm candidate={candidate} kept={state.kind === 'kept'} />
          ) : (
            candidate.keptReason && <Reason>{candidate.keptReason}</Reason>
          )}
        </div>
      </Columns>
    </Section>
  );
}

const RULE = 'the lowest equivalent annual cost among those that can be bought by';

const WORDS: Record<KeptState['kind'], (state: KeptState) => string> = {
  kept: (state) => `${nameIn(state)} is kept by hand.`,
  rule: (state) => `${nameIn(state)} is in force by the round’s rule: ${RULE}.`,
  lapsed: (state) =>
    `The quote kept by hand can no longer be bought by. ${nameIn(state)} stands in by the round’s rule: ${RULE}.`,
  none: () =>
    'No quote can be bought by on the decision date, so the candidate is left out of the search. Have a vendor amend one, or enter another.',
};

function nameIn(state: KeptState): string {
  return state.kind === 'none' ? '' : `${state.vendor} ${state.number}`;
}

const Columns = styled.div`
  display: grid;
  grid-template-columns: 150px minmax(0, 1fr);
  gap: 8px 16px;
  padding: 14px 16px;
  h2 {
    font-size: 14px;
  }
  @media (max-width: 767px) {
    grid-template-columns: minmax(0, 1fr);
  }
`;

const Reason = styled.blockquote`
  margin: 8px 0 0;
  padding: 8px 12px;
  border-left: 3px solid var(--mw-rod-edge);
  background: var(--mw-chalk);
`;
