import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import { useQuery } from '@apollo/client/react';
import type { RunAlternativesQuery, RunAlternativesQueryVariables } from './use-alternatives.generated';

const RUN_ALTERNATIVES: TypedDocumentNode<RunAlternativesQuery, RunAlternativesQueryVariables> = gql`
  query RunAlternatives($id: ID!, $pointIndex: Int!) {
    run(id: $id) {
      id
      alternatives(pointIndex: $pointIndex) {
        count
        isExact
        nextBest {
          benefit
          picks
          cost {
            amount
            currency
          }
          capital {
            amount
            currency
          }
        }
      }
    }
  }
`;

export type Alternatives = RunAlternativesQuery['run']['alternatives'];

/** What else there is at a point of a run that has ended; asked for only while `wanted`. */
export function useAlternatives(id: string, pointIndex: number, wanted: boolean) {
  const { data, error } = useQuery(RUN_ALTERNATIVES, { variables: { id, pointIndex }, skip: !wanted });
  return { alternatives: data?.run.alternatives, error };
}
