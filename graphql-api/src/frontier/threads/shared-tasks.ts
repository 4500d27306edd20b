import type { FrontierSearch, ProofTask, ProofTaskResult } from '@metewand/frontier';
import { packResult, packTask, unpackResult, type PackedResult, type PackedTask } from './packed-task.js';
import type { ExchangeAnswer, ExchangeRequest, TaskExchange } from './task-exchange.js';

/**
 * The tasks of a search as its own process sees them. Those of the first rounds are small and done here. From then on
 * some tasks of each round lie on the exchange, for other processes; what nobody takes comes back. What was done
 * before, for a search that was lost, is not done again.
 */
export class SharedTasks {
  /** To be done here. */
  private readonly here: ProofTask[] = [];
  /** All tasks of a shared round that are not done. */
  private readonly packed = new Map<string, PackedTask>();
  /** Those of them that lie on the exchange. */
  private readonly offered = new Map<string, ProofTask>();
  private done: PackedResult[] = [];
  private exchangedAt = -Infinity;

  constructor(
    private readonly search: FrontierSearch,
    private readonly threads: number,
    private readonly outside: TaskExchange | undefined,
  ) {}

  /** A task to be done here; undefined if there is none at the moment. */
  next(): ProofTask | undefined {
    return this.here.shift() ?? this.search.take();
  }

  accept(result: ProofTaskResult): void {
    const packed = this.packed.get(result.id);
    if (packed) this.done.push(packResult(packed, result));
    this.takeIn(result);
  }

  /** The thread that worked on it is gone. */
  putBack(task: ProofTask): void {
    this.here.unshift(task);
  }

  /** Brings and fetches what is due, and what hands that are idle could do. */
  async exchange(isIdle: boolean): Promise<void> {
    if (!this.outside) return;
    if (this.here.length === 0 && this.packed.size === 0) await this.beginRound();
    if (this.packed.size === 0 && this.done.length === 0) return;
    const isDue = performance.now() - this.exchangedAt >= EXCHANGE_MS;
    if (isDue || (isIdle && this.here.length === 0)) await this.bringAndFetch();
  }

  /** Takes all tasks of a round that is shared, and leaves out those whose results are there already. */
  private async beginRound(): Promise<void> {
    const first = this.search.take();
    if (!first) return;
    this.here.push(first);
    if (roundOf(first) < FIRST_SHARED_ROUND) return;
    for (let task = this.search.take(); task; task = this.search.take()) this.here.push(task);
    for (const task of this.here) this.packed.set(task.id, packTask(task));
    const answer = await this.ask({ offer: [], done: [], wanted: namesOf(this.packed.values()), claim: 0 });
    this.takeInAll(answer);
    const open = this.here.filter(({ id }) => this.packed.has(id));
    this.here.splice(0, this.here.length, ...open);
  }

  private async bringAndFetch(): Promise<void> {
    const offer = this.moreToOffer();
    const wanted = namesOf([...this.offered.keys()].flatMap((id) => this.packed.get(id) ?? []));
    const claim = this.here.length === 0 ? this.threads : 0;
    const answer = await this.ask({ offer, done: this.done.splice(0), wanted, claim });
    this.takeInAll(answer);
    // without an answer, all of it can be done here
    this.takeBack(answer?.claimed ?? [...this.offered.keys()]);
  }

  private async ask(request: ExchangeRequest): Promise<ExchangeAnswer | undefined> {
    this.exchangedAt = performance.now();
    try {
      return await this.outside?.exchange(request);
    } catch {
      return undefined;
    }
  }

  /** From the far end of the round, so that the threads here seldom wait. */
  private moreToOffer(): PackedTask[] {
    const offer: PackedTask[] = [];
    while (this.offered.size < MOST_OFFERED && this.here.length > AHEAD * this.threads) {
      const task = this.here.pop()!;
      this.offered.set(task.id, task);
      offer.push(this.packed.get(task.id)!);
    }
    return offer;
  }

  private takeBack(ids: readonly string[]): void {
    for (const id of ids) {
      const task = this.offered.get(id);
      if (task && this.offered.delete(id)) this.here.push(task);
    }
  }

  private takeInAll(answer: ExchangeAnswer | undefined): void {
    for (const packed of answer?.finished ?? []) this.takeIn(unpackResult(packed));
  }

  private takeIn(result: ProofTaskResult): void {
    this.packed.delete(result.id);
    this.offered.delete(result.id);
    this.search.accept(result);
  }
}

function namesOf(packed: Iterable<PackedTask>): ExchangeRequest['wanted'] {
  return Array.from(packed, ({ id, digest }) => ({ id, digest }));
}

/** An id begins with the number of its round. */
function roundOf({ id }: ProofTask): number {
  return Number(id.split('.', 1)[0]);
}

/** By then a search has gone on for seconds, and a task takes about one: worth sending somewhere else. */
const FIRST_SHARED_ROUND = 2;
const EXCHANGE_MS = 250;
const MOST_OFFERED = 16;
/** Tasks for each thread that stay here. */
const AHEAD = 2;
