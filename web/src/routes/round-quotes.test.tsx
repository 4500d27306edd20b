import { screen, waitFor, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { aViewer } from '../test/factories';
import { fakeLink } from '../test/fake-link';
import { aCost, aQuote } from '../test/quote-factories';
import { renderRoute } from '../test/render-route';

const PATH = '/rounds/round-1/quotes';

function row(vendorName: string, over: Parameters<typeof aQuote>[0] = {}) {
  const candidate = {
    __typename: 'Candidate',
    id: 'candidate-2',
    code: 'C-122',
    name: 'Echo scanner, cardiac',
  };
  return { ...aQuote({ vendorName, cost: aCost(), ...over }), candidate };
}

async function openPage(items: ReturnType<typeof row>[], path = PATH, total = items.length) {
  const link = fakeLink({
    Viewer: () => ({ viewer: aViewer() }),
    RoundQuotes: {
      quotes: { __typename: 'QuotePage', total, items },
      round: {
        __typename: 'Round',
        id: 'round-1',
        name: 'Round 2027',
        decisionDate: '2027-04-30',
        counts: { __typename: 'RoundCounts', quotes: total, quotesToSettle: 5 },
      },
    },
  });
  const view = await renderRoute(path, link);
  await screen.findByRole('heading', { level: 1, name: 'Quotes' });
  const asked = () => link.asked.filter(({ operation }) => operation === 'RoundQuotes').at(-1)?.variables;
  return { ...view, asked };
}

describe('all quotes of a round', () => {
  it('are shown with what is wrong with each, and lead to their candidate', async () => {
    const { user, where } = await openPage([
      row('Oslander', { inForce: true }),
      row('Quillmoor', { faults: ['RUN_OUT', 'LEAD_TIME_TOO_LONG'] }),
      row('Pellworth', { faults: ['SERVICE_PRICE_MISSING'] }),
    ]);
    const rows = screen.getAllByRole('row').slice(1);
    expect(within(rows[0]!).getByText('In force')).toBeVisible();
    expect(within(rows[0]!).getByText('69 500,00 €')).toBeVisible();
    expect(within(rows[1]!).getByText('Run out')).toBeVisible();
    expect(within(rows[1]!).getByText('Delivery too late')).toBeVisible();
    expect(within(rows[2]!).getByText('Service price missing')).toBeVisible();
    expect(screen.getByText(/5 candidates have none that can be bought by/)).toBeVisible();
    await user.click(within(rows[1]!).getByRole('link', { name: 'Echo scanner, cardiac' }));
    await waitFor(() => expect(where()).toBe('/rounds/round-1/candidates/candidate-2/quotes'));
  });

  it('are searched and filtered by the address', async () => {
    const { user, asked, where } = await openPage([row('Oslander')], `${PATH}?q=echo&page=1`);
    expect(screen.getByRole('searchbox', { name: 'Find a quote' })).toHaveValue('echo');
    expect(asked()).toMatchObject({ filter: { search: 'echo', faultyOnly: false }, page: 1 });
    await user.click(screen.getByLabelText('Only with something to settle'));
    await waitFor(() => expect(where()).toBe(`${PATH}?q=echo&only=to-settle`));
    await waitFor(() => expect(asked()).toMatchObject({ filter: { search: 'echo', faultyOnly: true } }));
    await user.clear(screen.getByRole('searchbox', { name: 'Find a quote' }));
    await user.type(screen.getByRole('searchbox', { name: 'Find a quote' }), 'scan');
    await waitFor(() => expect(where()).toBe(`${PATH}?q=scan&only=to-settle`));
  });

  it('can be had back when the filters leave none', async () => {
    const { user, where } = await openPage([], `${PATH}?q=nothing`);
    await user.click(screen.getByRole('button', { name: 'Clear filters' }));
    await waitFor(() => expect(where()).toBe(PATH));
  });

  it('go back to page 1 from a page that has vanished', async () => {
    const { where } = await openPage([row('Oslander')], `${PATH}?page=9`);
    await waitFor(() => expect(where()).toBe(PATH));
  });

  it('say where quotes come from while there are none', async () => {
    await openPage([]);
    expect(screen.getByRole('heading', { name: 'No quote has come in yet' })).toBeVisible();
    expect(screen.getByRole('link', { name: 'Open the candidates' })).toBeVisible();
  });
});
