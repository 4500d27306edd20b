import type { Model } from '../model/model.js';
import type { Precision } from './step-line.js';

/** What benefits are multiples of, and how far a sum of prices may be off: far less than that, in any sensible unit. */
export function precisionOf({ optionBenefit, classCount }: Model): Precision {
  let step = 0;
  let largest = 0;
  for (const benefit of optionBenefit) {
    step = commonDivisor(step, benefit);
    largest = Math.max(largest, benefit);
  }
  // each addition is off by 2⁻⁵³ of its sum at most; a sum has a few terms per class
  return { step: Math.max(1, step), slack: 1e-6 + largest * classCount * classCount * 2 ** -50 };
}

function commonDivisor(one: number, other: number): number {
  while (other > 0) [one, other] = [other, one % other];
  return one;
}
