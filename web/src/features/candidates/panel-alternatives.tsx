import styled from 'styled-components';
import { formatDate } from '../../lib/dates';
import { currencySign, formatAmountWhole } from '../../lib/money';
import { paths } from '../../lib/paths';
import { ButtonLink } from '../../ui/button';
import type { CandidateDetailsFragment } from './candidate-details.generated';

type Alternative = CandidateDetailsFragment['quotes'][number];

interface PanelAlternativesProps {
  roundId: string;
  candidate: CandidateDetailsFragment;
}

/** The quotes of a candidate: which one is in force and why, until when each stands, and what is wrong with it. */
export function PanelAlternatives({ roundId, candidate }: PanelAlternativesProps) {
  const { quotes } = candidate;
  const currency = quotes[0]?.cost.lifeCycleCost.currency;
  return (
    <section>
      <Head>
        <h3>Alternatives</h3>
        {currency && <span className="tiny muted">life-cycle cost, {currencySign(currency)}</span>}
      </Head>
      {quotes.length === 0 && <p className="small muted">No vendor has quoted yet.</p>}
      <ul>
        {quotes.map((quote) => (
          <Line key={quote.id} $inForce={quote.inForce}>
            <Dot $inForce={quote.inForce} aria-hidden />
            <span>
              <b>{quote.vendor.name}</b> <span className="muted">{quote.number}</span>
              {quote.inForce && <span className="visually-hidden"> (in force)</span>}
              <Standing quote={quote} />
            </span>
            <span className="num">{formatAmountWhole(quote.cost.lifeCycleCost)}</span>
          </Line>
        ))}
      </ul>
      {candidate.quoteInForceReason && <p className="tiny muted">{whyInForce(candidate)}</p>}
      <Wide>
        <ButtonLink size="small" to={paths.candidateQuotes(roundId, candidate.id)} block>
          {quotes.length === 0 ? 'Open the quotes' : 'Compare the quotes'}
        </ButtonLink>
      </Wide>
    </section>
  );
}

function Standing({ quote }: { quote: Alternative }) {
  const faults = faultWords(quote);
  if (faults.length === 0) return <Small>Valid to {formatDate(quote.validUntil)}</Small>;
  return <Small $fault>{faults.join(' · ')}</Small>;
}

function faultWords({ faults, validUntil, leadWeeks }: Alternative): string[] {
  return faults.map((fault) => {
    if (fault === 'RUN_OUT') return `Ends ${formatDate(validUntil)}`;
    if (fault === 'SERVICE_PRICE_MISSING') return 'Service price missing';
    return `Lead time ${leadWeeks} weeks`;
  });
}

function whyInForce({ quoteInForceReason, keptReason }: CandidateDetailsFragment): string {
  if (quoteInForceReason !== 'KEPT') return 'In force by the rule: lowest annual cost of the usable quotes.';
  return keptReason ? `Kept by the coordinator: ${keptReason}` : 'Kept by the coordinator.';
}

const Head = styled.div`
  display: flex;
  justify-content: space-between;
  align-items: baseline;
`;

const Line = styled.li<{ $inForce: boolean }>`
  display: grid;
  grid-template-columns: 18px minmax(0, 1fr) auto;
  gap: 8px;
  align-items: center;
  padding: 8px 0;
  border-bottom: 1px solid var(--mw-line);
  font-size: 13px;
  line-height: 1.3;
  .num {
    font-size: 14px;
    font-weight: ${({ $inForce }) => ($inForce ? 700 : 400)};
  }
`;

const Dot = styled.i<{ $inForce: boolean }>`
  width: 14px;
  height: 14px;
  border: ${({ $inForce }) => ($inForce ? '5px solid var(--mw-action)' : '1.5px solid var(--mw-line-strong)')};
  border-radius: 50%;
`;

const Small = styled.span<{ $fault?: boolean }>`
  display: block;
  font-size: 12px;
  font-weight: ${({ $fault }) => ($fault ? 600 : 400)};
  color: var(${({ $fault }) => ($fault ? '--mw-caution' : '--mw-ink-2')});
`;

const Wide = styled.div`
  margin-top: 10px;
`;
