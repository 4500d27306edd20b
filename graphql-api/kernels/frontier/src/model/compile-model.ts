import type { Model, OptionList } from './model.js';
import type { Problem } from '../problem/problem.js';
import { compileRows } from './rows.js';

/**
 * Two mandatory items of one group leave its class without an option: the problem has no portfolio, and the model
 * says so with `undefined`. explainInfeasible names the items.
 */
export function compileModel(problem: Problem): Model | undefined {
  const options = listOptions(problem);
  if (options === undefined) return undefined;
  const { optionItem, optionPieces } = options;
  const each = (value: (item: number, pieces: number) => number): Float64Array =>
    Float64Array.from(optionItem, (item, option) => (item < 0 ? 0 : value(item, optionPieces[option])));
  const layout = {
    ...options,
    optionBenefit: each((item, pieces) => problem.items[item].benefit * pieces),
    optionCost: each((item, pieces) => problem.items[item].cost * pieces),
  };
  return { problem, ceiling: problem.ceiling ?? Infinity, ...layout, ...compileRows(problem, layout) };
}

function listOptions(problem: Problem): OptionList | undefined {
  const mandatory = new Set(problem.mustInclude);
  const optionStart: number[] = [];
  const optionClass: number[] = [];
  const optionItem: number[] = [];
  const optionPieces: number[] = [];
  const classOfItem = new Int32Array(problem.items.length).fill(-1);
  const add = (item: number, pieces: number): void => {
    optionClass.push(optionStart.length - 1);
    optionItem.push(item);
    optionPieces.push(pieces);
  };
  for (const members of classesOf(problem)) {
    const required = members.filter((item) => mandatory.has(problem.items[item].id));
    if (required.length > 1) return undefined;
    optionStart.push(optionItem.length);
    if (required.length === 0) add(-1, 0);
    for (const item of required.length === 1 ? required : members) {
      const most = mostPieces(problem, item, mandatory.has(problem.items[item].id));
      if (most > 0) classOfItem[item] = optionStart.length - 1;
      for (let pieces = 1; pieces <= most; pieces++) add(item, pieces);
    }
  }
  return {
    classCount: optionStart.length,
    optionStart: Int32Array.from([...optionStart, optionItem.length]),
    optionClass: Int32Array.from(optionClass),
    optionItem: Int32Array.from(optionItem),
    optionPieces: Int32Array.from(optionPieces),
    classOfItem,
  };
}

/** Items that may be taken, by class, in the order of their first item. */
function classesOf(problem: Problem): number[][] {
  const leftOut = new Set(problem.leaveOut);
  const classes: number[][] = [];
  const byGroup = new Map<string, number[]>();
  for (const [index, { id, oneOf }] of problem.items.entries()) {
    if (leftOut.has(id)) continue;
    const group = oneOf === undefined ? undefined : byGroup.get(oneOf);
    if (group) {
      group.push(index);
      continue;
    }
    const members = [index];
    classes.push(members);
    if (oneOf !== undefined) byGroup.set(oneOf, members);
  }
  return classes;
}

/** More pieces than the ceiling pays for need no option; a mandatory item keeps its first in any case. */
function mostPieces(problem: Problem, item: number, mandatory: boolean): number {
  const { cost, most = 1 } = problem.items[item];
  const affordable = cost === 0 ? most : Math.min(most, Math.floor((problem.ceiling ?? Infinity) / cost));
  return mandatory ? Math.max(1, affordable) : affordable;
}
