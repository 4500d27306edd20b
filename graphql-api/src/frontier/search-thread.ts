import { parentPort, workerData } from 'node:worker_threads';
import { searchFrontier } from '@metewand/frontier';
import type { SearchMessage, SearchOrder } from './run-result.js';
import { RunRows } from './run-rows.js';
import { LOOKED_AT_SAMPLE, REPORT_MS } from './search-settings.js';

// Entry of a worker thread: searches as ordered and says where it is. It knows neither database nor run.

const { problem, seed, evaluations, effort, leastEvaluations, stop } = workerData as SearchOrder;
const stopAsked = new Int32Array(stop);
const rows = new RunRows(problem);

const search = searchFrontier(problem, { seed, evaluations, effort, lookedAtSample: LOOKED_AT_SAMPLE });
let reportedAt = -Infinity;
let step = search.next();
while (!step.done) {
  const progress = step.value;
  if (performance.now() - reportedAt >= REPORT_MS) {
    reportedAt = performance.now();
    say({ kind: 'progress', progress: rows.progress(progress) });
  }
  const mayStop = progress.evaluations >= leastEvaluations && Atomics.load(stopAsked, 0) === 1;
  step = search.next(mayStop ? { stop: true } : undefined);
}
say({ kind: 'result', result: rows.result(step.value) });

function say(message: SearchMessage) {
  parentPort?.postMessage(message);
}
