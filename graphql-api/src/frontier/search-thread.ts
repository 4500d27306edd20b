import { once } from 'node:events';
import { parentPort, receiveMessageOnPort } from 'node:worker_threads';
import { searchFrontier } from '@metewand/frontier';
import { PortExchange } from './port-exchange.js';
import type { SearchMessage, SearchOrder } from './run-result.js';
import { RunRows } from './run-rows.js';
import { LOOKED_AT_SAMPLE, REPORT_MS } from './search-settings.js';
import { searchWithThreads } from './threads/search-with-threads.js';
import { warmUpProblem } from './warm-up-problem.js';

// Entry of a worker thread: waits for an order, then searches and says where it is. It knows neither database nor run.

const port = parentPort!;
const { problem, seed, evaluations, effort, threads, leastEvaluations, stop } = await nextOrder();
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

/** Until the order comes, a search of no account has the code compiled. */
async function nextOrder(): Promise<SearchOrder> {
  const warmUp = searchFrontier(warmUpProblem(), { reportEvery: 20_000 });
  while (!warmUp.next().done) {
    const waiting = receiveMessageOnPort(port);
    if (waiting) return waiting.message as SearchOrder;
  }
  const [order] = (await once(port, 'message')) as [SearchOrder];
  return order;
}
