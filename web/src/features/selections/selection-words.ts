import type { CertificateStatus, SelectionState } from '../../generated/graphql';
import type { TagTone } from '../../ui/tag';

export const DECISION_WORDS: Record<SelectionState, string> = {
  SUBMITTED: 'Waits for a decision',
  APPROVED: 'Approved',
  RETURNED: 'Returned',
  DECLINED: 'Declined',
};

export const STATE_TONES: Record<SelectionState, TagTone> = {
  SUBMITTED: 'caution',
  APPROVED: 'good',
  RETURNED: 'plain',
  DECLINED: 'bad',
};

/** How sure the search is that nothing better exists at this cost. */
export const CERTIFICATE_WORDS: Record<CertificateStatus, string> = {
  COMPLETE: 'Proven complete: no better portfolio exists, at this cost or at any other.',
  BOUNDED:
    'The search has proven a bound on what could still be gained at this cost; part of the cost axis is still open.',
  UNPROVEN: 'It is the best found at this cost. That nothing better exists is not yet proven.',
  INFEASIBLE: 'No portfolio keeps all limits.',
};

/** "2027-01": the year of the round's decision and the memo's number within the round. */
export function memoCode(decisionDate: string, number: number): string {
  return `${decisionDate.slice(0, 4)}-${String(number).padStart(2, '0')}`;
}
