import { gql } from '@apollo/client';
import type { ApolloCache, TypedDocumentNode } from '@apollo/client';
import { useMutation } from '@apollo/client/react';
import type { SaveScoreMutation, SaveScoreMutationVariables } from './use-save-score.generated';
import type { RoundCounts } from '../../generated/graphql';
import { SHEET_SCORE } from './sheet-parts';

const SAVE_SCORE: TypedDocumentNode<SaveScoreMutation, SaveScoreMutationVariables> = gql`
  mutation SaveScore($input: SaveScoreInput!) {
    saveScore(input: $input) {
      ...SheetScore
    }
  }
  ${SHEET_SCORE}
`;

export type ScoreToSave = SaveScoreMutationVariables['input'];

/** `wasMissing`: the round then counts one missing score less, without asking for the counts again. */
export function useSaveScore(roundId: string) {
  const [saveScore] = useMutation(SAVE_SCORE);
  return (input: ScoreToSave, { wasMissing }: { wasMissing: boolean }) =>
    saveScore({ variables: { input }, update: (cache) => void (wasMissing && countOneLess(cache, roundId)) });
}

function countOneLess(cache: ApolloCache, roundId: string) {
  cache.modify<{ counts: RoundCounts }>({
    id: cache.identify({ __typename: 'Round', id: roundId }),
    fields: {
      counts: (counts) => {
        const { scoresMissing } = counts as RoundCounts;
        return { ...(counts as RoundCounts), scoresMissing: Math.max(0, scoresMissing - 1) };
      },
    },
  });
}
