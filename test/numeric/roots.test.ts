import fc from 'fast-check';
import { expect, test } from 'vitest';
import { findRoot } from '../../src/numeric/roots.ts';

const rootOf = (f: (x: number) => number, lo: number, hi: number, tolerance?: number): number => {
  const found = findRoot(f, lo, hi, tolerance);
  if (found.status !== 'solved') throw new Error(found.why);
  return found.value;
};

test('cos x = x at 0.7390851332151607 (Dottie number, OEIS A003957)', () => {
  expect(rootOf((x) => Math.cos(x) - x, 0, 1)).toBeCloseTo(0.7390851332151607, 13);
});

test('the root of Wallis, x³ − 2x − 5 = 0, is 2.0945514815423265 (OEIS A007493)', () => {
  expect(rootOf((x) => x ** 3 - 2 * x - 5, 2, 3)).toBeCloseTo(2.0945514815423265, 13);
});

test('any monotone cubic in any bracket is solved, and the answer stays inside', () => {
  const size = fc.double({ min: 0.01, max: 100, noNaN: true });
  const place = fc.double({ min: -50, max: 50, noNaN: true });
  fc.assert(
    fc.property(place, size, size, size, (root, left, right, steep) => {
      const f = (x: number) => steep * (x - root) + (x - root) ** 3;
      const found = rootOf(f, root - left, root + right, 1e-10);
      expect(Math.abs(found - root)).toBeLessThan(1e-9);
    }),
  );
});

test('a flat ninth power and a jump still end', () => {
  expect(Math.abs(rootOf((x) => (x - 0.3) ** 9, -1, 4))).toBeCloseTo(0.3, 3);
  expect(rootOf((x) => (x < 0.3 ? -1 : 1), -1, 4)).toBeCloseTo(0.3, 11);
});

test('the ends count as roots, and values too small to multiply still show their signs', () => {
  expect(rootOf((x) => x, 0, 1)).toBe(0);
  expect(rootOf((x) => x - 1, 0, 1)).toBe(1);
  expect(rootOf((x) => (x - 0.5) * 1e-200, 0, 1)).toBeCloseTo(0.5, 11);
});

test('without a sign change, or without a value, it says so', () => {
  expect(findRoot((x) => x * x + 1, -1, 1)).toMatchObject({
    status: 'infeasible',
    remedy: 'Widen the interval.',
  });
  expect(findRoot(() => Number.NaN, 0, 1).status).toBe('infeasible');
  expect(findRoot((x) => (x === 0 || x === 1 ? x - 0.5 : Number.NaN), 0, 1).status).toBe('infeasible');
});
