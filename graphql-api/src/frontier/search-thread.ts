import { parentPort, workerData } from 'node:worker_threads';
import { PortExchange } from './port-exchange.js';
import type { SearchMessage, SearchOrder } from './run-result.js';
import { RunRows } from './run-rows.js';
import { LOOKED_AT_SAMPLE, REPORT_MS } from './search-settings.js';
import { searchWithThreads } from './threads/search-with-threads.js';

// Entry of a worker thread: searches as ordered and says where it is. It knows neither database nor run.

const { problem, seed, evaluations, effort, threads, leastEvaluations, stop } = workerData as SearchOrder;
const port = parentPort!;
const stopAsked = new Int32Array(stop);
const rows = new RunRows(problem);
let seen = 0;
let reportedAt = -Infinity;

const result = await searchWithThreads(problem, {
  seed,
  evaluations,
  effort,
  threads,
  lookedAtSample: LOOKED_AT_SAMPLE,
  exchange: new PortExchange(port),
  isStopped: () => seen >= leastEvaluations && Atomics.load(stopAsked, 0) === 1,
  onProgress: (progress) => {
    seen = progress.evaluations;
    if (performance.now() - reportedAt < REPORT_MS) return;
    reportedAt = performance.now();
    say({ kind: 'progress', progress: rows.progress(progress) });
  },
});
say({ kind: 'result', result: rows.result(result) });
port.unref();

function say(message: SearchMessage) {
  port.postMessage(message);
}
