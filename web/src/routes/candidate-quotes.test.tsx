import { screen, waitFor, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import {
  answers,
  inputOf,
  openPage,
  oslander,
  pellworth,
  plain,
  press,
  quillmoor,
} from '../test/open-candidate-quotes';
import { aCandidateWithQuotes } from '../test/quote-factories';

describe('the quotes of a candidate, side by side', () => {
  it('say whose they are and lead to the candidates before and after', async () => {
    const { user, where } = await openPage(answers(aCandidateWithQuotes([oslander, quillmoor])));
    expect(screen.getByText('C-122 · Cardiology, Alder House · 2 quotes')).toBeVisible();
    expect(screen.getByRole('link', { name: 'Next candidate, C-123' })).toBeVisible();
    await user.click(screen.getByRole('link', { name: 'Previous candidate, C-121' }));
    await waitFor(() => expect(where()).toBe('/rounds/round-1/candidates/candidate-1/quotes'));
  });

  it('mark the lowest figure, a quote that ends too early, and a price that is missing', async () => {
    await openPage(answers(aCandidateWithQuotes([oslander, quillmoor, pellworth])));
    const table = screen.getByRole('table', { name: 'The quotes side by side' });
    const cells = (name: RegExp) =>
      within(within(table).getByRole('row', { name }))
        .getAllByRole('cell')
        .map((cell) => plain(cell.textContent));
    expect(cells(/^Acquisition/)).toEqual(['78 200,00', '71 900,00 lowest', '92 600,00']);
    expect(cells(/^Service/)).toEqual(['31 200,00 lowest', '39 800,00', '— no price named']);
    expect(cells(/^Life-cycle cost/)).toEqual([
      '103 000,00 lowest',
      '107 800,00',
      '83 500,00without service',
    ]);
    expect(cells(/^Against the lowest/)).toEqual(['lowest', '+4 800,00', '— not comparable without service']);
    expect(cells(/^Valid until/)[1]).toBe('7 Apr 2027, too early');
  });

  it('open each figure into its formula and what goes into it', async () => {
    const { user } = await openPage(answers(aCandidateWithQuotes([oslander])));
    const opener = screen.getByRole('button', { name: 'Service' });
    expect(opener).toHaveAttribute('aria-expanded', 'false');
    await user.click(opener);
    expect(opener).toHaveAttribute('aria-expanded', 'true');
    expect(screen.getByText(/^Yearly service × exchange rate × sum of the discount factors/)).toBeVisible();
    expect(screen.getByText('3 to 8, after 2 of warranty')).toBeVisible();
  });

  it('give their place to what belongs there while none has come in', async () => {
    await openPage(answers(aCandidateWithQuotes([])));
    expect(screen.getByRole('heading', { name: 'Lay the first quote along the rod' })).toBeVisible();
    await press('Enter a quote');
    expect(await screen.findByRole('dialog', { name: 'Enter a quote' })).toBeVisible();
  });

  it('can only be read by those who do not purchase', async () => {
    await openPage(answers(aCandidateWithQuotes([oslander]), {}, ['AUDITOR']));
    expect(screen.queryByRole('button', { name: /Enter|Change|Keep|choose files/ })).toBeNull();
  });

  it('are frozen once a portfolio is submitted', async () => {
    await openPage(answers(aCandidateWithQuotes([oslander], { stage: 'DECIDE' })));
    expect(screen.getByText('The quotes of this round are frozen')).toBeVisible();
    expect(screen.queryByRole('button', { name: /Enter|Change|Keep|choose files/ })).toBeNull();
  });
});

describe('keeping a quote', () => {
  const both = [oslander, quillmoor];

  it('tells the round’s rule from a choice by hand', async () => {
    await openPage(answers(aCandidateWithQuotes(both)));
    expect(screen.getByText(/^Oslander Q-2731 is in force by the round’s rule/)).toBeVisible();
    expect(screen.queryByRole('button', { name: 'Back to the rule' })).toBeNull();
  });

  it('wants a reason', async () => {
    const { user, link } = await openPage(answers(aCandidateWithQuotes(both)));
    await user.click(screen.getByRole('button', { name: 'Keep Oslander' }));
    expect(screen.getByLabelText('Reason')).toHaveAccessibleDescription(/Write in a sentence/);
    expect(inputOf(link, 'KeepQuote')).toBeUndefined();
  });

  it('shows why another one cannot be kept, with the reason still there', async () => {
    const message = 'Quote Q-2684 cannot be kept: it runs out on 2027-04-07.';
    const given = answers(aCandidateWithQuotes(both), {
      KeepQuote: { keepQuote: { __typename: 'QuoteNotUsable', message } },
    });
    const { user, link } = await openPage(given);
    await user.click(screen.getByRole('button', { name: 'Choose another' }));
    await user.click(screen.getByRole('radio', { name: /Quillmoor/ }));
    await user.type(screen.getByLabelText('Reason'), 'Cheaper to buy.');
    await user.click(screen.getByRole('button', { name: 'Keep Quillmoor' }));
    await waitFor(() => expect(screen.getByLabelText('Reason')).toHaveAccessibleDescription(message));
    expect(screen.getByLabelText('Reason')).toHaveValue('Cheaper to buy.');
    expect(inputOf(link, 'KeepQuote')).toEqual({
      candidateId: 'candidate-2',
      quoteId: quillmoor.id,
      reason: 'Cheaper to buy.',
      version: 3,
    });
  });

  it('goes back to the rule', async () => {
    const kept = aCandidateWithQuotes(both, { keptReason: 'Fast service.', quoteInForceReason: 'KEPT' });
    const given = answers(kept, {
      KeepQuote: { keepQuote: { __typename: 'Candidate', id: 'candidate-2', version: 4, keptReason: '' } },
    });
    const { user, link } = await openPage(given);
    expect(screen.getByText('Oslander Q-2731 is kept by hand.')).toBeVisible();
    expect(screen.getByLabelText('Reason')).toHaveValue('Fast service.');
    await user.click(screen.getByRole('button', { name: 'Back to the rule' }));
    await waitFor(() => expect(inputOf(link, 'KeepQuote')).toMatchObject({ quoteId: null, reason: '' }));
  });
});
