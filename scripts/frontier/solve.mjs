import { searchFrontier } from '@metewand/frontier';
import { setImmediate } from 'node:timers/promises';

/**
 * Searches to the end, or until `seconds` are over or `isStopped` answers true; then the result says `stopped` and holds
 * what was found. Between two reports it lets the process hear of signals.
 */
export async function solve(
  problem,
  { seed, threads, seconds = Infinity, onProgress, isStopped = () => false },
) {
  const deadline = performance.now() + 1000 * seconds;
  // often enough for a deadline and for Ctrl-C; the result is the same however often
  const search = searchFrontier(problem, { seed, threads, reportEvery: 50_000 });
  let step = search.next();
  while (!step.done) {
    onProgress?.(step.value);
    await setImmediate();
    step = search.next({ stop: isStopped() || performance.now() >= deadline });
  }
  return step.value;
}
