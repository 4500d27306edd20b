import type { ActivitySums } from './activity-sums.js';
import { LEAST_PIECES, MOST_PIECES, type OpenPart, type Range } from './open-part.js';

/** Writes down what is left of a part: open classes, the options kept, and the rows that they could still break. */
export function buildPart(part: OpenPart, keep: Uint8Array, range: Range, sums: ActivitySums): OpenPart {
  const left = splitClasses(part, keep);
  const rows = breakableRows(part, sums);
  const { rowMost, settledBenefit, settledCost, settledPieces } = settle(part, left.chosen, rows);
  return {
    model: part.model,
    ...range,
    settled: left.settled,
    settledBenefit,
    settledCost,
    settledPieces,
    classCount: left.start.length - 1,
    start: Int32Array.from(left.start),
    option: Int32Array.from(left.options, (option) => part.option[option]),
    benefit: Float64Array.from(left.options, (option) => part.benefit[option]),
    cost: Float64Array.from(left.options, (option) => part.cost[option]),
    row: Int32Array.from(rows, ({ id }) => id),
    rowMost,
    ...termsOf(part, left.options, rows),
  };
}

interface KeptRow {
  /** Index in the model, or one of the bounds on pieces. */
  readonly id: number;
  /** Index among the figures of the sums. */
  readonly figure: number;
  readonly bound: number;
}

function breakableRows(part: OpenPart, { most, bound }: ActivitySums): KeptRow[] {
  const rows: KeptRow[] = [];
  const keepRow = (id: number, figure: number): void => {
    if (most[figure] > bound[figure]) rows.push({ id, figure, bound: bound[figure] });
  };
  const count = part.row.length;
  // the bounds on pieces may have changed: they are taken from the range, not from the part
  for (let row = 0; row < count; row++) if (part.row[row] >= 0) keepRow(part.row[row], row);
  keepRow(MOST_PIECES, count + 2);
  keepRow(LEAST_PIECES, count + 3);
  return rows;
}

/** Options by open class, and those of classes that have only one left. */
function splitClasses(
  part: OpenPart,
  keep: Uint8Array,
): { settled: Int32Array; chosen: number[]; start: number[]; options: number[] } {
  const settled = part.settled.slice();
  const chosen: number[] = [];
  const start = [0];
  const options: number[] = [];
  for (let k = 0; k < part.classCount; k++) {
    const first = options.length;
    for (let option = part.start[k]; option < part.start[k + 1]; option++) {
      if (keep[option] === 1) options.push(option);
    }
    if (options.length - first > 1) {
      start.push(options.length);
      continue;
    }
    const only = options.pop()!;
    chosen.push(only);
    settled[part.model.optionClass[part.option[only]]] = part.option[only];
  }
  return { settled, chosen, start, options };
}

/** Counts the options of settled classes into the sums and takes them off the rows' bounds. */
function settle(
  part: OpenPart,
  chosen: readonly number[],
  rows: readonly KeptRow[],
): Pick<OpenPart, 'rowMost' | 'settledBenefit' | 'settledCost' | 'settledPieces'> {
  let { settledBenefit, settledCost, settledPieces } = part;
  const used = new Float64Array(part.row.length);
  let pieces = 0;
  for (const option of chosen) {
    settledBenefit += part.benefit[option];
    settledCost += part.cost[option];
    pieces += part.model.optionPieces[part.option[option]];
    for (let term = part.termStart[option]; term < part.termStart[option + 1]; term++) {
      used[part.termRow[term]] += part.termValue[term];
    }
  }
  settledPieces += pieces;
  const usedOf = ({ id, figure }: KeptRow): number =>
    id === MOST_PIECES ? pieces : id === LEAST_PIECES ? -pieces : used[figure];
  const rowMost = Float64Array.from(rows, (row) => row.bound - usedOf(row));
  return { rowMost, settledBenefit, settledCost, settledPieces };
}

function termsOf(
  part: OpenPart,
  options: readonly number[],
  rows: readonly KeptRow[],
): Pick<OpenPart, 'termStart' | 'termRow' | 'termValue'> {
  const rowOfFigure = new Int32Array(part.row.length + 4).fill(-1);
  for (const [row, { figure }] of rows.entries()) rowOfFigure[figure] = row;
  const mostPieces = rowOfFigure[part.row.length + 2];
  const leastPieces = rowOfFigure[part.row.length + 3];
  const termStart = new Int32Array(options.length + 1);
  const termRow: number[] = [];
  const termValue: number[] = [];
  const add = (row: number, value: number): void => {
    if (row < 0 || value === 0) return;
    termRow.push(row);
    termValue.push(value);
  };
  for (const [place, option] of options.entries()) {
    for (let term = part.termStart[option]; term < part.termStart[option + 1]; term++) {
      add(rowOfFigure[part.termRow[term]], part.termValue[term]);
    }
    const pieces = part.model.optionPieces[part.option[option]];
    add(mostPieces, pieces);
    add(leastPieces, -pieces);
    termStart[place + 1] = termRow.length;
  }
  return { termStart, termRow: Int32Array.from(termRow), termValue: Float64Array.from(termValue) };
}
