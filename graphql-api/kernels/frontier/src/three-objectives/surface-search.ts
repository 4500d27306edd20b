import { Random } from '../local-search/random.js';
import { describeViolation, violationsOf } from '../problem/feasible.js';
import { Links } from '../model/links.js';
import type { Model } from '../model/model.js';
import { picksOf, WorkingPortfolio } from '../model/working-portfolio.js';
import { Neighbourhood } from './neighbourhood.js';
import { secondCosts, simplexWeights, type Weights } from './simplex-weights.js';
import { SurfaceArchive } from './surface-archive.js';

/**
 * Local search over three objectives: greedy starts over weights on a simplex, then all portfolios one change away from
 * each member and two changes away, and in turn with these shakes that grow until one finds something new. A member
 * remembers the weights it was found under; its changes are ranked by them.
 */
export class SurfaceSearch {
  readonly archive: SurfaceArchive;
  private readonly portfolio: WorkingPortfolio;
  private readonly links: Links;
  private readonly neighbourhood: Neighbourhood;
  private readonly optionSecondCost: Float64Array;
  private readonly random: Random;

  private readonly weights: readonly Weights[];
  /** Numbers of weights whose greedy start is still to come. */
  private readonly starts: number[];
  private current = 0;
  private weightsOfSlot = new Uint16Array(256);
  private levelOfSlot = new Uint8Array(256);
  /** By level: slots whose neighbourhood of that level is to be looked through. Some have left or risen since. */
  private readonly unexplored: [number[], number[]] = [[], []];
  /** Evaluations by which the shakes are behind the pairs. */
  private shakesDue = 0;
  private shakeSize = LEAST_SHAKE;
  /** The least broken portfolio, kept until there is a feasible one. */
  private nearest: { excess: number; chosen: Int32Array } | undefined;

  constructor(
    private readonly model: Model,
    seed: number,
    lookedAtSample: number,
  ) {
    this.archive = new SurfaceArchive(model, lookedAtSample, (slot) => this.noteNew(slot));
    this.portfolio = new WorkingPortfolio(model);
    this.links = new Links(model);
    this.optionSecondCost = secondCosts(model);
    const { portfolio, links, optionSecondCost, archive } = this;
    this.neighbourhood = new Neighbourhood(portfolio, links, optionSecondCost, archive);
    this.random = new Random(seed);
    this.weights = simplexWeights(model, optionSecondCost, SIMPLEX_STEPS);
    this.starts = this.shuffled(this.weights.length);
  }

  /** Does the next piece of work: a start, the look at one neighbourhood, or a shake. */
  step(): void {
    const start = this.starts.pop();
    if (start !== undefined) {
      this.current = start;
      this.chooseGreedily();
      this.settle();
      return;
    }
    const single = this.takeUnexplored(0);
    if (single >= 0) {
      this.lookAround(single, 0);
      return;
    }
    const paired = this.shakesDue > 0 ? -1 : this.takeUnexplored(1);
    if (paired >= 0) this.lookAround(paired, 1);
    else this.shake();
  }

  /** What the least broken portfolio met breaks, if no feasible one was found. */
  nearestMiss(): string[] {
    if (!this.nearest || this.archive.surface.size > 0) return [];
    return violationsOf(this.model.problem, picksOf(this.model, this.nearest.chosen)).map(describeViolation);
  }

  private lookAround(slot: number, level: 0 | 1): void {
    const { archive, neighbourhood } = this;
    this.current = this.weightsOfSlot[slot];
    this.levelOfSlot[slot] = level + 1;
    if (level === 0) this.unexplored[1].push(slot);
    this.portfolio.load(archive.surface.choicesOf(slot));
    neighbourhood.refresh();
    const before = archive.evaluations;
    if (level === 0) neighbourhood.scanSingles(this.weights[this.current]);
    else {
      neighbourhood.scanPairs(this.weights[this.current], MOST_PAIRED);
      this.shakesDue += (archive.evaluations - before) / PAIRS_TO_SHAKES;
    }
  }

