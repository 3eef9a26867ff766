import fc from 'fast-check';
import { expect, test } from 'vitest';
import { type Attitude, attitudeOf } from '../../../src/physics/balance/attitude.ts';

/** The direction of down in hull axes, as turned: pitch then heel. */
const downAt = ({ pitch, heel }: Attitude) => [
  Math.sin(pitch),
  Math.cos(pitch) * Math.sin(heel),
  -Math.cos(pitch) * Math.cos(heel),
];

const degrees = Math.PI / 180;

test('nothing to hang by: no attitude', () => {
  expect(attitudeOf([0, 0, 0])).toBeNull();
});

test('without heel it is atan2(x_G − x_B, z_B − z_G), past the vertical too', () => {
  expect(attitudeOf([0.3, 0, -0.3])!.pitch).toBeCloseTo(45 * degrees, 12);
  expect(attitudeOf([-0.3, 0, -0.3])!.pitch).toBeCloseTo(-45 * degrees, 12);
  expect(attitudeOf([0.3, 0, 0.3])!.pitch).toBeCloseTo(135 * degrees, 12);
});

test('the hang vector points down in the attitude found', () => {
  const component = fc.double({ min: -2, max: 2, noNaN: true });
  fc.assert(
    fc.property(component, component, component, (x, y, z) => {
      const size = Math.hypot(x, y, z);
      fc.pre(size > 1e-3);
      const down = downAt(attitudeOf([x, y, z])!);
      [x, y, z].forEach((each, i) => {
        expect(down[i]).toBeCloseTo(each / size, 9);
      });
    }),
  );
});

test('a mirrored craft heels the other way and keeps its pitch', () => {
  const here = attitudeOf([0.1, 0.2, -0.5])!;
  const mirrored = attitudeOf([0.1, -0.2, -0.5])!;
  expect(mirrored.pitch).toBe(here.pitch);
  expect(mirrored.heel).toBe(-here.heel);
});

// Inclining experiment, Nicholls’s Seamanship p. 532: a ship of W with its metacentre GM above the CG hangs from it as a
// blimp hangs from its CB; a weight w shifted athwart by d heels it to tan φ = w d / (W GM).
test.each([
  { shifted: 100, by: 30, total: 9000, tangent: Math.tan(8 * degrees), depth: 2.37, digits: 2 },
  { shifted: 3, by: 40, total: 2600, tangent: 2 / 12 / 29.5, depth: 8.17, digits: 2 },
])('inclining: $shifted t over $by ft', ({ shifted, by, total, tangent, depth, digits }) => {
  const heelWith = (h: number) => attitudeOf([0, shifted * by, -total * h])!.heel;
  expect((shifted * by) / (total * tangent)).toBeCloseTo(depth, digits);
  expect(Math.tan(heelWith((shifted * by) / (total * tangent)))).toBeCloseTo(tangent, 12);
});
