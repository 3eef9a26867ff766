import fc from 'fast-check';
import { expect, test } from 'vitest';
import { integrateFixed } from '../../src/numeric/quadrature.ts';
import { integrate, type Tolerance } from './adaptiveQuadrature.ts';

const integralOf = (f: (x: number) => number, a: number, b: number, tolerance?: Tolerance): number => {
  const found = integrate(f, a, b, tolerance);
  if (found.status !== 'solved') throw new Error(found.why);
  return found.value.value;
};

test('powers up to the Kronrod rule’s degree of 22 are exact on one piece', () => {
  for (let power = 0; power <= 22; power += 1) {
    const loose = { absolute: 10 };
    expect(integralOf((x) => (power + 1) * x ** power, 0, 1, loose)).toBeCloseTo(1, 14);
  }
  // A far higher power is beyond it, so the check above can fail.
  expect(Math.abs(integralOf((x) => x ** 30, -1, 1, { absolute: 10 }) * 15.5 - 1)).toBeGreaterThan(1e-12);
});

test.each([
  ['√x on 0…1', (x: number) => Math.sqrt(x), 0, 1, 2 / 3],
  ['ln x on 0…1', (x: number) => Math.log(x), 0, 1, -1],
  ['4/(1+x²) on 0…1', (x: number) => 4 / (1 + x * x), 0, 1, Math.PI],
  ['a peak 1e-3 wide', (x: number) => 1e-3 / (1e-6 + x * x), -1, 1, 2 * Math.atan(1000)],
  ['|x − 1/3| on 0…1', (x: number) => Math.abs(x - 1 / 3), 0, 1, 5 / 18],
] as const)('%s, in closed form', (_, f, a, b, exact) => {
  expect(integralOf(f, a, b) / exact).toBeCloseTo(1, 9);
});

test('swapping the ends changes the sign, splitting the range changes nothing', () => {
  const f = (x: number) => Math.exp(-x) * Math.cos(3 * x);
  fc.assert(
    fc.property(fc.double({ min: -3, max: 3, noNaN: true }), (middle) => {
      const whole = integralOf(f, -4, 4);
      expect(integralOf(f, 4, -4)).toBeCloseTo(-whole, 8);
      expect(integralOf(f, -4, middle) + integralOf(f, middle, 4)).toBeCloseTo(whole, 7);
    }),
  );
});

test('it agrees with the fixed rule on a smooth integrand, and its error bound holds', () => {
  const f = (x: number) => Math.sin(x * x);
  const found = integrate(f, 0, 4, { relative: 1e-6 });
  if (found.status !== 'solved') throw new Error(found.why);
  const reference = integrateFixed(f, 0, 4, 40, 8);
  expect(Math.abs(found.value.value - reference)).toBeLessThanOrEqual(found.value.error);
  expect(found.value.error).toBeLessThanOrEqual(1e-6 * Math.abs(reference) * 1.001);
});

test('an integrand without value, or one that diverges, is not answered', () => {
  expect(integrate((x) => Math.sqrt(x), -1, 1).status).toBe('infeasible');
  expect(integrate((x) => 1 / x, 0, 1).status).toBe('infeasible');
});

test('an integral of zero is solved', () => {
  expect(integralOf(() => 0, 0, 1)).toBe(0);
});
