import { EvenSample } from '../archive/even-sample.js';
import type { Model } from '../model/model.js';
import type { WorkingPortfolio } from '../model/working-portfolio.js';
import { ParetoSurface } from './pareto-surface.js';

/** What a search over three objectives has found: the surface, how much was looked at, samples for the chart. */
export class SurfaceArchive {
  readonly surface: ParetoSurface;
  readonly lookedAt: EvenSample;
  readonly onceKept = new EvenSample(ONCE_KEPT_CAPACITY);
  /** Portfolios of which the three figures were worked out. */
  evaluations = 0;
  /** Number of times the surface has changed. */
  improvements = 0;
  private beaten = 0;
  private crowdedFrom = CROWDED_FROM;
  /** How far a portfolio has to lie from what nearly beats it. */
  private apart: { benefit: number; cost: number; secondCost: number } | undefined;
  /** The next such distance beside the spread of the members. */
  private share = 2 ** -10;

  constructor(
    model: Model,
    lookedAtCapacity: number,
    /** Told the slot of every new member. */
    private readonly onKept: (slot: number) => void,
  ) {
    this.surface = new ParetoSurface(model.optionStart, (benefit, cost) => this.sampleBeaten(benefit, cost));
    this.lookedAt = new EvenSample(lookedAtCapacity);
  }

  /**
   * Keeps a feasible portfolio that no member beats, and in a crowded archive only one that beats a member or lies
   * apart from all that nearly beat it. (A three-objective surface of a hundred items can have millions of points.)
   */
  offer(portfolio: WorkingPortfolio, secondCost: number): void {
    if (!this.isCrowdedOut(portfolio.benefit, portfolio.cost, secondCost)) this.keep(portfolio, secondCost);
  }

  /** Keeps a feasible portfolio that no member beats. */
  keep(portfolio: WorkingPortfolio, secondCost: number): void {
    const slot = this.surface.offer(portfolio.benefit, portfolio.cost, secondCost, portfolio.chosen);
    if (slot < 0) return;
    this.improvements++;
    this.onKept(slot);
    if (this.surface.size > this.crowdedFrom) this.askForMoreApart();
  }

  private isCrowdedOut(benefit: number, cost: number, secondCost: number): boolean {
    const { surface, apart } = this;
    return (
      apart !== undefined &&
      surface.isBeaten(benefit - apart.benefit, cost + apart.cost, secondCost + apart.secondCost) &&
      !surface.wouldBeat(benefit, cost, secondCost)
    );
  }

  /** As epsilon-dominance does (Laumanns et al. 2002; from memory), but without letting go of what was kept before. */
  private askForMoreApart(): void {
    const { benefit, cost, secondCost } = this.surface.spread();
    const { share } = this;
    this.apart = { benefit: share * benefit, cost: share * cost, secondCost: share * secondCost };
    this.share *= 2;
    this.crowdedFrom *= 1.125;
  }

  private sampleBeaten(benefit: number, cost: number): void {
    const number = this.beaten++;
    if (number >= this.onceKept.nextWanted) this.onceKept.take(number, cost, benefit);
  }
}

const ONCE_KEPT_CAPACITY = 5_000;
const CROWDED_FROM = 40_000;
