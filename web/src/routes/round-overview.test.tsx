import { screen, waitFor, within } from '@testing-library/react';
import { expect, test } from 'vitest';
import { aViewer } from '../test/factories';
import { fakeLink, refusal } from '../test/fake-link';
import { renderRoute } from '../test/render-route';
import { anEntry, anOverview, euros } from '../test/round-factories';

const PATH = '/rounds/round-1/overview';
const signedInAs = (...roles: ReturnType<typeof aViewer>['membership']['roles']) => ({
  viewer: aViewer({ roles }),
});

test('says in a sentence what is to settle, by whom and where', async () => {
  const link = fakeLink({ Viewer: signedInAs('PURCHASING_COORDINATOR'), RoundOverview: anOverview() });
  await renderRoute(PATH, link);
  expect(await screen.findByRole('heading', { level: 1 })).toHaveTextContent(
    'Two things to settle before the decision',
  );
  const missing = within(screen.getByRole('region', { name: 'Missing before the decision' }));
  expect(missing.getByText('Hanne Vos')).toBeVisible();
  expect(missing.getByRole('link', { name: 'Add a quote' })).toHaveAttribute(
    'href',
    '/rounds/round-1/candidates/c-109/quotes',
  );
  expect(screen.getByText(/1\s587\s700 more than the ceiling/u)).toBeVisible();
});

test('says that nothing is left when everything is settled', async () => {
  const link = fakeLink({
    Viewer: signedInAs('AUDITOR'),
    RoundOverview: anOverview({ overview: { toSettle: [] } }),
  });
  await renderRoute(PATH, link);
  expect(await screen.findByText('Nothing is left to settle before the decision')).toBeVisible();
});

test('lists what is missing when the round is not ready', async () => {
  const link = fakeLink({
    Viewer: signedInAs('PURCHASING_COORDINATOR'),
    RoundOverview: anOverview(),
    AdvanceRound: {
      advanceRound: {
        __typename: 'RoundNotReady',
        message: 'The round cannot go on yet.',
        missing: ['Pia Holm has 3 scores to give.'],
      },
    },
  });
  const { user } = await renderRoute(PATH, link);
  await user.click(await screen.findByRole('button', { name: 'Close scoring' }));
  const dialog = within(await screen.findByRole('dialog'));
  expect(dialog.getByText(/Scores freeze/u)).toBeInTheDocument();
  await user.click(dialog.getByRole('button', { name: 'Close scoring' }));
  expect(await dialog.findByRole('alert')).toHaveTextContent('Pia Holm has 3 scores to give.');
  expect(link.asked.find(({ operation }) => operation === 'AdvanceRound')?.variables).toEqual({
    input: { roundId: 'round-1', version: 3 },
  });
});

test('goes a step back only with a reason', async () => {
  const link = fakeLink({
    Viewer: signedInAs('PURCHASING_COORDINATOR'),
    RoundOverview: anOverview(),
    StepBackRound: { stepBackRound: { __typename: 'Round', id: 'round-1', stage: 'GATHER', version: 4 } },
  });
  const { user } = await renderRoute(PATH, link);
  await user.click(await screen.findByRole('button', { name: 'Back to gathering' }));
  const dialog = within(await screen.findByRole('dialog'));
  await user.click(dialog.getByRole('button', { name: 'Back to gathering' }));
  expect(dialog.getByLabelText('Reason')).toHaveAccessibleDescription('Write why the round goes back.');
  expect(link.asked.some(({ operation }) => operation === 'StepBackRound')).toBe(false);
  await user.type(dialog.getByLabelText('Reason'), 'A criterion was missing');
  await user.click(dialog.getByRole('button', { name: 'Back to gathering' }));
  await waitFor(() => expect(screen.queryByRole('dialog')).not.toBeInTheDocument());
  expect(link.asked.find(({ operation }) => operation === 'StepBackRound')?.variables).toEqual({
    input: { roundId: 'round-1', version: 3, reason: 'A criterion was missing' },
  });
});

test('leaves out what the role may not do', async () => {
  const link = fakeLink({ Viewer: signedInAs('AUDITOR'), RoundOverview: anOverview() });
  await renderRoute(PATH, link);
  await screen.findByText('Two things to settle before the decision');
  for (const name of ['Close scoring', 'Back to gathering', 'Set the ceiling'])
    expect(screen.queryByRole('button', { name })).not.toBeInTheDocument();
});

test('keeps a typed ceiling when somebody else set it first, and saves it over theirs when told', async () => {
  let version = 3;
  const theirs = { version: 5, ceiling: euros('2500000.00') };
  const link = fakeLink({
    Viewer: signedInAs('FINANCE_DIRECTOR'),
    RoundOverview: () => anOverview({ round: version === 3 ? {} : theirs }),
    SetCeiling: ({ input }) => {
      version = 5;
      if ((input as { version: number }).version !== version)
        throw refusal('CONFLICT', 'This round was changed by somebody else in the meantime.');
      return { setCeiling: { ...anOverview().round, version: 6, ceiling: euros('2600000.00') } };
    },
  });
  const { user } = await renderRoute(PATH, link);
  await user.click(await screen.findByRole('button', { name: 'Set the ceiling' }));
  const dialog = within(await screen.findByRole('dialog'));
  const field = dialog.getByLabelText(/Budget ceiling/u);
  await user.clear(field);
  await user.type(field, '2.600.000');
  await user.click(dialog.getByRole('button', { name: 'Set the ceiling' }));
  expect(await dialog.findByText(/Its ceiling now is 2\s500\s000,00/u)).toBeInTheDocument();
  expect(field).toHaveValue('2.600.000');
  await user.click(dialog.getByRole('button', { name: 'Go on with mine' }));
  await user.click(dialog.getByRole('button', { name: 'Set the ceiling' }));
  await waitFor(() => expect(screen.queryByRole('dialog')).not.toBeInTheDocument());
  expect(link.asked.findLast(({ operation }) => operation === 'SetCeiling')?.variables).toEqual({
    input: { roundId: 'round-1', version: 5, ceiling: '2600000', heldBackPercent: '4' },
  });
});

test('loads the whole trail piece by piece', async () => {
  const link = fakeLink({
    Viewer: signedInAs('AUDITOR'),
    RoundOverview: anOverview(),
    AllActivity: ({ after }) => ({
      auditFeed: {
        __typename: 'AuditFeed',
        endCursor: after ? '1' : '2',
        hasMore: !after,
        items: [after ? anEntry(1, 'Demo data loaded') : anEntry(2, 'Candidate added')],
      },
    }),
  });
  const { user } = await renderRoute(PATH, link);
  await user.click(await screen.findByRole('button', { name: 'All activity' }));
  const dialog = within(await screen.findByRole('dialog'));
  expect(await dialog.findByText(/Candidate added/u)).toBeInTheDocument();
  await user.click(dialog.getByRole('button', { name: 'Load more' }));
  expect(await dialog.findByText(/Demo data loaded/u)).toBeInTheDocument();
  expect(dialog.getByText(/Candidate added/u)).toBeInTheDocument();
  expect(dialog.queryByRole('button', { name: 'Load more' })).not.toBeInTheDocument();
});
