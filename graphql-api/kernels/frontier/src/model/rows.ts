import { countName, needName } from '../problem/feasible.js';
import type { Model, OptionList, Row } from './model.js';
import type { Item, Problem } from '../problem/problem.js';

type CompiledRows = Pick<Model, 'rows' | 'rowMost' | 'rowWeight' | 'termStart' | 'termRow' | 'termValue'>;

/** All limits and links but the ceiling as sparse rows over options; rows that no choice can break are left away. */
export function compileRows(problem: Problem, options: OptionList): CompiledRows {
  const drafts = [...draftRows(problem)].filter((draft) => canBreak(draft, options));
  const termsOfOption: [row: number, value: number][][] = Array.from(options.optionItem, () => []);
  for (const [row, draft] of drafts.entries()) {
    for (const [item, value] of draft.entries) {
      if (value === 0) continue;
      for (const option of optionsOfItem(options, item)) {
        termsOfOption[option].push([row, value * factor(draft, options, option)]);
      }
    }
  }
  const termStart = new Int32Array(termsOfOption.length + 1);
  for (const [option, terms] of termsOfOption.entries())
    termStart[option + 1] = termStart[option] + terms.length;
  const terms = termsOfOption.flat();
  return {
    rows: drafts.map(({ kind, name, sign }) => ({ kind, name, sign })),
    rowMost: Float64Array.from(drafts, (draft) => draft.most),
    rowWeight: Float64Array.from(drafts, (draft) => weightOf(draft.most)),
    termStart,
    termRow: Int32Array.from(terms, ([row]) => row),
    termValue: Float64Array.from(terms, ([, value]) => value),
  };
}

/** About one over the bound, as a power of two, so that excesses can be added and taken back without rounding. */
function weightOf(most: number): number {
  return 2 ** -Math.ceil(Math.log2(Math.max(1, Math.abs(most))));
}

interface DraftRow extends Row {
  readonly most: number;
  /** Whether an entry counts once per piece or once as soon as the item is taken. */
  readonly per: 'piece' | 'taken item';
  /** From an index into problem.items to its entry. */
  readonly entries: ReadonlyMap<number, number>;
}

function* draftRows(problem: Problem): Generator<DraftRow> {
  yield* limitRows(problem);
  const indexOf = new Map(problem.items.map((item, index) => [item.id, index]));
  const entries = (ids: readonly string[], value: number): [number, number][] =>
    ids.map((id) => [indexOf.get(id)!, value]);

  for (const count of problem.counts ?? []) {
    const row = (kind: Row['kind'], sign: 1 | -1, bound: number): DraftRow => {
      const perPiece = new Map(entries(count.items, sign));
      return { kind, name: countName(count), sign, most: sign * bound, per: 'piece', entries: perPiece };
    };
    if (count.most !== undefined) yield row('count most', 1, count.most);
    if (count.least !== undefined) yield row('count least', -1, count.least);
  }
  for (const exclusive of problem.eitherOr ?? []) {
    const whenTaken = new Map(entries(exclusive, 1));
    yield {
      kind: 'either or',
      name: exclusive.join(', '),
      sign: 1,
      most: 1,
      per: 'taken item',
      entries: whenTaken,
    };
  }
  for (const { id, needs = [] } of problem.items) {
    for (const anyOf of needs) {
      if (anyOf.includes(id)) continue;
      const whenTaken = new Map([...entries([id], 1), ...entries(anyOf, -1)]);
      yield {
        kind: 'needs',
        name: needName(id, anyOf),
        sign: 1,
        most: 0,
        per: 'taken item',
        entries: whenTaken,
      };
    }
  }
}

function* limitRows({ limits = [], items, leastBenefit }: Problem): Generator<DraftRow> {
  const each = (value: (item: Item) => number): Map<number, number> =>
    new Map(items.map((item, index) => [index, value(item)]));
  for (const [index, { name, most, least }] of limits.entries()) {
    const uses = each((item) => item.uses?.[index] ?? 0);
    yield { kind: 'limit most', name, sign: 1, most, per: 'piece', entries: uses };
    if (least === undefined) continue;
    const negated = each((item) => -(item.uses?.[index] ?? 0));
    yield { kind: 'limit least', name, sign: -1, most: -least, per: 'piece', entries: negated };
  }
  if (leastBenefit !== undefined) {
    const negated = each((item) => -item.benefit);
    yield {
      kind: 'least benefit',
      name: 'benefit',
      sign: -1,
      most: -leastBenefit,
      per: 'piece',
      entries: negated,
    };
  }
}

function canBreak(draft: DraftRow, options: OptionList): boolean {
  const classes = new Set<number>();
  for (const item of draft.entries.keys()) {
    if (options.classOfItem[item] >= 0) classes.add(options.classOfItem[item]);
  }
  let highest = 0;
  for (const k of classes) {
    let highestOfClass = -Infinity;
    for (let option = options.optionStart[k]; option < options.optionStart[k + 1]; option++) {
      const entry = draft.entries.get(options.optionItem[option]) ?? 0;
      highestOfClass = Math.max(highestOfClass, entry * factor(draft, options, option));
    }
    highest += highestOfClass;
  }
  return highest > draft.most;
}

function* optionsOfItem(options: OptionList, item: number): Generator<number> {
  const k = options.classOfItem[item];
  if (k < 0) return;
  for (let option = options.optionStart[k]; option < options.optionStart[k + 1]; option++) {
    if (options.optionItem[option] === item) yield option;
  }
}

function factor(draft: DraftRow, options: OptionList, option: number): number {
  return draft.per === 'piece' ? options.optionPieces[option] : 1;
}
