import type { Problem } from '@metewand/frontier';
import type { ExchangeAnswer, ExchangeRequest } from './threads/task-exchange.js';

/** The JSON that a run's row keeps. Money in minor units, benefit in ten-thousandths of a point. */

/** The labels behind the problem's items, frozen with it: column `items`. */
export interface RunInput {
  currency: string;
  /** What could be spent on capital. */
  spendableMinor: number;
  items: RunItemRow[];
  leftOut: RunLeftOutRow[];
}

/** In the order of the problem's items, whose id is the code. */
export interface RunItemRow {
  candidateId: string;
  quoteId: string;
  code: string;
  name: string;
  siteName: string;
  departmentName: string;
  vendorName: string;
  benefit: number;
  capitalMinor: number;
  lifeCycleCostMinor: number;
  mandatory: boolean;
}

export interface RunLeftOutRow {
  candidateId: string;
  code: string;
  name: string;
  reason: string;
  mandatory: boolean;
}

/** A portfolio of the front: `picks` are indices of items, rising. */
export interface RunPointRow {
  benefit: number;
  cost: number;
  picks: number[];
}

export type ChartPair = readonly [cost: number, benefit: number];

/** What is proven of a front. */
export interface RunProofRow {
  /** Steps that no portfolio passes, rising in both figures. */
  bound: ChartPair[];
  /** Stretches of cost in which nothing is missing, both ends included. */
  provenStretches: [from: number, to: number][];
  /** Of the axis between the cheapest portfolio there may be and the dearest, 0 to 1. */
  provenShare: number;
  /** In benefit times cost, from no benefit and the end of the axis. */
  hypervolume: number;
  /** The same of the bound: that of the whole front is no larger. */
  hypervolumeBound: number;
}

/** Where a search is: column `progress`. */
export interface RunProgressRow {
  evaluations: number;
  kept: number;
  points: RunPointRow[];
  /** Missing while nothing is proven. */
  proof?: RunProofRow;
}

/** What a search found: column `result`. */
export interface RunResultRow {
  status: 'COMPLETE' | 'BOUNDED' | 'UNPROVEN' | 'INFEASIBLE';
  stopped: boolean;
  evaluations: number;
  /** In order of cost, rising in both figures. */
  points: RunPointRow[];
  /** Missing where nothing is proven. */
  proof?: RunProofRow;
  kneeIndex: number | null;
  lookedAt: ChartPair[];
  onceKept: ChartPair[];
  counts: { lookedAt: number; kept: number; sinceBeaten: number };
  notes: string[];
}

/** What the thread of a search gets to work on. */
export interface SearchOrder {
  problem: Problem;
  seed: number;
  evaluations: number;
  effort: number;
  threads: number;
  /** A stop counts only from here on: somebody has seen a front this far already. */
  leastEvaluations: number;
  /** One integer, 1 to stop. */
  stop: SharedArrayBuffer;
}

/** What the thread of a search says. */
export type SearchMessage =
  | { kind: 'progress'; progress: RunProgressRow }
  | { kind: 'exchange'; number: number; request: ExchangeRequest }
  | { kind: 'result'; result: RunResultRow };

/** What it hears: the answer to an exchange, empty where there was none. */
export interface ExchangeReply {
  number: number;
  answer?: ExchangeAnswer;
}
