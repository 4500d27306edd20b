import type { Message } from './message.js';

export interface ApprovalAsked {
  roundName: string;
  memoNumber: number;
  submittedBy: string;
  /** In words, with currency, as `left`. */
  capital: string;
  left: string;
  benefit: string;
  candidates: number;
  reason: string;
  link: string;
}

/** To the finance directors, when a portfolio is submitted. */
export function approvalAsked(asked: ApprovalAsked): Message {
  return {
    subject: `${asked.roundName}: memo ${asked.memoNumber} asks for your decision`,
    body: [
      `${asked.submittedBy} has submitted a portfolio of ${asked.candidates} candidates for approval.`,
      `Capital  ${asked.capital}, which leaves ${asked.left} of what may be spent\nBenefit  ${asked.benefit} points`,
      ...(asked.reason ? [`Why this one: ${asked.reason}`] : []),
      `Read the memo and decide:\n${asked.link}`,
    ].join('\n\n'),
  };
}
