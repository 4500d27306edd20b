import { join, list, objectWithKeys, optional, refuse, text, wholeNumber } from './json-shape.js';
import { ProblemError } from './problem-error.js';
import { PROBLEM_FORMAT, type Count, type Item, type Limit, type Problem } from './problem.js';

/**
 * Reads a problem out of parsed JSON. Nothing is guessed or dropped: an unknown key or item, a duplicate, a
 * fraction, a figure out of its range or a sum that doubles cannot hold throws a ProblemError.
 */
export function parseProblem(json: unknown): Problem {
  const object = objectWithKeys(json, '', ['format', 'items'], PROBLEM_KEYS);
  if (object.format !== PROBLEM_FORMAT) refuse('format', `"${PROBLEM_FORMAT}"`, object.format);
  const limits = optional(object, 'limits', '', (value, path) => list(value, path, limit, { most: 32 }));
  const problem: Problem = withoutMissing({
    format: PROBLEM_FORMAT,
    name: optional(object, 'name', '', (value, path) => text(value, path, { most: 200 })),
    ceiling: optional(object, 'ceiling', '', atLeastZero),
    limits,
    items: list(object.items, 'items', (value, path) => item(value, path, limits?.length ?? 0), {
      most: 20_000,
    }),
    mustInclude: optional(object, 'mustInclude', '', ids),
    leaveOut: optional(object, 'leaveOut', '', ids),
    eitherOr: optional(object, 'eitherOr', '', (value, path) =>
      list(value, path, (inner, innerPath) => ids(inner, innerPath, 2)),
    ),
    counts: optional(object, 'counts', '', (value, path) => list(value, path, count)),
    leastBenefit: optional(object, 'leastBenefit', '', atLeastZero),
  });
  refuseDuplicates(problem);
  refuseUnknownItems(problem);
  refuseContradictions(problem);
  refuseLargeSums(problem);
  return problem;
}

const PROBLEM_KEYS = [
  'name',
  'ceiling',
  'limits',
  'mustInclude',
  'leaveOut',
  'eitherOr',
  'counts',
  'leastBenefit',
];

function limit(value: unknown, path: string): Limit {
  const object = objectWithKeys(value, path, ['name', 'most'], ['least']);
  const most = wholeNumber(object.most, join(path, 'most'));
  const least = optional(object, 'least', path, (number, at) => wholeNumber(number, at));
  if (least !== undefined && least > most) refuse(join(path, 'least'), `at most ${most}, its most`, least);
  return withoutMissing({ name: text(object.name, join(path, 'name')), most, least });
}

function item(value: unknown, path: string, limitCount: number): Item {
  const object = objectWithKeys(value, path, ['id', 'benefit', 'cost'], ITEM_KEYS);
  return withoutMissing({
    id: text(object.id, join(path, 'id'), { least: 1, most: 100 }),
    benefit: atLeastZero(object.benefit, join(path, 'benefit')),
    cost: atLeastZero(object.cost, join(path, 'cost')),
    uses: optional(object, 'uses', path, (uses, at) => usesOfLength(uses, at, limitCount)),
    oneOf: optional(object, 'oneOf', path, (name, at) => text(name, at, { least: 1 })),
    most: optional(object, 'most', path, (most, at) => wholeNumber(most, at, { least: 1, most: 1000 })),
    needs: optional(object, 'needs', path, (needs, at) =>
      list(needs, at, (inner, innerPath) => ids(inner, innerPath, 1)),
    ),
    secondCost: optional(object, 'secondCost', path, atLeastZero),
  });
}

const ITEM_KEYS = ['uses', 'oneOf', 'most', 'needs', 'secondCost'];

function usesOfLength(value: unknown, path: string, limitCount: number): number[] {
  const uses = list(value, path, (use, at) => wholeNumber(use, at));
  if (uses.length === limitCount) return uses;
  throw new ProblemError(path, `${limitCount} figures, one per limit`, `${uses.length}`);
}

