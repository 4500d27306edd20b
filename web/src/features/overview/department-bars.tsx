import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import styled from 'styled-components';
import { formatAmountWhole } from '../../lib/money';
import { Bar } from '../../ui/bar';
import type { DepartmentBarFragment } from './department-bars.generated';

export const DEPARTMENT_BAR: TypedDocumentNode<DepartmentBarFragment> = gql`
  fragment DepartmentBar on DepartmentAsk {
    candidates
    department {
      id
      name
    }
    asked {
      amount
      currency
    }
  }
`;

/** What each department asks for, the greatest first. */
export function DepartmentBars({ asks }: { asks: readonly DepartmentBarFragment[] }) {
  const sorted = asks.toSorted((a, b) => Number(b.asked.amount) - Number(a.asked.amount));
  const greatest = Number(sorted[0]?.asked.amount ?? 0) || 1;
  return (
    <List aria-label="Asked for by department">
      {sorted.map(({ department, asked }) => (
        <li key={department.id}>
          <span>{department.name}</span>
          <Bar share={Number(asked.amount) / greatest} />
          <b className="num">{formatAmountWhole(asked)}</b>
        </li>
      ))}
    </List>
  );
}

const List = styled.ul`
  display: grid;
  grid-template-columns: 1fr 1fr;
  gap: 14px 32px;
  margin-top: 24px;
  font-size: 13px;
  li {
    display: grid;
    grid-template-columns: 124px minmax(0, 1fr) 74px;
    gap: 8px;
    align-items: center;
  }
  @media (max-width: 1023px) {
    grid-template-columns: minmax(0, 1fr);
  }
`;
