/**
 * The search kernel as built (`dist`) against its targets: `npm run bench -- frontier [rows] [--seed n]`, for example
 * `npm run bench -- frontier T2 T7 --seed 20270215`. Instances are drawn anew for each run, from the seed or else from
 * the date, so that nothing can have been tuned on them. Times are CPU seconds of whole processes, all their threads
 * together. The table goes to standard output, progress to standard error.
 */
import { cpus, loadavg } from 'node:os';
import { parseArgs } from 'node:util';
import { evolutionRow } from './rows/against-evolution.mjs';
import { hundredRow, largerRow } from './rows/against-highs.mjs';
import { demoRow, exactRow, openDataRow } from './rows/exact.mjs';
import { firstSetRow } from './rows/first-set.mjs';
import { correlatedRow, largeRow } from './rows/gaps.mjs';
import { growthTable } from './rows/growth.mjs';
import { ratesRow } from './rows/rates.mjs';

import { threadsRow } from './rows/threads.mjs';
import { verificationRow } from './rows/verification.mjs';
import { printAligned, printWrapped } from './table.mjs';

const ROWS = [
  exactRow,
  hundredRow,
  largerRow,
  evolutionRow,
  firstSetRow,
  ratesRow,
  largeRow,
  correlatedRow,
  verificationRow,
  threadsRow,

  openDataRow,
  demoRow,
];
const WIDTHS = [3, 34, 60, 16, 16, 6, 6];

const { values, positionals } = parseArgs({ options: { seed: { type: 'string' } }, allowPositionals: true });
const seed = values.seed === undefined ? seedOfTheDate() : Number(values.seed);
const unknown = positionals.filter((id) => id !== growthTable.id && !ROWS.some((row) => row.id === id));
if (!Number.isSafeInteger(seed) || unknown.length > 0) {
  console.error(`Rows are ${ROWS.map(({ id }) => id).join(', ')}, ${growthTable.id}; --seed takes a number.`);
  process.exit(2);
}
const isWanted = (id) => positionals.length === 0 || positionals.includes(id);
const context = { seed, say: (text) => console.error(`  ${text}`) };

console.log(`Seed ${seed}; ${machine()}`);
printWrapped(['', 'what', 'measured', 'floor', 'goal', 'floor?', 'goal?'], WIDTHS);
for (const row of ROWS.filter(({ id }) => isWanted(id))) {
  console.error(`${row.id}: ${row.what}`);
  const { measured, floor, goal } = await row.run(context);
  printWrapped([row.id, row.what, measured, row.floor, row.goal, answer(floor), answer(goal)], WIDTHS);
}
if (isWanted(growthTable.id)) {
  console.error(growthTable.id);
  const lines = await growthTable.lines(context);
  console.log('');
  printAligned([growthTable.head, ...lines]);
  console.log(growthTable.foot);
}
console.log(`At the end: ${machine()}`);

/** Seconds since a day in 2020, so that two runs differ and the number stays one to type. */
function seedOfTheDate() {
  return Math.floor(Date.now() / 1000) - 1_577_836_800;
}

/** More processes waiting than half the cores beside this bench's own one: others were at work too. */
function machine() {
  const [load] = loadavg();
  const cores = cpus().length;
  const state = load > 1 + cores / 4 ? 'a loaded machine' : 'a quiet machine';
  return `${cores} cores, load ${load.toFixed(1)}: ${state}; Node ${process.version}`;
}

function answer(holds) {
  if (holds === undefined) return '–';
  return holds ? 'yes' : 'no';
}
