/**
 * A small dense matrix split into lower and upper triangle with full pivoting, for solving with it and with its
 * transpose. The matrix may have more columns than independent rows: `rank`, `rowOrder` and `columnOrder` tell which
 * rows and columns make up the square part that the solves are about.
 */
export class LinearSystem {
  /** Independent rows found; the first `rank` of rowOrder and columnOrder are the square part. */
  rank = 0;
  rowOrder = new Int32Array(0);
  columnOrder = new Int32Array(0);
  private rows = 0;
  private columns = 0;
  private entries = new Float64Array(0);
  private scratch = new Float64Array(0);

  /** Makes room for a matrix of zeros, to be filled with `set` and split with `factor`. */
  reset(rows: number, columns: number): void {
    this.rows = rows;
    this.columns = columns;
    if (this.entries.length < rows * columns) this.entries = new Float64Array(2 * rows * columns);
    this.entries.fill(0, 0, rows * columns);
    if (this.rowOrder.length < rows) this.rowOrder = new Int32Array(2 * rows);
    if (this.columnOrder.length < columns) this.columnOrder = new Int32Array(2 * columns);
    const longest = Math.max(rows, columns);
    if (this.scratch.length < longest) this.scratch = new Float64Array(2 * longest);
  }

  set(row: number, column: number, value: number): void {
    this.entries[row * this.columns + column] = value;
  }

  /** Splits the matrix. Pivots at or below `smallest` count as zero: what is left then depends on the rest. */
  factor(smallest: number): void {
    const { rows, columns, entries, rowOrder, columnOrder } = this;
    for (let row = 0; row < rows; row++) rowOrder[row] = row;
    for (let column = 0; column < columns; column++) columnOrder[column] = column;
    const most = Math.min(rows, columns);
    for (this.rank = 0; this.rank < most; this.rank++) {
      if (!this.bringPivot(smallest)) return;
      const step = this.rank;
      const pivot = entries[step * columns + step];
      for (let row = step + 1; row < rows; row++) {
        const factor = entries[row * columns + step] / pivot;
        entries[row * columns + step] = factor;
        if (factor === 0) continue;
        for (let column = step + 1; column < columns; column++) {
          entries[row * columns + column] -= factor * entries[step * columns + column];
        }
      }
    }
  }

  /** Solves A·x = right side. `right` holds one figure per row in the matrix' own order, `x` one per column. */
  solve(right: Float64Array, x: Float64Array): void {
    const { rank, columns, entries, rowOrder, columnOrder, scratch } = this;
    for (let row = 0; row < rank; row++) {
      let sum = right[rowOrder[row]];
      for (let column = 0; column < row; column++) sum -= entries[row * columns + column] * scratch[column];
      scratch[row] = sum;
    }
    for (let row = rank - 1; row >= 0; row--) {
      let sum = scratch[row];
      for (let column = row + 1; column < rank; column++)
        sum -= entries[row * columns + column] * scratch[column];
      scratch[row] = sum / entries[row * columns + row];
      x[columnOrder[row]] = scratch[row];
    }
  }

  /** Solves Aᵀ·x = right side. `right` holds one figure per column, `x` one per row. */
  solveTransposed(right: Float64Array, x: Float64Array): void {
    const { rank, columns, entries, rowOrder, columnOrder, scratch } = this;
    for (let column = 0; column < rank; column++) {
      let sum = right[columnOrder[column]];
      for (let row = 0; row < column; row++) sum -= entries[row * columns + column] * scratch[row];
      scratch[column] = sum / entries[column * columns + column];
    }
    for (let column = rank - 1; column >= 0; column--) {
      let sum = scratch[column];
      for (let row = column + 1; row < rank; row++) sum -= entries[row * columns + column] * scratch[row];
      scratch[column] = sum;
      x[rowOrder[column]] = sum;
    }
  }

  /** Swaps the largest entry of what is left to the corner; false if all of it counts as zero. */
  private bringPivot(smallest: number): boolean {
    const { rank, rows, columns, entries } = this;
    let largest = smallest;
    let pivotRow = -1;
    let pivotColumn = -1;
    for (let row = rank; row < rows; row++) {
      for (let column = rank; column < columns; column++) {
        const size = Math.abs(entries[row * columns + column]);
        if (size <= largest) continue;
        largest = size;
        pivotRow = row;
        pivotColumn = column;
      }
    }
    if (pivotRow < 0) return false;
    if (pivotRow !== rank) this.swapRows(rank, pivotRow);
    if (pivotColumn !== rank) this.swapColumns(rank, pivotColumn);
    return true;
  }

  private swapRows(one: number, other: number): void {
    const { columns, entries, rowOrder } = this;
    for (let column = 0; column < columns; column++) {
      const entry = entries[one * columns + column];
      entries[one * columns + column] = entries[other * columns + column];
      entries[other * columns + column] = entry;
    }
    [rowOrder[one], rowOrder[other]] = [rowOrder[other], rowOrder[one]];
  }

  private swapColumns(one: number, other: number): void {
    const { rows, columns, entries, columnOrder } = this;
    for (let row = 0; row < rows; row++) {
      const entry = entries[row * columns + one];
      entries[row * columns + one] = entries[row * columns + other];
      entries[row * columns + other] = entry;
    }
    [columnOrder[one], columnOrder[other]] = [columnOrder[other], columnOrder[one]];
  }
}
