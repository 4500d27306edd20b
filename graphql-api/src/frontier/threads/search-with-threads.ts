import { setImmediate } from 'node:timers/promises';
import {
  beginSearch,
  type Problem,
  type SearchProgress,
  type SearchResult,
  type SearchSettings,
} from '@metewand/frontier';
import { ProofWork } from './proof-work.js';
import type { TaskExchange } from './task-exchange.js';

export interface ThreadedSearchSettings extends SearchSettings {
  /** Threads that work on the proof; with 1 the calling thread does all of it itself. */
  readonly threads: number;
  /** After so long the search ends with what it has found. */
  readonly seconds?: number;
  readonly onProgress?: (progress: SearchProgress) => void;
  /** Asked often; true ends the search with what it has found. */
  readonly isStopped?: () => boolean;
  /** Where other processes take tasks of this search and bring their results. */
  readonly exchange?: TaskExchange;
}

/**
 * Searches as `searchFrontier` does, on several threads. The calling thread coordinates: it does what needs the whole
 * front, and hands out the tasks of the proof. However many threads or processes work on them, and whichever is lost,
 * a search that is not stopped comes to the same result.
 */
export async function searchWithThreads(
  problem: Problem,
  settings: ThreadedSearchSettings,
): Promise<SearchResult> {
  const { seconds = Infinity, isStopped = () => false, onProgress } = settings;
  const deadline = performance.now() + 1000 * seconds;
  const begun = beginSearch(problem, settings);
  if ('result' in begun) return begun.result;
  const { search } = begun;
  const work = new ProofWork(problem, begun, settings);
  try {
    let heardAt = performance.now();
    while (!search.isOver) {
      if (!search.advance()) await work.goOn();
      if (search.isReportDue) onProgress?.(search.progress());
      if (performance.now() - heardAt > MOST_DEAF_MS) {
        await setImmediate();
        heardAt = performance.now();
      }
      if (isStopped() || performance.now() >= deadline) return search.result(true);
    }
    return search.result(false);
  } finally {
    await work.end();
  }
}

/** The process hears of messages and signals at least so often, as far as the pieces of the search allow. */
const MOST_DEAF_MS = 10;
