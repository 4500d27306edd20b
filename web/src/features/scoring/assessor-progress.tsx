import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import styled from 'styled-components';
import { Bar } from '../../ui/bar';
import { Person } from '../../ui/initials';
import { Section } from '../../ui/section';
import type { AssessorGivenFragment } from './assessor-progress.generated';

export const ASSESSOR_GIVEN: TypedDocumentNode<AssessorGivenFragment> = gql`
  fragment AssessorGiven on AssessorProgress {
    given
    of
    membership {
      id
      name
      title
    }
  }
`;

/** How far each assessor is. Only counts: the scores themselves stay closed. */
export function AssessorProgress({ assessors }: { assessors: readonly AssessorGivenFragment[] }) {
  return (
    <Section title="Assessors" aside="scores given" padded>
      <List>
        {assessors.map(({ membership, given, of }) => (
          <li key={membership.id}>
            <span>
              <Person name={membership.name} />
              <small>{membership.title}</small>
            </span>
            <Bar share={of === 0 ? 0 : given / of} />
            <span className="num">{`${given} of ${of}`}</span>
          </li>
        ))}
      </List>
    </Section>
  );
}

const List = styled.ul`
  display: grid;
  gap: 12px;
  li {
    display: grid;
    grid-template-columns: minmax(0, 1fr) 120px 90px;
    gap: 16px;
    align-items: center;
  }
  small {
    display: block;
    padding-left: 30px;
    font-size: 13px;
    color: var(--mw-ink-2);
  }
  @media (max-width: 767px) {
    li {
      grid-template-columns: minmax(0, 1fr) 80px;
    }
    li > :nth-child(2) {
      display: none;
    }
  }
`;
