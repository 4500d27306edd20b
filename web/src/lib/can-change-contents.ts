import type { RoundStage } from '../generated/graphql';

/** Candidates, quotes, limits and the ceiling are frozen once a portfolio is submitted. */
export function canChangeContents(stage: RoundStage): boolean {
  return stage === 'GATHER' || stage === 'SCORE' || stage === 'SEARCH';
}
