import { CombinationScan, leastLoss } from './combination-scan.js';
import { chooseGreedily, startWeights, type StartWeights } from './construct.js';
import { describeViolation, violationsOf } from '../problem/feasible.js';
import { ExplorationOrder } from './exploration-order.js';
import { walkUp } from './greedy-walk.js';
import { Links } from '../model/links.js';
import type { Model } from '../model/model.js';
import { MoveList } from './move-list.js';
import { Random } from './random.js';
import { SearchArchive } from '../archive/search-archive.js';
import { Settler } from './settler.js';
import { picksOf, WorkingPortfolio } from '../model/working-portfolio.js';

/**
 * Local search over a front with neighbourhoods of growing size (variable neighbourhood search; Mladenović and Hansen
 * 1997, over an archive as in Pareto local search; both from memory). First greedy starts; then all portfolios one
 * change away from each member and all two changes away; then, by turns of as many evaluations each, combinations of
 * three changes, and shakes that grow until one finds something new. Whatever is new is explored from the smallest
 * neighbourhood on, the member with the widest gap to its neighbours first.
 */
export class LocalSearch {
  readonly archive: SearchArchive;
  private readonly portfolio: WorkingPortfolio;
  private readonly links: Links;
  private readonly moves: MoveList;
  private readonly settler: Settler;
  private readonly order: ExplorationOrder;
  /** The scan has a portfolio of its own, so that a start may be offered while it is under way. */
  private readonly scanned: WorkingPortfolio;
  private readonly scannedMoves: MoveList;
  private readonly scan: CombinationScan;
  private readonly random: Random;
  private readonly loaded: Int32Array;

  /** Shares of limits for the walks still to be made, and weights for the starts after them; the next one last. */
  private readonly walks = [3, 0, 1, 0.3];
  private readonly starts: StartWeights[];
  private scanUnderWay = false;
  /** Evaluations by which the shakes are behind the wide scans. */
  private shakesDue = 0;
  private shakeSize = LEAST_SHAKE;
  /** The least broken portfolio, kept until there is a feasible one. */
  private nearest: { excess: number; chosen: Int32Array } | undefined;

  constructor(
    private readonly model: Model,
    seed: number,
    lookedAtSample: number,
  ) {
    this.archive = new SearchArchive(model, lookedAtSample);
    this.portfolio = new WorkingPortfolio(model);
    this.links = new Links(model);
    this.moves = new MoveList(this.portfolio, this.links);
    this.settler = new Settler(this.portfolio, this.moves, this.archive);
    this.order = new ExplorationOrder(this.archive, COMBINATIONS.length + 1);
    this.scanned = new WorkingPortfolio(model);
    this.scannedMoves = new MoveList(this.scanned, this.links);
    this.scan = new CombinationScan(this.scanned, this.scannedMoves, this.archive);
    this.random = new Random(seed);
    this.loaded = new Int32Array(model.classCount);
    this.starts = startWeights(model).reverse();
    this.findCheapest();
  }

  /** Does the next piece of work, of about so many evaluations where it can be divided. */
  step(evaluations: number): void {
    this.archive.tendTable();
    if (this.scanUnderWay) {
      this.continueScan(evaluations);
      return;
    }
    if (this.start()) return;
    const member = this.order.next();
    const isWide = member >= 0 && this.levelOf(member) === WIDEST_LEVEL;
    if (member < 0 || (isWide && this.shakesDue > 0)) this.shake();
    else this.explore(member);
  }

  /** What the least broken portfolio met breaks, if no feasible one was found. */
  nearestMiss(): string[] {
    if (!this.nearest || this.archive.front.size > 0) return [];
    return violationsOf(this.model.problem, picksOf(this.model, this.nearest.chosen)).map(describeViolation);
  }

  /**
   * Repairs and improves a choice of one option per class at a price for cost, in benefit per unit of cost, and offers
   * what it comes by. May be called between any two steps.
   */
  offerStart(chosen: Int32Array, price: number): void {
    this.portfolio.load(chosen);
    this.settle(price);
  }

  /** A feasible portfolio of little cost, if one is easily had, for the walks to begin at. */
  private findCheapest(): void {
    if (this.settler.repair(DEAR)) this.archive.offer(this.portfolio);
    else this.noteNearest();
  }

