import { expect, test } from 'vitest';
import { hullOf } from '../../../src/physics/hull/hullOf.ts';
import { built } from './built.ts';
import { near } from './near.ts';

const CYLINDER = {
  kind: 'cylinder',
  diameter: 1,
  noseEnd: 'flat',
  noseLength: 0,
  middleLength: 2,
  tailEnd: 'flat',
  tailLength: 0,
} as const;

// Any table of mensuration.
test('a plain cylinder: volume, area with both faces, inertia, tape over the faces', () => {
  const hull = built(CYLINDER);
  near(hull.volume, Math.PI / 2);
  near(hull.area, 2 * Math.PI + Math.PI / 2);
  near(hull.cbStation, 1);
  near(hull.skinStation, 1);
  near(hull.volumeInertia[0], (hull.volume * 0.25) / 2);
  near(hull.volumeInertia[1], hull.volume * (0.25 / 4 + 4 / 12));
  near(hull.seamLength, 3);
  near(hull.tapeAt(0, 0), 0.5);
  near(hull.tapeAt(2, 0), 2.5);
  near(hull.tapeAt(0.7, 0), 1.2);
});

test('cone: a third of the cylinder, CB at 3/4 of its length from the tip', () => {
  const hull = built({ ...CYLINDER, noseEnd: 'cone', noseLength: 3, middleLength: 0 });
  near(hull.volume, Math.PI / 4);
  near(hull.cbStation, (3 / 4) * 3);
  near(hull.area, Math.PI * 0.5 * Math.hypot(3, 0.5) + Math.PI / 4);
});

test('half a ball at each end: capsule', () => {
  const end = { noseEnd: 'ellipsoid', noseLength: 0.5, tailEnd: 'ellipsoid', tailLength: 0.5 } as const;
  const hull = built({ ...CYLINDER, ...end });
  near(hull.volume, (Math.PI / 6) * 1 + Math.PI / 2);
  near(hull.area, Math.PI + 2 * Math.PI);
  near(hull.tapeAt(1.5, 0), Math.PI / 4 + 1);
});

// Tangent ogive: V = π[ℓϱ² − ℓ³/3 − (ϱ − R)ϱ² asin(ℓ/ϱ)], elementary integral of (√(ϱ² − x²) − (ϱ − R))².
test('tangent ogive: its volume, and no corner at the shoulder', () => {
  const [R, l] = [0.5, 1.4];
  const arc = (R * R + l * l) / (2 * R);
  const hull = built({ ...CYLINDER, noseEnd: 'ogive', noseLength: l, middleLength: 0 });
  near(hull.volume, Math.PI * (l * arc ** 2 - l ** 3 / 3 - (arc - R) * arc ** 2 * Math.asin(l / arc)), 1e-11);
  expect(0.5 - hull.radius(l - 1e-4, 0)).toBeLessThan(1e-8);
});

test('an ogive as long as its radius is half a ball', () => {
  const hull = built({ ...CYLINDER, noseEnd: 'ogive', noseLength: 0.5, middleLength: 0 });
  near(hull.volume, Math.PI / 12);
});

test('a length given with a flat end is not used', () => {
  near(built({ ...CYLINDER, tailLength: 5 }).length, 2);
});

test('an ogive shorter than its radius, and a hull without length, are refused with a sentence', () => {
  const short = hullOf({ ...CYLINDER, tailEnd: 'ogive', tailLength: 0.3 });
  const none = hullOf({ ...CYLINDER, middleLength: 0 });
  if (short.status === 'solved' || none.status === 'solved') throw new Error('must be refused');
  expect(short.why).toMatch(/^The tail is an ogive \{0.3 length\} long/);
  expect(short.remedy).toMatch(/at least \{0.5 length\}/);
  expect(none.remedy).toMatch(/at least 1 mm/);
});
