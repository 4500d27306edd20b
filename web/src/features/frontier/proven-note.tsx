import { formatPercent } from '../../lib/money';
import type { Front } from './front';
import { shortCost } from './wording';

/** More stretches than this are told by their share of the axis alone. */
const MOST_NAMED = 2;

/** What the filling of the rod says, in words. */
export function ProvenNote({ front }: { front: Proof }) {
  return <span>{provenText(front)}</span>;
}

type Proof = Pick<Front, 'proven' | 'provenShare' | 'status'>;

export function provenText({ status, proven, provenShare }: Proof): string {
  if (status === 'COMPLETE') return 'Filled rod: proven complete, no better portfolio exists at any cost';
  if (status !== 'BOUNDED') return 'Pale rod: nothing proven yet';
  if (proven.length === 0) return 'Pale rod: a bound is proven, no stretch is complete yet';
  return `Filled rod: ${sharePercent(provenShare)} of the axis is proven complete${stretches(proven)}`;
}

/** Rounded down: "100 %" is said only of a whole proof. */
export function sharePercent(share: number): string {
  return formatPercent(Math.floor(share * 1000) / 1000, 1);
}

function stretches(proven: Proof['proven']): string {
  if (proven.length > MOST_NAMED) return '';
  return `, ${proven.map(([from, to]) => stretch(from, to)).join(' and ')}`;
}

/** A proof begins with the cheapest portfolio there is: below it, nothing can be missing. */
function stretch(from: number, to: number): string {
  return from <= 0 ? `up to ${shortCost(to)}` : `from ${shortCost(from)} to ${shortCost(to)}`;
}
