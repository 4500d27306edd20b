import type { Amount } from '../../lib/money';
import { sumOf } from '../../lib/minor-units';
import type { ComparedQuote, CostPartKind } from './compared-quote';

export type CostLineId =
  'acquisition' | 'installation' | 'training' | 'service' | 'consumables' | 'energy' | 'residual';

export interface CostLine {
  id: CostLineId;
  name: string;
  /** What else the line holds. */
  note?: string;
  kinds: readonly CostPartKind[];
}

/** The lines of a life-cycle cost, in the one order they are ever shown in. */
export const COST_LINES: readonly CostLine[] = [
  { id: 'acquisition', name: 'Acquisition', kinds: ['ACQUISITION'] },
  {
    id: 'installation',
    name: 'Installation',
    note: 'with delivery and works',
    kinds: ['DELIVERY', 'INSTALLATION', 'WORKS'],
  },
  { id: 'training', name: 'Training', kinds: ['TRAINING'] },
  { id: 'service', name: 'Service', kinds: ['SERVICE'] },
  { id: 'consumables', name: 'Consumables', kinds: ['CONSUMABLES'] },
  { id: 'energy', name: 'Energy', kinds: ['ENERGY'] },
  { id: 'residual', name: 'Residual value', kinds: ['RESIDUAL'] },
];

/** Present value of one line, in the organisation's currency; below zero for the residual value. */
export function lineAmount({ cost }: Pick<ComparedQuote, 'cost'>, line: CostLine): Amount {
  const parts = cost.parts.filter(({ kind }) => line.kinds.includes(kind));
  return sumOf(
    cost.lifeCycleCost.currency,
    parts.map(({ amount }) => amount),
  );
}

/** Without a price for service the totals are too low to be compared. */
export function isWhole({ faults }: Pick<ComparedQuote, 'faults'>): boolean {
  return !faults.includes('SERVICE_PRICE_MISSING');
}
