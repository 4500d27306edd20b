import { compileModel } from '../model/compile-model.js';
import type { Model } from '../model/model.js';
import type { Problem } from '../problem/problem.js';
import { openProof } from '../proof/opening.js';
import type { FoundPortfolio, ProofNode } from '../proof/proof-task.js';
import { workTask } from '../proof/work-task.js';
import { risingPart, type BoundLine, type OpenStretch } from './bound-line.js';

/** A stretch of cost of a slice: of the portfolios whose second cost is at most so much. */
export interface SliceWindow {
  readonly mostSecondCost: number;
  /** Both ends included. */
  readonly from: number;
  readonly to: number;
  /** Points known in the stretch, and the last one before; only what is better is looked for. */
  readonly known: BoundLine;
  /** Whether the stretch is so long that it is worth cutting up before anything else. */
  readonly isLong: boolean;
}

export interface SliceOutcome {
  /** Better portfolios than known, by the option chosen in each class. Some may be beaten by others. */
  readonly found: readonly FoundPortfolio[];
  /** Where still better ones may lie; empty if there are none. */
  readonly open: readonly OpenStretch[];
  /** In branches of an enumeration. */
  readonly effort: number;
}

/** Searches a window exactly, with about so much effort. Yields to ask whether to stop. */
export type SliceSearch = (
  window: SliceWindow,
  effort: number,
) => Generator<undefined, SliceOutcome, boolean>;

/** The exact search for benefit and cost, on slices of a problem with a second cost. */
export function exactSliceSearch(problem: Problem): SliceSearch {
  const modelOf = sliceModels(problem);
  return function* search({ mostSecondCost, from, to, known, isLong }, effort) {
    const model = modelOf(mostSecondCost);
    let nodes = isLong ? openProof(model, { from, to }).windows : [wholeStretch(model, from, to)];
    let points = known;
    const found: FoundPortfolio[] = [];
    let spent = 0;
    while (nodes.length > 0 && spent < effort) {
      const result = workTask(model, {
        id: '',
        nodes,
        known: points,
        dives: false,
        effort: Math.min(effort - spent, ONE_GO),
      });
      spent += result.effort;
      nodes = result.open;
      found.push(...result.found);
      points = risingPart([...points, ...result.found.map(({ cost, benefit }) => [cost, benefit] as const)]);
      if (yield) break;
    }
    return { found, open: nodes, effort: spent };
  };
}

/** A slice's model is the same for every bound on the second cost but for one figure. */
function sliceModels(problem: Problem): (mostSecondCost: number) => Model {
  const limits = problem.limits ?? [];
  const noUses = limits.map(() => 0);
  const name = unusedName(limits.map((limit) => limit.name));
  const items = problem.items.map(({ secondCost = 0, uses = noUses, ...item }) => {
    return { ...item, uses: [...uses, secondCost] };
  });
  // a bound that every portfolio breaks: a row that none can break is left away
  const model = compileModel({ ...problem, items, limits: [...limits, { name, most: -1 }] });
  if (model === undefined) throw new Error('There is no slice of a problem without portfolios.');
  const row = model.rows.findIndex((each) => each.kind === 'limit most' && each.name === name);
  return (mostSecondCost) => ({ ...model, rowMost: model.rowMost.with(row, mostSecondCost) });
}

function unusedName(used: readonly string[]): string {
  let name = 'second cost';
  while (used.includes(name)) name += ' of the slice';
  return name;
}

/** Everything in a stretch, under a line that nothing can pass. */
function wholeStretch({ optionBenefit }: Model, from: number, to: number): ProofNode {
  const height = optionBenefit.reduce((sum, benefit) => sum + benefit, 0);
  const options = Int32Array.from(optionBenefit, (_, option) => option);
  return { from, to, leastPieces: 0, options, tangent: { height, slope: 0 } };
}

/** In branches of an enumeration, some tenths of a second. */
const ONE_GO = 400_000;
