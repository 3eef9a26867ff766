import { expect, test } from 'vitest';
import { hullOf } from '../../../src/physics/hull/hullOf.ts';
import { built } from './built.ts';
import { near } from './near.ts';

// T. Prestero, MIT/WHOI 2001: dimensions of the hull, from memory; θ = 0.436 rad.
const PRESTERO = {
  kind: 'myring',
  noseLength: 0.191,
  noseOffset: 0.0165,
  middleLength: 0.654,
  tailLength: 0.541,
  tailOffset: 0.0368,
  nosePower: 2,
  tailAngle: 0.436,
  diameter: 0.191,
} as const;

test('the hull of Prestero has its printed figures', () => {
  const hull = built(PRESTERO);
  near(hull.length, 1.33, 0.003); // 1.33 m, from memory
  near(hull.planformArea, 0.226, 0.003); // second-hand
  near(hull.cbStation, 0.61, 0.01); // second-hand, two digits
  near(hull.frontalArea, 0.0285, 0.006); // second-hand; π d²/4 itself is 0.02865
  near(hull.volume, 0.0315, 0.006); // from memory
});

test('the tail meets the cylinder without a corner and leaves the full tip at the angle given', () => {
  const hull = built({ ...PRESTERO, tailOffset: 0 });
  const start = 0.191 - 0.0165 + 0.654;
  near((hull.radius(start, 0) - hull.radius(start + 1e-5, 0)) / 1e-5 + 1, 1, 1e-3);
  near(hull.radius(hull.length - 1e-6, 0) / 1e-6, Math.tan(0.436), 1e-4);
  expect(hull.radius(hull.length, 0)).toBeLessThan(1e-12);
});

test('ends cut back leave faces that count in area and tape distance', () => {
  const hull = built(PRESTERO);
  const nose = hull.radius(0, 0);
  near(nose, (0.191 / 2) * Math.sqrt(1 - ((0.0165 - 0.191) / 0.191) ** 2));
  near(hull.tapeAt(0, 0), nose);
  expect(hull.stationAt(nose / 2, 0)).toBe(0);
  near(hull.seamLength - hull.tapeAt(hull.length, 0), hull.radius(hull.length, 0));
});

// n = 2 and no middle: nose is half a spheroid, whatever the offsets of the other end.
test('with n = 2 and no cut the nose is half a spheroid', () => {
  const hull = built({ ...PRESTERO, noseOffset: 0 });
  for (const x of [0.001, 0.05, 0.15])
    near(hull.radius(x, 0), 0.0955 * Math.sqrt(1 - (1 - x / 0.191) ** 2), 1e-10);
});

test.each([
  { change: { noseOffset: 0.2 }, why: /nose offset/, remedy: /under \{0.191 length\}/ },
  { change: { tailOffset: 0.6 }, why: /tail offset/, remedy: /under \{0.541 length\}/ },
  { change: { tailAngle: -0.1 }, why: /cross the axis/, remedy: /between 0°/ },
  { change: { tailAngle: 0.9 }, why: /swell past/, remedy: /between 0°/ },
])('refused with a sentence: $change', ({ change, why, remedy }) => {
  const outcome = hullOf({ ...PRESTERO, ...change });
  if (outcome.status === 'solved') throw new Error('must be refused');
  expect(outcome.why).toMatch(why);
  expect(outcome.remedy).toMatch(remedy);
});

test('the greatest angle it offers is the greatest it takes', () => {
  const greatest = Math.atan((1.5 * 0.191) / 0.541);
  expect(hullOf({ ...PRESTERO, tailAngle: greatest - 1e-9 }).status).toBe('solved');
  expect(hullOf({ ...PRESTERO, tailAngle: greatest + 1e-9 }).status).toBe('infeasible');
});
