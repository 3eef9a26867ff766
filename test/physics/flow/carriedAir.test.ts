import { expect, test } from 'vitest';
import type { HullShape } from '../../../src/craft/hullSchema.ts';
import type { CarriedAir } from '../../../src/physics/flow/carriedAir.ts';
import { ellipsoidAddedMass } from '../../../src/physics/hull/addedMass.ts';
import { benchShapes } from '../../bench/shapes.ts';
import { nameOf, SHAPES } from '../hull/shapes.ts';
import { flowOf, reversed } from './flowOf.ts';

function carried(shape: HullShape, detail = 1): CarriedAir {
  const found = flowOf(shape, detail).addedMass();
  if (found.status !== 'solved') throw new Error(found.why);
  return found.value;
}

const spheroid = (fineness: number): HullShape => ({ kind: 'spheroid', length: fineness, diameter: 1 });

// H. Lamb, ARC R&M 623 (1918), his finenesses rounded; which figures are from memory: test/physics/hull/addedMass.test.ts.
test.each([
  [1.5, 0.305, 0.621, 0.094],
  [2.0, 0.209, 0.702, 0.24],
  [2.99, 0.122, 0.803, 0.465],
  [3.99, 0.082, 0.86, 0.608],
  [6.01, 0.045, 0.918, 0.764],
])('Lamb’s table at fineness %d: %d, %d, %d, within the 0.0025 of its rounding', (f, k1, k2, turn) => {
  const { surge, sway, yaw } = carried(spheroid(f));
  expect(Math.abs(surge - k1)).toBeLessThanOrEqual(0.0025);
  expect(Math.abs(sway - k2)).toBeLessThanOrEqual(0.0025);
  expect(Math.abs(yaw - turn)).toBeLessThanOrEqual(0.0025);
});

test.each([0.6, 1, 2, 4, 8, 20])('fineness %d: Lamb’s closed form to 1e-6, acting at the middle', (f) => {
  const [found, exact] = [carried(spheroid(f)), ellipsoidAddedMass(f / 2, 0.5, 0.5)];
  expect(found.surge).toBeCloseTo(exact.surge, 6);
  expect(found.sway).toBeCloseTo(exact.sway, 5);
  expect(found.yaw).toBeCloseTo(exact.yaw, 5);
  expect(found.swayStation / f).toBeCloseTo(0.5, 6);
});

const every: [string, HullShape][] = [
  ...Object.entries(benchShapes),
  ...SHAPES.map((shape): [string, HullShape] => [nameOf(shape), shape]),
];

test.each(every)('%s: positive, and twice as many panels change it by less than 5e-4', (_, shape) => {
  const [coarse, fine] = [carried(shape), carried(shape, 2)];
  for (const key of ['surge', 'sway', 'yaw'] as const) {
    expect(coarse[key]).toBeGreaterThan(0);
    expect(Math.abs(coarse[key] - fine[key])).toBeLessThan(5e-4);
  }
});

test.each([benchShapes.twoSpheroid, benchShapes.series58, benchShapes.cylinder, SHAPES[10]!])(
  'tail first the same air is carried, acting at the mirrored station: $kind',
  (shape) => {
    const [ahead, astern] = [carried(shape), carried(reversed(shape))];
    for (const key of ['surge', 'sway', 'yaw'] as const)
      expect(Math.abs(ahead[key] - astern[key])).toBeLessThan(2e-4);
    const { length } = flowOf(shape).hull;
    expect((ahead.swayStation + astern.swayStation) / length).toBeCloseTo(1, 3);
  },
);

// Strip theory: broadside each slice of a slender hull carries its own volume (Munk, NACA TR 184, 1924), so sway tends
// to 1 and acts at the CB.
test('a slender hull tends to strip theory', () => {
  const { sway, yaw, swayStation, surge } = carried({
    kind: 'naca4',
    length: 30,
    diameter: 1,
    tail: 'closed',
  });
  expect(sway).toBeGreaterThan(0.985);
  expect(sway).toBeLessThan(1);
  expect(yaw).toBeGreaterThan(0.95);
  expect(surge).toBeLessThan(0.01);
  expect(
    Math.abs(swayStation - flowOf({ kind: 'naca4', length: 30, diameter: 1, tail: 'closed' }).hull.cbStation),
  ).toBeLessThan(0.1);
});
