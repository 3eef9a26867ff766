import fc from 'fast-check';
import { expect, test } from 'vitest';
import { type SwingTerms, swingPeriod } from '../../../src/physics/balance/swing.ts';
import { STANDARD_GRAVITY } from '../../../src/units/constants.ts';

const still: SwingTerms = {
  solidMass: 1,
  pendulumDepth: 0.3,
  solidInertia: 0.09,
  gasInertia: 0,
  airInertia: 0,
  gasMass: 0,
  airMass: 0,
  surge: 0,
  pitch: 0,
};

const period = (terms: SwingTerms): number => {
  const answer = swingPeriod(terms);
  if (answer.status === 'infeasible') throw new Error(answer.why);
  return answer.value;
};

test('held in place by endless added mass, a bob on a thread has 2π√(h/g)', () => {
  const held = { ...still, airMass: 1e9, surge: 1 };
  expect(period(held)).toBeCloseTo(2 * Math.PI * Math.sqrt(0.3 / STANDARD_GRAVITY), 8);
});

test('free to drift, the same craft swings faster than held', () => {
  const free = { ...still, solidInertia: 0.15 };
  expect(period(free)).toBeLessThan(period({ ...free, airMass: 1e9, surge: 1 }));
});

/**
 * The two equations of motion themselves, stepped by Runge–Kutta: surge x of the CB and pitch θ, small angles,
 *   M ẍ + W h θ̈ = 0,   W h ẍ + I θ̈ + W g h θ = 0.
 */
function steppedPeriod({ solidMass: w, pendulumDepth: h, ...t }: SwingTerms): number {
  const mass = w + t.gasMass + t.surge * t.airMass;
  const inertia = t.solidInertia + t.gasInertia + t.pitch * t.airInertia;
  const determinant = mass * inertia - (w * h) ** 2;
  const slope = ([, theta, v, rate]: readonly number[]): number[] => [
    v!,
    rate!,
    (w * h * w * STANDARD_GRAVITY * h * theta!) / determinant,
    (-mass * w * STANDARD_GRAVITY * h * theta!) / determinant,
  ];
  const shifted = (y: readonly number[], k: readonly number[], by: number) =>
    y.map((each, i) => each + by * k[i]!);
  const dt = 1e-3;
  let y: number[] = [0, 0.01, 0, 0];
  let time = 0;
  let crossings = 0;
  for (;;) {
    const k1 = slope(y);
    const k2 = slope(shifted(y, k1, dt / 2));
    const k3 = slope(shifted(y, k2, dt / 2));
    const k4 = slope(shifted(y, k3, dt));
    const next = y.map((each, i) => each + (dt * (k1[i]! + 2 * k2[i]! + 2 * k3[i]! + k4[i]!)) / 6);
    if (y[1]! > 0 !== next[1]! > 0) {
      crossings += 1;
      // A quarter period to the first crossing, then half a period to each.
      if (crossings === 5) return (time + (dt * y[1]!) / (y[1]! - next[1]!)) / 2.25;
    }
    y = next;
    time += dt;
  }
}

test('it agrees with the equations of motion stepped in time', () => {
  const share = fc.double({ min: 0.05, max: 1, noNaN: true });
  const terms = fc
    .record({ w: share, h: share, radius: share, gas: share, air: share, surge: share, pitch: share })
    .map(({ w, h, radius, gas, air, surge, pitch }) => ({
      solidMass: w,
      pendulumDepth: h,
      // About the CB, never less than that of all mass at its CG.
      solidInertia: w * (h * h + radius * radius),
      gasInertia: 0.1 * gas,
      airInertia: 0.5 * air,
      gasMass: gas,
      airMass: air,
      surge,
      pitch,
    }));
  fc.assert(
    fc.property(terms, (each) => {
      expect(period(each) / steppedPeriod(each)).toBeCloseTo(1, 5);
    }),
    { numRuns: 20 },
  );
});

test('a CG that is not below the CB gives no period, and says by how much', () => {
  expect(swingPeriod({ ...still, pendulumDepth: -0.02 })).toMatchObject({
    status: 'infeasible',
    why: expect.stringContaining('{0.02 smallLength}'),
  });
  expect(swingPeriod({ ...still, pendulumDepth: 0 }).status).toBe('infeasible');
  expect(swingPeriod({ ...still, solidMass: 0 }).status).toBe('infeasible');
});
