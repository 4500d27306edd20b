import {
  hypervolume,
  kneeOf,
  type FrontierPoint,
  type Problem,
  type ProvenSoFar,
  type SearchProgress,
  type SearchResult,
} from '@metewand/frontier';
import type { RunPointRow, RunProgressRow, RunProofRow, RunResultRow } from './run-result.js';

type Step = readonly [cost: number, benefit: number];

/** From what the search says of a problem to what the run's row keeps of it. */
export class RunRows {
  private readonly indexOf: ReadonlyMap<string, number>;

  constructor(private readonly problem: Problem) {
    this.indexOf = new Map(problem.items.map(({ id }, index) => [id, index]));
  }

  progress(progress: SearchProgress): RunProgressRow {
    return {
      evaluations: progress.evaluations,
      kept: progress.kept,
      points: progress.portfolios().map((point) => this.point(point)),
      ...this.proof(progress.points(), progress.proven()),
    };
  }

  result(result: SearchResult): RunResultRow {
    const steps = result.points.map(({ cost, benefit }): Step => [cost, benefit]);
    return {
      status: STATUS[result.status],
      stopped: result.stopped,
      evaluations: result.evaluations,
      points: result.points.map((point) => this.point(point)),
      ...this.proof(steps, result),
      kneeIndex: kneeOf(steps) ?? null,
      lookedAt: [...result.lookedAt],
      onceKept: [...result.onceKept],
      counts: result.counts,
      // the second one speaks in minor units
      notes: result.notes.slice(0, 1),
    };
  }

  point({ benefit, cost, picks }: FrontierPoint): RunPointRow {
    const indices = Object.keys(picks).map((id) => this.indexOf.get(id) ?? -1);
    return { benefit, cost, picks: indices.sort((one, other) => one - other) };
  }

  /** Nothing while nothing is proven. */
  private proof(points: readonly Step[], { bound, provenStretches }: ProvenSoFar): { proof?: RunProofRow } {
    const [first] = bound;
    if (first === undefined) return {};
    const end = this.problem.ceiling ?? Math.max(lastCost(points), lastCost(bound));
    const reference = { benefit: 0, cost: end };
    return {
      proof: {
        bound: bound.map(([cost, benefit]) => [cost, benefit]),
        provenStretches: provenStretches.map(([from, to]) => [from, to]),
        provenShare: shareOf(provenStretches, first[0], end),
        hypervolume: hypervolume(points, reference),
        hypervolumeBound: hypervolume(bound, reference),
      },
    };
  }
}

const STATUS = {
  complete: 'COMPLETE',
  bounded: 'BOUNDED',
  unproven: 'UNPROVEN',
  infeasible: 'INFEASIBLE',
} as const satisfies Record<SearchResult['status'], RunResultRow['status']>;

/** How much of the whole costs from one to another lies in some stretches, 0 to 1. */
function shareOf(stretches: ProvenSoFar['provenStretches'], from: number, to: number): number {
  let covered = 0;
  for (const [begin, end] of stretches) {
    covered += Math.max(0, Math.min(end, to) - Math.max(begin, from) + 1);
  }
  return Math.min(1, covered / (to - from + 1));
}

function lastCost(steps: readonly Step[]): number {
  return steps.at(-1)?.[0] ?? 0;
}
