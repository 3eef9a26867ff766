import { expect, test } from 'vitest';
import { hullOf } from '../../../src/physics/hull/hullOf.ts';
import { built } from './built.ts';
import { measured } from './measured.ts';
import { near } from './near.ts';

const SPHEROID = built({ kind: 'spheroid', length: 3, diameter: 1 });

function goresOf(count: number, places: number) {
  const rows = measured(SPHEROID, places).map(({ tape, girth }) => ({ tape, width: girth / count }));
  return { kind: 'gores', count, rows } as const;
}

test.each([
  { places: 12, shares: 2e-3, metres: 6e-3 },
  { places: 24, shares: 1e-4, metres: 5e-4 },
  { places: 48, shares: 2e-5, metres: 1e-4 },
])(
  'gores cut for a 3 m spheroid at $places places sew up to it within $metres m',
  ({ places, ...allowed }) => {
    const hull = built(goresOf(8, places));
    near(hull.volume, SPHEROID.volume, allowed.shares);
    near(hull.area, SPHEROID.area, allowed.shares);
    near(hull.filmArea, SPHEROID.area, allowed.shares);
    expect(Math.abs(hull.length - 3)).toBeLessThan(allowed.metres);
    expect(Math.abs(hull.cbStation - 1.5)).toBeLessThan(allowed.metres);
    near(hull.seamLength, SPHEROID.seamLength, 1e-12);
  },
);

test('the same girth in any number of gores is the same hull; two gores are two sheets', () => {
  const six = built(goresOf(6, 16));
  near(built(goresOf(11, 16)).volume, six.volume, 1e-11);
  near(built({ kind: 'twoSheet', rows: goresOf(2, 16).rows }).volume, six.volume, 1e-11);
});

const row = (tape: number, width: number) => ({ tape, width });

test('three rows are enough: greatest girth, tape and film are those of the pattern', () => {
  const width = (2 * Math.PI * 0.3) / 5;
  const hull = built({ kind: 'gores', count: 5, rows: [row(0, 0), row(1, width), row(2, 0)] });
  near(hull.height, 0.6);
  near(hull.seamLength, 2);
  near(hull.filmArea, hull.area, 1e-10);
  expect(hull.length).toBeLessThan(2);
});

// Width w everywhere over a tape S: the tips lie flat until r = s meets w n/2π = R; then a cylinder. Elementary.
test('a rectangular two-sheet bag: flat faces, a cylinder between, film in folds at the ends', () => {
  const [w, S] = [0.5, 2];
  const R = w / Math.PI;
  const hull = built({ kind: 'twoSheet', rows: [row(0, w), row(1, w), row(S, w)] });
  near(hull.length, S - 2 * R);
  near(hull.volume, Math.PI * R * R * (S - 2 * R));
  near(hull.area, 2 * Math.PI * R * (S - 2 * R) + 2 * Math.PI * R * R);
  near(hull.filmArea, 2 * w * S);
  near(hull.seamLength, S);
  near(hull.tapeAt(0, 0), R);
  near(hull.skinStation, hull.length / 2);
  // Film: uniform 2w per metre of tape, on the faces at r = s; about the axis ∫r² 2w ds.
  near(hull.skinInertia[0], 2 * w * (R * R * (S - 2 * R) + (2 * R ** 3) / 3));
});

test('a tip that widens faster than the tape allows lies flat until it meets the pattern', () => {
  const rows = [row(0, 0), row(0.05, 0.2), row(0.3, 0.35), row(1, 0.4), row(2, 0)];
  const hull = built({ kind: 'gores', count: 6, rows });
  const face = hull.radius(0, 0);
  expect(face).toBeGreaterThan(0.3);
  near(hull.tapeAt(0, 0), face, 1e-9);
  expect(hull.filmArea).toBeGreaterThan(hull.area * 1.001);
  // Beyond the face the girth is the pattern's.
  near(hull.girth(hull.stationAt(1, 0)), 6 * 0.4, 1e-9);
});

test('a pattern without length, pinched or out of order is refused with a sentence', () => {
  const wide = hullOf({ kind: 'gores', count: 4, rows: [row(0, 0), row(0.5, 3), row(1, 0)] });
  const pinched = hullOf({ kind: 'twoSheet', rows: [row(0, 0), row(0.5, 0), row(1, 0)] });
  const late = hullOf({ kind: 'twoSheet', rows: [row(0.1, 0), row(0.5, 1), row(1, 0)] });
  if (wide.status === 'solved' || pinched.status === 'solved' || late.status === 'solved')
    throw new Error('must be refused');
  expect(wide.why).toMatch(/everywhere wider/);
  expect(pinched.why).toMatch(/^Row 2 has width 0/);
  expect(late.why).toMatch(/begins at 0/);
});
