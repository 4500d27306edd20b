import type { RoundStage } from '../../generated/graphql';

interface StepWords {
  /** On the button. */
  action: string;
  /** Said once it is done. */
  done: string;
  question: string;
  /** What freezes, and what does not. */
  freezes: readonly string[];
}

/** The coordinator's own steps forward. From the search on, submitting and deciding a portfolio moves the round. */
export const FORWARD: Partial<Record<RoundStage, StepWords>> = {
  GATHER: {
    action: 'Open scoring',
    done: 'Scoring is open',
    question: 'Open scoring for the assessors?',
    freezes: [
      'Criteria and weights freeze. Weights changed later are sensitivity cases only.',
      'Candidates, quotes and limits stay open for changes.',
      'Assessors score alone: nobody sees another’s scores until scoring closes.',
    ],
  },
  SCORE: {
    action: 'Close scoring',
    done: 'Scoring is closed',
    question: 'Close scoring for everybody?',
    freezes: [
      'Scores freeze. Everybody then sees them and the benefit they add up to.',
      'Candidates, quotes and limits stay open until a portfolio is submitted.',
      'The search can start.',
    ],
  },
};

/** The coordinator's steps back, each with a reason for the record. */
export const BACK: Partial<Record<RoundStage, Omit<StepWords, 'freezes'> & { effect: string }>> = {
  SCORE: {
    action: 'Back to gathering',
    done: 'The round is back to gathering',
    question: 'Go back to gathering?',
    effect: 'Scores given so far are kept. Criteria and weights can be changed again.',
  },
  SEARCH: {
    action: 'Reopen scoring',
    done: 'Scoring is open again',
    question: 'Open scoring again?',
    effect: 'Scores can be changed again and are hidden from others until scoring closes. Runs are kept.',
  },
};
