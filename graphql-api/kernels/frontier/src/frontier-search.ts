import { LocalSearch } from './local-search/local-search.js';
import type { Model } from './model/model.js';
import { picksOf } from './model/working-portfolio.js';
import { boundSteps, provenStretches } from './proof/bound-set.js';
import { FrontierProof } from './proof/frontier-proof.js';
import { openProof, type ProofStart } from './proof/opening.js';
import { precisionOf } from './proof/precision.js';
import type { ProofTask, ProofTaskResult } from './proof/proof-task.js';
import { ProvenFront } from './proof/proven-front.js';
import type { FrontierPoint, ProvenSoFar, SearchProgress, SearchResult, SearchSettings } from './search.js';

/**
 * A search for the frontier and its proof, for a host that decides where the work is done. What needs the whole front
 * at hand is done here by `advance`; the tasks of the proof are taken, worked on anywhere with `workTask`, and their
 * results accepted, in any order. The outcome depends on the problem and the settings alone.
 *
 * First the local search, for a set that is useful at once. Then the proof opens with the relaxation, whose windows
 * give the local search new starts. Then rounds: tasks over all open windows; what they found is merged; the local
 * search goes on from there.
 */
export class FrontierSearch {
  private readonly seed: number;
  private readonly mostEvaluations: number;
  private readonly mostEffort: number;
  private readonly reportEvery: number;

  private readonly search: LocalSearch;
  private readonly front: ProvenFront;
  private readonly to: number;
  private readonly step: number;
  private proof: FrontierProof | undefined;
  private starts: ProofStart[] = [];

  /** Evaluations that the size of the problem asks for in the first round. */
  private readonly share: number;
  /** Evaluations at which the local search makes way for the proof. */
  private searchUntil: number;
  private round = 0;
  private isMerged = true;
  private effortHandedOut = 0;
  private reportedAt = 0;

  constructor(
    private readonly model: Model,
    settings: SearchSettings,
  ) {
    const { seed = 1, evaluations = 20_000_000, effort = Infinity, lookedAtSample = 20_000 } = settings;
    this.seed = seed;
    this.mostEvaluations = Math.min(evaluations, sensibleEvaluations(model, LEAST_EVALUATIONS));
    this.mostEffort = effort;
    this.reportEvery = settings.reportEvery ?? 250_000;
    this.search = new LocalSearch(model, seed, lookedAtSample);
    this.front = new ProvenFront(model);
    this.to = model.ceiling < Infinity ? model.ceiling : this.search.archive.mostCost;
    this.step = precisionOf(model).step;
    this.share = EVALUATIONS_PER_OPTION * model.optionCost.length;
    this.searchUntil = Math.min(this.share, MOST_AT_FIRST, this.mostEvaluations);
  }

  /** Whether all is proven, or the settings allow no more. */
  get isOver(): boolean {
    if (this.proof?.isComplete === true) return true;
    return this.isSearchDone && this.isProofSpent && (this.proof?.isIdle ?? true);
  }

  /** Rounds of the proof that have begun. The tasks of each are longer than those of the one before. */
  get rounds(): number {
    return this.round;
  }

  /** Whether as much has been done since the last progress as lies between two reports; the first come sooner. */
  get isReportDue(): boolean {
    const soon = Math.max(FIRST_REPORT, this.reportedAt);
    return this.lookedAt - this.reportedAt >= Math.min(soon, this.reportEvery);
  }

  /** Does the next piece of what is done here; false if nothing is until results have been accepted. */
  advance(): boolean {
    const { archive } = this.search;
    const before = archive.evaluations;
    if (before < this.searchUntil) {
      this.search.step(Math.min(this.searchUntil - before, this.reportEvery, SLICE));
      // a step that had nothing to look at has used up its turn all the same
      if (archive.evaluations === before) archive.evaluations++;
      return true;
    }
    const start = this.starts.pop();
    if (start) {
      this.search.offerStart(start.chosen, start.price);
      return true;
    }
    if (this.isRoundUnderWay) return false;
    this.beginNext();
    return true;
  }

  /** A task to be worked on anywhere; undefined if there is none at the moment. */
  take(): ProofTask | undefined {
    if (this.isProofSpent) return undefined;
    const task = this.proof?.take();
    this.effortHandedOut += task?.effort ?? 0;
    return task;
  }

  /** Lets a task be handed out again whose worker was lost. */
  putBack(id: string): void {
    this.effortHandedOut -= this.proof?.putBack(id)?.effort ?? 0;
  }

  /** Takes in what came of a task. The same task done twice counts once. */
  accept(result: ProofTaskResult): void {
    if (!this.proof?.accept(result)) return;
    for (const { benefit, cost, chosen } of result.found) this.front.offer(benefit, cost, chosen);
  }

