import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import { useMutation } from '@apollo/client/react';
import { useState } from 'react';
import type { CostAxis } from '../../generated/graphql';
import { errorMessage } from '../../lib/error-code';
import type { StartSearchMutation, StartSearchMutationVariables } from './use-start-search.generated';

const START_SEARCH: TypedDocumentNode<StartSearchMutation, StartSearchMutationVariables> = gql`
  mutation StartSearch($input: StartSearchInput!) {
    startSearch(input: $input) {
      ... on Run {
        id
        number
      }
      ... on LimitsCollide {
        message
        notes
      }
      ... on NothingToSearch {
        message
      }
      ... on SearchAlreadyRunning {
        message
      }
    }
  }
`;

/** Why no search began. */
export interface StartRefusal {
  message: string;
  /** One sentence per limit that collides. */
  notes: readonly string[];
  /** Where it can be mended. */
  mendAt?: 'limits' | 'quotes';
}

/** Starts a search of the round; gives the number of the new run, or undefined where it was refused. */
export function useStartSearch(roundId: string) {
  const [startSearch, { loading }] = useMutation(START_SEARCH);
  const [refusal, setRefusal] = useState<StartRefusal>();
  async function start(costAxis: CostAxis): Promise<number | undefined> {
    setRefusal(undefined);
    try {
      const { data } = await startSearch({ variables: { input: { roundId, costAxis } } });
      const result = data!.startSearch;
      if (result.__typename === 'Run') return result.number;
      setRefusal(refusalOf(result));
    } catch (error) {
      setRefusal({ message: errorMessage(error), notes: [] });
    }
  }
  return { start, loading, refusal };
}

type Refused = Exclude<StartSearchMutation['startSearch'], { __typename: 'Run' }>;

function refusalOf(result: Refused): StartRefusal {
  const { message } = result;
  switch (result.__typename) {
    case 'LimitsCollide':
      return { message, notes: result.notes, mendAt: 'limits' };
    case 'NothingToSearch':
      return { message, notes: [], mendAt: 'quotes' };
    case 'SearchAlreadyRunning':
      return { message, notes: [] };
  }
}
