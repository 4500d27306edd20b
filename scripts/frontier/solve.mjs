import { hasSecondCost, searchFrontier } from '@metewand/frontier';
import { setImmediate } from 'node:timers/promises';
import { searchWithThreads } from '../../graphql-api/dist/frontier/threads/search-with-threads.js';

/**
 * Searches to the end, or until `seconds` are over or `isStopped` answers true; then the result says `stopped` and holds
 * what was found. However many threads: the set is the same. A second cost is searched on one thread in any case.
 */
export function solve(problem, { seed, threads, seconds, onProgress, isStopped }) {
  const search = hasSecondCost(problem) ? searchOnOneThread : searchWithThreads;
  return search(problem, { seed, threads, seconds, onProgress, isStopped });
}

/** Between two reports it lets the process hear of signals. */
async function searchOnOneThread(problem, { seed, seconds = Infinity, onProgress, isStopped = () => false }) {
  const deadline = performance.now() + 1000 * seconds;
  const search = searchFrontier(problem, { seed });
  let step = search.next();
  while (!step.done) {
    onProgress?.(step.value);
    await setImmediate();
    step = search.next({ stop: isStopped() || performance.now() >= deadline });
  }
  return step.value;
}
