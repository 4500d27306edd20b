import { screen, waitFor, within } from '@testing-library/react';
import { expect, test } from 'vitest';
import { aRound, aViewer } from '../test/factories';
import { fakeLink, refusal } from '../test/fake-link';
import { renderRoute } from '../test/render-route';

const limits = '/rounds/round-1/limits';

test('hangs the pages of the round on the rod and marks the present one', async () => {
  await renderRoute(limits, fakeLink({ Viewer: { viewer: aViewer() } }));
  const nav = await screen.findByRole('navigation', { name: 'Main' });
  expect(within(nav).getByRole('link', { name: /Limits/ })).toHaveAttribute('aria-current', 'page');
  expect(within(nav).getByRole('link', { name: /Candidates/ })).toHaveTextContent('46');
  expect(within(nav).getByRole('link', { name: /Quotes/ })).toHaveTextContent('5 open');
  expect(within(nav).getByRole('link', { name: /Scoring/ })).not.toHaveTextContent('open');
});

test('shows the step of the round and its decision date', async () => {
  await renderRoute(
    limits,
    fakeLink({ Viewer: { viewer: aViewer({ rounds: [aRound({ stage: 'SEARCH' })] }) } }),
  );
  const steps = await screen.findByRole('list', { name: 'Steps of the round' });
  const now = within(steps)
    .getAllByRole('listitem')
    .filter((step) => step.getAttribute('aria-current') === 'step');
  expect(now.map((step) => step.textContent)).toEqual(['Search']);
  expect(screen.getByText(/Decision due 15.Jan.2027/)).toBeVisible();
});

test.each([
  [['PURCHASING_COORDINATOR'], 'GATHER', '/rounds/round-1/overview'],
  [['CLINICAL_ASSESSOR'], 'SCORE', '/rounds/round-1/scoring'],
  [['FINANCE_DIRECTOR'], 'SEARCH', '/rounds/round-1/frontier'],
  [['FINANCE_DIRECTOR'], 'DECIDE', '/rounds/round-1/approval'],
] as const)('lands %s in %s where their work lies', async (roles, stage, path) => {
  const viewer = aViewer({ roles: [...roles], rounds: [aRound({ stage })] });
  const { where } = await renderRoute('/', fakeLink({ Viewer: { viewer } }));
  await waitFor(() => expect(where()).toBe(path));
});

test('renews the token once for all requests that were refused, and tries them again', async () => {
  const link = fakeLink({
    RefreshSession: { refreshSession: { __typename: 'SignedIn', accessToken: 'token-2' } },
    Viewer: () => {
      if (link.asked.at(-1)?.token !== 'token-2') throw refusal('UNAUTHENTICATED');
      return { viewer: aViewer() };
    },
  });
  await renderRoute(limits, link);
  expect(await screen.findByRole('navigation', { name: 'Main' })).toBeVisible();
  expect(link.asked.filter(({ operation }) => operation === 'RefreshSession')).toHaveLength(1);
});

test('asks to sign in when the session is over, and keeps the address', async () => {
  const link = fakeLink({
    RefreshSession: () => {
      throw refusal('UNAUTHENTICATED');
    },
  });
  const { where } = await renderRoute(limits, link, { token: null });
  expect(await screen.findByRole('button', { name: 'Sign in' })).toBeVisible();
  expect(where()).toBe('/sign-in?to=%2Frounds%2Fround-1%2Flimits');
});

test('signs out from the member’s menu', async () => {
  const link = fakeLink({ Viewer: { viewer: aViewer() }, SignOut: { signOut: true } });
  const { user, where } = await renderRoute(limits, link);
  await user.click(await screen.findByRole('button', { name: /Hanne Vos/ }));
  await user.click(await screen.findByRole('menuitem', { name: /Sign out/ }));
  await waitFor(() => expect(where()).toBe('/sign-in'));
  expect(link.asked.map(({ operation }) => operation)).toContain('SignOut');
});

test('offers another clinic group only to members of several', async () => {
  await renderRoute(limits, fakeLink({ Viewer: { viewer: aViewer() } }));
  expect(await screen.findByText('Alderbrook Clinics')).toBeVisible();
  expect(screen.queryByRole('button', { name: /Clinic group/ })).not.toBeInTheDocument();
});

test('says what happened when the server fails, with the number for support', async () => {
  const link = fakeLink({
    Viewer: () => {
      throw refusal('INTERNAL_SERVER_ERROR');
    },
  });
  await renderRoute(limits, link);
  expect(await screen.findByRole('heading', { name: 'This page could not be shown' })).toBeVisible();
  expect(screen.getByText(/req-1/)).toBeVisible();
  expect(screen.getByRole('button', { name: 'Try again' })).toBeVisible();
});

test('leaves out the pages a role may not see', async () => {
  await renderRoute(limits, fakeLink({ Viewer: { viewer: aViewer({ roles: ['REQUESTER'] }) } }));
  const nav = await screen.findByRole('navigation', { name: 'Main' });
  expect(within(nav).queryByRole('link', { name: /Candidates|Frontier|Approval/ })).not.toBeInTheDocument();
});

test('tells a member whose role has no page in the round whom to turn to', async () => {
  await renderRoute('/', fakeLink({ Viewer: { viewer: aViewer({ roles: ['REQUESTER'] }) } }));
  expect(await screen.findByRole('heading', { name: 'Your role has no page in this round' })).toBeVisible();
  expect(screen.getByText('Round 2027 is under way.')).toBeVisible();
});

test('calls scores and quotes open only while they can still be given', async () => {
  const counts = { ...aRound().counts, scoresMissing: 13 };
  const rounds = [aRound({ stage: 'DECIDE', counts })];
  await renderRoute(limits, fakeLink({ Viewer: { viewer: aViewer({ rounds }) } }));
  const nav = await screen.findByRole('navigation', { name: 'Main' });
  expect(within(nav).getByRole('link', { name: /Scoring/ })).not.toHaveTextContent('open');
  expect(within(nav).getByRole('link', { name: /Quotes/ })).not.toHaveTextContent('open');
});
