import type { Message } from './message.js';

export interface SelectionDecided {
  roundName: string;
  memoNumber: number;
  /** "approved", "returned" or "declined". */
  outcome: string;
  decidedBy: string;
  comment: string;
  next: string;
  link: string;
}

/** To whoever submitted the portfolio. */
export function selectionDecided(decided: SelectionDecided): Message {
  return {
    subject: `${decided.roundName}: memo ${decided.memoNumber} was ${decided.outcome}`,
    body: [
      `${decided.decidedBy} has ${decided.outcome} memo ${decided.memoNumber}. ${decided.next}`,
      ...(decided.comment ? [`Comment: ${decided.comment}`] : []),
      `Open the memo:\n${decided.link}`,
    ].join('\n\n'),
  };
}
