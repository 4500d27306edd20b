import { anInstance } from './instances.mjs';
import { aTangledProblem } from './tangled.mjs';

/**
 * The 60 problems of 20 to 60 alternatives whose fronts HiGHS worked out, cost step by cost step, for
 * test/highs-fronts.json: a third of them tangled, the others rounds of all sorts.
 */
export function verifiedProblems() {
  return Array.from({ length: 60 }, (_, index) => {
    const alternatives = 20 + ((7 * index) % 41);
    const seed = 4_000 + index;
    if (index % 3 === 0) return aTangledProblem(seed, alternatives);
    if (index % 12 === 1) return anInstance({ seed, alternatives: 20 + (index % 11), addedBenefit: 20 });
    const money = index % 4 === 2 ? 'minor' : 'small';
    return anInstance({ seed, alternatives, capacities: index % 13, money });
  });
}
