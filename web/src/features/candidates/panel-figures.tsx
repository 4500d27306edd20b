import styled from 'styled-components';
import { formatMoneyWhole } from '../../lib/money';
import { BenefitRod } from './benefit-rod';
import type { CandidateDetailsFragment } from './candidate-details.generated';

/** Capital, life-cycle cost and benefit of a candidate by its quote in force. */
export function PanelFigures({ candidate }: { candidate: CandidateDetailsFragment }) {
  const { quoteInForce, benefit } = candidate;
  return (
    <Grid>
      <div>
        <dt>Capital</dt>
        <dd>{quoteInForce ? formatMoneyWhole(quoteInForce.cost.capital) : '—'}</dd>
      </div>
      <div>
        <dt>Life-cycle cost</dt>
        <dd>{quoteInForce ? formatMoneyWhole(quoteInForce.cost.lifeCycleCost) : '—'}</dd>
      </div>
      <div>
        <dt>Benefit score</dt>
        <dd>
          {benefit ? (
            <BenefitRod points={benefit.points} width={72} />
          ) : (
            <Later>— after scoring closes</Later>
          )}
        </dd>
      </div>
      {benefit && benefit.missingScores > 0 && (
        <div>
          <dt>Scores missing</dt>
          <dd>{benefit.missingScores}</dd>
        </div>
      )}
    </Grid>
  );
}

const Grid = styled.dl`
  display: grid;
  grid-template-columns: 1fr 1fr;
  gap: 10px 12px;
  padding: 10px 0;
  border: solid var(--mw-line);
  border-width: 1px 0;
  dt {
    font-size: 12px;
    color: var(--mw-ink-2);
  }
  dd {
    font-size: 16px;
    font-weight: 700;
  }
`;

const Later = styled.span`
  display: block;
  line-height: 1.3;
  font-size: 13px;
  font-weight: 400;
`;
