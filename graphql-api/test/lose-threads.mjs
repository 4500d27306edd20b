import { text } from 'node:stream/consumers';
import { searchWithThreads } from '../dist/frontier/threads/search-with-threads.js';

// Searches as told on standard input, and ends the first threads it starts while they are at work.

const { problem, settings, losses } = JSON.parse(await text(process.stdin));
let lost = 0;
process.on('worker', (thread) => {
  if (lost >= losses) return;
  lost += 1;
  // the first word is that it is ready, after which it has a task
  thread.once('message', () => setTimeout(() => void thread.terminate(), 20));
});
const { status, points } = await searchWithThreads(problem, settings);
process.stdout.write(JSON.stringify({ status, points, lost }));
