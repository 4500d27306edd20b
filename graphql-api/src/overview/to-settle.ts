import type { QuoteFault } from '@metewand/costing';
import { WIDE_SPREAD_POINTS } from '@metewand/scoring';
import type { Candidate } from '../candidates/entities/candidate.entity.js';
import type { LinkWithMembers } from '../candidates/links.service.js';
import { LinkKind } from '../candidates/entities/link.entity.js';
import { dayInWords } from '../common/words.js';
import type { RoundCosts, UnpricedCandidate } from '../costing/round-costs.service.js';
import type { Membership } from '../memberships/entities/membership.entity.js';
import type { AssessorProgress } from '../scoring/models/score-sheet.model.js';
import { faultWords } from '../quotes/fault-words.js';
import type { Round } from '../rounds/entities/round.entity.js';
import type { Spread } from './score-spreads.js';
import { ToSettleKind, type ToSettle } from './models/round-overview.model.js';

export interface OverviewFacts {
  costs: RoundCosts;
  round: Round;
  /** Who settles what is wrong with quotes. */
  coordinator: Membership | null;
  assessors: readonly AssessorProgress[];
  /** By assessor; only what the viewer may know. */
  unscoredCandidateIds: ReadonlyMap<string, string[]>;
  /** Undefined until scoring has closed. */
  spreads: readonly Spread[] | undefined;
  links: readonly LinkWithMembers[];
}

/** What is still open before the decision, most pressing first, and how many of the same checks found nothing. */
export function toSettle(facts: OverviewFacts): { open: ToSettle[]; settled: number } {
  const checks = [
    ...withoutQuote(facts),
    quotesWithFault(
      facts,
      ToSettleKind.QUOTE_ENDS_EARLY,
      'RUN_OUT',
      'ends before the decision date',
      'end before the decision date',
    ),
    quotesWithFault(
      facts,
      ToSettleKind.SERVICE_PRICE_MISSING,
      'SERVICE_PRICE_MISSING',
      'has no service price',
      'have no service price',
    ),
    ...missingScores(facts),
    ...(facts.spreads ? [farApart(facts.spreads)] : []),
    ...doubleRequests(facts),
  ];
  const open = checks.filter((check) => check !== null);
  return { open, settled: facts.costs.priced.length + checks.length - open.length };
}

function withoutQuote({ costs, coordinator, round }: OverviewFacts): ToSettle[] {
  const mandatoryFirst = [...costs.unpriced].sort(
    (one, other) => Number(other.candidate.mandatory) - Number(one.candidate.mandatory),
  );
  return mandatoryFirst.map((each) => ({
    kind: ToSettleKind.NO_OPEN_QUOTE,
    title: `${label(each.candidate)} has no quote open on ${dayInWords(round.decisionDate)}`,
    detail: [each.candidate.mandatory && 'It is mandatory and would be left out', whatIsWrong(each, round)]
      .filter(Boolean)
      .join('. '),
    by: coordinator,
    candidateIds: [each.candidate.id],
  }));
}

function whatIsWrong({ quotes }: UnpricedCandidate, round: Round): string {
  if (quotes.length === 0) return 'It has no quote yet';
  return quotes
    .map(
      ({ quote, faults }) =>
        `${quote.number}: ${faults.map((fault) => faultWords(fault, quote, round)).join(', ')}`,
    )
    .join('; ');
}

/** Only where another quote is in force: without one the candidate has a line of its own already. */
function quotesWithFault(
  { costs, coordinator }: OverviewFacts,
  kind: ToSettleKind,
  fault: QuoteFault,
  one: string,
  many: string,
): ToSettle | null {
  const faulty = costs.priced.flatMap(({ candidate, quotes }) =>
    quotes.filter(({ faults }) => faults.includes(fault)).map(() => candidate),
  );
  if (faulty.length === 0) return null;
  const candidates = [...new Set(faulty)];
  return {
    kind,
    title: faulty.length === 1 ? `1 quote ${one}` : `${faulty.length} quotes ${many}`,
    detail: `Another quote counts meanwhile: ${listed(candidates)}`,
    by: coordinator,
    candidateIds: candidates.map(({ id }) => id),
  };
}

function missingScores({ assessors, unscoredCandidateIds }: OverviewFacts): (ToSettle | null)[] {
  return assessors.map(({ membership, given, of }) => {
    const missing = of - given;
    if (missing <= 0) return null;
    return {
      kind: ToSettleKind.SCORE_MISSING,
      title: missing === 1 ? '1 score is missing' : `${missing} scores are missing`,
      detail: `${membership.name} has given ${given} of ${of}`,
      by: membership,
      candidateIds: unscoredCandidateIds.get(membership.id) ?? [],
    };
  });
}

function farApart(spreads: readonly Spread[]): ToSettle | null {
  const wide = spreads
    .filter(({ points }) => points >= WIDE_SPREAD_POINTS)
    .sort((one, other) => other.points - one.points);
  if (wide.length === 0) return null;
  const [widest] = wide;
  const candidates = [...new Set(wide.map(({ candidate }) => candidate))];
  return {
    kind: ToSettleKind.SCORES_FAR_APART,
    title: wide.length === 1 ? 'Scores lie far apart once' : `Scores lie far apart ${wide.length} times`,
    detail: `The widest: ${widest.points} points on ${label(widest.candidate)}, ${widest.criterionName}`,
    by: widest.outlier,
    candidateIds: candidates.map(({ id }) => id),
  };
}

/** Candidates that exclude each other although different departments ask: probably one need asked for twice. */
function doubleRequests({ links, costs, coordinator }: OverviewFacts): ToSettle[] {
  const byId = new Map(
    [...costs.priced, ...costs.unpriced].map(({ candidate }) => [candidate.id, candidate]),
  );
  return links
    .filter(({ link }) => link.kind === LinkKind.EITHER_OR)
    .map(({ link, memberIds }) => ({
      link,
      members: memberIds.flatMap((id) => byId.get(id) ?? []).sort(byCode),
    }))
    .filter(({ members }) => new Set(members.map(({ departmentId }) => departmentId)).size > 1)
    .map(({ link, members }) => ({
      kind: ToSettleKind.EITHER_OR_PAIR,
      title: `One need may be asked for twice: ${members.map(label).join(' and ')}`,
      detail: link.reason,
      by: coordinator,
      candidateIds: members.map(({ id }) => id),
    }));
}

const LISTED = 6;

function listed(candidates: readonly Candidate[]): string {
  const codes = candidates.slice(0, LISTED).map(({ code }) => code);
  const more = candidates.length - codes.length;
  return more > 0 ? `${codes.join(', ')} and ${more} more` : codes.join(', ');
}

function label({ code, name }: Candidate): string {
  return `${code} ${name}`;
}

function byCode(one: Candidate, other: Candidate): number {
  return one.code < other.code ? -1 : 1;
}
