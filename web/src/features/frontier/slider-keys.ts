import type { Portfolio } from './portfolio';
import { dearestWithin } from './portfolio';

interface Where {
  portfolios: readonly Portfolio[];
  at: number;
  /** A long graduation, in currency units. */
  step: number;
  knee: number | undefined;
}

/** The portfolio a key on the rod leads to; undefined for a key that means nothing here. */
export function portfolioAfterKey(key: string, { portfolios, at, step, knee }: Where): number | undefined {
  const last = portfolios.length - 1;
  const { cost } = portfolios[at]!;
  switch (key) {
    case 'ArrowRight':
    case 'ArrowUp':
      return Math.min(last, at + 1);
    case 'ArrowLeft':
    case 'ArrowDown':
      return Math.max(0, at - 1);
    case 'PageUp':
      return Math.min(last, Math.max(at + 1, dearestWithin(portfolios, cost + step)));
    case 'PageDown':
      return Math.max(0, Math.min(at - 1, dearestWithin(portfolios, cost - step)));
    case 'Home':
      return 0;
    case 'End':
      return last;
    case 'k':
    case 'K':
      return knee;
    default:
      return undefined;
  }
}
