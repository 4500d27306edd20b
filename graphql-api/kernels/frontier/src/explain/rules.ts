import { countName, needName, type Picks, type Violation, violationsOf } from '../problem/feasible.js';
import type { Problem } from '../problem/problem.js';

/** One rule of a problem, so that it can be given up on its own. */
export interface Rule {
  readonly kind: Exclude<Violation['kind'], 'unknown item' | 'pieces'>;
  /** As violations name it. */
  readonly name: string;
  /** Its bound, where it bounds a sum. */
  readonly bound?: number;
  /** Place in the list the problem keeps such rules in; for a need, of the item and of the need. */
  readonly place: number;
  readonly needPlace?: number;
}

/** Every rule of the problem, in the order of the document. What one item's `most` says is no rule but what it is. */
export function rulesOf(problem: Problem): Rule[] {
  return [...sumRules(problem), ...linkRules(problem)];
}

/** Whether the rule bounds its sum from below. */
export function isLeastRule({ kind }: Rule): boolean {
  return kind === 'limit least' || kind === 'count least' || kind === 'least benefit';
}

/** The problem with only some of its rules. */
export function withRules(problem: Problem, kept: ReadonlySet<Rule>): Problem {
  const keeps = new Map<Rule['kind'], Set<string>>();
  const at = (place: number, needPlace?: number): string => `${place} ${needPlace ?? ''}`;
  for (const { kind, place, needPlace } of kept) {
    const places = keeps.get(kind) ?? new Set();
    keeps.set(kind, places.add(at(place, needPlace)));
  }
  const has = (kind: Rule['kind'], place = 0, needPlace?: number): boolean =>
    keeps.get(kind)?.has(at(place, needPlace)) ?? false;
  const groups = groupNames(problem);
  return {
    ...problem,
    ceiling: has('ceiling') ? problem.ceiling : undefined,
    leastBenefit: has('least benefit') ? problem.leastBenefit : undefined,
    limits: problem.limits?.map(({ name, most, least }, place) => ({
      name,
      most: has('limit most', place) ? most : NO_BOUND,
      least: has('limit least', place) ? least : undefined,
    })),
    counts: problem.counts?.map(({ name, items, most, least }, place) => ({
      name,
      items,
      most: has('count most', place) ? most : undefined,
      least: has('count least', place) ? least : undefined,
    })),
    items: problem.items.map((item, place) => ({
      ...item,
      oneOf: item.oneOf !== undefined && has('one of', groups.indexOf(item.oneOf)) ? item.oneOf : undefined,
      needs: item.needs?.filter((_, needPlace) => has('needs', place, needPlace)),
    })),
    eitherOr: problem.eitherOr?.filter((_, place) => has('either or', place)),
    mustInclude: problem.mustInclude?.filter((_, place) => has('must include', place)),
    leaveOut: problem.leaveOut?.filter((_, place) => has('left out', place)),
  };
}

/** The rules that a portfolio breaks. Of rules with one name all count as broken when one is. */
export function brokenRules(problem: Problem, rules: readonly Rule[], picks: Picks): Rule[] {
  const broken = new Set(violationsOf(problem, picks).map(({ kind, name }) => `${kind} ${name}`));
  return rules.filter(({ kind, name }) => broken.has(`${kind} ${name}`));
}

/** A limit cannot go without a most: no sum of a problem comes near this. */
const NO_BOUND = Number.MAX_SAFE_INTEGER;

function* sumRules({ ceiling, limits = [], counts = [], leastBenefit }: Problem): Generator<Rule> {
  if (ceiling !== undefined) yield { kind: 'ceiling', name: 'ceiling', bound: ceiling, place: 0 };
  for (const [place, { name, most, least }] of limits.entries()) {
    yield { kind: 'limit most', name, bound: most, place };
    if (least !== undefined) yield { kind: 'limit least', name, bound: least, place };
  }
  for (const [place, count] of counts.entries()) {
    const name = countName(count);
    const { most, least = 0 } = count;
    if (most !== undefined) yield { kind: 'count most', name, bound: most, place };
    if (least > 0) yield { kind: 'count least', name, bound: least, place };
  }
  if (leastBenefit !== undefined) {
    yield { kind: 'least benefit', name: 'benefit', bound: leastBenefit, place: 0 };
  }
}

function* linkRules(problem: Problem): Generator<Rule> {
  const { mustInclude = [], leaveOut = [], eitherOr = [], items } = problem;
  for (const [place, name] of mustInclude.entries()) yield { kind: 'must include', name, place };
  for (const [place, name] of leaveOut.entries()) yield { kind: 'left out', name, place };
  for (const [place, name] of groupNames(problem).entries()) yield { kind: 'one of', name, place };
  for (const [place, ids] of eitherOr.entries()) yield { kind: 'either or', name: ids.join(', '), place };
  for (const [place, { id, needs = [] }] of items.entries()) {
    for (const [needPlace, anyOf] of needs.entries()) {
      yield { kind: 'needs', name: needName(id, anyOf), place, needPlace };
    }
  }
}

function groupNames({ items }: Problem): string[] {
  const names = new Set<string>();
  for (const { oneOf } of items) if (oneOf !== undefined) names.add(oneOf);
  return [...names];
}
