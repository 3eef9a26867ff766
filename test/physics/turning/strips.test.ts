import { expect, test } from 'vitest';
import type { HullShape } from '../../../src/craft/hullSchema.ts';
import { finiteLength, stripsOf } from '../../../src/physics/turning/strips.ts';
import { built } from '../hull/built.ts';
import { near } from '../hull/near.ts';

// Cylinders broadside, length over diameter and drag coefficient: C. Matthews, Aeronautical Engineer's Data Book, p. 95.
test.each([
  [1, 0.63],
  [2, 0.68],
  [5, 0.74],
  [10, 0.82],
  [40, 0.98],
  [Number.POSITIVE_INFINITY, 1.2],
])('a cylinder of fineness %d has the table’s drag', (fineness, drag) => {
  near(1.2 * finiteLength(fineness), drag, 1e-3);
});

test('longer cylinders have more drag for their size, and none more than the endless one', () => {
  let before = 0;
  for (let fineness = 1; fineness < 500; fineness *= 1.07) {
    const now = finiteLength(fineness);
    expect(now).toBeGreaterThan(before);
    before = now;
  }
  expect(before).toBeLessThan(1);
});

/** Σ drag · Xⁿ, n = 0 the side force on it moved sideways at unit speed in air of unit density, n = 3 with |X| turned at unit rate. */
const sum = (shape: HullShape, weight: (ahead: number) => number): number => {
  const { ahead, drag } = stripsOf(built(shape));
  return drag.reduce((total, each, i) => total + each * weight(ahead[i]!), 0);
};

const cylinder: HullShape = {
  kind: 'cylinder',
  diameter: 0.8,
  noseEnd: 'flat',
  noseLength: 0,
  middleLength: 4,
  tailEnd: 'flat',
  tailLength: 0,
};

// ½ρ C_d D Ω² ∫ X² |X| dX over −L/2 … L/2 = ½ρ C_d D Ω² · 2 (L/2)⁴/4 = ½ρ C_d D Ω² L⁴/32.
test('a cylinder spinning about its middle: ½ρ C_d D Ω² L⁴/32, both halves', () => {
  const [length, diameter] = [4, 0.8];
  const dragCoefficient = 1.2 * finiteLength(length / diameter);
  near(
    sum(cylinder, (x) => Math.abs(x) ** 3),
    (0.5 * dragCoefficient * diameter * length ** 4) / 32,
    1e-12,
  );
  near(
    sum(cylinder, () => 1),
    0.5 * dragCoefficient * diameter * length,
    1e-12,
  );
});

// ∫ D dX = π L D/4 and ∫ D |X|³ dX = 4 D (L/2)⁴/30: ∫ √(1 − s²) s³ ds = 2/15 over 0 … 1.
test('a spheroid: its outline, and its spin in closed form', () => {
  const [length, diameter] = [3, 1];
  const factor = 0.6 * finiteLength(3);
  const spheroid: HullShape = { kind: 'spheroid', length, diameter };
  near(
    sum(spheroid, () => 1),
    factor * (Math.PI / 4) * length * diameter,
    1e-9,
  );
  near(
    sum(spheroid, (x) => Math.abs(x) ** 3),
    factor * diameter * 2 * (length / 2) ** 4 * (2 / 15),
    1e-9,
  );
});

// The outline seen from the side is that of planformArea for a body of revolution.
test.each<[string, HullShape]>([
  ['NACA', { kind: 'naca4', length: 3, diameter: 0.7, tail: 'open' }],
  ['two half-spheroids', { kind: 'twoSpheroid', foreLength: 1, aftLength: 2.4, diameter: 0.9 }],
  ['cylinder with a cone', { ...cylinder, tailEnd: 'cone', tailLength: 1.2 }],
])('%s: the strips together are the outline', (_, shape) => {
  const hull = built(shape);
  const factor = 0.6 * finiteLength(hull.length / hull.height);
  near(
    sum(shape, () => 1),
    factor * hull.planformArea,
    2e-3,
  );
});
