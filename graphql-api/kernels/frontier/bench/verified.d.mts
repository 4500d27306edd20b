import type { Problem } from '../src/problem/problem.js';

export function verifiedProblems(): Problem[];
