import type { ParetoFront } from '../src/archive/pareto-front.js';
import type { Problem } from '../src/problem/problem.js';

export function nsga2(
  problem: Problem,
  settings: { readonly seed: number; readonly population?: number },
): Generator<{ readonly front: ParetoFront; readonly evaluations: number }, never>;
