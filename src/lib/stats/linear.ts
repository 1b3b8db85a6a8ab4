import {
  create,
  createDenseMatrixClass,
  createFibonacciHeapClass,
  createLsolve,
  createLup,
  createMatrix,
  createMatrixClass,
  createSpaClass,
  createSparseMatrixClass,
  createUsolve,
} from 'mathjs';
import {
  absDependencies,
  addScalarDependencies,
  divideScalarDependencies,
  equalScalarDependencies,
  largerDependencies,
  multiplyScalarDependencies,
  smallerDependencies,
  subtractScalarDependencies,
  typedDependencies,
  unaryMinusDependencies,
} from 'mathjs/number';

// Only what an LU decomposition of plain numbers needs: the whole of mathjs would reach the browser.
const math = create(
  {
    ...typedDependencies,
    ...absDependencies,
    ...addScalarDependencies,
    ...divideScalarDependencies,
    ...equalScalarDependencies,
    ...largerDependencies,
    ...multiplyScalarDependencies,
    ...smallerDependencies,
    ...subtractScalarDependencies,
    ...unaryMinusDependencies,
    createDenseMatrixClass,
    createFibonacciHeapClass,
    createLsolve,
    createLup,
    createMatrix,
    createMatrixClass,
    createSpaClass,
    createSparseMatrixClass,
    createUsolve,
  },
  { matrix: 'Array' },
);

export type Vector = readonly number[];
export type Matrix = readonly Vector[];

/** Inner product; a shorter `right` counts as zeros. */
export const dot = (left: Vector, right: Vector): number =>
  left.reduce((sum, value, i) => sum + value * (right[i] ?? 0), 0);

/** Matrix times vector. */
export const times = (matrix: Matrix, vector: Vector): number[] =>
  matrix.map((row) => dot(row, vector));

/**
 * Inverse of a symmetric positive definite matrix, scaled to a unit diagonal before its LU
 * decomposition so that unequal units cost no digits.
 *
 * Example: `inverse([[4, 0], [0, 0.25]])` is `[[0.25, 0], [0, 4]]`.
 */
export function inverse(matrix: Matrix): number[][] {
  const scale = matrix.map((row, i) => 1 / Math.sqrt(row[i] ?? NaN));
  const at = (i: number): number => scale[i] ?? NaN;
  const scaled = matrix.map((row, i) => row.map((value, j) => value * at(i) * at(j)));
  const { L, U, p } = math.lup(scaled) as { L: number[][]; U: number[][]; p: number[] };
  const columns = scaled.map((_, j) => {
    // Row i of the permuted identity holds its 1 where p sends column j.
    const unit = scaled.map((__, i) => (p[j] === i ? 1 : 0));
    const column = math.usolve(U, math.lsolve(L, unit)) as number[][];
    return column.map(([value]) => value ?? NaN);
  });
  return scaled.map((_, i) => scaled.map((__, j) => (columns[j]?.[i] ?? NaN) * at(i) * at(j)));
}
