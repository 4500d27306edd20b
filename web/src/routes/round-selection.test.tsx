import { screen, waitFor, within } from '@testing-library/react';
import { expect, test } from 'vitest';
import { aRound, aViewer } from '../test/factories';
import { fakeLink } from '../test/fake-link';
import { renderRoute } from '../test/render-route';

const PATH = '/rounds/round-1/approval';
const euros = (amount: string) => ({ __typename: 'Money', amount, currency: 'EUR' });

function aSelection(over: Record<string, unknown> = {}) {
  const line = {
    __typename: 'MemoLine',
    code: 'C-01',
    name: 'Mobile X-ray unit',
    siteName: 'Alder House',
    departmentName: 'Imaging',
    vendorName: 'Tarn & Vale',
    quoteNumber: 'Q-1',
    benefit: '40.0000',
    mandatory: true,
    capital: euros('97740.00'),
    lifeCycleCost: euros('136417.00'),
  };
  return {
    __typename: 'Selection',
    id: 'sel-1',
    number: 1,
    state: 'SUBMITTED',
    version: 2,
    reason: 'Best for the money.',
    comment: '',
    fingerprint: 'sha256:ab',
    submittedAt: '2026-12-01T10:00:00.000Z',
    decidedAt: null,
    submittedBy: { __typename: 'Membership', id: 'm-9', name: 'Hanne Vos' },
    decidedBy: null,
    memo: {
      __typename: 'Memo',
      roundName: 'Round 2027',
      runNumber: 3,
      costAxis: 'CAPITAL',
      certificateStatus: 'UNPROVEN',
      benefit: '40.0000',
      capital: euros('97740.00'),
      lifeCycleCost: euros('136417.00'),
      ceiling: euros('100000.00'),
      spendable: euros('98000.00'),
      leftUnderCeiling: euros('260.00'),
      lines: [line],
      leftOut: [
        {
          __typename: 'MemoLeftOut',
          code: 'C-02',
          name: 'Bone densitometer',
          reason: 'Does not fit.',
          benefit: null,
          capital: null,
        },
      ],
      cautions: [{ __typename: 'MemoCaution', title: 'Recalls', text: 'Look at the public list.' }],
      assumptions: [{ __typename: 'MemoAssumption', name: 'Discount rate', text: '3.5 %' }],
      limitUses: [],
    },
    ...over,
  };
}

function page(selections: unknown[]) {
  const { id, name, decisionDate, counts } = aRound();
  return {
    round: { __typename: 'Round', id, name, decisionDate, counts, selections },
    auditFeed: { __typename: 'AuditFeed', items: [] },
  };
}

const as = (role: 'FINANCE_DIRECTOR' | 'PURCHASING_COORDINATOR', answers: Parameters<typeof fakeLink>[0]) =>
  fakeLink({ Viewer: { viewer: aViewer({ roles: [role] }) }, ...answers });

const decided = { decideSelection: { __typename: 'Selection', id: 'sel-1', state: 'APPROVED', version: 3 } };

test('shows the memo with what it asks for, buys, leaves out and warns of', async () => {
  await renderRoute(PATH, as('FINANCE_DIRECTOR', { RoundSelection: page([aSelection()]) }));
  expect(await screen.findByRole('heading', { level: 1, name: 'Purchase of equipment' })).toBeVisible();
  expect(screen.getByText('1 of 46 candidates')).toBeVisible();
  expect(screen.getByText('Does not fit.')).toBeVisible();
  expect(screen.getByText('Look at the public list.', { exact: false })).toBeVisible();
  expect(screen.getByText(/not yet proven/u)).toBeVisible();
});

test('lets the finance director approve the very version that was read', async () => {
  const link = as('FINANCE_DIRECTOR', { RoundSelection: page([aSelection()]), DecideSelection: decided });
  const { user } = await renderRoute(PATH, link);
  await user.click(await screen.findByRole('button', { name: /^Approve 97\s740,00/u }));
  expect(link.asked.find(({ operation }) => operation === 'DecideSelection')?.variables).toEqual({
    input: { id: 'sel-1', version: 2, decision: 'APPROVE', comment: '' },
  });
});

test('asks for a comment before it returns or declines', async () => {
  const link = as('FINANCE_DIRECTOR', { RoundSelection: page([aSelection()]), DecideSelection: decided });
  const { user } = await renderRoute(PATH, link);
  await user.click(await screen.findByRole('button', { name: 'Decline' }));
  expect(screen.getByLabelText('Comment')).toHaveAccessibleDescription(/Write a comment/u);
  expect(link.asked.some(({ operation }) => operation === 'DecideSelection')).toBe(false);
  await user.type(screen.getByLabelText('Comment'), 'Too early.');
  await user.click(screen.getByRole('button', { name: 'Decline' }));
  expect(link.asked.find(({ operation }) => operation === 'DecideSelection')?.variables).toMatchObject({
    input: { decision: 'DECLINE', comment: 'Too early.' },
  });
});

test('shows a refusal beside the decision and keeps the comment', async () => {
  const message = 'This portfolio was decided already.';
  const link = as('FINANCE_DIRECTOR', {
    RoundSelection: page([aSelection()]),
    DecideSelection: { decideSelection: { __typename: 'SelectionAlreadyDecided', message } },
  });
  const { user } = await renderRoute(PATH, link);
  await user.type(await screen.findByLabelText('Comment'), 'Good.');
  await user.click(screen.getByRole('button', { name: /^Approve/u }));
  expect(await screen.findByRole('alert')).toHaveTextContent(message);
  expect(screen.getByLabelText('Comment')).toHaveValue('Good.');
});

test('keeps the refusal in sight where somebody else has decided meanwhile', async () => {
  const message = 'This portfolio was decided already.';
  let decidedElsewhere = false;
  const link = as('FINANCE_DIRECTOR', {
    RoundSelection: () => page([aSelection(decidedElsewhere ? { state: 'APPROVED', version: 3 } : {})]),
    DecideSelection: () => {
      decidedElsewhere = true;
      return { decideSelection: { __typename: 'SelectionAlreadyDecided', message } };
    },
  });
  const { user } = await renderRoute(PATH, link);
  await user.click(await screen.findByRole('button', { name: /^Approve/u }));
  expect(await screen.findByRole('alert')).toHaveTextContent(message);
  await waitFor(() => expect(screen.queryByRole('button', { name: /^Approve/u })).not.toBeInTheDocument());
  expect(screen.getByRole('alert')).toHaveTextContent(message);
});

test('offers no decision to the coordinator, nor to who submitted it', async () => {
  const own = aSelection({ submittedBy: { __typename: 'Membership', id: 'm-1', name: 'Hanne Vos' } });
  const first = await renderRoute(
    PATH,
    as('PURCHASING_COORDINATOR', { RoundSelection: page([aSelection()]) }),
  );
  await screen.findByRole('heading', { level: 1 });
  expect(screen.queryByRole('button', { name: /^Approve/u })).not.toBeInTheDocument();
  first.unmount();
  await renderRoute(PATH, as('FINANCE_DIRECTOR', { RoundSelection: page([own]) }));
  const box = within(await screen.findByRole('region', { name: 'Your decision' }));
  expect(box.getByText(/somebody else has to decide/u)).toBeVisible();
});

test('says what belongs here before anything was submitted', async () => {
  await renderRoute(PATH, as('FINANCE_DIRECTOR', { RoundSelection: page([]) }));
  expect(await screen.findByText('No portfolio has been sent for approval yet')).toBeVisible();
});
