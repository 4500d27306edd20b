import type { ProofNode, ProofTask, ProofTaskResult } from './proof-task.js';

type Point = readonly [cost: number, benefit: number];

/**
 * Hands out the tasks of a proof and takes in their results. Tasks may be done anywhere, in any order, more than once;
 * the tasks that come to be, and what each brings, are always the same: a task knows only what its parents found, and
 * what all windows together found in a first short look, which every window gets before any is looked at for long.
 */
export class FrontierProof {
  private readonly waiting: ProofTask[] = [];
  private readonly handedOut = new Map<string, ProofTask>();
  /** Windows that have had their short look. */
  private readonly looked: { readonly id: string; readonly nodes: readonly ProofNode[] }[] = [];
  private looksDue: number;
  effort = 0;

  /**
   * @param known the points that the windows' first tasks may build on, in order of cost
   * @param pointsNow the front with all that was found since, asked for once: when every window has been looked at
   */
  constructor(
    windows: readonly ProofNode[],
    known: readonly Point[],
    private readonly pointsNow: () => readonly Point[],
  ) {
    this.looksDue = windows.length;
    for (const [index, node] of windows.entries()) {
      this.waiting.push({
        id: `${index}`,
        nodes: [node],
        known: knownFor([node], known),
        effort: SHORT_LOOK,
      });
    }
  }

  /** Whether nothing is open: the front is complete. */
  get isComplete(): boolean {
    return this.waiting.length === 0 && this.handedOut.size === 0 && this.looksDue === 0;
  }

  /** A task to be worked on; undefined if there is none at the moment. */
  take(): ProofTask | undefined {
    const task = this.waiting.shift();
    if (task) this.handedOut.set(task.id, task);
    return task;
  }

  /** Lets a task be handed out again whose worker was lost. */
  putBack(id: string): void {
    const task = this.handedOut.get(id);
    if (task === undefined) return;
    this.handedOut.delete(id);
    this.waiting.unshift(task);
  }

  /** Takes a result in; false if the task has been done already. */
  accept(result: ProofTaskResult): boolean {
    const task = this.handedOut.get(result.id);
    if (task === undefined) return false;
    this.handedOut.delete(result.id);
    this.effort += result.effort;
    if (this.looksDue > 0) this.acceptLook(result);
    else this.waiting.push(...tasksOf(result, withFound(task.known, result)));
    return true;
  }

  /** The parts of the problem in which something may still be missing. */
  openNodes(): ProofNode[] {
    const tasks = [...this.waiting, ...this.handedOut.values()];
    return [...this.looked, ...tasks].flatMap(({ nodes }) => nodes);
  }

  private acceptLook({ id, open }: ProofTaskResult): void {
    this.looked.push({ id, nodes: open });
    if (--this.looksDue > 0) return;
    const points = this.pointsNow();
    this.looked.sort((one, other) => Number(one.id) - Number(other.id));
    for (const { id: window, nodes } of this.looked.splice(0)) {
      if (nodes.length > 0)
        this.waiting.push({ id: `${window}.0`, nodes, known: knownFor(nodes, points), effort: LONG_LOOK });
    }
  }
}

/** What is left of a task as tasks of their own, so that several can go on with it. */
function tasksOf({ id, open }: ProofTaskResult, known: readonly Point[]): ProofTask[] {
  const pieces = Math.min(open.length, MOST_PIECES);
  return Array.from({ length: pieces }, (_, piece) => {
    const nodes = open.filter((_node, place) => place % pieces === piece);
    return { id: `${id}.${piece}`, nodes, known: knownFor(nodes, known), effort: LONG_LOOK };
  });
}

/** The points in the stretches of some nodes, and the last one before. */
function knownFor(nodes: readonly ProofNode[], points: readonly Point[]): Point[] {
  const from = Math.min(...nodes.map((node) => node.from));
  const to = Math.max(...nodes.map((node) => node.to));
  const within = points.filter(([cost]) => cost <= to);
  const firstInside = within.findIndex(([cost]) => cost > from);
  return within.slice(firstInside < 0 ? -1 : Math.max(0, firstInside - 1));
}

function withFound(known: readonly Point[], { found }: ProofTaskResult): Point[] {
  const points = [...known, ...found.map(({ cost, benefit }): Point => [cost, benefit])];
  return points.sort(([one], [other]) => one - other);
}

/** Efforts in branches of an enumeration: some milliseconds, and about a second. */
const SHORT_LOOK = 6_000;
const LONG_LOOK = 1_000_000;
const MOST_PIECES = 8;
