import { screen, waitFor, within } from '@testing-library/react';
import { expect, test } from 'vitest';
import { aViewer } from '../test/factories';
import { fakeLink, refusal } from '../test/fake-link';
import { renderRoute } from '../test/render-route';
import { aCandidate, aCandidatePage, aCandidateRow, aLimit, euros } from '../test/round-factories';

const PATH = '/rounds/round-1/candidates';
const coordinator = { viewer: aViewer({ roles: ['PURCHASING_COORDINATOR'] }) };

const panel = (candidate = aCandidate()) => ({
  candidate,
  round: { __typename: 'Round', id: 'round-1', stage: 'SCORE', limits: [aLimit()] },
});

test('says how much is asked for, and asks the API for what the address says', async () => {
  const link = fakeLink({ Viewer: coordinator, RoundCandidates: aCandidatePage() });
  await renderRoute(`${PATH}?view=mandatory&q=scan&site=s-1&sort=-capital&page=1`, link);
  expect(await screen.findByText(/ask for 3\s987\s700\s€, which is 166\s% of the ceiling/u)).toBeVisible();
  expect(screen.getByRole('button', { name: 'Site: Alder House' })).toBeVisible();
  expect(link.asked.find(({ operation }) => operation === 'RoundCandidates')?.variables).toEqual({
    roundId: 'round-1',
    filter: { view: 'MANDATORY', search: 'scan', departmentId: null, siteId: 's-1' },
    sort: { key: 'CAPITAL', direction: 'DESC' },
    page: 1,
    pageSize: 25,
  });
});

test('sorts on the server and searches a moment after typing', async () => {
  const link = fakeLink({ Viewer: coordinator, RoundCandidates: aCandidatePage() });
  const { user, where } = await renderRoute(`${PATH}?page=2`, link);
  const table = within(await screen.findByRole('table', { name: 'Candidates' }));
  await user.click(table.getByRole('button', { name: /Capital/u }));
  await waitFor(() => expect(where()).toBe(`${PATH}?sort=-capital`));
  await user.type(screen.getByRole('searchbox', { name: 'Find a need' }), 'endo');
  await waitFor(() => expect(where()).toBe(`${PATH}?sort=-capital&q=endo`));
  expect(link.asked.at(-1)?.variables).toMatchObject({
    filter: { search: 'endo' },
    sort: { key: 'CAPITAL', direction: 'DESC' },
  });
});

test('flags what is mandatory, needed or without an open quote, and hides benefit until scoring closes', async () => {
  const needs = {
    __typename: 'Link' as const,
    id: 'k-1',
    kind: 'NEEDS' as const,
    candidate: { __typename: 'Candidate' as const, id: 'c-109' },
    members: [{ __typename: 'Candidate' as const, id: 'c-110', code: 'C-110' }],
  };
  const row = aCandidateRow({ mandatory: true, quoteInForce: null, links: [needs] });
  await renderRoute(
    PATH,
    fakeLink({ Viewer: coordinator, RoundCandidates: aCandidatePage({ page: { items: [row] } }) }),
  );
  const line = within(await screen.findByRole('row', { name: /Video endoscope set/u }));
  for (const flag of ['No open quote', 'Mandatory', 'Needs C-110'])
    expect(line.getByText(flag)).toBeVisible();
  expect(line.getByText('after scoring closes')).toBeInTheDocument();
});

test('opens a candidate by keyboard, and gives the focus back to its row', async () => {
  const link = fakeLink({ Viewer: coordinator, RoundCandidates: aCandidatePage(), CandidatePanel: panel() });
  const { user, where } = await renderRoute(PATH, link);
  const row = await screen.findByRole('link', { name: 'Video endoscope set' });
  row.focus();
  await user.keyboard('{Enter}');
  const dialog = within(await screen.findByRole('dialog', { name: 'Video endoscope set' }));
  expect(await dialog.findByText(/Ends 2\sDec\s2026/u)).toBeInTheDocument();
  expect(dialog.getByText('4 of 50')).toBeInTheDocument();
  expect(
    dialog.getByText(/A qualified person must confirm them in writing before an order/u),
  ).toBeInTheDocument();
  await user.keyboard('{Escape}');
  await waitFor(() => expect(where()).toBe(PATH));
  await waitFor(() => expect(screen.getByRole('link', { name: 'Video endoscope set' })).toHaveFocus());
});

