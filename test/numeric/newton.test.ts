import fc from 'fast-check';
import { expect, test } from 'vitest';
import { jacobianOf, solveNewton } from '../../src/numeric/newton.ts';
import { valueOrNull } from '../../src/numeric/outcome.ts';

// A. Freudenstein & B. Roth's two equations, root (5, 4), with a false valley at (11.41, −0.8968): J. J. Moré,
// B. S. Garbow & K. E. Hillstrom, Testing Unconstrained Optimization Software, ACM TOMS 7 (1981), no. 2 (from memory).
const freudensteinRoth = ([x, y]: Float64Array, into: Float64Array): void => {
  into[0] = -13 + x! + ((5 - y!) * y! - 2) * y!;
  into[1] = -29 + x! + ((y! + 1) * y! - 14) * y!;
};

test('a known pair of equations, from near its root', () => {
  const root = valueOrNull(solveNewton(freudensteinRoth, [6, 3.5]))!;
  expect(root[0]).toBeCloseTo(5, 10);
  expect(root[1]).toBeCloseTo(4, 10);
});

test('in a valley without a root it stops and says so', () => {
  expect(solveNewton(freudensteinRoth, [0.5, -2])).toMatchObject({
    status: 'infeasible',
    why: expect.stringMatching(/Newton’s method|do not settle/),
  });
});

test('a full step would run away; the damped one arrives', () => {
  const root = valueOrNull(
    solveNewton(
      ([x], into) => {
        into[0] = Math.atan(x!);
      },
      [20],
    ),
  )!;
  expect(Math.abs(root[0]!)).toBeLessThan(1e-11);
});

test('linear equations of any size of unknowns take it one step and one to see that', () => {
  const entry = fc.double({ min: -1, max: 1, noNaN: true });
  const size = fc.constantFrom(1e-6, 1e-3, 1, 1e3);
  const rows = fc.array(fc.array(entry, { minLength: 3, maxLength: 3 }), { minLength: 3, maxLength: 3 });
  const sizes = fc.tuple(size, size, size);
  fc.assert(
    fc.property(rows, sizes, fc.tuple(entry, entry, entry), (given, scale, share) => {
      // Diagonally dominant, so that it can be solved.
      const a = given.map((row, i) => row.map((each, j) => (i === j ? 4 + each : each)));
      const root = share.map((each, i) => each * scale[i]!);
      const f = (x: Float64Array, into: Float64Array) => {
        for (const [i, row] of a.entries()) {
          into[i] = row.reduce((sum, each, j) => sum + (each * (x[j]! - root[j]!)) / scale[j]!, 0);
        }
      };
      const found = valueOrNull(solveNewton(f, [0, 0, 0], { sizes: scale, mostSteps: 3 }))!;
      for (const [i, each] of found.entries()) {
        expect(Math.abs(each - root[i]!)).toBeLessThan(1e-9 * scale[i]!);
      }
    }),
  );
});

test('slopes by differences against slopes by hand', () => {
  const rows = jacobianOf(freudensteinRoth, Float64Array.of(2, 3), [1, 10]);
  // ∂f/∂y = −3y² + 10y − 2 and 3y² + 2y − 14, times the size 10.
  const byHand = [
    [1, 10],
    [1, 190],
  ];
  for (const [i, row] of byHand.entries()) {
    for (const [j, each] of row.entries()) expect(rows[i]![j]).toBeCloseTo(each, 4);
  }
});

test('no value, or equations that say the same twice: an answer in words', () => {
  const nowhere = solveNewton(
    (_, into) => {
      into[0] = Number.NaN;
    },
    [1],
  );
  expect(nowhere.status).toBe('infeasible');
  const twice = solveNewton(
    ([x, y], into) => {
      into[0] = x! + y! - 1;
      into[1] = x! + y! - 1;
    },
    [3, 4],
  );
  expect(twice.status).toBe('infeasible');
});