  /** Makes the next of the starts: first the walks, which give a rough front at once. False when all are made. */
  private start(): boolean {
    const { portfolio, archive } = this;
    const limitShare = archive.front.size > 0 ? this.walks.pop() : undefined;
    if (limitShare !== undefined) {
      portfolio.load(archive.front.choicesAt(0, this.loaded));
      walkUp(portfolio, this.links, archive, limitShare);
      return true;
    }
    const weights = this.starts.pop();
    if (weights === undefined) return false;
    chooseGreedily(portfolio, weights);
    this.settle(weights.price);
    return true;
  }

  private continueScan(evaluations: number): void {
    const before = this.archive.evaluations;
    this.scanUnderWay = !this.scan.advance(evaluations);
    if (this.scan.size === WIDEST.size) this.shakesDue += this.archive.evaluations - before;
  }

  private explore(place: number): void {
    const { front } = this.archive;
    const level = this.levelOf(place);
    const price = this.priceAt(place);
    this.archive.setExplored(front.slotAt(place), level + 1);
    if (level === 0) {
      this.portfolio.load(front.choicesAt(place, this.loaded));
      this.moves.refresh();
      this.settler.scanSingles(price, 1);
      return;
    }
    const { size, most } = COMBINATIONS[level - 1];
    this.scanned.load(front.choicesAt(place, this.loaded));
    this.scannedMoves.refresh();
    this.scan.begin(size, leastLoss(this.scannedMoves, price, most));
    this.scanUnderWay = true;
  }

  private levelOf(place: number): number {
    return this.archive.exploredOf(this.archive.front.slotAt(place));
  }

  /** Changes a random member at random in several places and settles the outcome. */
  private shake(): void {
    const { archive, random, portfolio } = this;
    const before = { evaluations: archive.evaluations, improvements: archive.improvements };
    const place = archive.front.size > 0 ? random.below(archive.front.size) : -1;
    if (place >= 0) portfolio.load(archive.front.choicesAt(place, this.loaded));
    else if (this.nearest) portfolio.load(this.nearest.chosen);
    for (let change = 0; change < this.shakeSize; change++) this.changeAtRandom();
    this.settle(place >= 0 ? this.priceAt(place) : 0);
    const foundNew = archive.improvements > before.improvements;
    this.shakeSize = foundNew || this.shakeSize === MOST_SHAKE ? LEAST_SHAKE : this.shakeSize + 1;
    this.shakesDue -= archive.evaluations - before.evaluations;
    // a shake that changed and mended nothing has still used up its turn
    archive.evaluations++;
  }

  private changeAtRandom(): void {
    const { model, random, portfolio } = this;
    if (model.classCount === 0) return;
    const k = random.below(model.classCount);
    const option = model.optionStart[k] + random.below(model.optionStart[k + 1] - model.optionStart[k]);
    if (option === portfolio.chosen[k]) return;
    const size = this.links.packageOf(portfolio, option, random.below(this.links.variants(option)));
    for (let at = 0; at < size; at++) portfolio.choose(this.links.together[at]);
  }

  /** Repairs the portfolio and improves it, both at a price for cost. */
  private settle(price: number): void {
    const { portfolio, settler, archive } = this;
    if (!settler.repair(price)) {
      this.noteNearest();
      return;
    }
    if (!archive.isBeaten(portfolio.benefit, portfolio.cost)) archive.offer(portfolio);
    settler.improve(price);
  }

  /** What a unit of cost is worth around a member: the slope of the front between its neighbours. */
  private priceAt(place: number): number {
    const { front } = this.archive;
    const before = Math.max(0, place - 1);
    const after = Math.min(front.size - 1, place + 1);
    const cost = front.costAt(after) - front.costAt(before);
    return cost > 0 ? (front.benefitAt(after) - front.benefitAt(before)) / cost : 0;
  }

  private noteNearest(): void {
    if (this.archive.front.size > 0) return;
    const excess = this.portfolio.excess();
    if (this.nearest && this.nearest.excess <= excess) return;
    this.nearest = { excess, chosen: this.portfolio.chosen.slice() };
  }
}

/** A price at which any cost outweighs any benefit. */
const DEAR = 1e9;
const LEAST_SHAKE = 3;
const MOST_SHAKE = 12;

/**
 * What follows the single changes of a member: all combinations of so many of the moves that lose least. The widest
 * takes turns with the shakes.
 */
const WIDEST = { size: 3, most: 50 };
const COMBINATIONS = [{ size: 2, most: 200 }, WIDEST];
const WIDEST_LEVEL = COMBINATIONS.length;
