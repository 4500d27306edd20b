import type { RoundStage } from '../../generated/graphql';
import { formatDate, formatDayMonth } from '../../lib/dates';

const WORDS = ['No', 'One', 'Two', 'Three', 'Four', 'Five', 'Six', 'Seven', 'Eight', 'Nine', 'Ten', 'Eleven', 'Twelve']; // prettier-ignore

interface RoundNow {
  stage: RoundStage;
  scoringClosesOn: string;
  decisionDate: string;
}

/** The answer of the overview in a sentence: "Five things to settle before the decision". */
export function overviewAnswer({ stage }: Pick<RoundNow, 'stage'>, open: number): string {
  if (stage === 'ORDER') return 'The decision is made';
  if (stage === 'CLOSED') return 'This round is closed';
  if (open === 0) return 'Nothing is left to settle before the decision';
  return `${WORDS[open] ?? open} ${open === 1 ? 'thing' : 'things'} to settle before the decision`;
}

/** One quiet line below: what goes on in the round meanwhile. */
export function whatGoesOn(round: RoundNow): string {
  switch (round.stage) {
    case 'GATHER':
      return 'Departments’ candidates and their quotes are being gathered until scoring opens.';
    case 'SCORE':
      return `Assessors score until ${formatDayMonth(round.scoringClosesOn)}. Quotes can be settled meanwhile.`;
    case 'SEARCH':
      return 'The search works with what is there. Run it once more after settling them.';
    case 'DECIDE':
      return `A portfolio is submitted; the figures are frozen. Decision due ${formatDate(round.decisionDate)}.`;
    case 'ORDER':
      return 'The approved portfolio can be ordered.';
    case 'CLOSED':
      return 'Its figures are kept as they were decided.';
  }
}
