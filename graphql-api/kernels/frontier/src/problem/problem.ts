/** A selection problem, format `metewand-problem/1`. All figures are whole numbers in units of the writer's choice. */
export interface Problem {
  readonly format: typeof PROBLEM_FORMAT;
  readonly name?: string;
  /** The most the whole portfolio may cost. */
  readonly ceiling?: number;
  readonly limits?: readonly Limit[];
  readonly items: readonly Item[];
  /** Items of which at least one piece is taken. */
  readonly mustInclude?: readonly string[];
  /** Items of which none is taken. */
  readonly leaveOut?: readonly string[];
  /** Of each inner list at most one item is taken, in any number of pieces. */
  readonly eitherOr?: readonly (readonly string[])[];
  readonly counts?: readonly Count[];
  /** The least benefit of a portfolio that counts. */
  readonly leastBenefit?: number;
}

/** A capacity: what all pieces taken use together lies between `least` and `most`. */
export interface Limit {
  readonly name: string;
  readonly most: number;
  readonly least?: number;
}

/** Benefit, cost and uses are per piece. */
export interface Item {
  readonly id: string;
  readonly benefit: number;
  readonly cost: number;
  /** One figure per limit of the problem, in its order; negative where the item gives something back. */
  readonly uses?: readonly number[];
  /** At most one item with the same name is taken. */
  readonly oneOf?: string;
  /** The most pieces of it; 1 if left out. */
  readonly most?: number;
  /** Of each inner list at least one item is taken whenever this one is. */
  readonly needs?: readonly (readonly string[])[];
  /** A third objective, minimised too; 0 where left out while another item has one. */
  readonly secondCost?: number;
}

/** How many pieces of the named items are taken together. */
export interface Count {
  readonly name?: string;
  readonly items: readonly string[];
  readonly least?: number;
  readonly most?: number;
}

export const PROBLEM_FORMAT = 'metewand-problem/1';

/** Whether there are three objectives: one item with a second cost is enough. */
export function hasSecondCost({ items }: Problem): boolean {
  return items.some(({ secondCost }) => secondCost !== undefined);
}
