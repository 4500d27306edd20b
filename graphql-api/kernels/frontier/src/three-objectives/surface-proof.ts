import type { Model } from '../model/model.js';
import { WorkingPortfolio } from '../model/working-portfolio.js';
import type { FoundPortfolio } from '../proof/proof-task.js';
import { lineAbove, type BoundLine } from './bound-line.js';
import { secondCosts } from './simplex-weights.js';
import type { SliceOutcome, SliceSearch, SliceWindow } from './slice-search.js';
import type { SurfaceArchive } from './surface-archive.js';
import type { Layer } from './surface-bound.js';

/**
 * Proves a surface by slices over the second cost. A slice is the front of benefit and cost of all portfolios whose
 * second cost is at most so much. Lowering that bound changes a slice only where a point drops out, for a portfolio
 * that is feasible stays unbeaten among fewer. So from an exact slice the proof goes down to the next lower bound at
 * which a point drops out, and searches anew only between that point's neighbours. A point's least second cost is the
 * bound at which it was last there. Every point of the surface is in the slice of its own second cost.
 */
export class SurfaceProof {
  /** From the highest second cost down. */
  layers: Layer[] = [];
  /** At any second cost: no portfolio of at most a cost has more benefit. Empty if nothing is proven. */
  line: BoundLine = [];
  effort = 0;
  /** Whether the host said stop; what was proven until then stands. */
  stopped = false;
  private readonly portfolio: WorkingPortfolio;
  private readonly optionSecondCost: Float64Array;
  /** No portfolio that counts has a higher cost or second cost. */
  private readonly mostCost: number;
  private readonly mostSecondCost: number;

  constructor(
    model: Model,
    private readonly archive: SurfaceArchive,
    private readonly searchSlice: SliceSearch,
    /** In branches of an enumeration: counted, not timed, so that a run can be repeated. */
    private readonly mostEffort: number,
  ) {
    this.portfolio = new WorkingPortfolio(model);
    this.optionSecondCost = secondCosts(model);
    this.mostCost = Math.min(model.ceiling, sumOfMost(model, model.optionCost));
    this.mostSecondCost = sumOfMost(model, this.optionSecondCost);
  }

  /** Intervals of cost in which no point is missing: all of it or none, for the proof goes along the second cost. */
  get provenStretches(): [fromCost: number, toCost: number][] {
    return this.isComplete ? [[0, this.mostCost]] : [];
  }

  /** Whether every point of the surface is known. */
  get isComplete(): boolean {
    return this.layers.length > 0 && this.layers.every(({ exactFrom, least }) => exactFrom <= least);
  }

  /**
   * Looks at whole slices: exactly, if that can be, at the widest, and shortly at so many more, spread over the second
   * costs of the members. Their lines bound the surface before anything else is known of it.
   */
  *boundLayers(sliceCount: number): Work<void> {
    if (!this.isSpent) yield* this.addLayer(this.mostSecondCost, LONG_LOOK);
    for (const most of this.spreadSecondCosts(sliceCount)) {
      if (!this.isSpent) yield* this.addLayer(most, SHORT_LOOK);
    }
  }

  /** Goes down from every exact slice to the next one. */
  *closeLayers(): Work<void> {
    const exact = this.layers.map(({ exactFrom, most }) => exactFrom <= most);
    for (let at = 0; at < exact.length; at++) if (exact[at]) yield* this.goDown(at);
  }

  private get isSpent(): boolean {
    return this.stopped || this.effort >= this.mostEffort;
  }

  /** Through the layer and those below it that have no exact slice of their own. */
  private *goDown(at: number): Work<void> {
    let front: FrontPoint[] | undefined = this.frontPoints(this.layers[at].line);
    while (front) {
      const highest = Math.max(-1, ...front.map(({ secondCost }) => secondCost));
      at = this.markExact(at, Math.max(0, highest), front);
      if (at < 0) return;
      front = yield* this.lowered(front, highest - 1);
    }
  }

  /**
   * Notes that everything is known from a second cost on. Returns the layer to go on in, or -1 if what is below has
   * been found exactly already or there is nothing below.
   */
  private markExact(at: number, exactFrom: number, front: readonly FrontPoint[]): number {
    const line = front.map(({ cost, benefit }) => [cost, benefit] as const);
    for (;;) {
      const layer = this.layers[at];
      this.layers[at] = { ...layer, exactFrom, line };
      if (exactFrom > layer.least) return at;
      const below = this.layers[at + 1];
      if (below === undefined || below.exactFrom <= below.most) return -1;
      at++;
      if (exactFrom > below.most) return at;
    }
  }

