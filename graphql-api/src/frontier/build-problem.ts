import type { Count, Item, Limit as ProblemLimit, Problem } from '@metewand/frontier';
import { LinkKind } from '../candidates/entities/link.entity.js';
import { LimitMeasure } from '../limits/entities/limit.entity.js';
import { boundOf, CEILING_LIMIT_NAME, useOf, type MeasuredCandidate } from '../limits/limit-measures.js';
import { CostAxis } from './cost-axis.enum.js';
import { leaveOutDependents, type LeftOut } from './left-out.js';

export interface ProblemCandidate extends MeasuredCandidate {
  id: string;
  code: string;
  mandatory: boolean;
  benefitTenThousandths: number;
  /** Gross, in minor units of the organisation's currency, as `lifeCycleCostMinor`. */
  capitalMinor: number;
  lifeCycleCostMinor: number;
}

export interface ProblemLink {
  kind: LinkKind;
  candidateId: string | null;
  memberIds: readonly string[];
  least: number | null;
  most: number | null;
}

export interface NamedLimit {
  name: string;
  measure: LimitMeasure;
  siteId: string | null;
  least: string | null;
  most: string | null;
}

export interface ProblemSource {
  name: string;
  currency: string;
  costAxis: CostAxis;
  /** What may be spent on capital, in minor units. */
  spendableMinor: number;
  /** With a quote in force, by code. */
  candidates: readonly ProblemCandidate[];
  /** Codes of those without one, by id. */
  withoutQuote: ReadonlyMap<string, string>;
  links: readonly ProblemLink[];
  limits: readonly NamedLimit[];
}

export interface BuiltProblem {
  problem: Problem;
  /** The candidates behind the problem's items, in their order. */
  items: readonly ProblemCandidate[];
  leftOut: readonly LeftOut[];
}

/**
 * A round as metewand-problem/1: benefit in ten-thousandths of a point, money in minor units, other uses in
 * hundredths, item ids are candidate codes. The ceiling is on capital: on the life-cycle axis it becomes a limit.
 * Throws a RangeError when a life-cycle cost is below zero, because the format takes no such cost.
 */
export function buildProblem(source: ProblemSource): BuiltProblem {
  const { items, leftOut } = leaveOutDependents(source);
  const measuredLimits = source.limits.filter(({ measure }) => measure !== LimitMeasure.CANDIDATES);
  const codes = new Map(items.map(({ id, code }) => [id, code]));
  const onCapital = source.costAxis === CostAxis.CAPITAL;
  const problem: Problem = {
    format: 'metewand-problem/1',
    name: source.name,
    ...(onCapital && { ceiling: source.spendableMinor }),
    limits: [
      ...(onCapital ? [] : [{ name: CEILING_LIMIT_NAME, most: source.spendableMinor }]),
      ...measuredLimits.map((limit) => problemLimit(limit, items, source.currency)),
    ],
    items: items.map((candidate) => problemItem(candidate, source, measuredLimits, codes)),
    mustInclude: items.filter(({ mandatory }) => mandatory).map(({ code }) => code),
    eitherOr: linksOf(source, LinkKind.EITHER_OR)
      .map(({ memberIds }) => codesOf(memberIds, codes))
      .filter((members) => members.length > 1),
    counts: [
      ...source.limits
        .filter(({ measure }) => measure === LimitMeasure.CANDIDATES)
        .map((limit) => countOfLimit(limit, items, source.currency)),
      ...linksOf(source, LinkKind.COUNT).map((link) => countOfLink(link, codes)),
    ],
  };
  return { problem, items, leftOut };
}

function problemItem(
  candidate: ProblemCandidate,
  source: ProblemSource,
  limits: readonly NamedLimit[],
  codes: ReadonlyMap<string, string>,
): Item {
  const onCapital = source.costAxis === CostAxis.CAPITAL;
  const cost = onCapital ? candidate.capitalMinor : candidate.lifeCycleCostMinor;
  if (cost < 0) throw new RangeError(`The life-cycle cost of ${candidate.code} is below zero.`);
  const needs = linksOf(source, LinkKind.NEEDS)
    .filter(({ candidateId }) => candidateId === candidate.id)
    .map(({ memberIds }) => codesOf(memberIds, codes));
  return {
    id: candidate.code,
    benefit: candidate.benefitTenThousandths,
    cost,
    uses: [...(onCapital ? [] : [candidate.capitalMinor]), ...limits.map((limit) => useOf(limit, candidate))],
    ...(needs.length > 0 && { needs }),
  };
}

/** The format wants a most: where the limit has none, it is what all items take together. */
function problemLimit(limit: NamedLimit, items: readonly ProblemCandidate[], currency: string): ProblemLimit {
  const { name, measure } = limit;
  const all = items.reduce((sum, item) => sum + Math.max(0, useOf(limit, item)), 0);
  const least = limit.least === null ? undefined : boundOf(measure, limit.least, currency);
  const most = limit.most === null ? Math.max(all, least ?? all) : boundOf(measure, limit.most, currency);
  return { name, most, ...(least !== undefined && { least }) };
}

function countOfLimit(limit: NamedLimit, items: readonly ProblemCandidate[], currency: string): Count {
  const { name, measure } = limit;
  return {
    name,
    items: items.filter((item) => useOf(limit, item) > 0).map(({ code }) => code),
    ...(limit.least !== null && { least: boundOf(measure, limit.least, currency) }),
    ...(limit.most !== null && { most: boundOf(measure, limit.most, currency) }),
  };
}

function countOfLink({ memberIds, least, most }: ProblemLink, codes: ReadonlyMap<string, string>): Count {
  return {
    items: codesOf(memberIds, codes),
    ...(least !== null && { least }),
    ...(most !== null && { most }),
  };
}

/** In an order of their codes, so that the same round gives the same text whatever its ids are. */
function linksOf(source: ProblemSource, kind: LinkKind): ProblemLink[] {
  const codeOf = new Map(source.candidates.map(({ id, code }) => [id, code]));
  const key = ({ candidateId, memberIds }: ProblemLink) =>
    [codeOf.get(candidateId ?? '') ?? '', ...codesOf(memberIds, codeOf)].join(' ');
  return source.links
    .filter((link) => link.kind === kind)
    .sort((one, other) => (key(one) < key(other) ? -1 : 1));
}

/** Sorted codes of the ids that are items. */
function codesOf(ids: readonly string[], codes: ReadonlyMap<string, string>): string[] {
  return ids.flatMap((id) => codes.get(id) ?? []).sort();
}