  /** One of the members whose neighbourhood of that level was not looked through, by chance; -1 if there is none. */
  private takeUnexplored(level: 0 | 1): number {
    const slots = this.unexplored[level];
    while (slots.length > 0) {
      const at = this.random.below(slots.length);
      const slot = slots[at];
      slots[at] = slots[slots.length - 1];
      slots.pop();
      if (this.levelOfSlot[slot] === level && this.archive.surface.isMember(slot)) return slot;
    }
    return -1;
  }

  private noteNew(slot: number): void {
    if (slot >= this.levelOfSlot.length) {
      const [levels, weights] = [new Uint8Array(2 * slot), new Uint16Array(2 * slot)];
      levels.set(this.levelOfSlot);
      weights.set(this.weightsOfSlot);
      this.levelOfSlot = levels;
      this.weightsOfSlot = weights;
    }
    this.levelOfSlot[slot] = 0;
    this.weightsOfSlot[slot] = this.current;
    this.unexplored[0].push(slot);
  }

  /** Chooses in each class what is best by the weights alone; it may break links and limits. */
  private chooseGreedily(): void {
    const { model, portfolio, optionSecondCost } = this;
    const { benefit, cost, secondCost } = this.weights[this.current];
    for (let k = 0; k < model.classCount; k++) {
      let best = model.optionStart[k];
      let bestWorth = -Infinity;
      for (let option = best; option < model.optionStart[k + 1]; option++) {
        const worth =
          benefit * model.optionBenefit[option] -
          cost * model.optionCost[option] -
          secondCost * optionSecondCost[option];
        if (worth <= bestWorth) continue;
        bestWorth = worth;
        best = option;
      }
      portfolio.choose(best);
    }
  }

  /** Changes a random member at random in several places and settles the outcome by random weights. */
  private shake(): void {
    const { archive, portfolio, random } = this;
    const before = { evaluations: archive.evaluations, improvements: archive.improvements };
    const slot = this.randomMember();
    if (slot >= 0) portfolio.load(archive.surface.choicesOf(slot));
    this.current = random.below(this.weights.length);
    for (let change = 0; change < this.shakeSize; change++) this.changeAtRandom();
    this.settle();
    const foundNew = archive.improvements > before.improvements;
    this.shakeSize = foundNew || this.shakeSize === MOST_SHAKE ? LEAST_SHAKE : this.shakeSize + 1;
    this.shakesDue -= archive.evaluations - before.evaluations;
    // a shake that changed and mended nothing has still used up its turn
    archive.evaluations++;
  }

  private randomMember(): number {
    const { surface } = this.archive;
    if (surface.size === 0) return -1;
    for (;;) {
      const slot = this.random.below(surface.slotsEver);
      if (surface.isMember(slot)) return slot;
    }
  }

  private changeAtRandom(): void {
    const { model, random, portfolio, links } = this;
    if (model.classCount === 0) return;
    const k = random.below(model.classCount);
    const option = model.optionStart[k] + random.below(model.optionStart[k + 1] - model.optionStart[k]);
    if (option === portfolio.chosen[k]) return;
    const size = links.packageOf(portfolio, option, random.below(links.variants(option)));
    for (let at = 0; at < size; at++) portfolio.choose(links.together[at]);
  }

  /** Repairs the portfolio and improves it, both by the current weights. */
  private settle(): void {
    const { neighbourhood } = this;
    const weights = this.weights[this.current];
    if (!neighbourhood.repair(weights)) {
      this.noteNearest();
      return;
    }
    neighbourhood.offerPortfolio();
    neighbourhood.improve(weights);
  }

  private noteNearest(): void {
    if (this.archive.surface.size > 0) return;
    const excess = this.portfolio.excess();
    if (this.nearest && this.nearest.excess <= excess) return;
    this.nearest = { excess, chosen: this.portfolio.chosen.slice() };
  }

  private shuffled(count: number): number[] {
    const order = Array.from({ length: count }, (_, number) => number);
    for (let last = count - 1; last > 0; last--) {
      const other = this.random.below(last + 1);
      [order[last], order[other]] = [order[other], order[last]];
    }
    return order;
  }
}

const SIMPLEX_STEPS = 12;
const LEAST_SHAKE = 3;
const MOST_SHAKE = 12;
const MOST_PAIRED = 200;
const PAIRS_TO_SHAKES = 3;
