import { parentPort, workerData } from 'node:worker_threads';
import {
  kneeOf,
  searchFrontier,
  type FrontierPoint,
  type Problem,
  type SearchResult,
} from '@metewand/frontier';
import type { RunPointRow, RunResultRow, SearchMessage, SearchOrder } from './run-result.js';
import { LOOKED_AT_SAMPLE, REPORT_MS } from './search-settings.js';

// Entry of a worker thread: searches as ordered and says where it is. It knows neither database nor run.

const { problem, seed, evaluations, leastEvaluations, stop } = workerData as SearchOrder;
const stopAsked = new Int32Array(stop);
const indexOf = indexById(problem);

const search = searchFrontier(problem, { seed, evaluations, lookedAtSample: LOOKED_AT_SAMPLE });
let of = evaluations;
let reportedAt = -Infinity;
let step = search.next();
while (!step.done) {
  const progress = step.value;
  of = progress.of;
  if (performance.now() - reportedAt >= REPORT_MS) {
    reportedAt = performance.now();
    const points = progress.portfolios().map(pointRow);
    const { evaluations: done, kept } = progress;
    say({ kind: 'progress', progress: { evaluations: done, of, kept, points } });
  }
  const mayStop = progress.evaluations >= leastEvaluations && Atomics.load(stopAsked, 0) === 1;
  step = search.next(mayStop ? { stop: true } : undefined);
}
say({ kind: 'result', result: resultRow(step.value) });

function say(message: SearchMessage) {
  parentPort?.postMessage(message);
}

function resultRow(result: SearchResult): RunResultRow {
  return {
    status: result.status === 'infeasible' ? 'INFEASIBLE' : 'UNPROVEN',
    stopped: result.stopped,
    evaluations: result.evaluations,
    of,
    points: result.points.map(pointRow),
    kneeIndex: kneeOf(result.points.map(({ cost, benefit }) => [cost, benefit])) ?? null,
    lookedAt: [...result.lookedAt],
    onceKept: [...result.onceKept],
    counts: result.counts,
    // the second one speaks in minor units
    notes: result.notes.slice(0, 1),
  };
}

function pointRow({ benefit, cost, picks }: FrontierPoint): RunPointRow {
  const indices = Object.keys(picks).map((id) => indexOf.get(id) ?? -1);
  return { benefit, cost, picks: indices.sort((one, other) => one - other) };
}

function indexById({ items }: Problem): Map<string, number> {
  return new Map(items.map(({ id }, index) => [id, index]));
}
