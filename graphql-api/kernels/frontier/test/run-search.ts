import type { Problem } from '../src/problem/problem.js';
import {
  searchFrontier,
  type SearchProgress,
  type SearchResult,
  type SearchSettings,
} from '../src/search.js';
import type { Point } from './brute-force.js';

export function runToEnd(
  problem: Problem,
  settings?: SearchSettings,
  onProgress: (progress: SearchProgress) => void = () => undefined,
): SearchResult {
  const search = searchFrontier(problem, settings);
  for (;;) {
    const step = search.next();
    if (step.done) return step.value;
    onProgress(step.value);
  }
}

export function pointsOf(result: SearchResult): Point[] {
  return result.points.map(({ cost, benefit }) => [cost, benefit]);
}
