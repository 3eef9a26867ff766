import fc from 'fast-check';
import { expect, test } from 'vitest';
import { carlsonRD } from '../../src/numeric/carlson.ts';
import { integrate } from './adaptiveQuadrature.ts';

// B. C. Carlson, Numer. Algorithms 10 (1995), section 3 (values from memory).
test.each([
  [0, 2, 1, 1.7972103521034],
  [2, 3, 4, 0.16510527294261],
])('R_D(%f, %f, %f) = %f (Carlson 1995)', (x, y, z, value) => {
  expect(carlsonRD(x, y, z)).toBeCloseTo(value, 13);
});

/** ∫₀^∞ g dt with t = s²/(1 − s)², which is smooth at both ends for these integrands. */
const toInfinity = (g: (t: number) => number): number => {
  const found = integrate((s) => g((s / (1 - s)) ** 2) * ((2 * s) / (1 - s) ** 3), 0, 1, { relative: 1e-11 });
  if (found.status !== 'solved') throw new Error(found.why);
  return found.value.value;
};

const size = fc.double({ min: 0.05, max: 20, noNaN: true });

test('it agrees with its defining integral by quadrature', () => {
  fc.assert(
    fc.property(size, size, size, (x, y, z) => {
      const root = (t: number) => Math.sqrt((t + x) * (t + y) * (t + z));
      expect(carlsonRD(x, y, z) / toInfinity((t) => 1.5 / ((t + z) * root(t)))).toBeCloseTo(1, 9);
    }),
    { numRuns: 30 },
  );
});

test('equal arguments: R_D(x,x,x) = x^(−3/2) (DLMF 19.20.18)', () => {
  fc.assert(
    fc.property(size, (x) => {
      expect(carlsonRD(x, x, x) * x ** 1.5).toBeCloseTo(1, 14);
    }),
  );
});

test('scaling, and Σ R_D over the three turns = 3/√(xyz) (DLMF 19.21.9, from memory)', () => {
  fc.assert(
    fc.property(size, size, size, size, (x, y, z, k) => {
      expect((carlsonRD(k * x, k * y, k * z) * k ** 1.5) / carlsonRD(x, y, z)).toBeCloseTo(1, 13);
      const turns = carlsonRD(x, y, z) + carlsonRD(y, z, x) + carlsonRD(z, x, y);
      expect((turns * Math.sqrt(x * y * z)) / 3).toBeCloseTo(1, 13);
    }),
  );
});

test('the circumference of the ellipse 2 × 1 (semi-axes) is 9.68844822054768 (from memory)', () => {
  // Complete elliptic integral of the second kind: E(m) = (1−m)/3 [R_D(0, 1−m, 1) + R_D(0, 1, 1−m)] (DLMF 19.25.1).
  const m = 0.75;
  const e = ((1 - m) / 3) * (carlsonRD(0, 1 - m, 1) + carlsonRD(0, 1, 1 - m));
  expect(8 * e).toBeCloseTo(9.68844822054768, 12);
});

test('outside its domain it refuses', () => {
  expect(() => carlsonRD(1, 1, 0)).toThrow(RangeError);
  expect(() => carlsonRD(Number.NaN, 1, 1)).toThrow(RangeError);
});
