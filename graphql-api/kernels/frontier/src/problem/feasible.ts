import type { Item, Problem } from './problem.js';

/** Pieces taken of each item; an item that is not named is not taken. */
export type Picks = Readonly<Record<string, number>>;

/** A rule a portfolio breaks. `used` is what it has, `allowed` the bound it passes. */
export interface Violation {
  readonly kind:
    | 'unknown item'
    | 'pieces'
    | 'ceiling'
    | 'limit most'
    | 'limit least'
    | 'one of'
    | 'needs'
    | 'either or'
    | 'count most'
    | 'count least'
    | 'must include'
    | 'left out'
    | 'least benefit';
  readonly name: string;
  readonly used: number;
  readonly allowed: number;
}

export interface Totals {
  readonly benefit: number;
  readonly cost: number;
  /** One figure per limit. */
  readonly uses: readonly number[];
}

/**
 * Checks a portfolio against every rule of the problem, straight from the document and without the search's own
 * tables, so that it can witness against the search. An empty list means feasible.
 */
export function violationsOf(problem: Problem, picks: Picks): Violation[] {
  const taken = new Map(Object.entries(picks).filter(([, pieces]) => pieces !== 0));
  return [
    ...brokenPieces(problem, taken),
    ...brokenLimits(problem, totalsOf(problem, picks)),
    ...brokenGroups(problem, taken),
    ...brokenNeeds(problem, taken),
    ...brokenChoices(problem, taken),
    ...brokenCounts(problem, taken),
  ];
}

/** Benefit, cost and use of each limit, added up from the document. */
export function totalsOf(problem: Problem, picks: Picks): Totals {
  const items = new Map(problem.items.map((item) => [item.id, item]));
  const sum = (ofPiece: (item: Item) => number): number => {
    let total = 0;
    for (const [id, pieces] of Object.entries(picks)) {
      const item = items.get(id);
      if (item) total += ofPiece(item) * pieces;
    }
    return total;
  };
  return {
    benefit: sum((item) => item.benefit),
    cost: sum((item) => item.cost),
    uses: (problem.limits ?? []).map((_, index) => sum((item) => item.uses?.[index] ?? 0)),
  };
}

/** A broken rule as a sentence without its full stop. */
export function describeViolation({ kind, name, used, allowed }: Violation): string {
  switch (kind) {
    case 'unknown item':
      return `there is no item ${name}`;
    case 'pieces':
      return `${used} pieces of ${name}, where whole pieces up to ${allowed} may be taken`;
    case 'ceiling':
      return `the cost is ${used}, over the ceiling of ${allowed}`;
    case 'limit most':
      return `${name} is ${used}, over its limit of ${allowed}`;
    case 'limit least':
      return `${name} is ${used}, under its least of ${allowed}`;
    case 'one of':
      return `${used} items of the group ${name}, where only one may be taken`;
    case 'needs':
      return `${name}, and none of them is taken`;
    case 'either or':
      return `${used} of ${name}, which exclude each other`;
    case 'count most':
      return `${used} pieces of ${name}, where at most ${allowed} may be taken`;
    case 'count least':
      return `${used} pieces of ${name}, where at least ${allowed} must be taken`;
    case 'must include':
      return `${name} must be taken and is not`;
    case 'left out':
      return `${name} is left out and was taken`;
    case 'least benefit':
      return `the benefit is ${used}, under the least of ${allowed}`;
  }
}

/** What notes and violations call a count that carries no name. */
export function countName(count: { name?: string; items: readonly string[] }): string {
  return count.name ?? count.items.join(', ');
}

/** What notes and violations call a need: `lens needs camera or scope`. */
export function needName(item: string, anyOf: readonly string[]): string {
  return `${item} needs ${anyOf.join(' or ')}`;
}

type Taken = ReadonlyMap<string, number>;

function* brokenPieces(problem: Problem, taken: Taken): Generator<Violation> {
  const items = new Map(problem.items.map((item) => [item.id, item]));
  for (const [id, pieces] of taken) {
    const item = items.get(id);
    if (!item) {
      yield { kind: 'unknown item', name: id, used: pieces, allowed: 0 };
      continue;
    }
    const most = item.most ?? 1;
    if (!Number.isInteger(pieces) || pieces < 0 || pieces > most) {
      yield { kind: 'pieces', name: id, used: pieces, allowed: most };
    }
  }
}

function* brokenLimits(problem: Problem, totals: Totals): Generator<Violation> {
  const ceiling = problem.ceiling ?? Infinity;
  if (totals.cost > ceiling) yield { kind: 'ceiling', name: 'ceiling', used: totals.cost, allowed: ceiling };
  for (const [index, { name, most, least = -Infinity }] of (problem.limits ?? []).entries()) {
    const used = totals.uses[index];
    if (used > most) yield { kind: 'limit most', name, used, allowed: most };
    if (used < least) yield { kind: 'limit least', name, used, allowed: least };
  }
  const leastBenefit = problem.leastBenefit ?? 0;
  if (totals.benefit < leastBenefit) {
    yield { kind: 'least benefit', name: 'benefit', used: totals.benefit, allowed: leastBenefit };
  }
}

function* brokenGroups(problem: Problem, taken: Taken): Generator<Violation> {
  const itemsTaken = new Map<string, number>();
  for (const { id, oneOf } of problem.items) {
    if (oneOf !== undefined && taken.has(id)) itemsTaken.set(oneOf, (itemsTaken.get(oneOf) ?? 0) + 1);
  }
  for (const [name, used] of itemsTaken) {
    if (used > 1) yield { kind: 'one of', name, used, allowed: 1 };
  }
}

function* brokenNeeds(problem: Problem, taken: Taken): Generator<Violation> {
  for (const { id, needs = [] } of problem.items) {
    if (!taken.has(id)) continue;
    for (const anyOf of needs) {
      if (!anyOf.some((other) => taken.has(other))) {
        yield { kind: 'needs', name: needName(id, anyOf), used: 0, allowed: 1 };
      }
    }
  }
}

function* brokenChoices(problem: Problem, taken: Taken): Generator<Violation> {
  for (const id of problem.mustInclude ?? []) {
    if (!taken.has(id)) yield { kind: 'must include', name: id, used: 0, allowed: 1 };
  }
  for (const id of problem.leaveOut ?? []) {
    const used = taken.get(id) ?? 0;
    if (used > 0) yield { kind: 'left out', name: id, used, allowed: 0 };
  }
  for (const exclusive of problem.eitherOr ?? []) {
    const used = exclusive.filter((id) => taken.has(id)).length;
    if (used > 1) yield { kind: 'either or', name: exclusive.join(', '), used, allowed: 1 };
  }
}

function* brokenCounts(problem: Problem, taken: Taken): Generator<Violation> {
  for (const count of problem.counts ?? []) {
    const used = count.items.reduce((sum, id) => sum + (taken.get(id) ?? 0), 0);
    const { least = 0, most = Infinity } = count;
    if (used > most) yield { kind: 'count most', name: countName(count), used, allowed: most };
    if (used < least) yield { kind: 'count least', name: countName(count), used, allowed: least };
  }
}
