import fc from 'fast-check';
import { expect, test } from 'vitest';
import { factorDense, solveDense } from '../../src/numeric/dense.ts';

const entry = fc.double({ min: -10, max: 10, noNaN: true });
const square = fc
  .integer({ min: 1, max: 12 })
  .chain((n) =>
    fc.tuple(
      fc.array(fc.array(entry, { minLength: n, maxLength: n }), { minLength: n, maxLength: n }),
      fc.array(entry, { minLength: n, maxLength: n }),
    ),
  );

const times = (rows: readonly (readonly number[])[], x: readonly number[]): number[] =>
  rows.map((row) => row.reduce((sum, a, j) => sum + a * x[j]!, 0));

test('what it finds satisfies the equations', () => {
  fc.assert(
    fc.property(square, ([rows, b]) => {
      const found = solveDense(rows, b);
      if (found.status !== 'solved') return;
      const scale = 1 + Math.max(...found.value.map(Math.abs));
      times(rows, found.value).forEach((value, i) => {
        expect(Math.abs(value - b[i]!)).toBeLessThan(1e-10 * scale);
      });
    }),
  );
});

test('well-conditioned equations give back the unknowns they were made from', () => {
  fc.assert(
    fc.property(square, ([rows, x]) => {
      const strong = rows.map((row, i) => row.map((a, j) => (i === j ? a + 200 : a)));
      const found = solveDense(strong, times(strong, x));
      if (found.status !== 'solved') throw new Error(found.why);
      found.value.forEach((value, i) => {
        expect(value).toBeCloseTo(x[i]!, 10);
      });
    }),
  );
});

test('a nil on the diagonal is no obstacle: rows are exchanged', () => {
  const found = solveDense(
    [
      [0, 2, 1],
      [1, 0, 0],
      [3, 0, 1],
    ],
    [7, 1, 6],
  );
  expect(found).toEqual({ status: 'solved', value: [1, 2, 3] });
});

test.each([
  [
    'equal rows',
    [
      [1, 2],
      [1, 2],
    ],
  ],
  [
    'a column of nil',
    [
      [0, 2],
      [0, 3],
    ],
  ],
  [
    'dependent to rounding',
    [
      [0.1, 0.3],
      [0.3, 0.9],
    ],
  ],
  [
    'no number',
    [
      [Number.NaN, 1],
      [1, 1],
    ],
  ],
])('%s: a sentence, no number', (_, rows) => {
  const found = solveDense(rows, [1, 1]);
  expect(found.status).toBe('infeasible');
});

test('one factoring serves many right-hand sides', () => {
  const solver = factorDense(Float64Array.from([2, 1, 1, 3]), 2);
  if (solver.status !== 'solved') throw new Error(solver.why);
  expect([...solver.value([3, 4])]).toEqual([1, 1]);
  expect([...solver.value([1, 3])]).toEqual([0, 1]);
});
