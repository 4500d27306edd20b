import { CSV, JPG, PDF, PNG, XLSX, XLSX_TYPE, ZIP } from '../../test/sample-files.js';
import { isContentOf, sha256Of } from './file-content.js';

describe('isContentOf', () => {
  const files = [
    ['application/pdf', PDF],
    ['image/png', PNG],
    ['image/jpeg', JPG],
    [XLSX_TYPE, XLSX],
    ['text/csv', CSV],
  ] as const;

  it.each(files)('knows %s by its content, and no other for it', async (contentType, bytes) => {
    const found: string[] = [];
    for (const [other] of files) if (await isContentOf(bytes, other)) found.push(other);
    expect(found).toEqual([contentType]);
  });

  it('takes no other archive for a workbook', async () => {
    expect(await isContentOf(ZIP, XLSX_TYPE)).toBe(false);
  });

  it.each([
    ['text in another encoding', Buffer.from('Gr\xf6\xdfe;1', 'latin1')],
    ['text with a NUL', Buffer.from('a;b\0')],
    ['a program', Buffer.from('4d5a90000300', 'hex')],
  ])('takes no %s for CSV', async (_case, bytes) => {
    expect(await isContentOf(bytes, 'text/csv')).toBe(false);
  });

  it('is not misled by a damaged archive', async () => {
    expect(await isContentOf(XLSX.subarray(0, 40), XLSX_TYPE)).toBe(false);
  });
});

describe('sha256Of', () => {
  it('gives the published digest of “abc” (FIPS 180-4)', () => {
    expect(sha256Of(Buffer.from('abc'))).toBe(
      'ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad',
    );
  });
});
