import { notesOfMiss, NOTHING_KEEPS_ALL, sensibleEvaluations } from '../frontier-search.js';
import { explainInfeasible } from '../explain/explain-infeasible.js';
import { compileModel } from '../model/compile-model.js';
import type { Model } from '../model/model.js';
import { picksOf } from '../model/working-portfolio.js';
import type { Problem } from '../problem/problem.js';
import type { FrontierPoint, SearchProgress, SearchResult, SearchSettings, StopSearch } from '../search.js';
import type { SurfacePoint } from './dominated-volume.js';
import type { ParetoSurface } from './pareto-surface.js';
import { boundOf } from './surface-bound.js';
import { exactSliceSearch, type SliceSearch } from './slice-search.js';
import { SurfaceProof } from './surface-proof.js';
import { SurfaceSearch } from './surface-search.js';

export interface ThreeObjectivesPoint extends FrontierPoint {
  readonly secondCost: number;
}

/** What searchFrontier gives, for three objectives. Plain data. */
export interface ThreeObjectivesResult extends SearchResult {
  /** In order of cost, of equal ones in order of second cost; none is matched or beaten by another in all three. */
  readonly points: readonly ThreeObjectivesPoint[];
  /** Every feasible portfolio is matched or beaten in all three by one of these; empty if nothing is proven. */
  readonly surfaceBound: readonly SurfacePoint[];
  /** Closed intervals of second cost in which no point is missing, from the highest down. */
  readonly provenSecondCosts: readonly (readonly [from: number, to: number])[];
}

/**
 * Looks for the portfolios that no other feasible portfolio matches or beats in benefit, cost and second cost together,
 * and proves by slices over the second cost as much as the effort allows. An item without a second cost counts 0.
 * Runs as searchFrontier does. `sliceSearch` makes the exact search for a slice.
 */
export function* searchThreeObjectives(
  problem: Problem,
  settings: SearchSettings = {},
  sliceSearch: (problem: Problem) => SliceSearch = exactSliceSearch,
): Generator<SearchProgress, ThreeObjectivesResult, StopSearch | undefined> {
  const { seed = 1, evaluations = 20_000_000, reportEvery = 250_000, lookedAtSample = 20_000 } = settings;
  const { effort = SENSIBLE_EFFORT } = settings;
  const reasons = explainInfeasible(problem);
  const model = compileModel(problem);
  if (reasons.length > 0 || model === undefined) return infeasible(seed, reasons);

  const search = new SurfaceSearch(model, seed, lookedAtSample);
  const proof = new SurfaceProof(model, search.archive, sliceSearch(problem), effort);
  const of = Math.min(evaluations, sensibleEvaluations(model, LEAST_EVALUATIONS));
  const progress = (): SearchProgress => progressOf(search, proof, model);
  // the bound comes early, the long proof last: a run that is stopped in between has both points and a gap
  let stopped = yield* searchUntil(search, of / 4, reportEvery, progress);
  if (!stopped) stopped = yield* report(proof.boundLayers(sliceCount(search)), progress);
  if (!stopped) stopped = yield* report(proof.closeLayers(), progress);
  if (!stopped && !proof.isComplete) stopped = yield* searchUntil(search, of, reportEvery, progress);
  const cutShort = proof.stopped || (stopped && search.archive.evaluations < of);
  return resultOf(search, proof, model, seed, cutShort);
}

/** Where the surface is small, going down from the widest slice is soon done. */
function sliceCount({ archive }: SurfaceSearch): number {
  return Math.min(256, archive.surface.size / 128);
}

function* searchUntil(
  search: SurfaceSearch,
  until: number,
  reportEvery: number,
  progress: () => SearchProgress,
): Generator<SearchProgress, boolean, StopSearch | undefined> {
  const { archive } = search;
  while (archive.evaluations < until) {
    const pause = Math.min(until, archive.evaluations + reportEvery);
    while (archive.evaluations < pause) search.step();
    if ((yield progress())?.stop) return true;
  }
  return false;
}

/** Lets the proof work, with a progress whenever it asks whether to go on. Ends with whether the host said stop. */
function* report(
  work: Generator<undefined, void, boolean>,
  progress: () => SearchProgress,
): Generator<SearchProgress, boolean, StopSearch | undefined> {
  let stop = false;
  for (let step = work.next(stop); !step.done; step = work.next(stop)) {
    stop ||= (yield progress())?.stop ?? false;
  }
  return stop;
}

function progressOf({ archive }: SurfaceSearch, proof: SurfaceProof, model: Model): SearchProgress {
  const { surface, evaluations } = archive;
  return {
    evaluations,
    kept: surface.size,
    bestBenefit: surface.mostBenefit,
    points: () => Array.from(surface.slots(), (slot) => [surface.costOf(slot), surface.benefitOf(slot)]),
    portfolios: () => pointsOf(surface, model),
    proven: () => ({ bound: proof.line, provenStretches: proof.provenStretches }),
  };
}

function pointsOf(surface: ParetoSurface, model: Model): ThreeObjectivesPoint[] {
  return Array.from(surface.slots(), (slot) => ({
    benefit: surface.benefitOf(slot),
    cost: surface.costOf(slot),
    secondCost: surface.secondCostOf(slot),
    picks: picksOf(model, surface.choicesOf(slot)),
  }));
}

function resultOf(
  search: SurfaceSearch,
  proof: SurfaceProof,
  model: Model,
  seed: number,
  stopped: boolean,
): ThreeObjectivesResult {
  const { surface, lookedAt, onceKept, evaluations } = search.archive;
  const points = pointsOf(surface, model);
  if (proof.isComplete && points.length === 0) {
    return infeasible(seed, [NOTHING_KEEPS_ALL], evaluations);
  }
  const { layers } = proof;
  const bounded = layers.length > 0 ? 'bounded' : 'unproven';
  return {
    status: proof.isComplete ? 'complete' : bounded,
    stopped,
    seed,
    evaluations,
    points,
    bound: proof.line,
    provenStretches: proof.provenStretches,
    surfaceBound: boundOf(
      layers,
      points.map(({ cost, benefit, secondCost }) => [cost, benefit, secondCost]),
    ),
    provenSecondCosts: layers
      .filter(({ exactFrom, most }) => exactFrom <= most)
      .map(({ least, most, exactFrom }) => [Math.max(least, exactFrom), most]),
    lookedAt: lookedAt.all(),
    onceKept: onceKept.all(),
    counts: { lookedAt: evaluations, kept: points.length, sinceBeaten: surface.sinceBeaten },
    notes: points.length > 0 ? [] : notesOfMiss(search.nearestMiss()),
  };
}

function infeasible(seed: number, notes: readonly string[], evaluations = 0): ThreeObjectivesResult {
  return {
    status: 'infeasible',
    stopped: false,
    seed,
    evaluations,
    points: [],
    bound: [],
    provenStretches: [],
    surfaceBound: [],
    provenSecondCosts: [],
    lookedAt: [],
    onceKept: [],
    counts: { lookedAt: evaluations, kept: 0, sinceBeaten: 0 },
    notes,
  };
}

/** The surface is wide: a short local search would leave too much to the proof. */
const LEAST_EVALUATIONS = 50_000;
/** Some minutes: a small surface needs less, and of a large one no effort proves all. */
const SENSIBLE_EFFORT = 300_000_000;
