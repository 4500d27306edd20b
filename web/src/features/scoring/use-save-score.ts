import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import { useMutation } from '@apollo/client/react';
import type { SaveScoreMutation, SaveScoreMutationVariables } from './use-save-score.generated';
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

export function useSaveScore() {
  const [saveScore] = useMutation(SAVE_SCORE);
  return async (input: ScoreToSave) => {
    const { data } = await saveScore({ variables: { input } });
    return data!.saveScore;
  };
}
