import { createServer } from 'node:http';
import { simpleParser } from 'mailparser';
import { SMTPServer } from 'smtp-server';

// Stands in for a mail server during development and tests: takes every letter, sends none on, shows all.
// SMTP_PORT and INBOX_PORT choose the ports; without them free ones are taken and printed.

const keepAtMost = 500;
const letters = [];

const smtp = new SMTPServer({
  authOptional: true,
  disabledCommands: ['STARTTLS'],
  size: 10 * 1024 * 1024,
  onData: (stream, session, done) => void receive(stream, session).then(() => done(), done),
});
const page = createServer((request, response) =>
  answer(new URL(request.url, 'http://inbox').pathname, response),
);

const smtpPort = await listen(smtp, smtp.server, process.env.SMTP_PORT);
const pagePort = await listen(page, page, process.env.INBOX_PORT);
console.log(`ready on http://127.0.0.1:${pagePort} with SMTP on port ${smtpPort}`);

process.once('SIGTERM', () => process.exit(0));

function listen(listener, server, port) {
  return new Promise((resolve, reject) => {
    server.once('error', reject);
    listener.listen(Number(port ?? 0), '127.0.0.1', () => resolve(server.address().port));
  });
}

async function receive(stream, session) {
  const letter = await simpleParser(stream);
  letters.push({
    id: letters.length === 0 ? 1 : letters.at(-1).id + 1,
    receivedAt: new Date().toISOString(),
    from: letter.from?.text ?? '',
    to: session.envelope.rcptTo.map(({ address }) => address),
    subject: letter.subject ?? '',
    text: letter.text ?? '',
  });
  if (letters.length > keepAtMost) letters.shift();
}

function answer(path, response) {
  response.setHeader('x-content-type-options', 'nosniff');
  response.setHeader('referrer-policy', 'no-referrer');
  response.setHeader('cache-control', 'no-store');
  response.setHeader(
    'content-security-policy',
    "default-src 'none'; style-src 'unsafe-inline'; base-uri 'none'; form-action 'none'; frame-ancestors 'none'",
  );
  if (path === '/api/letters') return send(response, 200, 'application/json', JSON.stringify(letters));
  if (path === '/') return send(response, 200, 'text/html', inbox());
  return send(response, 404, 'text/plain', 'There is only / and /api/letters.\n');
}

function send(response, status, type, body) {
  response.writeHead(status, { 'content-type': `${type}; charset=utf-8` }).end(body);
}

function inbox() {
  return `<!doctype html>
<html lang="en">
<meta charset="utf-8">
<meta name="viewport" content="width=device-width">
<title>Inbox for trying out (${letters.length})</title>
<style>
  body { font: 16px/1.5 system-ui, sans-serif; max-width: 48rem; margin: 2rem auto; padding: 0 1rem; color-scheme: light dark }
  article { border-top: 1px solid; padding: 1rem 0 } h2 { font-size: 1.1rem; margin: 0 }
  pre { white-space: pre-wrap; overflow-wrap: anywhere; font: inherit }
</style>
<h1>Inbox for trying out</h1>
<p>Every letter the product sends ends here and nowhere else; reload the page to look again.</p>
${letters.length === 0 ? '<p>No letter yet.</p>' : letters.toReversed().map(article).join('\n')}
</html>
`;
}

function article({ id, receivedAt, from, to, subject, text }) {
  return `<article id="letter-${id}">
<h2>${escaped(subject)}</h2>
<p>From ${escaped(from)} to ${escaped(to.join(', '))}, <time>${receivedAt}</time></p>
<pre>${withLinks(text)}</pre>
</article>`;
}

/** Only http and https addresses become links; everything, the address included, is escaped. */
function withLinks(text) {
  return text
    .split(/(https?:\/\/[^\s<>"']*[^\s<>"'.,;:!?)\]])/)
    .map((part, i) =>
      i % 2 === 0 ? escaped(part) : `<a href="${escaped(part)}" rel="noreferrer">${escaped(part)}</a>`,
    )
    .join('');
}

function escaped(text) {
  const entities = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;', "'": '&#39;' };
  return text.replace(/[&<>"']/g, (character) => entities[character]);
}