test('shows a refused amount beside its field and on top, in the words of the form', async () => {
  const message = 'worksNet must be zero or more; it cannot be negative.';
  const inWords = 'Building works, without VAT must be zero or more; it cannot be negative.';
  const refused = Object.assign(refusal('BAD_USER_INPUT', message), {
    extensions: { code: 'BAD_USER_INPUT', fields: [{ field: 'fields.worksNet', message }] },
  });
  const link = fakeLink({
    Viewer: coordinator,
    RoundCandidates: aCandidatePage(),
    CandidatePanel: panel(),
    UpdateCandidate: () => {
      throw refused;
    },
  });
  const { user } = await renderRoute(`${PATH}?candidate=c-109&open=edit`, link);
  const works = await screen.findByLabelText('Building works, without VAT');
  await user.clear(works);
  await user.type(works, '-5');
  await user.click(screen.getByRole('button', { name: 'Save candidate' }));
  await waitFor(() => expect(works).toHaveAccessibleDescription(expect.stringContaining(inWords)));
  await user.click(within(screen.getByRole('alert')).getByRole('button', { name: inWords }));
  expect(works).toHaveFocus();
});

test('keeps what was typed when somebody else saved first, and says what they changed', async () => {
  let version = 1;
  const link = fakeLink({
    Viewer: coordinator,
    RoundCandidates: aCandidatePage(),
    CandidatePanel: () => panel(aCandidate(version === 1 ? {} : { version, quantity: 2 })),
    UpdateCandidate: ({ input }) => {
      version = 2;
      if ((input as { version: number }).version !== version) throw refusal('CONFLICT');
      return {
        updateCandidate: aCandidate({ version: 3, name: 'Endoscope tower', energyYearly: euros('-300.00') }),
      };
    },
  });
  const { user } = await renderRoute(`${PATH}?candidate=c-109&open=edit`, link);
  const name = await screen.findByLabelText('Name');
  await user.clear(name);
  await user.type(name, 'Endoscope tower');
  const energy = screen.getByLabelText('Energy a year');
  await user.clear(energy);
  await user.type(energy, '-300');
  await user.click(screen.getByRole('button', { name: 'Save candidate' }));
  expect(await screen.findByText(/They changed: Quantity/u)).toBeInTheDocument();
  expect(name).toHaveValue('Endoscope tower');
  await user.click(screen.getByRole('button', { name: 'Go on with mine' }));
  await user.click(screen.getByRole('button', { name: 'Save candidate' }));
  await waitFor(() => expect(screen.queryByLabelText('Name')).not.toBeInTheDocument());
  expect(link.asked.findLast(({ operation }) => operation === 'UpdateCandidate')?.variables).toMatchObject({
    input: { version: 2, fields: { name: 'Endoscope tower', energyYearly: '-300', quantity: 1 } },
  });
});

test('asks before typed changes are lost', async () => {
  const link = fakeLink({ Viewer: coordinator, RoundCandidates: aCandidatePage() });
  const { user, where } = await renderRoute(`${PATH}?open=add`, link);
  await user.type(await screen.findByLabelText('Name'), 'Blanket warmer');
  await user.click(screen.getByRole('button', { name: 'Cancel' }));
  await user.click(await screen.findByRole('button', { name: 'Leave' }));
  await waitFor(() => expect(where()).toBe(PATH));
});

test('invites to the first candidate when nothing has been asked for', async () => {
  const nothing = { items: [], total: 0, all: 0, somethingMissing: 0, mandatory: 0, askedFor: euros('0.00') };
  await renderRoute(
    PATH,
    fakeLink({ Viewer: coordinator, RoundCandidates: aCandidatePage({ page: nothing }) }),
  );
  expect(await screen.findByText('Lay the first candidate along the rod')).toBeVisible();
  expect(screen.getByRole('button', { name: 'Add candidate' })).toBeVisible();
});

test('offers to clear filters that leave nothing', async () => {
  const link = fakeLink({
    Viewer: coordinator,
    RoundCandidates: ({ filter }) =>
      aCandidatePage({ page: (filter as { search: string | null }).search ? { items: [], total: 0 } : {} }),
  });
  const { user, where } = await renderRoute(`${PATH}?q=nothing`, link);
  await screen.findByText('No candidate matches');
  await user.click(screen.getByRole('button', { name: 'Clear filters' }));
  await screen.findByRole('link', { name: 'Video endoscope set' });
  expect(where()).toBe(PATH);
  await waitFor(() => expect(screen.getByRole('searchbox', { name: 'Find a need' })).toHaveValue(''));
});

test('leaves adding out for an assessor', async () => {
  const assessor = { viewer: aViewer({ roles: ['CLINICAL_ASSESSOR'] }) };
  await renderRoute(PATH, fakeLink({ Viewer: assessor, RoundCandidates: aCandidatePage() }));
  await screen.findByRole('link', { name: 'Video endoscope set' });
  expect(screen.queryByRole('button', { name: 'Add candidate' })).not.toBeInTheDocument();
});
