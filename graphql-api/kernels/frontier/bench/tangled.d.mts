import type { Problem } from '../src/problem/problem.js';

export function aTangledProblem(seed: number, itemCount: number): Problem;
