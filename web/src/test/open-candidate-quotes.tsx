import { act, fireEvent, screen } from '@testing-library/react';
import type { PageData } from '../routes/candidate-quotes';
import { aRound, aViewer } from './factories';
import { fakeLink } from './fake-link';
import type { FakeLink } from './fake-link';
import { aCost, aQuote } from './quote-factories';
import { renderRoute } from './render-route';

export const PATH = '/rounds/round-1/candidates/candidate-2/quotes';
type Answers = Parameters<typeof fakeLink>[0];

export const oslander = aQuote({
  inForce: true,
  cost: aCost({ acquisition: '78200.00', service: '31200.00', residual: '-6400.00' }),
});
export const quillmoor = aQuote({
  vendorName: 'Quillmoor',
  number: 'Q-2684',
  validUntil: '2027-04-07',
  faults: ['RUN_OUT'],
  cost: aCost({ acquisition: '71900.00', service: '39800.00', residual: '-3900.00' }),
});
export const pellworth = aQuote({
  vendorName: 'Pellworth',
  number: 'Q-2709',
  faults: ['SERVICE_PRICE_MISSING'],
  serviceYearly: null,
  cost: aCost({ acquisition: '92600.00', service: '0.00', residual: '-9100.00' }),
});

export function answers(
  page: PageData | (() => PageData),
  more: Answers = {},
  roles = aViewer().membership.roles,
): Answers {
  return {
    Viewer: () => ({ viewer: aViewer({ roles, rounds: [aRound()] }) }),
    CandidateQuotes: () => ({ ...(typeof page === 'function' ? page() : page) }),
    CandidateOrder: {
      candidates: {
        __typename: 'CandidatePage',
        total: 3,
        items: ['C-121', 'C-122', 'C-123'].map((code, i) => ({
          __typename: 'Candidate',
          id: `candidate-${i + 1}`,
          code,
        })),
      },
    },
    VendorNames: { vendors: [{ __typename: 'Vendor', id: 'v-1', name: 'Tarnvale' }] },
    ...more,
  };
}

export async function openPage(given: Answers, path = PATH) {
  const link = fakeLink(given);
  const view = await renderRoute(path, link);
  await screen.findByRole('heading', { level: 1, name: 'Quotes for the echo scanner, cardiac' });
  return { ...view, link };
}

export function inputOf(link: FakeLink, operation: string) {
  const asked = link.asked.filter((each) => each.operation === operation).at(-1);
  return asked?.variables.input as Record<string, unknown> | undefined;
}

/** Presses a button and awaits what the router does about it. */
export function press(name: string) {
  return act(async () => {
    fireEvent.click(screen.getAllByRole('button', { name })[0]!);
    await Promise.resolve();
  });
}

export const plain = (text: string | null) => text?.replaceAll('\u00a0', ' ');
