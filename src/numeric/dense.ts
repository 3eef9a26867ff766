/**
 * Dense linear systems A x = b by LU with partial pivoting: P A = L U, then two triangular sweeps.
 * Source: G. H. Golub & C. F. Van Loan, Matrix Computations, algorithm 3.4.1 (from memory).
 */
import { infeasible, type Outcome, solved } from './outcome.ts';

/** A pivot this small against the greatest entry of the matrix counts as nil. */
const NIL = 1e-14;

export type DenseSolver = (b: ArrayLike<number>) => Float64Array;

/** x of A x = b, A given by rows, n × n. */
export function solveDense(rows: readonly ArrayLike<number>[], b: ArrayLike<number>): Outcome<number[]> {
  const n = rows.length;
  const matrix = new Float64Array(n * n);
  rows.forEach((row, i) => {
    matrix.set(row, i * n);
  });
  const solver = factorDense(matrix, n);
  if (solver.status !== 'solved') return solver;
  const x = [...solver.value(b)];
  return x.every(Number.isFinite) ? solved(x) : infeasible('The unknowns are beyond what a number can hold.');
}

/** A solver for many right-hand sides. `matrix` is n × n, row after row, and is overwritten with the factors. */
export function factorDense(matrix: Float64Array, n: number): Outcome<DenseSolver> {
  const least = NIL * matrix.reduce((most, entry) => Math.max(most, Math.abs(entry)), 0);
  const order = Int32Array.from({ length: n }, (_, i) => i);
  for (let k = 0; k < n; k += 1) {
    const pivot = pivotRow(matrix, n, k);
    if (!(Math.abs(matrix[pivot * n + k]!) > least)) return singular(k, n);
    if (pivot !== k) swapRows(matrix, n, order, pivot, k);
    eliminate(matrix, n, k);
  }
  return solved((b) => sweep(matrix, n, order, b));
}

const singular = (k: number, n: number) =>
  infeasible(
    `The ${n} equations do not settle their ${n} unknowns: the one numbered ${k + 1} follows from those before it.`,
  );

function pivotRow(a: Float64Array, n: number, k: number): number {
  let best = k;
  for (let i = k + 1; i < n; i += 1) if (Math.abs(a[i * n + k]!) > Math.abs(a[best * n + k]!)) best = i;
  return best;
}

function swapRows(a: Float64Array, n: number, order: Int32Array, i: number, k: number): void {
  const row = a.slice(i * n, (i + 1) * n);
  a.copyWithin(i * n, k * n, (k + 1) * n);
  a.set(row, k * n);
  [order[i], order[k]] = [order[k]!, order[i]!];
}

function eliminate(a: Float64Array, n: number, k: number): void {
  const pivot = a[k * n + k]!;
  for (let i = k + 1; i < n; i += 1) {
    const factor = a[i * n + k]! / pivot;
    if (factor !== 0) for (let j = k + 1; j < n; j += 1) a[i * n + j]! -= factor * a[k * n + j]!;
    a[i * n + k] = factor;
  }
}

function sweep(lu: Float64Array, n: number, order: Int32Array, b: ArrayLike<number>): Float64Array {
  const x = Float64Array.from(order, (row) => b[row]!);
  for (let i = 1; i < n; i += 1) for (let j = 0; j < i; j += 1) x[i]! -= lu[i * n + j]! * x[j]!;
  for (let i = n - 1; i >= 0; i -= 1) {
    for (let j = i + 1; j < n; j += 1) x[i]! -= lu[i * n + j]! * x[j]!;
    x[i]! /= lu[i * n + i]!;
  }
  return x;
}
