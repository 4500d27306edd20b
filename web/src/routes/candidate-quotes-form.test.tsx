import { fireEvent, screen, waitFor, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { refusal } from '../test/fake-link';
import { PATH, answers, inputOf, openPage, oslander, plain, press } from '../test/open-candidate-quotes';
import { aCandidateWithQuotes, aDocument, euros } from '../test/quote-factories';

describe('the form of a quote', () => {
  const saved = { ...oslander, cost: { __typename: 'QuoteCost', lifeCycleCost: euros('128200.00') } };

  async function fill(over: Record<string, string> = {}) {
    const dialog = await screen.findByRole('dialog');
    const texts = {
      Vendor: 'Oslander',
      'Quote number': 'Q-2731',
      'Date of the quote': '2026-11-01',
      'Valid until': '2027-06-30',
      'Price of one piece': '62.000,50',
      Warranty: '2',
      'Delivery time': '12',
      ...over,
    };
    for (const [label, value] of Object.entries(texts))
      fireEvent.change(within(dialog).getByLabelText(label), { target: { value } });
    return dialog;
  }
  const save = (user: Awaited<ReturnType<typeof openPage>>['user']) =>
    user.click(screen.getByRole('button', { name: 'Save the quote' }));

  it('saves the figures of a document and says at once what they come to', async () => {
    const given = answers(aCandidateWithQuotes([oslander], { documents: [aDocument()] }), {
      CreateQuote: { createQuote: saved },
    });
    const { user, link, where } = await openPage(given);
    await press('Enter its figures, oslander-offer.pdf');
    expect(where()).toContain('?quote=new&document=document-1');
    await fill();
    await save(user);
    await waitFor(() => expect(where()).toBe(PATH));
    expect(inputOf(link, 'CreateQuote')).toMatchObject({
      candidateId: 'candidate-2',
      fields: {
        ...{ vendorName: 'Oslander', number: 'Q-2731', quoteDate: '2026-11-01', unitPrice: '62000.50' },
        ...{ currency: 'EUR', delivery: '0.00', serviceYearly: null, documentId: 'document-1' },
      },
    });
    const news = await screen.findAllByText(/Life-cycle cost/);
    expect(news.map(({ textContent }) => plain(textContent))).toContain(
      'Oslander Q-2731 saved. Life-cycle cost 128 200,00 €',
    );
  });

  it('names what is missing beside the field and on top, where the focus goes', async () => {
    const { user, link } = await openPage(answers(aCandidateWithQuotes([oslander])), `${PATH}?quote=new`);
    const dialog = await screen.findByRole('dialog');
    await save(user);
    const summary = within(dialog).getByRole('alert');
    expect(summary).toHaveTextContent('Write the vendor.');
    expect(within(dialog).getByLabelText('Vendor')).toHaveAccessibleDescription('Write the vendor.');
    expect(summary.parentElement).toHaveFocus();
    await user.click(within(summary).getByRole('button', { name: 'Write the vendor.' }));
    expect(within(dialog).getByLabelText('Vendor')).toHaveFocus();
    expect(inputOf(link, 'CreateQuote')).toBeUndefined();
  });

  it.each([
    ['UnknownCurrency', 'Currency'],
    ['QuoteNumberTaken', 'Quote number'],
    ['QuoteDatesReversed', 'Valid until'],
    ['DiscountExceedsPrice', 'Discount on the whole'],
  ])('shows the refusal %s beside its field and keeps what was typed', async (__typename, label) => {
    const message = 'So it cannot be saved.';
    const given = answers(aCandidateWithQuotes([oslander]), {
      CreateQuote: { createQuote: { __typename, message } },
    });
    const { user } = await openPage(given, `${PATH}?quote=new`);
    const dialog = await fill();
    await save(user);
    await waitFor(() =>
      expect(within(dialog).getByLabelText(label)).toHaveAccessibleDescription(
        expect.stringContaining(message),
      ),
    );
    expect(within(dialog).getByLabelText('Vendor')).toHaveValue('Oslander');
  });

  it('puts a field the API refuses by name beside that field, in the words of the screen', async () => {
    const refused = Object.assign(new Error('no'), {
      extensions: {
        code: 'BAD_USER_INPUT',
        fields: [{ field: 'fields.leadWeeks', message: 'leadWeeks must not be greater than 520.' }],
      },
    });
    const given = answers(aCandidateWithQuotes([oslander]), {
      CreateQuote: () => {
        throw refused;
      },
    });
    const { user } = await openPage(given, `${PATH}?quote=new`);
    const dialog = await fill({ 'Delivery time': '999' });
    await save(user);
    await waitFor(() =>
      expect(within(dialog).getByLabelText('Delivery time')).toHaveAccessibleDescription(
        expect.stringContaining('Delivery time must not be greater than 520.'),
      ),
    );
  });

  it('keeps both sides when somebody else saved in between, and saves over it only when told', async () => {
    let now = oslander;
    const given = answers(() => aCandidateWithQuotes([now]), {
      UpdateQuote: ({ input }) => {
        if ((input as { version: number }).version < now.version) throw refusal('CONFLICT');
        return { updateQuote: saved };
      },
    });
    const { user, link, where } = await openPage(given);
    await press('Change quote Q-2731');
    const dialog = await screen.findByRole('dialog', { name: 'Change quote Q-2731' });
    await user.type(within(dialog).getByLabelText('Payment terms'), ' net');
    now = { ...oslander, version: 2, leadWeeks: 20 };
    await save(user);
    expect(await within(dialog).findByText(/^Somebody else has changed this quote/)).toBeVisible();
    expect(await within(dialog).findByText('20')).toBeVisible();
    expect(within(dialog).getByLabelText('Payment terms')).toHaveValue('30 days net');
    await user.click(within(dialog).getByRole('button', { name: 'Go on with mine' }));
    await save(user);
    await waitFor(() => expect(where()).toBe(PATH));
    expect(inputOf(link, 'UpdateQuote')).toMatchObject({
      version: 2,
      fields: { leadWeeks: 12, paymentTerms: '30 days net' },
    });
  });

  it('asks before it is closed with figures that are not saved', async () => {
    const { user, where } = await openPage(answers(aCandidateWithQuotes([oslander])), `${PATH}?quote=new`);
    const dialog = await screen.findByRole('dialog');
    await user.type(within(dialog).getByLabelText('Vendor'), 'Os');
    await user.click(within(dialog).getByRole('button', { name: 'Cancel' }));
    const question = await screen.findByRole('dialog', { name: 'The figures are not saved yet' });
    expect(where()).toContain('quote=new');
    await user.click(within(question).getByRole('button', { name: 'Discard them' }));
    await waitFor(() => expect(where()).toBe(PATH));
  });
});
