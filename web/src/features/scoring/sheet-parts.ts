import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import type {
  SheetCandidateFragment,
  SheetCriterionFragment,
  SheetScoreFragment,
} from './sheet-parts.generated';

export const SHEET_CANDIDATE: TypedDocumentNode<SheetCandidateFragment> = gql`
  fragment SheetCandidate on Candidate {
    id
    code
    name
    need
    department {
      id
      name
    }
    site {
      id
      name
    }
    benefit {
      points
      lowest
      highest
      missingScores
    }
  }
`;

export const SHEET_CRITERION: TypedDocumentNode<SheetCriterionFragment> = gql`
  fragment SheetCriterion on Criterion {
    id
    name
    lowAnchor
    highAnchor
    weight
  }
`;

export const SHEET_SCORE: TypedDocumentNode<SheetScoreFragment> = gql`
  fragment SheetScore on Score {
    id
    candidateId
    criterionId
    membershipId
    points
    cannotJudge
    reason
    version
  }
`;

export type SheetCandidate = SheetCandidateFragment;
export type SheetCriterion = SheetCriterionFragment;
export type SheetScore = SheetScoreFragment;