function count(value: unknown, path: string): Count {
  const object = objectWithKeys(value, path, ['items'], ['name', 'least', 'most']);
  const least = optional(object, 'least', path, atLeastZero);
  const most = optional(object, 'most', path, atLeastZero);
  if (least !== undefined && most !== undefined && least > most) {
    refuse(join(path, 'least'), `at most ${most}, its most`, least);
  }
  const name = optional(object, 'name', path, (text_, at) => text(text_, at));
  return withoutMissing({ name, items: ids(object.items, join(path, 'items')), least, most });
}

function atLeastZero(value: unknown, path: string): number {
  return wholeNumber(value, path, { least: 0 });
}

function ids(value: unknown, path: string, least = 0): string[] {
  const read = list(value, path, (id, at) => text(id, at, { least: 1 }), { least });
  refuseRepeated(read, (index) => `${path}[${index}]`);
  return read;
}

function refuseDuplicates(problem: Problem): void {
  refuseRepeated(
    problem.items.map((each) => each.id),
    (index) => `items[${index}].id`,
  );
  refuseRepeated(
    (problem.limits ?? []).map((each) => each.name),
    (index) => `limits[${index}].name`,
  );
  refuseRepeated(
    (problem.counts ?? []).map((each) => each.name),
    (index) => `counts[${index}].name`,
  );
}

function refuseRepeated(names: readonly (string | undefined)[], pathOf: (index: number) => string): void {
  const seen = new Set<string>();
  for (const [index, name] of names.entries()) {
    if (name === undefined) continue;
    if (seen.has(name))
      throw new ProblemError(pathOf(index), 'a name not used before in its list', `"${name}" again`);
    seen.add(name);
  }
}

function refuseUnknownItems(problem: Problem): void {
  const known = new Set(problem.items.map((each) => each.id));
  const check = (named: readonly string[] | undefined, path: string): void => {
    for (const [index, id] of (named ?? []).entries()) {
      if (!known.has(id)) refuse(`${path}[${index}]`, 'the id of an item', id);
    }
  };
  check(problem.mustInclude, 'mustInclude');
  check(problem.leaveOut, 'leaveOut');
  problem.eitherOr?.forEach((inner, index) => check(inner, `eitherOr[${index}]`));
  problem.counts?.forEach((each, index) => check(each.items, `counts[${index}].items`));
  problem.items.forEach((each, index) =>
    each.needs?.forEach((inner, place) => check(inner, `items[${index}].needs[${place}]`)),
  );
}

function refuseContradictions(problem: Problem): void {
  const mandatory = new Set(problem.mustInclude);
  for (const [index, id] of (problem.leaveOut ?? []).entries()) {
    if (mandatory.has(id)) refuse(`leaveOut[${index}]`, 'an item that mustInclude does not name', id);
  }
}

/** The kernel adds in doubles: exact as long as no sum can leave the whole numbers below 2^53. */
function refuseLargeSums(problem: Problem): void {
  const sum = (path: string, ofPiece: (item: Item) => number): void => {
    let total = 0;
    for (const [index, each] of problem.items.entries()) {
      total += Math.abs(ofPiece(each)) * (each.most ?? 1);
      if (total > Number.MAX_SAFE_INTEGER) {
        throw new ProblemError(`items[${index}].${path}`, 'a sum over all pieces below 2^53', 'a larger one');
      }
    }
  };
  sum('benefit', (each) => each.benefit);
  sum('cost', (each) => each.cost);
  sum('secondCost', (each) => each.secondCost ?? 0);
  for (const index of (problem.limits ?? []).keys()) sum(`uses[${index}]`, (each) => each.uses?.[index] ?? 0);
}

/** Keys without a value are left away, so that a parsed problem writes back to the text it came from. */
function withoutMissing<T extends object>(object: T): T {
  return Object.fromEntries(Object.entries(object).filter(([, value]) => value !== undefined)) as T;
}
