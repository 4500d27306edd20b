import { anInstance } from './instances.mjs';
import { aTangledProblem } from './tangled.mjs';

/**
 * The 60 problems of 20 to 60 alternatives whose fronts HiGHS worked out, cost step by cost step, for
 * test/highs-fronts.json: a third of them tangled, the others rounds with 0 to 12 capacities, in units of money of all
 * sizes, some strongly correlated. Many have their money in tens, because HiGHS takes one solve per point.
 */
export function verifiedProblems() {
  return Array.from({ length: 60 }, (_, index) => {
    const seed = 4_000 + index;
    if (index % 3 === 0) return aTangledProblem(seed, 20 + ((7 * index) % 17));
    if (index % 12 === 1) return anInstance({ seed, alternatives: 20 + (index % 7), addedBenefit: 20 });
    const alternatives = 20 + ((7 * index) % 41);
    const money = alternatives > 40 ? 'tens' : (['small', 'minor', 'tens'][index % 8] ?? 'tens');
    return anInstance({ seed, alternatives, capacities: index % 13, money });
  });
}
