import fc from 'fast-check';
import { expect, test } from 'vitest';
import { idealPower, powerAgainstFree } from '../../../src/physics/flow/idealPower.ts';

const positive = fc.double({ min: 0.01, max: 30, noNaN: true });

test('at rest P = √(T³/(2ρA)) (Rankine–Froude)', () => {
  fc.assert(
    fc.property(positive, positive, positive, (thrust, area, density) => {
      expect(
        idealPower(thrust, area, density, 0) / Math.sqrt(thrust ** 3 / (2 * density * area)),
      ).toBeCloseTo(1, 12);
    }),
  );
});

test('the thrust is the momentum given to the air, T = 2ρA(V + v)v, and P its energy', () => {
  fc.assert(
    fc.property(positive, positive, positive, positive, (thrust, area, density, speed) => {
      const through = idealPower(thrust, area, density, speed) / thrust;
      const added = through - speed;
      expect((2 * density * area * through * added) / thrust).toBeCloseTo(1, 6);
      const flux = density * area * through;
      const energy = (flux * ((speed + 2 * added) ** 2 - speed ** 2)) / 2;
      expect(energy / (thrust * through)).toBeCloseTo(1, 6);
    }),
  );
});

// Static thrust and power of a 9 × 4.7 propeller at 6026 rpm (UIUC data, second-hand): 4.022 N, 37.50 W, figure of merit 0.678.
test('static: the figure of merit of a measured propeller', () => {
  const area = (Math.PI / 4) * (9 * 0.0254) ** 2;
  expect(idealPower(4.022, area, 1.225, 0) / 37.5).toBeCloseTo(0.678, 2);
});

test('slow air gives more thrust per watt, fast air less; at most 1/ratio, nothing at rest', () => {
  fc.assert(
    fc.property(positive, positive, positive, (thrust, area, speed) => {
      const slow = powerAgainstFree(thrust, area, 1.2, speed, 0.8);
      const fast = powerAgainstFree(thrust, area, 1.2, speed, 1.1);
      expect(slow).toBeGreaterThan(1);
      expect(slow).toBeLessThanOrEqual(1 / 0.8 + 1e-9);
      expect(fast).toBeLessThan(1);
      expect(fast).toBeGreaterThanOrEqual(1 / 1.1 - 1e-9);
      expect(powerAgainstFree(thrust, area, 1.2, speed, 1)).toBe(1);
      expect(powerAgainstFree(thrust, area, 1.2, 0, 0.5)).toBe(1);
    }),
  );
});

test('a disc without thrust gives the limit 1/ratio, and no speed at all gives 1', () => {
  expect(powerAgainstFree(0, 0.05, 1.2, 3, 0.8)).toBeCloseTo(1.25, 6);
  expect(powerAgainstFree(0, 0.05, 1.2, 0, 0.8)).toBe(1);
  expect(Number.isFinite(powerAgainstFree(0, 0.05, 1.2, 3, -0.2))).toBe(true);
});