  /** The exact front of the slice of a lower bound; undefined if a part of it could not be proven. */
  private *lowered(front: readonly FrontPoint[], most: number): Work<FrontPoint[] | undefined> {
    const lowered: FrontPoint[] = [];
    for (let at = 0; at < front.length; at++) {
      if (front[at].secondCost <= most) {
        lowered.push(front[at]);
        continue;
      }
      // below the first point that drops out nothing changes, and nothing above the next that stays
      const from = front[at].cost;
      while (at + 1 < front.length && front[at + 1].secondCost > most) at++;
      const to = (front[at + 1]?.cost ?? this.mostCost + 1) - 1;
      if (this.isSpent) return undefined;
      const before = lowered.at(-1)?.benefit;
      const window = { mostSecondCost: most, from, to, isLong: false };
      const { open } = yield* this.search(window, before ?? 0, LONG_LOOK);
      if (open.length > 0) return undefined;
      const least = before === undefined ? 0 : before + 1;
      lowered.push(...this.frontPoints(this.archive.surface.frontWithin(least, to, most)));
    }
    return lowered;
  }

  /** Searches a window of a slice and takes what it finds into the archive. */
  private *search(
    window: Omit<SliceWindow, 'known'>,
    leastBenefit: number,
    effort: number,
  ): Work<SliceOutcome> {
    const known = this.archive.surface.frontWithin(leastBenefit, window.to, window.mostSecondCost);
    const search = this.searchSlice({ ...window, known }, Math.min(effort, this.mostEffort - this.effort));
    let step = search.next();
    while (!step.done) {
      this.stopped = yield;
      step = search.next(this.stopped);
    }
    this.effort += step.value.effort;
    for (const portfolio of step.value.found) this.keep(portfolio);
    return step.value;
  }

  private keep({ chosen }: FoundPortfolio): void {
    this.portfolio.load(chosen);
    const secondCost = chosen.reduce((sum, option) => sum + this.optionSecondCost[option], 0);
    this.archive.keep(this.portfolio, secondCost);
  }

  private frontPoints(line: BoundLine): FrontPoint[] {
    const { surface } = this.archive;
    return line.map(([cost, benefit]) => ({
      cost,
      benefit,
      secondCost: surface.leastSecondCost(benefit, cost),
    }));
  }

  private *addLayer(most: number, effort: number): Work<void> {
    const window = { mostSecondCost: most, from: 0, to: this.mostCost, isLong: true };
    const { open } = yield* this.search(window, 0, effort);
    const known = this.archive.surface.frontWithin(0, this.mostCost, most);
    const exactFrom = open.length === 0 ? most : most + 1;
    const layer = { least: 0, most, exactFrom, line: lineAbove(known, open) };
    const at = this.layers.findIndex((above) => above.least <= most);
    if (at < 0) {
      this.layers.push(layer);
      this.line = layer.line;
      return;
    }
    // it takes over what is below its bound
    const above = this.layers[at];
    this.layers.splice(at, 1, { ...above, least: most + 1 }, { ...layer, least: above.least });
  }

  /** In an order in which the gaps between them are halved: those passed over when time is up lie evenly apart. */
  private spreadSecondCosts(count: number): Set<number> {
    const { surface } = this.archive;
    const sorted = Float64Array.from(surface.slots(), (slot) => surface.secondCostOf(slot)).sort();
    const spread = new Set<number>();
    for (let parts = 2; parts <= count; parts *= 2) {
      for (let part = 1; part < parts; part += 2)
        spread.add(sorted[Math.floor((sorted.length * part) / parts)]);
    }
    spread.delete(this.mostSecondCost);
    return spread;
  }
}

/** Yields whenever the host should be asked; it answers true for stop. */
type Work<Result> = Generator<undefined, Result, boolean>;

/** A point of a slice's front with the least second cost known for it. */
interface FrontPoint {
  readonly cost: number;
  readonly benefit: number;
  readonly secondCost: number;
}

/** Efforts for one slice, or one gap in a slice: a tenth of a second, and ten seconds. */
const SHORT_LOOK = 100_000;
const LONG_LOOK = 20_000_000;

function sumOfMost({ classCount, optionStart }: Model, figures: Float64Array): number {
  let sum = 0;
  for (let k = 0; k < classCount; k++) {
    sum += figures
      .subarray(optionStart[k], optionStart[k + 1])
      .reduce((most, each) => Math.max(most, each), 0);
  }
  return sum;
}
