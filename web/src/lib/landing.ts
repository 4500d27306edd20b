import { paths } from './paths';
import { currentRound } from './viewer';
import type { Viewer } from './viewer';

/** Where a person's work lies when they arrive, by role; undefined when there is no round to work in. */
export function landingPath({
  membership,
  rounds,
}: Pick<Viewer, 'membership' | 'rounds'>): string | undefined {
  const round = currentRound(rounds);
  if (!round) return undefined;
  const has = (role: (typeof membership.roles)[number]) => membership.roles.includes(role);
  if (has('PURCHASING_COORDINATOR')) return paths.overview(round.id);
  if (has('FINANCE_DIRECTOR'))
    return round.stage === 'DECIDE' ? paths.approval(round.id) : paths.frontier(round.id);
  if (has('CLINICAL_ASSESSOR')) return paths.scoring(round.id);
  if (has('ORGANISATION_ADMIN') || has('AUDITOR')) return paths.overview(round.id);
  return undefined;
}
