import type { OpenPart } from '../relaxation/open-part.js';
import type { Losses } from './losses.js';

/**
 * The portfolio of the best options at some prices, and the changes of one class each that lead away from it and lose
 * no more than a cap: what the enumeration needs, laid out in the order in which it runs. Classes stand in order of
 * their least loss, and so do the changes of a class.
 */
export class Deviations {
  /** Of the portfolio of the best options. */
  readonly benefit: number;
  readonly cost: number;
  readonly activity: Float64Array;

  readonly classCount: number;
  /** The changes of class p are those from start[p] up to, not including, start[p + 1]. */
  readonly start: Int32Array;
  readonly classOf: Int32Array;
  /** Option of the part that a change chooses. */
  readonly option: Int32Array;
  readonly loss: Float64Array;
  readonly benefitChange: Float64Array;
  readonly costChange: Float64Array;

  /** Rows that many changes touch. What change e adds to the w-th of them stands at e × (their number) + w. */
  readonly wideRow: Int32Array;
  readonly wideChange: Float64Array;
  /** The other rows: the entries of change e are those from narrowStart[e] up to narrowStart[e + 1]. */
  readonly narrowStart: Int32Array;
  readonly narrowRow: Int32Array;
  readonly narrowChange: Float64Array;
  /** The last class with a change that lowers a row; -1 if none does. */
  readonly lastLowering: Int32Array;

  constructor(
    readonly part: OpenPart,
    readonly losses: Losses,
    cap: number,
  ) {
    const { option, classStart } = inOrderOfLoss(part, losses, cap);
    this.option = option;
    this.start = classStart;
    this.classCount = classStart.length - 1;
    this.classOf = new Int32Array(option.length);
    for (let p = 0; p < this.classCount; p++) this.classOf.fill(p, classStart[p], classStart[p + 1]);
    const bestOf = bestOptions(part, losses, option);
    this.loss = option.length === 0 ? new Float64Array(0) : Float64Array.from(option, (o) => losses.loss[o]);
    this.benefitChange = new Float64Array(option.length);
    this.costChange = new Float64Array(option.length);
    for (let change = 0; change < option.length; change++) {
      this.benefitChange[change] = part.benefit[option[change]] - part.benefit[bestOf[change]];
      this.costChange[change] = part.cost[option[change]] - part.cost[bestOf[change]];
    }
    const entries = entriesOf(part, option, bestOf);
    this.lastLowering = lastLoweringOf(part.row.length, entries, this.classOf);
    ({ wideRow: this.wideRow, wideChange: this.wideChange } = wideOf(
      part.row.length,
      entries,
      option.length,
    ));
    const isWide = new Uint8Array(part.row.length);
    for (const row of this.wideRow) isWide[row] = 1;
    ({
      narrowStart: this.narrowStart,
      narrowRow: this.narrowRow,
      narrowChange: this.narrowChange,
    } = narrowOf(entries, isWide));
    ({ benefit: this.benefit, cost: this.cost, activity: this.activity } = sumsOfBest(part, losses));
  }
}

/** What the changes add to the rows, all rows: sparse, by change. */
interface Entries {
  readonly start: Int32Array;
  readonly row: number[];
  readonly value: number[];
}

function inOrderOfLoss(
  { classCount, start }: OpenPart,
  { best, loss }: Losses,
  cap: number,
): { option: Int32Array; classStart: Int32Array } {
  const classes: number[][] = [];
  for (let k = 0; k < classCount; k++) {
    const changes: number[] = [];
    for (let option = start[k]; option < start[k + 1]; option++) {
      if (option !== best[k] && loss[option] <= cap) changes.push(option);
    }
    if (changes.length > 1) changes.sort((one, other) => loss[one] - loss[other] || one - other);
    if (changes.length > 0) classes.push(changes);
  }
  classes.sort(([one], [other]) => loss[one] - loss[other] || one - other);
  const classStart = new Int32Array(classes.length + 1);
  for (const [p, changes] of classes.entries()) classStart[p + 1] = classStart[p] + changes.length;
  const option = new Int32Array(classStart[classes.length]);
  for (const [p, changes] of classes.entries()) option.set(changes, classStart[p]);
  return { option, classStart };
}

