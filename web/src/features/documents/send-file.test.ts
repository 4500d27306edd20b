import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { afterEach, beforeEach, expect, it } from 'vitest';
import { SendFailed, sendFile } from './send-file';

let bodies: string[];
let answer: { status: number; hold?: boolean };
const store = createServer((request, response) => {
  response.setHeader('access-control-allow-origin', '*');
  // Browsers ask first, because the page watches the upload.
  if (request.method === 'OPTIONS') return response.writeHead(204).end();
  let body = '';
  request.on('data', (chunk: Buffer) => (body += chunk.toString('utf8')));
  request.on('end', () => {
    bodies.push(body);
    if (!answer.hold) response.writeHead(answer.status).end();
  });
});

beforeEach(async () => {
  bodies = [];
  answer = { status: 204 };
  await new Promise<void>((resolve) => store.listen(0, '127.0.0.1', resolve));
});
afterEach(async () => {
  store.closeAllConnections();
  await new Promise((resolve) => store.close(resolve));
});

function send(signal = new AbortController().signal) {
  const { port } = store.address() as AddressInfo;
  const fields = [
    { name: 'key', value: 'slot/1' },
    { name: 'policy', value: 'signed' },
  ];
  const progress: number[] = [];
  const file = new File(['the offer'], 'offer.pdf', { type: 'application/pdf' });
  const done = sendFile({ url: `http://127.0.0.1:${port}/bucket`, fields }, file, {
    onProgress: (sent) => progress.push(sent),
    signal,
  });
  return { done, progress };
}

it('posts the fields in their order, then the file', async () => {
  const { done, progress } = send();
  await done;
  const places = ['slot/1', 'signed', 'filename="offer.pdf"', 'the offer'].map((part) =>
    bodies[0]!.indexOf(part),
  );
  expect(places.every((place) => place > 0)).toBe(true);
  expect(places).toEqual([...places].sort((a, b) => a - b));
  expect(progress.at(-1)).toBe(9);
});

it('fails when the store refuses', async () => {
  answer = { status: 403 };
  await expect(send().done).rejects.toThrow(SendFailed);
});

it('stops when it is told to', async () => {
  answer = { status: 204, hold: true };
  const stop = new AbortController();
  const { done } = send(stop.signal);
  stop.abort();
  await expect(done).rejects.toMatchObject({ name: 'AbortError' });
});

it('sends nothing once it has been stopped', async () => {
  const stop = new AbortController();
  stop.abort();
  await expect(send(stop.signal).done).rejects.toMatchObject({ name: 'AbortError' });
  expect(bodies).toEqual([]);
});
