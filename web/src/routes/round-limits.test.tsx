import { screen, waitFor, within } from '@testing-library/react';
import { expect, test } from 'vitest';
import { aViewer } from '../test/factories';
import { fakeLink } from '../test/fake-link';
import { renderRoute } from '../test/render-route';
import { aLimit, aLimitsPage } from '../test/round-factories';

const PATH = '/rounds/round-1/limits';
const coordinator = { viewer: aViewer({ roles: ['PURCHASING_COORDINATOR'] }) };

test('says how many limits bind and by how much more is asked', async () => {
  await renderRoute(PATH, fakeLink({ Viewer: coordinator, RoundLimits: aLimitsPage() }));
  expect(await screen.findByRole('heading', { level: 1 })).toHaveTextContent(
    'The ceiling and 1 limit bind this round',
  );
  const row = within(screen.getByRole('row', { name: /Days of the technical team/u }));
  expect(row.getByText('12,5 more asked than allowed')).toBeVisible();
});

test('reads links as sentences', async () => {
  const candidate = (code: string, name: string) => ({
    __typename: 'Candidate' as const,
    id: code,
    code,
    name,
  });
  const page = aLimitsPage({
    links: [
      {
        __typename: 'Link',
        id: 'k-1',
        kind: 'NEEDS',
        least: null,
        most: null,
        reason: 'images need the workstation',
        candidate: candidate('C-13', 'Mammography'),
        members: [candidate('C-14', 'Reading workstation')],
      },
      {
        __typename: 'Link',
        id: 'k-2',
        kind: 'EITHER_OR',
        least: null,
        most: 1,
        reason: '',
        candidate: null,
        members: [candidate('C-03', 'Second magnet'), candidate('C-04', 'Upgrade')],
      },
    ],
  });
  await renderRoute(PATH, fakeLink({ Viewer: coordinator, RoundLimits: page }));
  const links = within(await screen.findByRole('region', { name: 'Links between candidates' }));
  const [needs, either] = links.getAllByRole('listitem');
  expect(needs).toHaveTextContent(
    'C-13 Mammography needs C-14 Reading workstation: images need the workstation',
  );
  expect(either).toHaveTextContent('Either C-03 Second magnet or C-04 Upgrade');
});

test('shows a taken name beside the name, and keeps what was typed', async () => {
  const message = 'This round has a limit named “Floor” already.';
  const link = fakeLink({
    Viewer: coordinator,
    RoundLimits: aLimitsPage(),
    CreateLimit: { createLimit: { __typename: 'LimitNameTaken', message } },
  });
  const { user } = await renderRoute(PATH, link);
  await user.click(await screen.findByRole('button', { name: 'Add limit' }));
  const dialog = within(await screen.findByRole('dialog'));
  await user.type(dialog.getByLabelText('Name'), 'Floor');
  await user.selectOptions(dialog.getByLabelText('Measure'), 'Floor area');
  await user.type(dialog.getByLabelText('Most'), '44,5');
  await user.click(dialog.getByRole('button', { name: 'Add limit' }));
  await waitFor(() => expect(dialog.getByLabelText('Name')).toHaveAccessibleDescription(message));
  expect(dialog.getByRole('alert')).toHaveTextContent(message);
  expect(dialog.getByLabelText('Most')).toHaveValue('44,5');
  expect(link.asked.find(({ operation }) => operation === 'CreateLimit')?.variables).toEqual({
    input: {
      roundId: 'round-1',
      fields: { name: 'Floor', measure: 'FLOOR_AREA', siteId: null, least: null, most: '44.5' },
    },
  });
});

test('removes a limit only after asking', async () => {
  let limits = [aLimit()];
  const link = fakeLink({
    Viewer: coordinator,
    RoundLimits: () => aLimitsPage({ limits }),
    DeleteLimit: () => {
      limits = [];
      return { deleteLimit: true };
    },
  });
  const { user } = await renderRoute(PATH, link);
  await user.click(await screen.findByRole('button', { name: 'Remove Days of the technical team' }));
  expect(link.asked.some(({ operation }) => operation === 'DeleteLimit')).toBe(false);
  await user.click(await screen.findByRole('button', { name: 'Remove the limit' }));
  expect(await screen.findByText('The ceiling alone binds this round')).toBeInTheDocument();
});

test('leaves changes out for an auditor, and once a portfolio is submitted', async () => {
  const auditor = { viewer: aViewer({ roles: ['AUDITOR'] }) };
  const first = await renderRoute(PATH, fakeLink({ Viewer: auditor, RoundLimits: aLimitsPage() }));
  await screen.findByText('Days of the technical team');
  expect(screen.queryByRole('button', { name: 'Add limit' })).not.toBeInTheDocument();
  first.unmount();
  await renderRoute(PATH, fakeLink({ Viewer: coordinator, RoundLimits: aLimitsPage({ stage: 'DECIDE' }) }));
  await screen.findByText('Days of the technical team');
  expect(screen.queryByRole('button', { name: 'Add limit' })).not.toBeInTheDocument();
});
