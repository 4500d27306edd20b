import type { Viewer, ViewerRound } from '../lib/viewer';

export function aRound(over: Partial<ViewerRound> = {}): ViewerRound {
  return {
    __typename: 'Round',
    id: 'round-1',
    name: 'Round 2027',
    stage: 'GATHER',
    openedOn: '2026-09-01',
    scoringClosesOn: '2026-11-30',
    decisionDate: '2027-01-15',
    counts: { __typename: 'RoundCounts', candidates: 46, quotes: 149, quotesToSettle: 5, scoresMissing: 0 },
    ...over,
  };
}

type Membership = Viewer['membership'];

export function aViewer(over: Partial<Viewer> & { roles?: Membership['roles'] } = {}): Viewer {
  const { roles = ['PURCHASING_COORDINATOR'], ...rest } = over;
  return {
    __typename: 'Viewer',
    email: 'hanne.vos@alderbrook.example',
    membership: { __typename: 'Membership', id: 'm-1', name: 'Hanne Vos', title: 'Purchasing', roles },
    organisation: {
      __typename: 'Organisation',
      id: 'org-1',
      name: 'Alderbrook Clinics',
      currency: 'EUR',
      locale: 'de-DE',
      timeZone: 'Europe/Berlin',
      demo: false,
      sites: [{ __typename: 'Site', id: 's-1', code: 'AH', name: 'Alder House' }],
    },
    memberships: [
      {
        __typename: 'MembershipChoice',
        organisationId: 'org-1',
        organisationName: 'Alderbrook Clinics',
        roles,
      },
    ],
    rounds: [aRound()],
    ...rest,
  };
}
