import type { RoundStage } from '../generated/graphql';
import { daysUntil } from './dates';

/** The five steps in order, with the word the screen uses. A closed round has all of them behind it. */
export const STEPS = [
  { id: 'GATHER', name: 'Gather' },
  { id: 'SCORE', name: 'Score' },
  { id: 'SEARCH', name: 'Search' },
  { id: 'DECIDE', name: 'Decide' },
  { id: 'ORDER', name: 'Order' },
] as const satisfies readonly { id: RoundStage; name: string }[];

/** Index into STEPS; 5 for a closed round. */
export function stepIndex(stage: RoundStage): number {
  const index = STEPS.findIndex((step) => step.id === stage);
  return index < 0 ? STEPS.length : index;
}

interface RoundDates {
  stage: RoundStage;
  openedOn: string;
  scoringClosesOn: string;
  decisionDate: string;
}

/** Share 0–1 of the time of the present step that has gone by: up to the close of scoring, then up to the decision. */
export function stepProgress(round: RoundDates, now: Date = new Date()): number {
  if (round.stage === 'ORDER' || round.stage === 'CLOSED') return 0;
  const scoring = round.stage === 'GATHER' || round.stage === 'SCORE';
  const from = scoring ? round.openedOn : round.scoringClosesOn;
  const to = scoring ? round.scoringClosesOn : round.decisionDate;
  const length = daysUntil(to, now) - daysUntil(from, now);
  if (length <= 0) return 1;
  return Math.min(1, Math.max(0, -daysUntil(from, now) / length));
}
