import type { LimitMeasure } from '../../generated/graphql';
import { formatAmountWhole } from '../../lib/money';
import { formatQuantity } from '../../lib/quantity';

interface MeasureWords {
  name: string;
  /** Unit after a figure; money brings its own sign. */
  unit: string;
}

export const MEASURES: Record<LimitMeasure, MeasureWords> = {
  ADDED_RUNNING_COST: { name: 'Added running cost a year', unit: '' },
  INSTALLATION_DAYS: { name: 'Installation days', unit: 'days' },
  FLOOR_AREA: { name: 'Floor area', unit: 'm²' },
  CANDIDATES: { name: 'Number of candidates', unit: '' },
};

interface LimitFigures {
  measure: LimitMeasure;
  least: string | null;
  most: string | null;
  asked: string;
}

/** A figure of a limit by the group's habits, without its unit; the unit stands with the measure. */
export function limitFigure(measure: LimitMeasure, value: string, currency: string): string {
  if (measure === 'ADDED_RUNNING_COST') return formatAmountWhole({ amount: value, currency });
  return formatQuantity(value);
}

/** How all candidates together stand against a limit: over the most, short of the least, or within it. */
export function standing(limit: LimitFigures, currency: string): { words: string; binds: boolean } {
  const asked = Number(limit.asked);
  const figure = (difference: number) => limitFigure(limit.measure, String(round(difference)), currency);
  if (limit.most !== null && asked > Number(limit.most))
    return { words: `${figure(asked - Number(limit.most))} more asked than allowed`, binds: true };
  if (limit.least !== null && asked < Number(limit.least))
    return { words: `${figure(Number(limit.least) - asked)} short of the least`, binds: true };
  if (limit.most !== null) return { words: `${figure(Number(limit.most) - asked)} left`, binds: false };
  return { words: 'Can be met', binds: false };
}

// Limits have at most two decimals; this takes the float's noise out of a difference.
function round(value: number): number {
  return Math.round(value * 100) / 100;
}
