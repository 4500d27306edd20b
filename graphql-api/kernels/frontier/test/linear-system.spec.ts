import { Random } from '../src/local-search/random.js';
import { LinearSystem } from '../src/relaxation/linear-system.js';

const SMALLEST = 1e-9;

function aMatrix(random: Random, rows: number, columns: number): number[][] {
  return Array.from({ length: rows }, () =>
    Array.from({ length: columns }, () => (random.fraction() < 0.4 ? 0 : 2 * random.fraction() - 1)),
  );
}

function factored(system: LinearSystem, matrix: readonly number[][]): LinearSystem {
  system.reset(matrix.length, matrix[0].length);
  for (const [row, entries] of matrix.entries()) {
    for (const [column, value] of entries.entries()) system.set(row, column, value);
  }
  system.factor(SMALLEST);
  return system;
}

function times(matrix: readonly number[][], x: Float64Array): number[] {
  return matrix.map((entries) => entries.reduce((sum, value, column) => sum + value * x[column], 0));
}

function transposed(matrix: readonly number[][]): number[][] {
  return matrix[0].map((_, column) => matrix.map((entries) => entries[column]));
}

function expectNear(one: readonly number[], other: Float64Array): void {
  for (const [place, figure] of one.entries()) expect(figure).toBeCloseTo(other[place], 7);
}

describe('a linear system', () => {
  it('is solved as it stands and transposed, one after the other in the same room', () => {
    const random = new Random(1);
    const system = new LinearSystem();
    let solved = 0;
    for (let round = 0; round < 200; round++) {
      const size = 1 + random.below(9);
      const matrix = aMatrix(random, size, size);
      factored(system, matrix);
      if (system.rank < size) continue;
      const right = Float64Array.from({ length: size }, () => random.fraction());
      const x = new Float64Array(size);
      system.solve(right, x);
      expectNear(times(matrix, x), right);
      system.solveTransposed(right, x);
      expectNear(times(transposed(matrix), x), right);
      solved++;
    }
    expect(solved).toBeGreaterThan(100);
  });

  it('tells rows that depend on others, and solves for those that do not', () => {
    const random = new Random(2);
    for (let round = 0; round < 50; round++) {
      const independent = aMatrix(random, 3, 5);
      const sum = independent[0].map((value, column) => value - 2 * independent[2][column]);
      const system = factored(new LinearSystem(), [...independent, sum]);
      const rank = factored(new LinearSystem(), independent).rank;
      expect(system.rank).toBe(rank);
      const matrix = [...independent, sum];
      const rows = [...system.rowOrder.subarray(0, rank)];
      const columns = [...system.columnOrder.subarray(0, rank)];
      const right = Float64Array.from([1, 2, 3, -5]);
      const x = new Float64Array(5);
      system.solve(right, x);
      for (const row of rows) {
        const product = columns.reduce((total, column) => total + matrix[row][column] * x[column], 0);
        expect(product).toBeCloseTo(right[row], 6);
      }
    }
  });

  it('has no rank where all of it counts as zero', () => {
    expect(factored(new LinearSystem(), [[0, 1e-10]]).rank).toBe(0);
  });
});
