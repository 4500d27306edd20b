import { createHash } from 'node:crypto';
import { TestApp, type Member } from './app.js';
import { aDemoOrganisation, asOwner, inOrganisation, type DemoOrganisation } from './demo-organisation.js';
import { CSV, PDF, PNG, XLSX, XLSX_TYPE } from './sample-files.js';

const START = `mutation ($input: StartUploadInput!) {
  startUpload(input: $input) {
    __typename ... on UploadSlot { url fields { name value } document { id fileName contentType sizeBytes state sha256 } } ... on UploadRefused { message }
  }
}`;
const FINISH = `mutation ($id: ID!) {
  finishUpload(documentId: $id) { __typename ... on Document { id state sha256 uploadedBy { name } quoteId } ... on UploadRefused { message } }
}`;
const OPEN = 'mutation ($id: ID!) { openDocument(id: $id) { url } }';
const DOCUMENTS = `query ($id: ID!) {
  candidate(id: $id) { documents { id fileName state quoteId } quotes { id documents { id } } }
}`;
const ATTACH = `mutation ($input: CreateQuoteInput!) { createQuote(input: $input) { __typename ... on Quote { id documents { id fileName } } } }`;

interface Slot {
  url: string;
  fields: { name: string; value: string }[];
  document: { id: string };
}

let app: TestApp;
let organisation: DemoOrganisation;
let other: DemoOrganisation;
let coordinator: Member;
let auditor: Member;

beforeAll(async () => {
  app = await TestApp.start();
  organisation = await aDemoOrganisation('T1', { stage: 'GATHER' });
  other = await aDemoOrganisation('T2');
  coordinator = await app.as(organisation.email('PURCHASING_COORDINATOR'));
  auditor = await app.as(organisation.email('AUDITOR'));
});
afterAll(() => app.stop());

const start = async (
  code: string,
  fileName: string,
  contentType: string,
  sizeBytes: number,
  member = coordinator,
) =>
  (
    await member.get(START, {
      input: { candidateId: organisation.candidate(code), fileName, contentType, sizeBytes },
    })
  ).startUpload;

/** As a browser does it: the fields of the slot, then the file. */
async function send({ url, fields }: Slot, bytes: Buffer) {
  const form = new FormData();
  for (const { name, value } of fields) form.append(name, value);
  form.append('file', new Blob([new Uint8Array(bytes)]));
  const { status } = await fetch(url, { method: 'POST', body: form });
  expect(status).toBe(204);
}

const finish = async (id: string) => (await coordinator.get(FINISH, { id })).finishUpload;
const documentsOf = async (code: string) =>
  (await coordinator.get(DOCUMENTS, { id: organisation.candidate(code) })).candidate;

async function upload(code: string, fileName: string, contentType: string, bytes: Buffer): Promise<string> {
  const slot = await start(code, fileName, contentType, bytes.length);
  await send(slot, bytes);
  await finish(slot.document.id);
  return slot.document.id;
}

const rowOf = async (id: string) =>
  (
    await asOwner((client) =>
      inOrganisation(client, organisation.id, 'select state from metewand.document where id = $1', [id]),
    )
  )[0];

/** The keys in the store that hold an id. The stand-in asks for no signature, so the test can look itself. */
async function keysOf(id: string): Promise<string[]> {
  const address = `${process.env.S3_ENDPOINT}/metewand?list-type=2&prefix=t/${organisation.id}/`;
  const listing = await (await fetch(address)).text();
  return [...listing.matchAll(/<Key>t\/[^/]+\/([^<]+)<\/Key>/g)]
    .map(([, key]) => key)
    .filter((key) => key.includes(id));
}

