import { violationsOf, type Item, type Picks, type Problem } from '@metewand/frontier';
import { amountInWords } from '../common/words.js';
import { CEILING_LIMIT_NAME } from '../limits/limit-measures.js';

/**
 * Why a candidate that could be chosen is not in the portfolio, in words, from the rules it would break if it came in
 * together with what it needs.
 */
export function reasonOut(code: string, problem: Problem, picks: Picks, currency: string): string {
  const rival = rivalOf(code, problem, picks);
  if (rival) return `Either this or ${rival}, which is in`;
  const together = withNeeded(code, problem, picks);
  const partners = together.slice(1);
  const reason = reasonOfPackage(together, problem, picks, currency);
  return partners.length > 0 ? `${reason} (with ${partners.join(' and ')}, which it needs)` : reason;
}

function reasonOfPackage(codes: readonly string[], problem: Problem, picks: Picks, currency: string): string {
  const added = Object.fromEntries(codes.map((code) => [code, 1]));
  const broken = violationsOf(problem, { ...picks, ...added });
  const limits = broken.filter(
    ({ kind, name }) => kind === 'count most' || (kind === 'limit most' && name !== CEILING_LIMIT_NAME),
  );
  if (limits.length > 0) return `Does not fit: ${limits.map(({ name }) => name).join(', ')}`;
  const rival = broken.find(({ kind }) => kind === 'either or');
  if (rival) return `Excludes what is in: ${rival.name}`;
  if (broken.length === 0)
    return `Fits, and costs ${amountInWords(sumOf(codes, problem).cost, currency)} more`;
  return isWorthLess(codes, problem, picks)
    ? 'Worth less than what is in for the same money'
    : 'Would cost more than what is left under the ceiling';
}

/** The candidate that is in and excludes this one. */
function rivalOf(code: string, { eitherOr = [] }: Problem, picks: Picks): string | undefined {
  return eitherOr
    .filter((members) => members.includes(code))
    .flatMap((members) => members.filter((id) => picks[id] > 0))[0];
}

/** The candidate and, one after another, the first of each of its needs that is not in; itself first. */
function withNeeded(code: string, problem: Problem, picks: Picks): string[] {
  const items = itemsOf(problem);
  const codes = [code];
  for (const each of codes) {
    for (const anyOf of items.get(each)?.needs ?? []) {
      if (!anyOf.some((id) => picks[id] > 0 || codes.includes(id))) codes.push(anyOf[0]);
    }
  }
  return codes;
}

/** Whether everything in the portfolio that need not be there gives more benefit for its cost. */
function isWorthLess(codes: readonly string[], problem: Problem, picks: Picks): boolean {
  const { benefit, cost } = sumOf(codes, problem);
  const mandatory = new Set(problem.mustInclude);
  return problem.items
    .filter(({ id }) => picks[id] > 0 && !mandatory.has(id))
    .every((item) => item.benefit * cost > benefit * item.cost);
}

function sumOf(codes: readonly string[], problem: Problem): { benefit: number; cost: number } {
  const items = itemsOf(problem);
  const sum = (figure: (item: Item) => number) =>
    codes.reduce((total, code) => total + (items.has(code) ? figure(items.get(code) as Item) : 0), 0);
  return { benefit: sum((item) => item.benefit), cost: sum((item) => item.cost) };
}

function itemsOf({ items }: Problem): Map<string, Item> {
  return new Map(items.map((item) => [item.id, item]));
}
