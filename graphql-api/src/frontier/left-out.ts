import { LinkKind } from '../candidates/entities/link.entity.js';
import type { ProblemCandidate, ProblemSource } from './build-problem.js';

export const NO_QUOTE_OPEN = 'No quote is open on the decision date';

/** A candidate that a search cannot choose, with the reason in words. */
export interface LeftOut {
  candidateId: string;
  reason: string;
}

/**
 * Candidates without a quote in force cannot be chosen, nor can those that need one of them and nothing else, nor
 * those that need these, and so on.
 */
export function leaveOutDependents({ candidates, withoutQuote, links }: ProblemSource): {
  items: ProblemCandidate[];
  leftOut: LeftOut[];
} {
  const codes = new Map([...withoutQuote, ...candidates.map(({ id, code }) => [id, code] as const)]);
  const out = new Map([...withoutQuote.keys()].map((id) => [id, NO_QUOTE_OPEN]));
  const needs = links.filter(({ kind }) => kind === LinkKind.NEEDS);
  for (let found = true; found;) {
    found = false;
    for (const { candidateId, memberIds } of needs) {
      if (candidateId === null || out.has(candidateId) || memberIds.some((id) => !out.has(id))) continue;
      const members = memberIds.flatMap((id) => codes.get(id) ?? []).sort();
      out.set(candidateId, `Needs ${members.join(' or ')}, which cannot be bought in this round`);
      found = true;
    }
  }
  return {
    items: candidates.filter(({ id }) => !out.has(id)),
    leftOut: [...out]
      .map(([candidateId, reason]) => ({ candidateId, reason }))
      .sort((one, other) =>
        (codes.get(one.candidateId) ?? '') < (codes.get(other.candidateId) ?? '') ? -1 : 1,
      ),
  };
}