describe('an upload', () => {
  it('goes straight to a slot, and is kept once it is checked', async () => {
    const slot = await start('C01', 'offers/Größe 1.pdf', 'application/pdf', PDF.length);
    expect(slot.document).toMatchObject({
      fileName: 'Größe 1.pdf',
      contentType: 'application/pdf',
      sizeBytes: PDF.length,
      state: 'EXPECTED',
      sha256: null,
    });
    const { id } = slot.document;
    expect((await documentsOf('C01')).documents).toEqual([]);
    await send(slot, PDF);
    const sha256 = createHash('sha256').update(PDF).digest('hex');
    const kept = {
      __typename: 'Document',
      id,
      state: 'READY',
      sha256,
      uploadedBy: { name: 'Hanne Vos' },
      quoteId: null,
    };
    expect(await finish(id)).toEqual(kept);
    expect(await finish(id)).toEqual(kept);
    expect((await documentsOf('C01')).documents).toMatchObject([
      { id, fileName: 'Größe 1.pdf', state: 'READY' },
    ]);
    expect(await keysOf(id)).toEqual([`documents/${id}/${sha256}`]);
  });

  it('is bound to one key, one content type, at most 20 MB and ten minutes', async () => {
    const { fields, document } = (await start('C01', 'a.pdf', 'application/pdf', 10)) as Slot;
    const policy = fields.find(({ name }) => name === 'Policy')?.value ?? '';
    const { conditions, expiration } = JSON.parse(Buffer.from(policy, 'base64').toString());
    expect(conditions).toEqual(
      expect.arrayContaining([
        ['content-length-range', 1, 20 * 1024 * 1024],
        { key: `t/${organisation.id}/slot/${document.id}` },
        { 'Content-Type': 'application/pdf' },
        { bucket: 'metewand' },
      ]),
    );
    const minutes = (new Date(expiration as string).getTime() - Date.now()) / 60_000;
    expect(minutes).toBeGreaterThan(9);
    expect(minutes).toBeLessThanOrEqual(10);
  });

  it.each([
    ['prices.xlsx', XLSX_TYPE, XLSX],
    ['prices.csv', 'application/vnd.ms-excel', CSV],
    ['plan.png', 'image/png', PNG],
  ])('takes %s', async (fileName, contentType, bytes) => {
    const id = await upload('C02', fileName, contentType, bytes);
    expect(await rowOf(id)).toEqual({ state: 'READY' });
  });

  it.each([
    [
      'a type that is not accepted',
      'tool.exe',
      'application/x-msdownload',
      100,
      'is of a type that is not accepted',
    ],
    ['a page in disguise', 'offer.pdf', 'text/html', 100, 'is of a type that is not accepted'],
    [
      'more than 20 MB',
      'offer.pdf',
      'application/pdf',
      20 * 1024 * 1024 + 1,
      'has 20.1 MB, which is too large',
    ],
    ['an empty file', 'offer.pdf', 'application/pdf', 0, 'is empty'],
  ])('is refused before it starts for %s', async (_case, fileName, contentType, sizeBytes, words) => {
    const refused = await start('C03', fileName, contentType, sizeBytes);
    expect(refused).toEqual({ __typename: 'UploadRefused', message: expect.stringContaining(words) });
    expect(refused.message).toContain('PDF, XLSX, CSV, PNG and JPG files of up to 20 MB');
    const rows = await asOwner((client) =>
      inOrganisation(client, organisation.id, 'select 1 from metewand.document where candidate_id = $1', [
        organisation.candidate('C03'),
      ]),
    );
    expect(rows).toEqual([]);
  });

  it.each([
    [
      'holds something else than its name says',
      'offer.pdf',
      'application/pdf',
      PNG,
      PNG.length,
      'is not what its name says',
    ],
    [
      'is text but no CSV in UTF-8',
      'offer.csv',
      'text/csv',
      Buffer.from('Gr\xf6\xdfe', 'latin1'),
      5,
      'is not what its name says',
    ],
    [
      'is of another size than announced',
      'offer.pdf',
      'application/pdf',
      PDF,
      PDF.length - 1,
      'its size is not the one announced',
    ],
    [
      'is larger than allowed, whatever was announced',
      'offer.pdf',
      'application/pdf',
      Buffer.concat([PDF, Buffer.alloc(20 * 1024 * 1024)]),
      20 * 1024 * 1024,
      'its size is not the one announced',
    ],
  ])('is thrown away when it %s', async (_case, fileName, contentType, bytes, sizeBytes, words) => {
    const slot = await start('C04', fileName, contentType, sizeBytes);
    const { id } = slot.document;
    await send(slot, bytes);
    expect(await keysOf(id)).toEqual([`slot/${id}`]);
    expect(await finish(id)).toEqual({
      __typename: 'UploadRefused',
      message: expect.stringContaining(words),
    });
    expect(await rowOf(id)).toBeUndefined();
    expect(await keysOf(id)).toEqual([]);
    expect((await coordinator.ask(FINISH, { id })).errors?.[0].extensions.code).toBe('NOT_FOUND');
  });

  it('is kept once, however often it is finished at the same time', async () => {
    const slot = await start('C04', 'offer.pdf', 'application/pdf', PDF.length);
    await send(slot, PDF);
    const { id } = slot.document;
    const answers = await Promise.all(Array.from({ length: 8 }, () => finish(id)));
    expect(answers.map(({ __typename, state }) => [__typename, state])).toEqual(
      answers.map(() => ['Document', 'READY']),
    );
    expect(await keysOf(id)).toEqual([`documents/${id}/${answers[0].sha256}`]);
  });

  it('is refused when nothing was sent', async () => {
    const { document } = await start('C04', 'offer.pdf', 'application/pdf', 10);
    expect(await finish(document.id)).toEqual({
      __typename: 'UploadRefused',
      message: expect.stringContaining('did not arrive'),
    });
  });

  it('is refused once a portfolio is submitted', async () => {
    const frozen = await aDemoOrganisation('T1', { stage: 'DECIDE' });
    const member = await app.as(frozen.email('PURCHASING_COORDINATOR'));
    const input = {
      candidateId: frozen.candidate('C01'),
      fileName: 'a.pdf',
      contentType: 'application/pdf',
      sizeBytes: 1,
    };
    expect((await member.ask(START, { input })).errors?.[0].extensions.code).toBe('WRONG_STAGE');
  });

  it('is for the coordinator, and for candidates of the own organisation', async () => {
    const input = { fileName: 'a.pdf', contentType: 'application/pdf', sizeBytes: 1 };
    const own = { input: { ...input, candidateId: organisation.candidate('C01') } };
    const foreign = { input: { ...input, candidateId: other.candidate('D01') } };
    expect((await auditor.ask(START, own)).errors?.[0].extensions.code).toBe('FORBIDDEN');
    expect((await coordinator.ask(START, foreign)).errors?.[0].extensions.code).toBe('NOT_FOUND');
  });
});

