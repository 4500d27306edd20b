import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import { Link } from 'react-router-dom';
import styled from 'styled-components';
import { Empty } from '../../ui/empty';
import { Icon } from '../../ui/icon';
import { Person } from '../../ui/initials';
import { Section } from '../../ui/section';
import type { ToSettleItemFragment } from './to-settle-list.generated';
import { settleLook } from './settle-look';
import type { SettleLook } from './settle-look';

export const TO_SETTLE_ITEM: TypedDocumentNode<ToSettleItemFragment> = gql`
  fragment ToSettleItem on ToSettle {
    kind
    title
    detail
    candidateIds
    by {
      id
      name
    }
  }
`;

interface ToSettleListProps {
  roundId: string;
  items: readonly ToSettleItemFragment[];
  settled: number;
  /** Once the decision is made, what is still open stays as a record. */
  decided: boolean;
}

/** What is missing before the decision, who settles it, and the way to where it is settled. */
export function ToSettleList({ roundId, items, settled, decided }: ToSettleListProps) {
  return (
    <Section
      title={decided ? 'Left open at the decision' : 'Missing before the decision'}
      aside={`${items.length} open, ${settled} settled`}
    >
      {items.length === 0 ? (
        <Empty plain title="Everything is settled">
          Quotes, scores and links are complete. What turns up later appears here.
        </Empty>
      ) : (
        <ul>
          {items.map((item) => (
            <Item key={item.kind + item.title} item={item} look={settleLook(roundId, item)} />
          ))}
        </ul>
      )}
    </Section>
  );
}

function Item({ item, look }: { item: ToSettleItemFragment; look: SettleLook }) {
  return (
    <Row>
      <Mark $tone={look.tone}>
        <Icon name={look.icon} />
      </Mark>
      <What>
        <b>{item.title}</b>
        <span>{item.detail}</span>
      </What>
      <Who>{item.by && <Person name={item.by.name} />}</Who>
      <Link to={look.to}>{look.action}</Link>
    </Row>
  );
}

const Row = styled.li`
  display: grid;
  grid-template-columns: 28px minmax(0, 1fr) 152px 176px;
  gap: 2px 12px;
  align-items: center;
  min-height: 49px;
  padding: 5px 16px;
  border-bottom: 1px solid var(--mw-line);
  &:last-child {
    border-bottom: 0;
  }
  > a {
    justify-self: end;
    text-align: right;
    font-weight: 600;
  }
  @media (max-width: 767px) {
    grid-template-columns: 28px minmax(0, 1fr) auto;
    padding-block: 10px;
    > a {
      grid-column: 3;
      padding-block: 4px;
    }
  }
`;

const Mark = styled.span<{ $tone: SettleLook['tone'] }>`
  display: grid;
  place-items: center;
  width: 28px;
  height: 28px;
  border-left: 3px solid;
  color: var(${({ $tone }) => ($tone === 'overlap' ? '--mw-rod-text' : `--mw-${$tone}`)});
  background: var(${({ $tone }) => ($tone === 'overlap' ? '--mw-rod-soft' : `--mw-${$tone}-soft`)});
`;

const What = styled.span`
  display: grid;
  line-height: 1.3;
  span {
    font-size: 13px;
    color: var(--mw-ink-2);
  }
  @media (max-width: 767px) {
    grid-column: 2 / -1;
  }
`;

const Who = styled.span`
  min-width: 0;
  @media (max-width: 767px) {
    grid-column: 2;
    font-size: 13px;
  }
`;
