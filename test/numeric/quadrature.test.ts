import fc from 'fast-check';
import { expect, test } from 'vitest';
import { gaussLegendre, integrateFixed } from '../../src/numeric/quadrature.ts';

test('the 3-point rule is 0, ±√(3/5) with weights 8/9, 5/9 (Abramowitz & Stegun, table 25.4)', () => {
  const { nodes, weights } = gaussLegendre(3);
  expect(nodes[0]).toBeCloseTo(-Math.sqrt(0.6), 15);
  expect(nodes[1]).toBe(0);
  expect(nodes[2]).toBeCloseTo(Math.sqrt(0.6), 15);
  expect(weights[0]).toBeCloseTo(5 / 9, 15);
  expect(weights[1]).toBeCloseTo(8 / 9, 15);
});

test('the 10-point rule agrees with Abramowitz & Stegun, table 25.4 (from memory)', () => {
  const { nodes, weights } = gaussLegendre(10);
  expect(nodes[9]).toBeCloseTo(0.973906528517172, 14);
  expect(weights[9]).toBeCloseTo(0.066671344308688, 14);
  expect(nodes[5]).toBeCloseTo(0.148874338981631, 14);
  expect(weights[5]).toBeCloseTo(0.295524224714753, 14);
});

test('an n-point rule integrates every power up to 2n − 1 exactly', () => {
  fc.assert(
    fc.property(fc.integer({ min: 1, max: 64 }), fc.nat({ max: 127 }), (n, draw) => {
      const power = draw % (2 * n);
      const exact = power % 2 === 1 ? 0 : 2 / (power + 1);
      expect(Math.abs(integrateFixed((t) => t ** power, -1, 1, n) - exact)).toBeLessThan(1e-13);
    }),
  );
});

test('a rule is computed once', () => {
  expect(gaussLegendre(20)).toBe(gaussLegendre(20));
});

test('composite panels give ∫₀^π sin = 2 and ∫₀^π x sin x = π', () => {
  expect(integrateFixed(Math.sin, 0, Math.PI, 8, 4)).toBeCloseTo(2, 13);
  expect(integrateFixed((x) => x * Math.sin(x), 0, Math.PI, 8, 4)).toBeCloseTo(Math.PI, 13);
});
