import { Annealing } from './annealing.js';
import { CombinationScan, leastLoss } from './combination-scan.js';
import { chooseGreedily, startWeights, type StartWeights } from './construct.js';
import { describeViolation, violationsOf } from '../problem/feasible.js';
import { ExplorationOrder } from './exploration-order.js';
import { walkUp } from './greedy-walk.js';
import { Links } from '../model/links.js';
import type { Model } from '../model/model.js';
import { MoveList } from './move-list.js';
import { PathRelinking } from './path-relinking.js';
import { Random } from './random.js';
import { SearchArchive } from '../archive/search-archive.js';
import { Shaking } from './shaking.js';
import { Settler } from './settler.js';
import { picksOf, WorkingPortfolio } from '../model/working-portfolio.js';

/**
 * Local search over a front with neighbourhoods of growing size (variable neighbourhood search; Mladenović and Hansen
 * 1997, over an archive as in Pareto local search; both from memory). First greedy walks for a rough front at once; then
 * by turns: exploring, greedy starts, path relinking, shakes and annealing. To explore is to look at all portfolios one
 * change away from a member, then at combinations of two changes, then of three; whatever is new is explored from the
 * smallest neighbourhood on, the member with the widest gap to its neighbours first.
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
  private readonly shaking: Shaking;
  private readonly annealing: Annealing;
  private readonly relinking: PathRelinking;
  private readonly exploring: Turn = {
    search: (evaluations) => this.explore(evaluations),
    share: 3,
    spent: 0,
  };
  /** Each gets its share of the evaluations, as long as it has something to do; those of a scan cost least by far. */
  private readonly turns: readonly Turn[] = [
    this.exploring,
    { search: () => this.start(), share: 1, spent: 0 },
    { search: () => this.relinking.linkNext(), share: 1, spent: 0 },
    { search: () => this.shake(), share: 1, spent: 0 },
    { search: () => this.anneal(), share: 1, spent: 0 },
  ];
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
    this.shaking = new Shaking(this.portfolio, this.links, this.random);
    this.annealing = new Annealing(this.portfolio, this.links, this.archive, this.random);
    this.relinking = new PathRelinking(this.portfolio, this.archive);
    this.loaded = new Int32Array(model.classCount);
    this.starts = startWeights(model).reverse();
    this.findCheapest();
  }

  /** Does the next piece of work, of about so many evaluations where it can be divided. */
  step(evaluations: number): void {
    const { archive } = this;
    archive.tendTable();
    if (this.walk()) return;
    // a scan is gone on with before anything else, so that in what pieces it is made changes nothing
    const turn = this.scanUnderWay ? this.exploring : this.nextTurn();
    const before = archive.evaluations;
    if (!turn.search(evaluations)) turn.spent = Math.max(...this.turns.map(({ spent }) => spent));
    // what changed and mended nothing has still used up its turn
    if (turn !== this.exploring && archive.evaluations === before) archive.evaluations++;
    turn.spent += (archive.evaluations - before) / turn.share;
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

  private nextTurn(): Turn {
    return this.turns.reduce((least, other) => (other.spent < least.spent ? other : least));
  }

  /** Makes the next of the walks, which give a rough front at once; false when all are made or none is possible. */
  private walk(): boolean {
    const { portfolio, archive } = this;
    const limitShare = archive.front.size > 0 ? this.walks.pop() : undefined;
    if (limitShare === undefined) return false;
    portfolio.load(archive.front.choicesAt(0, this.loaded));
    walkUp(portfolio, this.links, archive, limitShare);
    return true;
  }

  /** Makes the next of the greedy starts. */
  private start(): boolean {
    const weights = this.starts.pop();
    if (weights === undefined) return false;
    chooseGreedily(this.portfolio, weights);
    this.settle(weights.price);
    return true;
  }

  /** Explores the member that is next in order a level further. */
  private explore(evaluations: number): boolean {
    if (this.scanUnderWay) {
      this.scanUnderWay = !this.scan.advance(evaluations);
      return true;
    }
    const place = this.order.next();
    if (place < 0) return false;
    const { front } = this.archive;
    const level = this.levelOf(place);
    this.archive.setExplored(front.slotAt(place), level + 1);
    front.choicesAt(place, this.loaded);
    if (level === 0) this.exploreSingles(this.priceAt(place));
    else this.beginScan(COMBINATIONS[level - 1], this.priceAt(place));
    return true;
  }

  private exploreSingles(price: number): void {
    this.portfolio.load(this.loaded);
    this.moves.refresh();
    this.settler.scanSingles(price, 1);
  }

  private beginScan({ size, most }: { size: number; most: number }, price: number): void {
    this.scanned.load(this.loaded);
    this.scannedMoves.refresh();
    const isLong = this.scannedMoves.count > LONG_LIST;
    this.scan.begin(size, leastLoss(this.scannedMoves, price, isLong ? Math.min(most, CORE) : most));
    this.scanUnderWay = true;
  }

  private levelOf(place: number): number {
    return this.archive.exploredOf(this.archive.front.slotAt(place));
  }

  /** Changes a random member at random in several places and settles the outcome. */
  private shake(): boolean {
    const { archive } = this;
    const { improvements } = archive;
    const price = this.loadAny();
    this.shaking.shake();
    this.settle(price);
    this.shaking.learn(archive.improvements > improvements);
    return true;
  }

  private anneal(): boolean {
    const price = this.loadAny();
    this.annealing.walk(price);
    this.settle(price);
    return true;
  }

  /** Loads a random member, or the least broken portfolio while there is none. Returns the price around it. */
  private loadAny(): number {
    const { front } = this.archive;
    if (front.size === 0) {
      if (this.nearest) this.portfolio.load(this.nearest.chosen);
      return 0;
    }
    const place = this.random.below(front.size);
    this.portfolio.load(front.choicesAt(place, this.loaded));
    return this.priceAt(place);
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

/** A way to search (false if it found nothing to do), and the evaluations it has spent, divided by its share. */
interface Turn {
  readonly search: (evaluations: number) => boolean;
  readonly share: number;
  spent: number;
}

/** A price at which any cost outweighs any benefit. */
const DEAR = 1e9;

/** In long lists of moves only a core of those that lose least is combined, so that a scan stays short at any size. */
const LONG_LIST = 200;
const CORE = 100;

/** What follows the single changes of a member: all combinations of so many of the moves that lose least. */
const COMBINATIONS = [
  { size: 2, most: 200 },
  { size: 3, most: 50 },
];
