import { searchWithThreads } from '../../graphql-api/dist/frontier/threads/search-with-threads.js';

/**
 * Searches to the end, or until `seconds` are over or `isStopped` answers true; then the result says `stopped` and holds
 * what was found. However many threads: the set is the same.
 */
export function solve(problem, { seed, threads, seconds, onProgress, isStopped }) {
  return searchWithThreads(problem, { seed, threads, seconds, onProgress, isStopped });
}
