import { acceptFile, cleanFileName, LARGEST_FILE_BYTES } from './file-rules.js';

const announced = { fileName: 'quote.pdf', contentType: 'application/pdf', sizeBytes: 1_000 };

describe('acceptFile', () => {
  it.each([
    ['quote.pdf', 'application/pdf', 'application/pdf'],
    ['Prices.XLSX', 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet', undefined],
    ['prices.csv', 'application/vnd.ms-excel', 'text/csv'],
    ['prices.csv', '', 'text/csv'],
    ['plan.png', 'image/png', 'image/png'],
    ['photo.jpg', 'image/jpeg', 'image/jpeg'],
    ['photo.jpeg', 'IMAGE/JPEG', 'image/jpeg'],
  ])('takes %s sent as “%s”', (fileName, contentType, stored = contentType) => {
    expect(acceptFile({ ...announced, fileName, contentType })).toEqual({ fileName, contentType: stored });
  });

  it.each([
    ['quote.exe', 'application/pdf'],
    ['quote.pdf', 'text/html'],
    ['quote.pdf.html', 'text/html'],
    ['quote', 'application/pdf'],
    ['.pdf', 'application/pdf'],
    ['picture.svg', 'image/svg+xml'],
    ['quote.constructor', ''],
  ])('refuses %s sent as “%s” and names the types', (fileName, contentType) => {
    expect(acceptFile({ ...announced, fileName, contentType })).toEqual({
      refusal: expect.stringMatching(
        /not accepted\. Accepted are PDF, XLSX, CSV, PNG and JPG files of up to 20 MB\./,
      ),
    });
  });

  it('draws the line at 20 MB, and at nothing', () => {
    expect(acceptFile({ ...announced, sizeBytes: LARGEST_FILE_BYTES })).toHaveProperty('contentType');
    expect(acceptFile({ ...announced, sizeBytes: LARGEST_FILE_BYTES + 1 })).toEqual({
      refusal: expect.stringContaining('“quote.pdf” has 20.1 MB, which is too large.'),
    });
    expect(acceptFile({ ...announced, sizeBytes: 0 })).toEqual({
      refusal: expect.stringContaining('is empty'),
    });
  });
});

describe('cleanFileName', () => {
  it.each([
    ['C:\\Users\\x\\offer.pdf', 'offer.pdf'],
    ['../../etc/passwd', 'passwd'],
    ['a\r\nb\u0000.pdf', 'ab.pdf'],
    ['invoice\u202efdp.exe', 'invoicefdp.exe'],
    ['  two   words .pdf', 'two words .pdf'],
    ['Gro\u0308ße.pdf', 'Größe.pdf'],
    ['..hidden.pdf', 'hidden.pdf'],
  ])('makes of %j', (given, clean) => {
    expect(cleanFileName(given)).toBe(clean);
  });

  it('shortens a long name and keeps its ending', () => {
    expect(cleanFileName(`${'a'.repeat(500)}.pdf`)).toBe(`${'a'.repeat(196)}.pdf`);
  });
});
