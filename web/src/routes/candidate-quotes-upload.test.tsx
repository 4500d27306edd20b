import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { screen, waitFor } from '@testing-library/react';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { answers, inputOf, openPage, oslander } from '../test/open-candidate-quotes';
import { aCandidateWithQuotes, aDocument } from '../test/quote-factories';

describe('uploading a document', () => {
  let status = 204;
  const store = createServer((request, response) => {
    response.setHeader('access-control-allow-origin', '*');
    request.resume().on('end', () => response.writeHead(request.method === 'OPTIONS' ? 204 : status).end());
  });
  beforeAll(() => new Promise<void>((resolve) => store.listen(0, '127.0.0.1', resolve)));
  afterAll(() => store.close());

  const slot = () => ({
    startUpload: {
      __typename: 'UploadSlot',
      url: `http://127.0.0.1:${(store.address() as AddressInfo).port}/bucket`,
      fields: [{ __typename: 'FormField', name: 'key', value: 'slot/1' }],
      document: { __typename: 'Document', id: 'document-1' },
    },
  });
  const pdf = () => new File(['%PDF-1.4'], 'oslander-offer.pdf', { type: 'application/pdf' });

  it('sends it to the store, has it checked, and shows it among the documents', async () => {
    let documents: ReturnType<typeof aDocument>[] = [];
    const given = answers(() => aCandidateWithQuotes([oslander], { documents }), {
      StartUpload: slot,
      FinishUpload: () => {
        documents = [aDocument()];
        return { finishUpload: { __typename: 'Document', id: 'document-1', state: 'READY' } };
      },
    });
    const { user, link } = await openPage(given);
    status = 204;
    await user.upload(screen.getByLabelText('Quotes to upload'), pdf());
    expect(await screen.findByRole('button', { name: 'Download oslander-offer.pdf' })).toBeVisible();
    expect(inputOf(link, 'StartUpload')).toEqual({
      candidateId: 'candidate-2',
      fileName: 'oslander-offer.pdf',
      contentType: 'application/pdf',
      sizeBytes: 8,
    });
  });

  it('says the API’s reason when the content is refused', async () => {
    const message = 'The content of “oslander-offer.pdf” is not what its name says. Nothing was kept.';
    const given = answers(aCandidateWithQuotes([oslander]), {
      StartUpload: slot,
      FinishUpload: { finishUpload: { __typename: 'UploadRefused', message } },
    });
    const { user } = await openPage(given);
    status = 204;
    await user.upload(screen.getByLabelText('Quotes to upload'), pdf());
    expect(await screen.findByText(message)).toBeVisible();
    expect(screen.queryByRole('button', { name: 'Send again' })).toBeNull();
  });

  it('can be sent again when it did not arrive', async () => {
    const given = answers(aCandidateWithQuotes([oslander]), {
      StartUpload: slot,
      FinishUpload: { finishUpload: { __typename: 'Document', id: 'document-1', state: 'READY' } },
    });
    const { user } = await openPage(given);
    status = 503;
    await user.upload(screen.getByLabelText('Quotes to upload'), pdf());
    expect(await screen.findByText(/^It did not arrive/)).toBeVisible();
    status = 204;
    await user.click(screen.getByRole('button', { name: 'Send again' }));
    await waitFor(() => expect(screen.queryByRole('list', { name: 'Uploads' })).toBeNull());
  });

  it('refuses a wrong type before anything is sent', async () => {
    const { user, link } = await openPage(answers(aCandidateWithQuotes([oslander])));
    const input = screen.getByLabelText('Quotes to upload');
    input.removeAttribute('accept');
    await user.upload(input, new File(['x'], 'terms.docx'));
    expect(await screen.findByText(/“terms.docx” is of a type that is not accepted/)).toBeVisible();
    expect(inputOf(link, 'StartUpload')).toBeUndefined();
    await user.click(screen.getByRole('button', { name: 'Remove terms.docx from the list' }));
    expect(screen.queryByText(/not accepted/)).toBeNull();
  });
});
