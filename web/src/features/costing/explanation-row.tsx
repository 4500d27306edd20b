import styled from 'styled-components';
import type { ComparedQuote } from './compared-quote';
import type { Explanation } from './explain-cost';

/** Formula on the left, what goes into it below each quote. */
export function ExplanationRow({
  id,
  explanation,
  quotes,
}: {
  id?: string;
  explanation: Explanation;
  quotes: readonly ComparedQuote[];
}) {
  return (
    <tr id={id}>
      <Formula>{explanation.formula}</Formula>
      {quotes.map((quote) => (
        <Inputs key={quote.id}>
          <dl>
            {explanation.inputs(quote).map(({ name, value }) => (
              <div key={name}>
                <dt>{name}</dt>
                <dd>{value}</dd>
              </div>
            ))}
          </dl>
        </Inputs>
      ))}
    </tr>
  );
}

const Formula = styled.td`
  tr > && {
    height: auto;
    padding-block: 6px 12px;
    vertical-align: top;
    font-size: 12px;
    color: var(--mw-ink-2);
    background: var(--mw-chalk);
  }
`;

const Inputs = styled(Formula)`
  div {
    display: flex;
    flex-wrap: wrap;
    justify-content: space-between;
    gap: 0 8px;
    margin-bottom: 2px;
  }
  dd {
    margin-left: auto;
    font-weight: 600;
    text-align: right;
    color: var(--mw-ink);
  }
`;
