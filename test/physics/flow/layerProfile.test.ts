import fc from 'fast-check';
import { expect, test } from 'vitest';
import { integrateFixed } from '../../../src/numeric/quadrature.ts';
import { shareOfSpeed, thicknessOf } from '../../../src/physics/flow/layerProfile.ts';

const size = fc.double({ min: 1e-4, max: 2, noNaN: true });

test('a layer of the thickness found carries the momentum area asked for', () => {
  fc.assert(
    fc.property(size, fc.oneof(fc.constant(0), size), fc.boolean(), (area, radius, turbulent) => {
      const thickness = thicknessOf(area, radius, turbulent);
      // y = δ z⁷ makes the seventh root smooth.
      const carried = integrateFixed(
        (z) => {
          const y = thickness * z ** 7;
          const f = shareOfSpeed(y, thickness, turbulent);
          return 2 * Math.PI * f * (1 - f) * (radius + y) * 7 * thickness * z ** 6;
        },
        0,
        1,
        32,
      );
      expect(carried / area).toBeCloseTo(1, 9);
    }),
  );
});

test('none without area; at rest on the skin, full speed beyond, rising between', () => {
  expect(thicknessOf(0, 0, true)).toBe(0);
  expect(thicknessOf(0, 1, false)).toBe(0);
  for (const turbulent of [false, true]) {
    expect(shareOfSpeed(0, 1, turbulent)).toBe(0);
    expect(shareOfSpeed(-1, 1, turbulent)).toBe(0);
    expect(shareOfSpeed(1, 1, turbulent)).toBe(1);
    expect(shareOfSpeed(0.999999, 1, turbulent)).toBeCloseTo(1, 5);
    expect(shareOfSpeed(0.5, 1, turbulent)).toBeGreaterThan(shareOfSpeed(0.4, 1, turbulent));
  }
});

// Schlichting ch. X and XXI (from memory): H = δ₁/θ = 2.554 for this laminar profile, 9/7 for the seventh root.
test('shape figures 2.554 and 9/7 on a wide body', () => {
  for (const [turbulent, wanted] of [
    [false, 2.554],
    [true, 9 / 7],
  ] as const) {
    const theta = 1 / thicknessOf(2 * Math.PI * 1e6, 1e6, turbulent);
    const displaced = integrateFixed((z) => (1 - shareOfSpeed(z ** 7, 1, turbulent)) * 7 * z ** 6, 0, 1, 32);
    expect(displaced / theta).toBeCloseTo(wanted, 3);
  }
});
