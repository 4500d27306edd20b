import { execFileSync } from 'node:child_process';
import { join } from 'node:path';
import { knottyProblem } from './knotty-problem.js';

it('finds the same on one thread, on two, and when three threads are lost on the way', () => {
  const alone = search(1, 0);
  expect(alone).toMatchObject({ status: 'complete', lost: 0 });
  expect(alone.points.length).toBeGreaterThan(1_000);
  expect(search(2, 0)).toEqual(alone);
  expect(search(2, 3)).toEqual({ ...alone, lost: 3 });
}, 120_000);

function search(threads: number, losses: number) {
  const input = JSON.stringify({ problem: knottyProblem(), settings: { seed: 1, threads }, losses });
  const output = execFileSync(process.execPath, [join(__dirname, 'lose-threads.mjs')], { input });
  return JSON.parse(output.toString()) as { status: string; points: object[]; lost: number };
}
