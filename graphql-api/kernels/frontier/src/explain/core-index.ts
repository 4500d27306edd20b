import { groupsOf } from '../problem/groups.js';
import type { Problem } from '../problem/problem.js';
import type { Solved } from './solve.js';

/** How many of the kept portfolios hold an item, or any item of a group. */
export interface Share {
  readonly name: string;
  readonly holding: number;
  /** `holding` of the portfolios counted, from 0 to 1. */
  readonly share: number;
  /** In all, in some, in none of them. */
  readonly standing: 'core' | 'borderline' | 'exterior';
}

export interface CoreIndex {
  readonly portfolios: number;
  /** In the order of the problem's items. */
  readonly items: readonly Share[];
  /** The groups in the order of their first item. */
  readonly groups: readonly Share[];
  /** Whether it is proven that no point of the frontier is missing between the costs asked for. */
  readonly proven: boolean;
}

/** Costs, both included. */
export interface CostWindow {
  readonly from: number;
  readonly to: number;
}

/**
 * The core index: the share of the portfolios on the frontier that hold an item (Liesio, Mild, Salo 2007, "Preference
 * programming for robust portfolio modeling and project selection", EJOR 181, 1488-1505), also for groups, over those
 * with costs in the window only, if one is given. An item in all is core, whatever the benefit is worth in money; one in
 * none is exterior. Of portfolios with equal figures the frontier keeps one, and one is counted. Without a portfolio in
 * the window all shares are 0.
 */
export function coreIndex(
  { items }: Problem,
  result: Solved & { readonly provenStretches?: readonly (readonly [number, number])[] },
  window?: CostWindow,
): CoreIndex {
  const { from, to } = window ?? { from: 0, to: Infinity };
  const portfolios = result.points.filter(({ cost }) => cost >= from && cost <= to);
  const shareOf = (name: string, ids: readonly string[]): Share => {
    const holding = portfolios.filter(({ picks }) => ids.some((id) => picks[id] > 0)).length;
    const share = portfolios.length === 0 ? 0 : holding / portfolios.length;
    const standing = holding === 0 ? 'exterior' : holding === portfolios.length ? 'core' : 'borderline';
    return { name, holding, share, standing };
  };
  const groups = groupsOf(items).filter(([first]) => first.oneOf !== undefined);
  const stretches = result.provenStretches ?? [];
  return {
    portfolios: portfolios.length,
    items: items.map(({ id }) => shareOf(id, [id])),
    groups: groups.map((members) =>
      shareOf(
        members[0].oneOf!,
        members.map(({ id }) => id),
      ),
    ),
    proven: result.status === 'complete' || stretches.some(([first, last]) => first <= from && to <= last),
  };
}
