import { attachmentNamed } from './attachment-name.js';

describe('attachmentNamed', () => {
  it('keeps a name of any script within one quoted-free header value', () => {
    expect(attachmentNamed('Größe 1.pdf')).toBe(`attachment; filename*=UTF-8''Gr%C3%B6%C3%9Fe%201.pdf`);
  });

  it('lets no sign of the name end the value or begin another', () => {
    expect(attachmentNamed(`a"; filename=b'(*).pdf`)).toBe(
      `attachment; filename*=UTF-8''a%22%3B%20filename%3Db%27%28%2A%29.pdf`,
    );
  });
});
