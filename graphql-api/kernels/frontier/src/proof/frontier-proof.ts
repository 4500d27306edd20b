import type { ProofNode, ProofTask, ProofTaskResult } from './proof-task.js';
import { StepLine } from './step-line.js';

type Point = readonly [cost: number, benefit: number];

/**
 * Hands out the tasks of a proof and takes in their results, in rounds: each round every window of the axis that is
 * still open gets some work, a little in the first and more in each that follows. Tasks of a round may be done
 * anywhere, in any order, more than once. They know what all rounds before have found and nothing of each other, so the
 * tasks, and what they bring, are always the same.
 */
export class FrontierProof {
  /** In branches of an enumeration. */
  effort = 0;
  private round = 0;
  /** What is open, by window. */
  private readonly windows: ProofNode[][];
  private readonly waiting: ProofTask[] = [];
  private readonly handedOut = new Map<string, ProofTask>();
  private readonly windowOf = new Map<string, number>();
  private readonly leftOf = new Map<string, readonly ProofNode[]>();

  constructor(windows: readonly ProofNode[]) {
    this.windows = windows.map((node) => [node]);
  }

  /** Whether all tasks of the round are done. */
  get isRoundOver(): boolean {
    return this.waiting.length === 0 && this.handedOut.size === 0;
  }

  /** Whether no task is being worked on. */
  get isIdle(): boolean {
    return this.handedOut.size === 0;
  }

  /** Whether nothing is open any more. */
  get isComplete(): boolean {
    if (!this.isRoundOver) return false;
    for (const left of this.leftOf.values()) if (left.length > 0) return false;
    return this.windows.every((nodes) => nodes.length === 0);
  }

  /** Begins a round with what is known by now: points in order of cost. Only when the one before is over. */
  startRound(points: readonly Point[]): void {
    this.collectWhatIsLeft();
    const line = new StepLine(points);
    const effort = Math.min(MOST_EFFORT, FIRST_EFFORT * EFFORT_GROWTH ** this.round);
    for (const window of farApartFirst(this.windows.length)) {
      const nodes = this.windows[window];
      for (const piece of piecesOf(nodes)) {
        const id = `${this.round}.${this.windowOf.size}`;
        this.windowOf.set(id, window);
        this.waiting.push({
          id,
          nodes: piece,
          known: knownFor(piece, line),
          dives: this.round < DIVING_ROUNDS,
          effort,
        });
      }
      nodes.length = 0;
    }
    this.round++;
  }

  /** A task to be worked on; undefined if there is none at the moment. */
  take(): ProofTask | undefined {
    const task = this.waiting.shift();
    if (task) this.handedOut.set(task.id, task);
    return task;
  }

  /** Lets a task be handed out again whose worker was lost, and returns it. */
  putBack(id: string): ProofTask | undefined {
    const task = this.handedOut.get(id);
    if (task === undefined) return undefined;
    this.handedOut.delete(id);
    this.waiting.unshift(task);
    return task;
  }

  /** Takes a result in; false if the task has been done already. */
  accept({ id, open, effort }: ProofTaskResult): boolean {
    if (!this.handedOut.delete(id)) return false;
    this.effort += effort;
    this.leftOf.set(id, open);
    return true;
  }

  /** The parts of the problem in which something may still be missing. */
  openNodes(): ProofNode[] {
    const tasks = [...this.waiting, ...this.handedOut.values()].flatMap(({ nodes }) => nodes);
    return [...this.windows.flat(), ...tasks, ...[...this.leftOf.values()].flat()];
  }

  /** Files what the round left open under its windows, in the order of the tasks, whenever their results came. */
  private collectWhatIsLeft(): void {
    for (const [id, window] of this.windowOf) this.windows[window].push(...(this.leftOf.get(id) ?? []));
    this.windowOf.clear();
    this.leftOf.clear();
  }
}

/**
 * Numbers below a count, each far from those just before it: by their binary digits read backwards. So the front gets
 * better all along the axis, and not from one end on.
 */
function farApartFirst(count: number): number[] {
  const digits = Math.ceil(Math.log2(Math.max(2, count)));
  const backwards = (number: number): number =>
    Number.parseInt(number.toString(2).padStart(digits, '0').split('').reverse().join(''), 2);
  return Array.from({ length: count }, (_, number) => number).sort(
    (one, other) => backwards(one) - backwards(other),
  );
}

/** What is open in a window, dealt out to a few tasks so that several can go on with it. */
function piecesOf(nodes: readonly ProofNode[]): ProofNode[][] {
  const pieces = Math.min(nodes.length, MOST_PIECES);
  return Array.from({ length: pieces }, (_, piece) =>
    nodes.filter((_node, place) => place % pieces === piece),
  );
}

/** The points in the stretches of some nodes, and the last one before. */
function knownFor(nodes: readonly ProofNode[], line: StepLine): Point[] {
  const from = nodes.reduce((least, node) => Math.min(least, node.from), Infinity);
  const to = nodes.reduce((most, node) => Math.max(most, node.to), -Infinity);
  return line.pointsFor({ from, to });
}

/** Efforts in branches of an enumeration: at first some milliseconds a window, later about a second a task. */
const FIRST_EFFORT = 3_000;
const EFFORT_GROWTH = 32;
const MOST_EFFORT = 2_000_000;
const MOST_PIECES = 8;
const DIVING_ROUNDS = 2;
