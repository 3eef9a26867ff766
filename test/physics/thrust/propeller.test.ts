import fc from 'fast-check';
import { expect, test } from 'vitest';
import { discArea, idealPower, staticThrustOf } from '../../../src/physics/thrust/propeller.ts';

const INCH = 0.0254;

// APC 9×4.7 at rest, 6026 rpm, C_T 0.1192, C_P 0.0484: UIUC propeller data (second-hand); T = C_T ρ n² D⁴, P = C_P ρ n³ D⁵.
test('UIUC data: an APC 9×4.7 gives 4.022 N for 37.50 W at rest, figure of merit 0.678', () => {
  const [density, turns, diameter] = [1.225, 6026 / 60, 9 * INCH];
  const thrust = 0.1192 * density * turns ** 2 * diameter ** 4;
  const power = 0.0484 * density * turns ** 3 * diameter ** 5;
  expect(thrust).toBeCloseTo(4.022, 2);
  expect(power).toBeCloseTo(37.5, 1);
  const merit = idealPower(4.022, discArea(diameter), density) / 37.5;
  expect(merit).toBeCloseTo(0.678, 3);
  expect(staticThrustOf(37.5, 0.678, diameter, density)).toBeCloseTo(4.022, 2);
});

const thrusts = fc.double({ min: 1e-3, max: 100, noNaN: true });
const areas = fc.double({ min: 1e-4, max: 3, noNaN: true });
const speeds = fc.double({ min: 0, max: 40, noNaN: true });
const RHO = 1.2;

test('at rest it is √(T³/(2ρA)); thrust from that power is the thrust', () => {
  fc.assert(
    fc.property(thrusts, fc.double({ min: 0.02, max: 2, noNaN: true }), (thrust, diameter) => {
      const power = idealPower(thrust, discArea(diameter), RHO);
      expect(power / Math.sqrt(thrust ** 3 / (2 * RHO * discArea(diameter)))).toBeCloseTo(1, 12);
      expect(staticThrustOf(power, 1, diameter, RHO) / thrust).toBeCloseTo(1, 12);
    }),
  );
});

test('advancing: momentum and energy of the stream agree, T = 2ρA(V + v)v and P = T(V + v)', () => {
  fc.assert(
    fc.property(thrusts, areas, speeds, (thrust, area, speed) => {
      const through = idealPower(thrust, area, RHO, speed) / thrust;
      const induced = through - speed;
      expect((2 * RHO * area * through * induced) / thrust).toBeCloseTo(1, 5);
      // Kinetic energy that the stream takes away each second: ½ṁ[(V + 2v)² − V²].
      const flow = RHO * area * through;
      const energy = 0.5 * flow * ((speed + 2 * induced) ** 2 - speed ** 2);
      expect(energy / (thrust * through)).toBeCloseTo(1, 5);
    }),
  );
});

test('at no advance it is the static power, at great advance T V', () => {
  expect(idealPower(4, 0.05, RHO, 1e-9)).toBeCloseTo(idealPower(4, 0.05, RHO), 6);
  expect(idealPower(4, 0.05, RHO, 1e4) / (4 * 1e4)).toBeCloseTo(1, 5);
});

test('more thrust, less disc or more advance take more power', () => {
  fc.assert(
    fc.property(thrusts, areas, speeds, fc.double({ min: 1.01, max: 5, noNaN: true }), (t, a, v, more) => {
      const power = idealPower(t, a, RHO, v);
      expect(idealPower(t * more, a, RHO, v)).toBeGreaterThan(power);
      expect(idealPower(t, a, RHO, v + more)).toBeGreaterThan(power);
      expect(idealPower(t, a / more, RHO, v)).toBeGreaterThan(power);
    }),
  );
});

test('no thrust takes no power', () => {
  expect(idealPower(0, 0.05, RHO, 3)).toBe(0);
  expect(idealPower(0, 0.05, RHO)).toBe(0);
});
