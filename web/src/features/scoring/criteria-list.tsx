import styled from 'styled-components';
import { formatPercent } from '../../lib/money';
import { Section } from '../../ui/section';
import type { SheetCriterion } from './sheet-parts';

interface CriteriaListProps {
  criteria: readonly SheetCriterion[];
  /** Once scoring has opened. */
  frozen: boolean;
}

/** What is scored: each criterion with both anchors and its weight. */
export function CriteriaList({ criteria, frozen }: CriteriaListProps) {
  return (
    <Section
      title="Criteria"
      aside={frozen ? 'weights froze when scoring opened' : 'weights freeze when scoring opens'}
      padded
    >
      <List>
        {criteria.map(({ id, name, weight, lowAnchor, highAnchor }) => (
          <li key={id}>
            <b>{name}</b>
            <span className="num">{formatPercent(Number(weight), 1)}</span>
            <dl className="small muted">
              <dt>100</dt>
              <dd>{highAnchor}</dd>
              <dt>0</dt>
              <dd>{lowAnchor}</dd>
            </dl>
          </li>
        ))}
      </List>
    </Section>
  );
}

const List = styled.ul`
  li {
    display: grid;
    grid-template-columns: minmax(0, 1fr) auto;
    gap: 4px 16px;
    padding: 10px 0;
    border-top: 1px solid var(--mw-line);
  }
  dl {
    grid-column: 1 / -1;
    display: grid;
    grid-template-columns: 32px minmax(0, 1fr);
    gap: 2px;
  }
`;
