import type { Reduction } from '../reduction/reduction.js';
import { writeOverrun, type WriteFigure } from './write-figure.js';

/** What was settled about an item before the search, as a sentence. */
export function describeReduction(reduction: Reduction, write: WriteFigure = String): string {
  const { item } = reduction;
  switch (reduction.kind) {
    case 'beaten':
      return `${item} was left out before the search: ${reduction.by}, of the same group, is at least as good in everything.`;
    case 'brings nothing':
      return `${item} was left out before the search: it adds no benefit, and nothing else asks for it.`;
    case 'barred by a link':
      return `${reduction.because}; so ${item} was left out before the search.`;
    case 'does not fit': {
      const partners = reduction.together.filter((id) => id !== item);
      const who = partners.length === 0 ? 'it' : `it and ${partners.join(', ')}, which it needs,`;
      return `${item} was left out before the search: with ${who} ${writeOverrun(reduction.overrun, write)}.`;
    }
    case 'forced by a link':
      return `${reduction.because}; so it is in every portfolio.`;
    case 'cannot be spared':
      return `${item} is in every portfolio: without it ${writeOverrun(reduction.overrun, write)}.`;
    case 'fewer pieces':
      return `At most ${reduction.pieces} of ${item} can be taken: with all of them ${writeOverrun(reduction.overrun, write)}.`;
  }
}
