import { searchFrontier } from '@metewand/frontier';
import { anInstance } from './instances.mjs';

/**
 * The instance number `index` of a kind under the bench's seed. Seeds whose draw has no portfolio at all are passed
 * over: a search of a few thousand evaluations finds one where there is one.
 */
export function freshInstance(seed, index, options) {
  for (let attempt = 0; ; attempt++) {
    const problem = anInstance({ ...options, seed: seed + 1_000 * index + attempt });
    const probe = searchFrontier(problem, { evaluations: 20_000, reportEvery: 20_000 });
    const { done, value } = probe.next();
    if (done ? value.points.length > 0 : value.kept > 0) return problem;
  }
}
