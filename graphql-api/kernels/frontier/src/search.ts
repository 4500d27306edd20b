import { FrontierSearch, NOTHING_KEEPS_ALL } from './frontier-search.js';
import { explainInfeasible } from './explain/explain-infeasible.js';
import { compileModel } from './model/compile-model.js';
import type { Model } from './model/model.js';
import { workTask } from './proof/work-task.js';
import { reduceProblem } from './reduction/reduce-problem.js';
import type { Picks } from './problem/feasible.js';
import { ProblemError } from './problem/problem-error.js';
import { hasSecondCost, type Problem } from './problem/problem.js';
import {
  searchThreeObjectives,
  type ThreeObjectivesResult,
} from './three-objectives/search-three-objectives.js';

export interface SearchSettings {
  /** The same problem and settings give the same result, whenever and wherever. 1 if left out. */
  readonly seed?: number;
  /** Portfolios the local search may look at before it leaves the field to the proof; 20 million if left out. */
  readonly evaluations?: number;
  /** Branches the proof may look at. If left out: as many as it takes, with a second cost 300 million. */
  readonly effort?: number;
  /** About how many evaluations lie between two reports; a quarter million if left out. */
  readonly reportEvery?: number;
  /** The most points to keep as a sample of what was looked at; 20 000 if left out. */
  readonly lookedAtSample?: number;
}

/** How far a search is. Valid until it goes on; what is a function is worked out when asked for. */
export interface SearchProgress {
  /** Portfolios looked at, by the local search and in the proof. */
  readonly evaluations: number;
  /** Members of the front so far. */
  readonly kept: number;
  readonly bestBenefit: number | undefined;
  /** The front so far as [cost, benefit], in order of cost. */
  points(): [cost: number, benefit: number][];
  /** The same with what each portfolio takes. */
  portfolios(): FrontierPoint[];
  proven(): ProvenSoFar;
}

/** What is proven of a front. Empty lists: nothing. */
export interface ProvenSoFar {
  /** Steps [cost, benefit], rising in both: no feasible portfolio of at most that cost has more benefit. */
  readonly bound: readonly (readonly [cost: number, benefit: number])[];
  /** Closed intervals of cost in which no point is missing. */
  readonly provenStretches: readonly (readonly [fromCost: number, toCost: number])[];
}

/** Send it with `next` to end the search: the next step is the last and brings what was found. */
export interface StopSearch {
  readonly stop: boolean;
}

export interface FrontierPoint {
  readonly benefit: number;
  readonly cost: number;
  readonly picks: Picks;
}

/** Plain data: it can be sent between threads and written as JSON. */
export interface SearchResult extends ProvenSoFar {
  /**
   * `complete`: every point is there. `bounded`: the bound holds. `unproven`: nothing is known of what is missing.
   * `infeasible`: no portfolio meets every rule, which is proven.
   */
  readonly status: 'complete' | 'bounded' | 'unproven' | 'infeasible';
  readonly stopped: boolean;
  readonly seed: number;
  readonly evaluations: number;
  /** In order of cost, rising strictly in both figures. */
  readonly points: readonly FrontierPoint[];
  /** An even sample of the feasible portfolios looked at, as [cost, benefit]. */
  readonly lookedAt: readonly (readonly [cost: number, benefit: number])[];
  /** An even sample of the portfolios that were kept for a while and then beaten. */
  readonly onceKept: readonly (readonly [cost: number, benefit: number])[];
  readonly counts: { readonly lookedAt: number; readonly kept: number; readonly sinceBeaten: number };
  readonly notes: readonly string[];
}

/**
 * Looks for the portfolios that no other feasible portfolio beats in benefit and cost, and proves that none is missing,
 * on one thread. Yields a progress now and then; the host decides whether to go on, and ends it early with
 * `next({ stop: true })`. FrontierSearch is the same for several threads or machines, with the same result.
 *
 * Where an item has a second cost, there are three objectives, and the result is a ThreeObjectivesResult.
 */
export function* searchFrontier(
  problem: Problem,
  settings: SearchSettings = {},
): Generator<SearchProgress, SearchResult | ThreeObjectivesResult, StopSearch | undefined> {
  if (hasSecondCost(problem)) return yield* searchThreeObjectives(problem, settings);
  const begun = beginSearch(problem, settings);
  if ('result' in begun) return begun.result;
  const { search, model } = begun;
  while (!search.isOver) {
    if (!search.advance()) search.accept(workTask(model, search.take()!));
    if (!search.isReportDue) continue;
    if ((yield search.progress())?.stop ?? false) return search.result(true);
  }
  return search.result(false);
}

/**
 * Compiles a problem for a search whose tasks may be worked on elsewhere: anyone who has the problem gets the same
 * model. Or the result at once, where what is asked for can be seen to collide. Throws a ProblemError for a second
 * cost: with three objectives nothing is handed out.
 */
export function beginSearch(
  problem: Problem,
  settings: SearchSettings,
): { readonly search: FrontierSearch; readonly model: Model } | { readonly result: SearchResult } {
  refuseSecondCost(problem);
  const reasons = explainInfeasible(problem);
  const model = reasons.length > 0 ? undefined : modelOf(problem);
  if (model === undefined) return { result: infeasible(settings.seed ?? 1, reasons) };
  return { search: new FrontierSearch(model, settings), model };
}

/** The model that tasks of a search for this problem are about. Undefined: no portfolio is possible. */
export function modelOf(problem: Problem): Model | undefined {
  const reduced = reduceProblem(problem);
  return reduced.infeasible ? undefined : compileModel(reduced.problem);
}

function infeasible(seed: number, reasons: readonly string[]): SearchResult {
  return {
    status: 'infeasible',
    stopped: false,
    seed,
    evaluations: 0,
    points: [],
    bound: [],
    provenStretches: [],
    lookedAt: [],
    onceKept: [],
    counts: { lookedAt: 0, kept: 0, sinceBeaten: 0 },
    notes: reasons.length > 0 ? reasons : [NOTHING_KEEPS_ALL],
  };
}

function refuseSecondCost(problem: Problem): void {
  for (const [index, { secondCost }] of problem.items.entries()) {
    if (secondCost === undefined) continue;
    const expected = 'no second cost: the search has two objectives, benefit and cost';
    throw new ProblemError(`items[${index}].secondCost`, expected, `${secondCost}`);
  }
}
