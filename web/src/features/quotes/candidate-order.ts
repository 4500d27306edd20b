import { gql } from '@apollo/client';
import type { FetchPolicy, TypedDocumentNode } from '@apollo/client';
import { client } from '../../lib/apollo';
import type { CandidateOrderQuery, CandidateOrderQueryVariables } from './candidate-order.generated';

const CANDIDATE_ORDER: TypedDocumentNode<CandidateOrderQuery, CandidateOrderQueryVariables> = gql`
  query CandidateOrder($roundId: ID!, $page: Int!) {
    candidates(roundId: $roundId, sort: { key: CODE, direction: ASC }, page: $page, pageSize: 100) {
      total
      items {
        id
        code
      }
    }
  }
`;

type Neighbour = CandidateOrderQuery['candidates']['items'][number];

export interface Neighbours {
  previous?: Neighbour;
  next?: Neighbour;
}

/** The candidates before and after one by code. The order is fetched once; again when it does not hold the candidate. */
export async function loadNeighbours(roundId: string, candidateId: string): Promise<Neighbours> {
  const known = neighboursIn(await orderOf(roundId, 'cache-first'), candidateId);
  return known ?? neighboursIn(await orderOf(roundId, 'network-only'), candidateId) ?? {};
}

async function orderOf(roundId: string, fetchPolicy: FetchPolicy): Promise<Neighbour[]> {
  const order: Neighbour[] = [];
  for (let page = 1; ; page++) {
    const { data } = await client.query({
      query: CANDIDATE_ORDER,
      variables: { roundId, page },
      fetchPolicy,
    });
    const { items, total } = data!.candidates;
    order.push(...items);
    if (items.length === 0 || order.length >= total) return order;
  }
}

function neighboursIn(order: readonly Neighbour[], candidateId: string): Neighbours | undefined {
  const at = order.findIndex(({ id }) => id === candidateId);
  return at < 0 ? undefined : { previous: order[at - 1], next: order[at + 1] };
}
