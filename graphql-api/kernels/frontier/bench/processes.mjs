import { spawn } from 'node:child_process';
import { fileURLToPath } from 'node:url';

/**
 * Takes a measurement of measurements.mjs in a process of its own, so that each begins cold, owes nothing to the one
 * before, and has its own peak of memory. The same one asked for twice is taken once.
 *
 * @returns what the measurement gave, and `megabytes`, the most memory its process held
 */
export function measure(name, task) {
  const question = JSON.stringify({ name, task });
  if (!taken.has(question)) taken.set(question, inOwnProcess(question));
  return taken.get(question);
}

const taken = new Map();

function inOwnProcess(question) {
  const file = fileURLToPath(new URL('measured-process.mjs', import.meta.url));
  const child = spawn(process.execPath, [file], { stdio: ['pipe', 'pipe', 'inherit'] });
  const chunks = [];
  child.stdout.on('data', (chunk) => chunks.push(chunk));
  child.stdin.end(question);
  return new Promise((resolve, reject) => {
    child.on('error', reject);
    child.on('close', (code, signal) => {
      if (code === 0) resolve(JSON.parse(Buffer.concat(chunks).toString()));
      else reject(new Error(`A measurement ended with ${code ?? signal}: ${question.slice(0, 100)}`));
    });
  });
}
