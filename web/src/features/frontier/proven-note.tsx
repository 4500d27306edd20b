import type { Front } from './front';
import { shortCost } from './wording';

/** What the filling of the rod says, in words. */
export function ProvenNote({ front: { proven, status } }: { front: Pick<Front, 'proven' | 'status'> }) {
  return <span>{provenText(status, proven)}</span>;
}

export function provenText(status: Front['status'], proven: Front['proven']): string {
  if (status === 'COMPLETE') return 'Filled rod: proven complete over the whole length';
  if (proven.length === 0) return 'Pale rod: nothing proven yet';
  const stretches = proven.map(([from, to]) => `${shortCost(from)} to ${shortCost(to)}`);
  return `Filled rod: proven complete from ${stretches.join(', ')}`;
}
