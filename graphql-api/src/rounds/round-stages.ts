import { registerEnumType } from '@nestjs/graphql';

export enum RoundStage {
  GATHER = 'GATHER',
  SCORE = 'SCORE',
  SEARCH = 'SEARCH',
  DECIDE = 'DECIDE',
  ORDER = 'ORDER',
  CLOSED = 'CLOSED',
}

registerEnumType(RoundStage, { name: 'RoundStage', description: 'The steps of a round, in order.' });

/** The coordinator's own steps. SEARCH is left by submitting a portfolio, DECIDE by its decision. */
const FORWARD: Partial<Record<RoundStage, RoundStage>> = {
  [RoundStage.GATHER]: RoundStage.SCORE,
  [RoundStage.SCORE]: RoundStage.SEARCH,
};

const BACK: Partial<Record<RoundStage, RoundStage>> = {
  [RoundStage.SCORE]: RoundStage.GATHER,
  [RoundStage.SEARCH]: RoundStage.SCORE,
};

const CHANGEABLE = [RoundStage.GATHER, RoundStage.SCORE, RoundStage.SEARCH];
const SCORING_CLOSED = [RoundStage.SEARCH, RoundStage.DECIDE, RoundStage.ORDER, RoundStage.CLOSED];

export function stageAfter(stage: RoundStage): RoundStage | undefined {
  return FORWARD[stage];
}

export function stageBefore(stage: RoundStage): RoundStage | undefined {
  return BACK[stage];
}

/** Candidates, quotes, limits and assumptions are frozen once a portfolio is submitted. */
export function canChangeContents(stage: RoundStage): boolean {
  return CHANGEABLE.includes(stage);
}

/** Only then may anybody see what the others scored, or what it adds up to. */
export function isScoringClosed(stage: RoundStage): boolean {
  return SCORING_CLOSED.includes(stage);
}
