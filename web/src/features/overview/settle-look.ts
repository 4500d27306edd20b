import type { ToSettleKind } from '../../generated/graphql';
import { paths } from '../../lib/paths';
import type { IconName } from '../../ui/icon';

export interface SettleLook {
  icon: IconName;
  tone: 'bad' | 'caution' | 'overlap';
  /** Where it is settled, and what the link says. */
  to: string;
  action: string;
}

interface ToSettle {
  kind: ToSettleKind;
  candidateIds: readonly string[];
}

/** How an open thing looks, and where it is settled: with one candidate, straight at that candidate's quotes. */
export function settleLook(roundId: string, { kind, candidateIds }: ToSettle): SettleLook {
  const only = candidateIds.length === 1 ? candidateIds[0] : undefined;
  const quotes = only ? paths.candidateQuotes(roundId, only) : `${paths.quotes(roundId)}?only=to-settle`;
  switch (kind) {
    case 'NO_OPEN_QUOTE':
      return {
        icon: 'doc',
        tone: 'bad',
        to: only ? quotes : `${paths.candidates(roundId)}?view=something-missing`,
        action: only ? 'Add a quote' : 'See the candidates',
      };
    case 'QUOTE_ENDS_EARLY':
      return { icon: 'clock', tone: 'caution', to: quotes, action: 'Open the quotes' };
    case 'SERVICE_PRICE_MISSING':
      return { icon: 'warn', tone: 'caution', to: quotes, action: 'Fill in the price' };
    case 'SCORE_MISSING':
      return { icon: 'note', tone: 'bad', to: paths.scoring(roundId), action: 'Open the scores' };
    case 'SCORES_FAR_APART':
      return { icon: 'note', tone: 'caution', to: paths.scoring(roundId), action: 'Look at the scores' };
    case 'EITHER_OR_PAIR':
      return { icon: 'over', tone: 'overlap', to: `${paths.limits(roundId)}#links`, action: 'See the links' };
  }
}
