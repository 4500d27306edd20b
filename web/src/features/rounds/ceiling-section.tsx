import type { ReactNode } from 'react';
import styled from 'styled-components';
import { canChangeContents } from '../../lib/can-change-contents';
import { difference } from '../../lib/minor-units';
import { currencySign, formatAmountWhole } from '../../lib/money';
import type { Amount } from '../../lib/money';
import { formatQuantity } from '../../lib/quantity';
import { useCan } from '../../lib/use-can';
import { Button } from '../../ui/button';
import { Section } from '../../ui/section';
import { AskedRod } from './asked-rod';
import type { RoundCeilingFragment } from './round-ceiling.generated';

export interface Figure {
  value: string;
  name: string;
}

interface CeilingSectionProps {
  title: string;
  round: RoundCeilingFragment;
  /** Capital that all candidates together ask for. */
  asked: Amount;
  /** Further figures in the same line. */
  figures?: readonly Figure[];
  onEdit: () => void;
  children?: ReactNode;
}

/** What is asked for against what may be spent: figures, the rod, and what the page adds below. */
export function CeilingSection({ title, round, asked, figures = [], onEdit, children }: CeilingSectionProps) {
  const can = useCan();
  const editable = can('setCeiling') && canChangeContents(round.stage);
  const all: Figure[] = [
    { value: formatAmountWhole(asked), name: 'asked for' },
    { value: formatAmountWhole(round.ceiling), name: 'budget ceiling' },
    { value: formatAmountWhole(round.spendable), name: heldBack(round.heldBackPercent) },
    ...figures,
  ];
  return (
    <Section
      title={title}
      aside={<Aside currency={asked.currency} onEdit={editable ? onEdit : undefined} />}
      padded
    >
      <Figures>
        {all.map(({ value, name }) => (
          <div key={name}>
            <dt>{name}</dt>
            <dd>{value}</dd>
          </div>
        ))}
      </Figures>
      <AskedRod
        asked={Number(asked.amount)}
        spendable={Number(round.spendable.amount)}
        ceiling={Number(round.ceiling.amount)}
      >
        {compare(asked, round)}
      </AskedRod>
      {children}
    </Section>
  );
}

function Aside({ currency, onEdit }: { currency: string; onEdit?: () => void }) {
  return (
    <Edge>
      capital with VAT, {currencySign(currency)}
      {onEdit && (
        <Button size="small" onClick={onEdit}>
          Set the ceiling
        </Button>
      )}
    </Edge>
  );
}

function heldBack(percent: string): string {
  if (Number(percent) === 0) return 'may be spent';
  return `may be spent, ${formatQuantity(percent)}\u00a0% held back`;
}

function compare(asked: Amount, { ceiling, spendable }: RoundCeilingFragment): string {
  const more = (than: Amount) => formatAmountWhole(difference(asked, than));
  if (Number(asked.amount) > Number(ceiling.amount)) return `${more(ceiling)} more than the ceiling`;
  if (Number(asked.amount) > Number(spendable.amount)) return `${more(spendable)} more than may be spent`;
  return `${formatAmountWhole(difference(spendable, asked))} left to spend`;
}

const Edge = styled.span`
  display: flex;
  align-items: center;
  gap: 12px;
  margin-block: -4px;
`;

const Figures = styled.dl`
  display: flex;
  flex-wrap: wrap;
  gap: 8px 36px;
  margin: 2px 0 16px;
  div {
    display: flex;
    flex-direction: column-reverse;
  }
  dt {
    font-size: 13px;
    color: var(--mw-ink-2);
  }
  dd {
    font-size: 20px;
    font-weight: 700;
    line-height: 1.2;
    white-space: nowrap;
  }
`;