/** The best option of each change's class. */
function bestOptions(part: OpenPart, { best }: Losses, option: Int32Array): Int32Array {
  const bestOf = new Int32Array(part.option.length);
  for (let k = 0; k < part.classCount; k++) bestOf.fill(best[k], part.start[k], part.start[k + 1]);
  return option.map((chosen) => bestOf[chosen]);
}

function entriesOf(part: OpenPart, option: Int32Array, bestOf: Int32Array): Entries {
  const { termStart, termRow, termValue } = part;
  const start = new Int32Array(option.length + 1);
  const row: number[] = [];
  const value: number[] = [];
  const sums = new Float64Array(part.row.length);
  const add = (chosen: number, sign: 1 | -1, touched: number[]): void => {
    for (let term = termStart[chosen]; term < termStart[chosen + 1]; term++) {
      if (sums[termRow[term]] === 0) touched.push(termRow[term]);
      sums[termRow[term]] += sign * termValue[term];
    }
  };
  for (let change = 0; change < option.length; change++) {
    const touched: number[] = [];
    add(option[change], 1, touched);
    add(bestOf[change], -1, touched);
    for (const each of touched) {
      if (sums[each] !== 0) {
        row.push(each);
        value.push(sums[each]);
      }
      sums[each] = 0;
    }
    start[change + 1] = row.length;
  }
  return { start, row, value };
}

function lastLoweringOf(rows: number, { start, row, value }: Entries, classOf: Int32Array): Int32Array {
  const last = new Int32Array(rows).fill(-1);
  for (let change = 0; change < classOf.length; change++) {
    for (let entry = start[change]; entry < start[change + 1]; entry++) {
      if (value[entry] < 0 && classOf[change] > last[row[entry]]) last[row[entry]] = classOf[change];
    }
  }
  return last;
}

function wideOf(
  rows: number,
  { start, row, value }: Entries,
  changes: number,
): { wideRow: Int32Array; wideChange: Float64Array } {
  const touches = new Int32Array(rows);
  for (const each of row) touches[each]++;
  const wideRow = Int32Array.from(touches.keys()).filter((each) => touches[each] > WIDE_SHARE * changes);
  const place = new Int32Array(rows).fill(-1);
  for (const [at, each] of wideRow.entries()) place[each] = at;
  const wideChange = new Float64Array(changes * wideRow.length);
  for (let change = 0; change < changes; change++) {
    for (let entry = start[change]; entry < start[change + 1]; entry++) {
      const at = place[row[entry]];
      if (at >= 0) wideChange[change * wideRow.length + at] = value[entry];
    }
  }
  return { wideRow, wideChange };
}

function narrowOf(
  { start, row, value }: Entries,
  isWide: Uint8Array,
): { narrowStart: Int32Array; narrowRow: Int32Array; narrowChange: Float64Array } {
  const narrowStart = new Int32Array(start.length);
  const narrowRow: number[] = [];
  const narrowChange: number[] = [];
  for (let change = 0; change + 1 < start.length; change++) {
    for (let entry = start[change]; entry < start[change + 1]; entry++) {
      if (isWide[row[entry]] === 1) continue;
      narrowRow.push(row[entry]);
      narrowChange.push(value[entry]);
    }
    narrowStart[change + 1] = narrowRow.length;
  }
  return {
    narrowStart,
    narrowRow: Int32Array.from(narrowRow),
    narrowChange: Float64Array.from(narrowChange),
  };
}

function sumsOfBest(
  part: OpenPart,
  { best }: Losses,
): { benefit: number; cost: number; activity: Float64Array } {
  let benefit = part.settledBenefit;
  let cost = part.settledCost;
  const activity = new Float64Array(part.row.length);
  for (const option of best) {
    benefit += part.benefit[option];
    cost += part.cost[option];
    for (let term = part.termStart[option]; term < part.termStart[option + 1]; term++) {
      activity[part.termRow[term]] += part.termValue[term];
    }
  }
  return { benefit, cost, activity };
}

/** From this share of changes on that touch a row, a table is quicker to run over than a list. */
const WIDE_SHARE = 0.25;
