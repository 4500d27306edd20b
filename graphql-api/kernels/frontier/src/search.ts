import { explainInfeasible } from './explain/explain-infeasible.js';
import type { Picks } from './problem/feasible.js';
import { LocalSearch } from './local-search/local-search.js';
import { compileModel } from './model/compile-model.js';
import type { Model } from './model/model.js';
import type { ParetoFront } from './archive/pareto-front.js';
import { ProblemError } from './problem/problem-error.js';
import type { Problem } from './problem/problem.js';
import type { SearchArchive } from './archive/search-archive.js';
import { picksOf } from './model/working-portfolio.js';

export interface SearchSettings {
  /** The same problem and settings give the same result, whenever and wherever. 1 if left out. */
  readonly seed?: number;
  /** Portfolios to look at before the search ends; 20 million if left out. */
  readonly evaluations?: number;
  /** About how many evaluations lie between two reports; a quarter million if left out. */
  readonly reportEvery?: number;
  /** The most points to keep as a sample of what was looked at; 20 000 if left out. */
  readonly lookedAtSample?: number;
}

/** How far a search is. Valid until it goes on; `points` is worked out when asked for. */
export interface SearchProgress {
  readonly evaluations: number;
  readonly of: number;
  /** Members of the front so far. */
  readonly kept: number;
  readonly bestBenefit: number | undefined;
  /** The front so far as [cost, benefit], in order of cost. */
  points(): [cost: number, benefit: number][];
  /** The same with what each portfolio takes. */
  portfolios(): FrontierPoint[];
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
export interface SearchResult {
  /** `infeasible` only where it is proven that no portfolio meets every rule. */
  readonly status: 'unproven' | 'infeasible';
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
 * Looks for the portfolios that no other feasible portfolio beats in benefit and cost. Finds much and proves
 * nothing: the status of a set with points is `unproven`. Yields a progress now and then; the host
 * decides whether to go on, and ends it early with `next({ stop: true })`.
 */
export function* searchFrontier(
  problem: Problem,
  settings: SearchSettings = {},
): Generator<SearchProgress, SearchResult, StopSearch | undefined> {
  refuseSecondCost(problem);
  const { seed = 1, evaluations = 20_000_000, reportEvery = 250_000, lookedAtSample = 20_000 } = settings;
  const reasons = explainInfeasible(problem);
  const model = compileModel(problem);
  if (reasons.length > 0 || model === undefined) return infeasible(seed, reasons);

  const search = new LocalSearch(model, seed, lookedAtSample);
  const { archive } = search;
  const of = Math.min(evaluations, sensibleEvaluations(model));
  let stopped = false;
  while (!stopped && archive.evaluations < of) {
    const pause = Math.min(of, archive.evaluations + reportEvery);
    while (archive.evaluations < pause) search.step(pause - archive.evaluations);
    stopped = (yield progressOf(archive, model, of))?.stop ?? false;
  }
  return resultOf(search, model, seed, stopped && archive.evaluations < of);
}

/** Where there are few portfolios, looking at each of them many times over is enough. */
function sensibleEvaluations({ classCount, optionStart }: Model): number {
  let portfolios = 1;
  for (let k = 0; k < classCount; k++) portfolios *= optionStart[k + 1] - optionStart[k];
  return Math.max(50_000, 64 * portfolios);
}

function refuseSecondCost(problem: Problem): void {
  for (const [index, { secondCost }] of problem.items.entries()) {
    if (secondCost === undefined) continue;
    const expected = 'no second cost: the search has two objectives, benefit and cost';
    throw new ProblemError(`items[${index}].secondCost`, expected, `${secondCost}`);
  }
}

function progressOf({ front, evaluations }: SearchArchive, model: Model, of: number): SearchProgress {
  const bestBenefit = front.size > 0 ? front.benefitAt(front.size - 1) : undefined;
  const portfolios = (): FrontierPoint[] => portfoliosOf(front, model);
  return { evaluations, of, kept: front.size, bestBenefit, points: () => front.points(), portfolios };
}

function portfoliosOf(front: ParetoFront, model: Model): FrontierPoint[] {
  return front.points().map(([cost, benefit], place) => {
    return { benefit, cost, picks: picksOf(model, front.choicesAt(place)) };
  });
}

function resultOf(search: LocalSearch, model: Model, seed: number, stopped: boolean): SearchResult {
  const { front, lookedAt, onceKept, evaluations } = search.archive;
  const points = portfoliosOf(front, model);
  return {
    status: 'unproven',
    stopped,
    seed,
    evaluations,
    points,
    lookedAt: lookedAt.all(),
    onceKept: onceKept.all(),
    counts: { lookedAt: evaluations, kept: points.length, sinceBeaten: front.sinceBeaten },
    notes: points.length > 0 ? [] : notesOfMiss(search.nearestMiss()),
  };
}

function notesOfMiss(broken: readonly string[]): string[] {
  const found = 'No portfolio was found that keeps every limit and link; that there is none is not proven.';
  return broken.length === 0
    ? [found]
    : [found, `The nearest one found still breaks this: ${broken.join('; ')}.`];
}

function infeasible(seed: number, notes: readonly string[]): SearchResult {
  return {
    status: 'infeasible',
    stopped: false,
    seed,
    evaluations: 0,
    points: [],
    lookedAt: [],
    onceKept: [],
    counts: { lookedAt: 0, kept: 0, sinceBeaten: 0 },
    notes,
  };
}
