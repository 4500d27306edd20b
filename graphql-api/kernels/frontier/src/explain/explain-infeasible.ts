import type { Problem } from '../problem/problem.js';
import { describeCollision } from './describe-collision.js';
import { loosen } from './loosening.js';
import { plainReasons } from './plain-reasons.js';
import { smallestCollisions } from './smallest-collisions.js';
import type { Solve } from './solve.js';
import type { WriteFigure } from './write-figure.js';

/**
 * Why no portfolio can keep every limit and link, in sentences: the reasons that need no search, and, where a search is
 * given, the smallest sets of rules that collide, each with what would have to give way. An empty list proves nothing.
 * The search is asked many times and must not ask for an explanation itself.
 */
export function explainInfeasible(problem: Problem, write: WriteFigure = String, solve?: Solve): string[] {
  const plain = plainReasons(problem, write);
  if (solve === undefined) return plain;
  const collisions = smallestCollisions(problem, solve).flatMap((collision) => {
    const loosenings = collision.rules.map((rule) => loosen(problem, rule, solve));
    return describeCollision(collision, loosenings, write);
  });
  return [...plain, ...collisions];
}
