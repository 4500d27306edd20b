import { formatMoneyWhole, formatPercent } from '../../lib/money';
import type { Amount } from '../../lib/money';

interface CandidatesAnswerProps {
  count: number;
  askedFor: Amount;
  ceiling: Amount;
}

/** How many candidates ask for how much, and how that compares with the ceiling. */
export function CandidatesAnswer({ count, askedFor, ceiling }: CandidatesAnswerProps) {
  if (count === 0) return 'Nothing has been asked for yet.';
  const share = Number(askedFor.amount) / Number(ceiling.amount);
  return (
    <>
      <b style={{ color: 'var(--mw-ink)' }}>
        {count} {count === 1 ? 'candidate' : 'candidates'}
      </b>{' '}
      {count === 1 ? 'asks' : 'ask'} for {formatMoneyWhole(askedFor)}
      {Number.isFinite(share) && `, which is ${formatPercent(share)} of the ceiling`}.
    </>
  );
}
