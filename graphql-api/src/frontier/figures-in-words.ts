import type { WriteFigure } from '@metewand/frontier';
import { amountInWords } from '../common/words.js';
import { LimitMeasure } from '../limits/entities/limit.entity.js';
import { CEILING_LIMIT_NAME, formatUse } from '../limits/limit-measures.js';
import { formatPoints } from '../scoring/points.js';
import type { NamedLimit } from './build-problem.js';

/** Writes the whole numbers of a problem as people know them: amounts with their currency, days, square metres. */
export function figuresInWords(limits: readonly NamedLimit[], currency: string): WriteFigure {
  const measures = new Map(limits.map(({ name, measure }) => [name, measure]));
  return (figure, of) => {
    if (of === 'benefit') return formatPoints(figure);
    if (of === 'cost' || of.limit === CEILING_LIMIT_NAME) return amountInWords(figure, currency);
    const measure = measures.get(of.limit);
    if (measure === undefined) return String(figure);
    return measure === LimitMeasure.ADDED_RUNNING_COST
      ? amountInWords(figure, currency)
      : formatUse(measure, figure, currency);
  };
}