describe('opening a document', () => {
  it('gives a link for a minute that saves the file under its name, and writes it down', async () => {
    const id = await upload('C05', 'Größe 1.pdf', 'application/pdf', PDF);
    const { openDocument } = await auditor.get(OPEN, { id });
    const link = new URL(openDocument.url as string);
    expect(Object.fromEntries(link.searchParams)).toMatchObject({
      'X-Amz-Expires': '60',
      'response-content-disposition': `attachment; filename*=UTF-8''Gr%C3%B6%C3%9Fe%201.pdf`,
      'response-content-type': 'application/pdf',
    });
    const response = await fetch(link);
    expect(Buffer.from(await response.arrayBuffer())).toEqual(PDF);
    const { auditFeed } = await auditor.get('{ auditFeed(first: 1) { items { sentence by { name } } } }');
    expect(auditFeed.items).toEqual([
      { sentence: 'Document Größe 1.pdf opened', by: { name: 'Edda Brandt' } },
    ]);
  });

  it('knows no document that is still expected, of another organisation, or that never was', async () => {
    const { document } = await start('C05', 'offer.pdf', 'application/pdf', 10);
    const ready = await upload('C05', 'offer.pdf', 'application/pdf', PDF);
    const stranger = await app.as(other.email('PURCHASING_COORDINATOR'));
    const unknown = '00000000-0000-4000-8000-000000000000';
    const refused = [
      await coordinator.ask(OPEN, { id: document.id }),
      await stranger.ask(OPEN, { id: ready }),
      await stranger.ask(FINISH, { id: ready }),
      await coordinator.ask(OPEN, { id: unknown }),
    ];
    const answers = refused.map(({ errors }) => errors?.[0].message.replace(/[0-9a-f-]{36}/, 'ID'));
    expect(new Set(answers)).toEqual(new Set(['No document with id ID.']));
  });
});

describe('a document behind a quote', () => {
  const fields = {
    vendorName: 'Halvard Medical (demo)',
    number: 'HM-1',
    quoteDate: '2027-01-04',
    validUntil: '2027-06-30',
    currency: 'EUR',
    pricesIncludeVat: false,
    unitPrice: '1000.00',
    quantity: 1,
    delivery: '0',
    installation: '0',
    training: '0',
    discount: '0',
    warrantyYears: 1,
    serviceTier: '',
    serviceYearly: '120',
    leadWeeks: 6,
    incoterm: 'DAP',
    namedPlace: 'Ostermere Clinic',
    paymentTerms: '30 days net',
  };
  const attach = (code: string, documentId: string) =>
    coordinator.ask(ATTACH, {
      input: { candidateId: organisation.candidate(code), fields: { ...fields, documentId } },
    });

  it('is attached with the quote’s figures', async () => {
    const documentId = await upload('C06', 'quote.pdf', 'application/pdf', PDF);
    const { data } = await attach('C06', documentId);
    expect(data.createQuote.documents).toEqual([{ id: documentId, fileName: 'quote.pdf' }]);
    const { documents, quotes } = await documentsOf('C06');
    expect(documents).toMatchObject([{ id: documentId, quoteId: data.createQuote.id }]);
    expect(quotes).toContainEqual({ id: data.createQuote.id, documents: [{ id: documentId }] });
  });

  it('is one of the same candidate that has been checked, or the quote is not saved', async () => {
    const elsewhere = await upload('C07', 'quote.pdf', 'application/pdf', PDF);
    const { document } = await start('C08', 'quote.pdf', 'application/pdf', PDF.length);
    const before = (await documentsOf('C08')).quotes.length;
    for (const documentId of [elsewhere, document.id]) {
      const { errors } = await attach('C08', documentId);
      expect(errors?.[0]).toMatchObject({
        message: `No document with id ${documentId}.`,
        extensions: { code: 'NOT_FOUND' },
      });
    }
    expect((await documentsOf('C08')).quotes).toHaveLength(before);
  });
});
