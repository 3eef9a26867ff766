import fc from 'fast-check';
import { expect, test } from 'vitest';
import { addedMassOf, ellipsoidAddedMass } from '../../../src/physics/hull/addedMass.ts';
import { built } from './built.ts';
import { near } from './near.ts';

// H. Lamb, ARC R&M 623 (1918), his finenesses rounded; k1 row and 0.860, 0.094, 0.367, 0.465, 0.805 seen in a scan,
// the rest from memory.
const LAMB = [
  { f: 1.5, k1: 0.305, k2: 0.621, turn: 0.094 },
  { f: 2.0, k1: 0.209, k2: 0.702, turn: 0.24 },
  { f: 2.51, k1: 0.156, k2: 0.763, turn: 0.367 },
  { f: 2.99, k1: 0.122, k2: 0.803, turn: 0.465 },
  { f: 3.99, k1: 0.082, k2: 0.86, turn: 0.608 },
  { f: 4.99, k1: 0.059, k2: 0.895, turn: 0.701 },
  { f: 6.01, k1: 0.045, k2: 0.918, turn: 0.764 },
  { f: 6.97, k1: 0.036, k2: 0.933, turn: 0.805 },
];

test.each(LAMB)('Lamb’s table at fineness $f, within the 0.0025 of its rounding', ({ f, k1, k2, turn }) => {
  const added = addedMassOf(built({ kind: 'spheroid', length: f, diameter: 1 }));
  expect(Math.abs(added.surge - k1)).toBeLessThanOrEqual(0.0025);
  for (const k of [added.sway, added.heave]) expect(Math.abs(k - k2)).toBeLessThanOrEqual(0.0025);
  for (const k of [added.pitch, added.yaw]) expect(Math.abs(k - turn)).toBeLessThanOrEqual(0.0025);
});

/** Prolate spheroid in closed form: Lamb 1932, §§ 114, 373; M. Munk, NACA TR 184 (1924). */
function prolate(f: number) {
  const e = Math.sqrt(1 - 1 / (f * f));
  const L = Math.log((1 + e) / (1 - e));
  const alpha = ((2 * (1 - e * e)) / e ** 3) * (L / 2 - e);
  const beta = 1 / (e * e) - ((1 - e * e) / (2 * e ** 3)) * L;
  const turn = (e ** 4 * (beta - alpha)) / ((2 - e * e) * (2 * e * e - (2 - e * e) * (beta - alpha)));
  return { surge: alpha / (2 - alpha), sway: beta / (2 - beta), turn };
}

test('equals the closed form of the prolate spheroid', () => {
  fc.assert(
    fc.property(fc.double({ min: 1.2, max: 30, noNaN: true }), (f) => {
      const added = ellipsoidAddedMass(f, 1, 1);
      const closed = prolate(f);
      near(added.surge, closed.surge, 1e-9);
      near(added.sway, closed.sway, 1e-9);
      near(added.pitch, closed.turn, 1e-9);
    }),
  );
});

test('ball: a half, a half and nothing for turning', () => {
  const added = addedMassOf(built({ kind: 'spheroid', length: 2, diameter: 2 }));
  near(added.surge, 0.5);
  near(added.sway, 0.5);
  near(added.heave, 0.5);
  expect(added.pitch).toBeLessThan(1e-15);
  expect(added.yaw).toBeLessThan(1e-15);
});

const axis = fc.double({ min: 0.1, max: 10, noNaN: true });

test('the three shares of any ellipsoid add up to 2, and renaming the axes renames the answer', () => {
  fc.assert(
    fc.property(axis, axis, axis, (a, b, c) => {
      const added = ellipsoidAddedMass(a, b, c);
      const share = (k: number) => (2 * k) / (1 + k);
      near(share(added.surge) + share(added.sway) + share(added.heave), 2, 1e-12);
      const renamed = ellipsoidAddedMass(a, c, b);
      near(renamed.sway, added.heave, 1e-12);
      near(renamed.pitch, added.yaw, 1e-9);
      expect(Math.min(...Object.values(added))).toBeGreaterThanOrEqual(0);
    }),
  );
});

// Elliptic cylinder in two dimensions, broad side on: added mass πρb² against displaced πρbc; the limit a → ∞.
test('a very long ellipsoid tends to the elliptic cylinder', () => {
  const added = ellipsoidAddedMass(2000, 1, 2);
  near(added.heave, 1 / 2, 1e-4);
  near(added.sway, 2, 1e-4);
});
