import styled from 'styled-components';
import { formatMoneyWhole } from '../../lib/money';
import type { Amount } from '../../lib/money';
import { formatQuantity } from '../../lib/quantity';
import type { CandidateDetailsFragment, TakesFragment } from './candidate-details.generated';

type Limit = TakesFragment['limits'][number];

interface PanelTakesUpProps {
  candidate: CandidateDetailsFragment;
  limits: readonly Limit[];
}

/** What a candidate would take of the limits of the round and of its site. */
export function PanelTakesUp({ candidate, limits }: PanelTakesUpProps) {
  const most = (measure: Limit['measure']) =>
    limits.find(
      (limit) =>
        limit.measure === measure && limit.most && (!limit.site || limit.site.id === candidate.site.id),
    )?.most;
  const added = candidate.quoteInForce?.cost.addedRunningYearly;
  return (
    <section>
      <h3>Takes up</h3>
      <Rows>
        <dt>Installation days</dt>
        <dd>{ofMost(candidate.installationDays, '', most('INSTALLATION_DAYS'))}</dd>
        <dt>Floor area</dt>
        <dd>{ofMost(candidate.floorAreaM2, 'm²', most('FLOOR_AREA'))}</dd>
        <dt>Added running cost a year</dt>
        <dd>{added ? runningCost(added, most('ADDED_RUNNING_COST')) : '—'}</dd>
      </Rows>
    </section>
  );
}

function ofMost(value: string, unit: string, most: string | null | undefined): string {
  const taken = [formatQuantity(value), unit].filter(Boolean).join('\u00a0');
  return most ? `${taken} of ${formatQuantity(most)}` : taken;
}

function runningCost(added: Amount, most: string | null | undefined): string {
  if (!most) return formatMoneyWhole(added);
  return `${formatMoneyWhole(added)} of ${formatMoneyWhole({ ...added, amount: most })}`;
}

const Rows = styled.dl`
  display: grid;
  grid-template-columns: auto 1fr;
  gap: 6px 16px;
  font-size: 13px;
  dt {
    color: var(--mw-ink-2);
  }
  dd {
    text-align: right;
  }
`;