  progress(): SearchProgress {
    this.reportedAt = this.lookedAt;
    this.front.offerNew(this.search.archive.front);
    const { front } = this.front;
    const bestBenefit = front.size > 0 ? front.benefitAt(front.size - 1) : undefined;
    return {
      evaluations: this.lookedAt,
      kept: front.size,
      bestBenefit,
      points: () => front.points(),
      portfolios: () => this.portfolios(),
      proven: () => this.proven(),
    };
  }

  result(stopped: boolean): SearchResult {
    this.front.offerAll(this.search.archive.front);
    const { archive } = this.search;
    const points = this.portfolios();
    const proven = this.proven();
    return {
      status: this.status(points.length),
      stopped: stopped && !this.isOver,
      seed: this.seed,
      evaluations: this.lookedAt,
      points,
      ...proven,
      lookedAt: archive.lookedAt.all(),
      onceKept: archive.onceKept.all(),
      counts: { lookedAt: this.lookedAt, kept: points.length, sinceBeaten: archive.front.sinceBeaten },
      notes: points.length > 0 ? [] : this.notesOfMiss(),
    };
  }

  private get lookedAt(): number {
    return this.search.archive.evaluations + (this.proof?.effort ?? 0);
  }

  private get isSearchDone(): boolean {
    return this.search.archive.evaluations >= this.mostEvaluations;
  }

  private get isProofSpent(): boolean {
    return this.effortHandedOut >= this.mostEffort;
  }

  private get isRoundUnderWay(): boolean {
    if (!this.proof || this.proof.isRoundOver) return false;
    return !this.isProofSpent || !this.proof.isIdle;
  }

  /** After a round: merges what it has brought, and lets the local search go on from there. Then the next round. */
  private beginNext(): void {
    const { front, search } = this;
    front.offerAll(search.archive.front);
    if (!this.proof) {
      const opening = openProof(this.model, { from: 0, to: this.to });
      this.proof = new FrontierProof(opening.windows);
      this.starts = [...opening.starts];
    } else if (!this.isMerged) {
      search.archive.offerAll(front.front);
      this.isMerged = true;
      const evaluations = this.share * EVALUATIONS_GROWTH ** this.round;
      this.searchUntil = Math.min(this.mostEvaluations, search.archive.evaluations + evaluations);
    } else if (this.isProofSpent) {
      this.searchUntil = this.mostEvaluations;
    } else {
      this.proof.startRound(front.front.points());
      this.round++;
      this.isMerged = false;
    }
  }

  /** What each portfolio takes is worked out when asked for: written out for all of a large front it fills memory. */
  private portfolios(): FrontierPoint[] {
    const { model } = this;
    const { front } = this.front;
    return front.points().map(([cost, benefit], place) => {
      return {
        benefit,
        cost,
        get picks() {
          return picksOf(model, front.choicesAt(place));
        },
      };
    });
  }

  private proven(): ProvenSoFar {
    if (!this.proof) return { bound: [], provenStretches: [] };
    const points = this.front.front.points();
    const bound = boundSteps(points, this.proof.openNodes(), this.step, this.to);
    return { bound, provenStretches: provenStretches(points, bound, 0, this.to) };
  }

  private status(points: number): SearchResult['status'] {
    if (!this.proof) return 'unproven';
    if (!this.proof.isComplete) return 'bounded';
    return points > 0 ? 'complete' : 'infeasible';
  }

  private notesOfMiss(): string[] {
    return this.proof?.isComplete ? [NOTHING_KEEPS_ALL] : notesOfMiss(this.search.nearestMiss());
  }
}

/** Where there are few portfolios, looking at each of them many times over is enough; `least` in any case. */
export function sensibleEvaluations({ classCount, optionStart }: Model, least: number): number {
  let portfolios = 1;
  for (let k = 0; k < classCount; k++) portfolios *= optionStart[k + 1] - optionStart[k];
  return Math.max(least, 64 * portfolios);
}

/** What is to be said where nothing was found. `broken`: what the nearest portfolio still breaks. */
export function notesOfMiss(broken: readonly string[]): string[] {
  const found = 'No portfolio was found that keeps every limit and link; that there is none is not proven.';
  return broken.length === 0
    ? [found]
    : [found, `The nearest one found still breaks this: ${broken.join('; ')}.`];
}

export const NOTHING_KEEPS_ALL = 'No portfolio keeps all limits and links together.';

const LEAST_EVALUATIONS = 1_000;
const EVALUATIONS_PER_OPTION = 1_000;
const MOST_AT_FIRST = 500_000;
const EVALUATIONS_GROWTH = 5;
const FIRST_REPORT = 4_000;
/** Evaluations at a time: a few milliseconds, so that the host can have its say. */
const SLICE = 50_000;
