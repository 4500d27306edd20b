import type { ReactNode } from 'react';
import styled from 'styled-components';
import { formatAmount } from '../../lib/money';
import { Icon } from '../../ui/icon';
import type { ComparedQuote } from './compared-quote';
import { ExplanationRow } from './explanation-row';
import type { Figure } from './comparison-rows';
import { isWhole } from './cost-lines';
import type { CostLine } from './cost-lines';
import { CostFill } from './cost-fill';
import type { Explanation } from './explain-cost';

interface FigureRowProps {
  name: ReactNode;
  quotes: readonly ComparedQuote[];
  figures: readonly Figure[];
  total?: boolean;
  explanation?: Explanation;
  rowId?: string;
  open?: boolean;
  onToggle?: () => void;
}

/** A row of figures whose name opens how they come about. */
export function FigureRow({
  name,
  quotes,
  figures,
  total,
  explanation,
  rowId,
  open,
  onToggle,
}: FigureRowProps) {
  return (
    <>
      <tr data-total={total}>
        <th scope="row">
          {explanation ? (
            <Opener
              type="button"
              aria-expanded={open}
              aria-controls={open ? rowId : undefined}
              onClick={onToggle}
            >
              {name}
              <Icon name={open ? 'up' : 'down'} size={12} />
            </Opener>
          ) : (
            name
          )}
        </th>
        {figures.map(({ amount, lowest }, i) => (
          <td key={quotes[i]!.id} className="num">
            {amount ? (
              <>
                <Amount $lowest={lowest}>{formatAmount(amount)}</Amount>
                {lowest && <span className="visually-hidden"> lowest</span>}
                {total && !isWhole(quotes[i]!) && <Note>without service</Note>}
              </>
            ) : (
              <>
                — <Note>no price named</Note>
              </>
            )}
          </td>
        ))}
      </tr>
      {explanation && open && <ExplanationRow id={rowId} explanation={explanation} quotes={quotes} />}
    </>
  );
}

/** Swatch and name: the legend of the bars. */
export function LineName({ line }: { line: CostLine }) {
  return (
    <Legend>
      <Swatch $line={line.id} aria-hidden />
      <span>
        {line.name} {line.note && <Note>{line.note}</Note>}
      </span>
    </Legend>
  );
}

const Amount = styled.span<{ $lowest: boolean }>`
  ${({ $lowest }) =>
    $lowest &&
    'font-weight: 700; text-decoration: underline 3px var(--mw-rod); text-underline-offset: 3px; text-decoration-skip-ink: none;'}
`;

export const Note = styled.small`
  font-size: 12px;
  font-weight: 400;
  color: var(--mw-ink-2);
  td & {
    display: block;
    line-height: 1.2;
    white-space: normal;
  }
`;

const Opener = styled.button`
  display: inline-flex;
  align-items: center;
  gap: 8px;
  min-height: 28px;
  margin-left: -4px;
  padding: 0 4px;
  border: 0;
  background: none;
  color: inherit;
  text-align: left;
  cursor: pointer;
  > svg {
    color: var(--mw-ink-2);
  }
  &:hover {
    text-decoration: underline;
  }
`;

const Legend = styled.span`
  display: flex;
  align-items: center;
  gap: 8px;
`;

const Swatch = styled(CostFill)`
  flex: none;
  width: 12px;
  height: 12px;
`;
