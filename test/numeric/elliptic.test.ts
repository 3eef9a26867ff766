import fc from 'fast-check';
import { expect, test } from 'vitest';
import { carlsonRD } from '../../src/numeric/carlson.ts';
import { completeElliptic } from '../../src/numeric/elliptic.ts';
import { integrateFixed } from '../../src/numeric/quadrature.ts';

// Abramowitz & Stegun 1964, table 17.1 (from memory): K and E by the parameter m.
test.each([
  [0, 1.5707963267949, 1.5707963267949],
  [0.5, 1.8540746773014, 1.3506438810477],
  [0.9, 2.5780921133481, 1.1047747327041],
])('Abramowitz & Stegun, table 17.1, at m = %f: K %f, E %f', (m, k, e) => {
  const found = completeElliptic(1 - m);
  expect(found.k).toBeCloseTo(k, 12);
  expect(found.e).toBeCloseTo(e, 12);
});

const complement = fc.double({ min: 1e-12, max: 1, noNaN: true });

test('equal to Carlson’s forms: E = m₁/3 [R_D(0,m₁,1) + R_D(0,1,m₁)], K = E + m/3 R_D(0,m₁,1) (DLMF 19.25.1)', () => {
  fc.assert(
    fc.property(complement, (m1) => {
      const { k, e } = completeElliptic(m1);
      const d = carlsonRD(0, m1, 1) / 3;
      const wanted = m1 * (d + carlsonRD(0, 1, m1) / 3);
      expect(e / wanted).toBeCloseTo(1, 12);
      expect(k / (wanted + (1 - m1) * d)).toBeCloseTo(1, 12);
    }),
  );
});

test('all three are the integrals they are named for', () => {
  fc.assert(
    fc.property(fc.double({ min: 0.2, max: 1, noNaN: true }), (m1) => {
      const over = (f: (s: number, root: number) => number): number =>
        integrateFixed(
          (beta) => f(Math.sin(beta) ** 2, Math.sqrt(1 - (1 - m1) * Math.sin(beta) ** 2)),
          0,
          Math.PI / 2,
          24,
          2,
        );
      const { k, e, c } = completeElliptic(m1);
      expect(k / over((_, root) => 1 / root)).toBeCloseTo(1, 12);
      expect(e / over((_, root) => root)).toBeCloseTo(1, 12);
      expect(c / over((s, root) => (s * (1 - s)) / root ** 3)).toBeCloseTo(1, 12);
    }),
  );
});

test('C keeps its digits as m → 0, where it tends to π/16', () => {
  for (const m of [0, 1e-15, 1e-9, 1e-6])
    expect(completeElliptic(1 - m).c / (Math.PI / 16)).toBeCloseTo(1 + (3 / 4) * m, 11);
});

test('Legendre: E K′ + E′ K − K K′ = π/2 (DLMF 19.7.1)', () => {
  fc.assert(
    fc.property(fc.double({ min: 1e-6, max: 1 - 1e-6, noNaN: true }), (m) => {
      const [here, there] = [completeElliptic(1 - m), completeElliptic(m)];
      expect(here.e * there.k + there.e * here.k - here.k * there.k).toBeCloseTo(Math.PI / 2, 11);
    }),
  );
});
