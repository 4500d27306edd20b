import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';

/**
 * Published instances with a known front, read from the folder that FRONTIER_DATA names: vOptLib, set 1A (0/1
 * knapsacks with two values and one weight), and MOMKP (two values, two weights). Both maximise two values; each item
 * becomes a pair, taken or left, of which exactly one is chosen, so that cost = all second values - second value.
 *
 * @returns undefined where FRONTIER_DATA is not set, else instances { name, problem, front }; front is undefined
 * where none is published
 */
export function openData() {
  const folder = process.env.FRONTIER_DATA;
  if (folder === undefined) return undefined;
  if (!existsSync(folder)) throw new Error(`FRONTIER_DATA names no folder: ${folder}`);
  return [
    ...VOPTLIB.map((name) => readVOptLib(join(folder, 'voptlib'), name)),
    ...MOMKP.map((name) => readMomkp(join(folder, 'momkp', name), name)),
  ];
}

const VOPTLIB = ['2KP50-11', '2KP50-50', '2KP50-92', '2KP100-50', '2KP500-41'];
const MOMKP = ['2kp50', '2kp100'];

/** Numbers one after the other: items, objectives, constraints, then both values, the weights and the capacity. */
function readVOptLib(folder, name) {
  const text = readFileSync(join(folder, 'instances', `${name}.dat`), 'utf8');
  const numbers = text.replace(/#.*$/gm, '').trim().split(/\s+/).map(Number);
  const [count, objectives, constraints] = numbers;
  if (objectives !== 2) throw new Error(`${name} has ${objectives} objectives`);
  const rowsOf = (rows, from) =>
    Array.from({ length: rows }, (_, row) => numbers.slice(from + row * count, from + (row + 1) * count));
  const values = rowsOf(2, 3);
  const weights = rowsOf(constraints, 3 + 2 * count);
  const capacities = numbers.slice(3 + (2 + constraints) * count);
  const frontFile = join(folder, 'frontiers', `${name}.min`);
  const pairs = existsSync(frontFile) ? pairsOf(readFileSync(frontFile, 'utf8')) : undefined;
  return instanceOf({ name, values, weights, capacities, pairs });
}

/** Tables with a head line and a head column each; a capacity may end in a half, which whole weights cannot use. */
function readMomkp(folder, name) {
  const table = (file) =>
    readFileSync(join(folder, file), 'utf8')
      .trim()
      .split('\n')
      .slice(1)
      .map((line) => line.split(',').slice(1).map(Number));
  const pairs = table('pareto_sols.csv');
  const capacities = table('b.csv').map(([most]) => Math.floor(most));
  return instanceOf({ name, values: table('c.csv'), weights: table('a.csv'), capacities, pairs });
}

function pairsOf(text) {
  const lines = text.trim().split('\n');
  return lines.map((line) => line.trim().split(/\s+/).map(Number));
}

function instanceOf({ name, values: [first, second], weights, capacities, pairs }) {
  const pairOf = (benefit, place) => {
    const id = `${place + 1}`;
    const taken = { id: `${id} taken`, benefit, cost: 0, uses: weights.map((row) => row[place]), oneOf: id };
    const left = { id: `${id} left`, benefit: 0, cost: second[place], oneOf: id };
    return [taken, left];
  };
  const problem = {
    format: 'metewand-problem/1',
    name,
    limits: capacities.map((most, index) => ({ name: `weight ${index + 1}`, most })),
    items: first.flatMap(pairOf),
    counts: first.map((_, place) => ({
      name: `${place + 1}`,
      items: [`${place + 1} taken`, `${place + 1} left`],
      least: 1,
    })),
  };
  const total = second.reduce((sum, value) => sum + value, 0);
  const front = pairs?.map(([one, other]) => [total - other, one]).sort(([one], [other]) => one - other);
  return { name, problem, front };
}
