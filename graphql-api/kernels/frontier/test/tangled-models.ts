import { aTangledProblem } from '../bench/tangled.mjs';
import { compileModel } from '../src/model/compile-model.js';
import type { Model } from '../src/model/model.js';
import { parseProblem } from '../src/problem/parse-problem.js';

export interface SeededModel {
  readonly seed: number;
  readonly model: Model;
}

/** Models of problems with all kinds of limits and links, those left out that collide when compiled. */
export function tangledModels(count: number, itemCount: (seed: number) => number): SeededModel[] {
  return Array.from({ length: count }, (_, index) => index + 1).flatMap((seed) => {
    const model = compileModel(parseProblem(aTangledProblem(seed, itemCount(seed))));
    return model ? [{ seed, model }] : [];
  });
}
