import { totalsOf, violationsOf } from '@metewand/frontier';
import { Worker } from 'node:worker_threads';
import { dividedBounds, divisorOf, ROW, toIntegerProgram } from './integer-program.mjs';

/**
 * HiGHS on one problem. `ask` answers for the portfolios within the given bounds which has the most benefit:
 *
 * - `infeasible`: there is none within them;
 * - `found`: `picks` with their `benefit` and `cost`, added up from the document, and no other has more;
 * - `undecided`: `why` in words (`picks` may be there all the same), and `bound`.
 *
 * `bound` is a whole number that no benefit within the bounds exceeds. Every portfolio HiGHS names is rounded,
 * checked against every rule and added up again in whole numbers. A thread that fails is replaced, and asked again
 * once. Close it at the end.
 */
export class HighsSolver {
  #problem;
  #program;
  #divisor;
  #thread;

  constructor(problem) {
    this.#problem = problem;
    this.#program = toIntegerProgram(problem);
    this.#divisor = divisorOf(this.#program.objective.values());
  }

  /** Bounds: costMost, secondCostMost, benefitLeast; `start`: the picks of a portfolio that is known. */
  async ask({ seconds = 60, start, ...bounds }) {
    const question = {
      seconds,
      start: start && this.#program.columnsOf(start),
      rowBounds: this.#rowBounds(bounds),
    };
    let failure;
    for (let attempt = 0; attempt < 2; attempt++) {
      const answer = await this.#put(question);
      if (answer.failure === undefined) return this.#read(answer, bounds);
      failure = answer.failure;
      this.close();
    }
    return { verdict: 'undecided', why: `HiGHS failed twice (${failure})`, bound: Infinity };
  }

  close() {
    const thread = this.#thread;
    this.#thread = undefined;
    void thread?.terminate();
  }

  #rowBounds({ costMost = Infinity, secondCostMost = Infinity, benefitLeast = -Infinity }) {
    const { rows } = this.#program;
    const bounds = [
      { ...rows[ROW.cost], upper: Math.min(rows[ROW.cost].upper, costMost) },
      { ...rows[ROW.secondCost], upper: secondCostMost },
      { ...rows[ROW.benefit], lower: Math.max(rows[ROW.benefit].lower, benefitLeast) },
    ];
    return bounds.map((row, index) => [index, ...dividedBounds(row)]);
  }

  #put(question) {
    this.#thread ??= new Worker(new URL('highs-thread.mjs', import.meta.url), {
      workerData: { model: modelData(this.#program, this.#divisor), absoluteGap: 0.5 / this.#divisor },
    });
    const thread = this.#thread;
    return new Promise((resolve) => {
      const settle = (answer) => {
        clearTimeout(watch);
        thread.off('message', settle).off('error', onError).off('exit', onExit);
        resolve(answer);
      };
      const onError = (error) => settle({ failure: String(error?.message ?? error) });
      const onExit = (code) => settle({ failure: `its thread ended with ${code}` });
      // HiGHS looks at its own clock now and then only
      const patienceMs = Math.min(LONGEST_TIMER_MS, (2 * question.seconds + 30) * 1000);
      const watch = setTimeout(() => settle({ failure: 'it did not answer in time' }), patienceMs);
      thread.on('message', settle).on('error', onError).on('exit', onExit);
      thread.postMessage(question);
    });
  }

  #read({ status, columns, bound }, bounds) {
    if (status === 'infeasible') return { verdict: 'infeasible', bound: -Infinity };
    // a bound is a float: it may fall short of a whole number by a hair
    const most = Math.floor(bound * this.#divisor + 1e-3);
    if (!columns) return { verdict: 'undecided', why: inWords(status), bound: most };
    const portfolio = this.#portfolioOf(columns);
    const broken = this.#breaks(portfolio, bounds);
    if (broken) {
      const why = 'the portfolio HiGHS names breaks a rule when added up in whole numbers';
      return { verdict: 'undecided', why, bound: most };
    }
    if (most <= portfolio.benefit) return { verdict: 'found', ...portfolio, bound: portfolio.benefit };
    return { verdict: 'undecided', why: inWords(status), ...portfolio, bound: most };
  }

  #portfolioOf(columns) {
    const pieces = this.#problem.items.map(({ id }, index) => [id, Math.round(columns[index])]);
    const picks = Object.fromEntries(pieces.filter(([, count]) => count !== 0));
    const { benefit, cost } = totalsOf(this.#problem, picks);
    return { picks, benefit, cost };
  }

  #breaks({ picks, benefit, cost }, { costMost = Infinity, secondCostMost = Infinity, benefitLeast = 0 }) {
    if (violationsOf(this.#problem, picks).length > 0 || cost > costMost || benefit < benefitLeast)
      return true;
    let secondCost = 0;
    for (const item of this.#problem.items) secondCost += (item.secondCost ?? 0) * (picks[item.id] ?? 0);
    return secondCost > secondCostMost;
  }
}

const LONGEST_TIMER_MS = 2 ** 31 - 1;

function inWords(status) {
  return status === 'timeLimit' ? 'HiGHS ran out of time' : `HiGHS ended with the status ${status}`;
}

function modelData({ columnLower, columnUpper, rows, objective }, divisor) {
  const colCost = new Float64Array(columnLower.length);
  for (const [column, value] of objective) colCost[column] = value / divisor;
  const bounds = rows.map(dividedBounds);
  return {
    numCols: columnLower.length,
    numRows: rows.length,
    colCost,
    colLower: Float64Array.from(columnLower),
    colUpper: Float64Array.from(columnUpper),
    rowLower: Float64Array.from(bounds, ([lower]) => lower),
    rowUpper: Float64Array.from(bounds, ([, upper]) => upper),
    matrix: { format: 'csr', numRows: rows.length, numCols: columnLower.length, ...sparse(rows) },
  };
}

function sparse(rows) {
  const starts = [0];
  const indices = [];
  const values = [];
  for (const { terms, divisor } of rows) {
    for (const [column, value] of terms) {
      indices.push(column);
      values.push(value / divisor);
    }
    starts.push(indices.length);
  }
  return {
    starts: Int32Array.from(starts),
    indices: Int32Array.from(indices),
    values: Float64Array.from(values),
  };
}
