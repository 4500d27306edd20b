import { expect, it } from 'vitest';
import { megabytes, whyNotAccepted } from './upload-rules';

const MB = 1024 * 1024;

it.each(['offer.pdf', 'OFFER.PDF', 'prices.xlsx', 'prices.csv', 'scan.png', 'photo.jpg', 'photo.jpeg'])(
  'lets %s be sent',
  (name) => expect(whyNotAccepted({ name, size: 20 * MB })).toBeUndefined(),
);

it.each(['terms.docx', 'offer', 'offer.pdf.exe', '.pdf'])('refuses %s for its type', (name) =>
  expect(whyNotAccepted({ name, size: 10 })).toBe(
    `“${name}” is of a type that is not accepted. Accepted are PDF, XLSX, CSV, PNG and JPG files of up to 20\u00a0MB.`,
  ),
);

it('refuses what is empty', () => expect(whyNotAccepted({ name: 'a.pdf', size: 0 })).toContain('is empty'));

it('says how large a file is that is a byte too large', () =>
  expect(whyNotAccepted({ name: 'a.pdf', size: 20 * MB + 1 })).toContain(
    'has 20.1\u00a0MB, which is too large',
  ));

it('rounds sizes up', () => expect(megabytes(1)).toBe('0.1\u00a0MB'));
