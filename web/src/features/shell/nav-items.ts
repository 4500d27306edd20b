import { canChangeContents } from '../../lib/can-change-contents';
import { paths } from '../../lib/paths';
import type { ViewerRound } from '../../lib/viewer';
import type { IconName } from '../../ui/icon';

export interface NavItem {
  to: string;
  name: string;
  icon: IconName;
  /** Plain count at the right. */
  count?: string;
  /** True when the count asks for something to be done. */
  open?: boolean;
}

/** The pages of a round that `can` leaves in. What a role may not see is left out, not greyed. */
export function roundItems(round: ViewerRound, can: (operation: string) => boolean): NavItem[] {
  const { id, stage, counts } = round;
  const items: (NavItem & { needs: string })[] = [
    { to: paths.overview(id), name: 'Overview', icon: 'rod', needs: 'roundOverview' },
    {
      to: paths.candidates(id),
      name: 'Candidates',
      icon: 'list',
      count: String(counts.candidates),
      needs: 'candidates',
    },
    {
      to: paths.quotes(id),
      name: 'Quotes',
      icon: 'doc',
      ...openCount(canChangeContents(stage) ? counts.quotesToSettle : 0),
      needs: 'quotes',
    },
    { to: paths.limits(id), name: 'Limits', icon: 'limit', needs: 'round' },
    {
      to: paths.scoring(id),
      name: 'Scoring',
      icon: 'score',
      ...openCount(stage === 'SCORE' ? counts.scoresMissing : 0),
      needs: 'scoreSheet',
    },
    { to: paths.frontier(id), name: 'Frontier', icon: 'frontier', needs: 'run' },
    { to: paths.approval(id), name: 'Approval', icon: 'ok', needs: 'selection' },
  ];
  return items.filter(({ needs }) => can(needs));
}

function openCount(count: number): Pick<NavItem, 'count' | 'open'> {
  return count > 0 ? { count: `${count} open`, open: true } : {};
}
