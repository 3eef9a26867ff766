import { expect, test } from 'vitest';
import { hullOf } from '../../../src/physics/hull/hullOf.ts';
import { built } from './built.ts';
import { measured } from './measured.ts';
import { near } from './near.ts';

const SPHEROID = built({ kind: 'spheroid', length: 3, diameter: 1 });

test('a spheroid measured along the station is reproduced exactly, from as few as five rows', () => {
  for (const count of [4, 10]) {
    const rows = measured(SPHEROID, count).map(({ station, girth }) => ({
      at: station,
      size: girth / Math.PI,
    }));
    const hull = built({ kind: 'offsets', along: 'station', across: 'diameter', rows });
    // r² of a spheroid is a parabola in x, and three-point slopes of a parabola are exact.
    near(hull.volume, SPHEROID.volume, 1e-11);
    near(hull.area, SPHEROID.area, 1e-11);
    near(hull.cbStation, 1.5, 1e-11);
    near(hull.tapeAt(0.4, 0), SPHEROID.tapeAt(0.4, 0), 1e-10);
  }
});

test.each([
  { count: 12, shares: 2e-3, metres: 6e-3 },
  { count: 24, shares: 1e-4, metres: 5e-4 },
  { count: 48, shares: 2e-5, metres: 1e-4 },
])('a 3 m spheroid measured along the tape at $count places comes back within $metres m', (allowed) => {
  const rows = measured(SPHEROID, allowed.count).map(({ tape, girth }) => ({ at: tape, size: girth }));
  const hull = built({ kind: 'offsets', along: 'tape', across: 'girth', rows });
  near(hull.volume, SPHEROID.volume, allowed.shares);
  near(hull.area, SPHEROID.area, allowed.shares);
  expect(Math.abs(hull.length - 3)).toBeLessThan(allowed.metres);
  expect(Math.abs(hull.cbStation - 1.5)).toBeLessThan(allowed.metres);
  near(hull.seamLength, SPHEROID.seamLength, 1e-12);
});

const row = (at: number, size: number) => ({ at, size });
const along = (tape: 'station' | 'tape', rows: { at: number; size: number }[]) =>
  ({ kind: 'offsets', along: tape, across: 'diameter', rows }) as const;

test('every row is met, along the station and along the tape', () => {
  const rows = [row(0, 0), row(0.3, 0.4), row(1, 0.9), row(2, 0.7), row(2.7, 0.1)];
  const byStation = built(along('station', rows));
  const byTape = built(along('tape', rows));
  for (const { at, size } of rows.slice(1, -1)) {
    near(2 * byStation.radius(at, 0), size, 1e-9);
    near(2 * byTape.radius(byTape.stationAt(at, 0), 0), size, 1e-9);
  }
  near(byStation.height, 0.9);
  near(byTape.height, 0.9);
});

test('girth and diameter rows say the same', () => {
  const rows = [row(0, 0), row(0.3, 0.4), row(1, 0.9), row(2, 0)];
  const byDiameter = built(along('tape', rows));
  const girths = rows.map(({ at, size }) => row(at, Math.PI * size));
  near(built({ ...along('tape', girths), across: 'girth' }).volume, byDiameter.volume, 1e-12);
});

test('a cylinder with flat faces from rows: straight sides, faces in area and tape', () => {
  const byStation = built(along('station', [row(0, 1), row(1, 1), row(2, 1)]));
  near(byStation.volume, Math.PI / 2);
  near(byStation.area, 2.5 * Math.PI);
  const byTape = built(along('tape', [row(0, 0), row(0.5, 1), row(1.5, 1), row(2.5, 1)]));
  near(byTape.length, 2, 1e-9);
  near(byTape.volume, Math.PI / 2, 1e-9);
  near(byTape.area, 2.5 * Math.PI, 1e-9);
});

test('a cone by tape keeps its straight side', () => {
  const hull = built(along('tape', [row(0, 0), row(1, 0.6), row(2, 1.2)]));
  near(hull.length, 2 * Math.sqrt(1 - 0.09));
  near(hull.volume, (Math.PI * 0.36 * hull.length) / 3);
});

test.each([
  {
    rows: [row(0.1, 0), row(1, 1), row(2, 0)],
    tape: 'station',
    why: /first row stands at station \{0.1 length\}/,
  },
  {
    rows: [row(0, 0), row(1, 1), row(1, 1), row(2, 0)],
    tape: 'station',
    why: /^Row 3 stands at station \{1 length\}/,
  },
  {
    rows: [row(0, 0), row(1, 1), row(0.5, 1)],
    tape: 'tape',
    why: /^Row 3 stands at tape distance \{0.5 length\}/,
  },
  { rows: [row(0, 0), row(1, 0), row(2, 1)], tape: 'station', why: /^Row 2 has diameter 0/ },
  { rows: [row(0, 0.2), row(1, 1), row(2, 0)], tape: 'tape', why: /the tape starts on the axis/ },
  {
    rows: [row(0, 0), row(1, 1), row(1.1, 0.7)],
    tape: 'tape',
    why: /^Between rows 2 and 3 the diameter changes by/,
  },
] as const)('refused with a sentence: $why', ({ rows, tape, why }) => {
  const outcome = hullOf(along(tape, [...rows]));
  if (outcome.status === 'solved') throw new Error('must be refused');
  expect(outcome.why).toMatch(why);
  expect(outcome.remedy).not.toBe('');
});

test('rows read from the other end give the mirrored hull', () => {
  const rows = [row(0, 0), row(0.3, 0.5), row(1, 0.9), row(2, 0.7), row(2.7, 0)];
  for (const tape of ['station', 'tape'] as const) {
    const hull = built(along(tape, rows));
    const back = built(along(tape, rows.map(({ at, size }) => row(2.7 - at, size)).reverse()));
    near(back.volume, hull.volume, 1e-10);
    near(back.cbStation, hull.length - hull.cbStation, 1e-10);
    near(back.length, hull.length, 1e-10);
  }
});

// A ball of radius 1: r = sin s, of which the rows at the tips alone tell the circle.
test('tips that the rows allow are round, not flat: a ball by tape', () => {
  const rows = Array.from({ length: 13 }, (_, i) =>
    row((Math.PI * i) / 12, i === 12 ? 0 : 2 * Math.sin((Math.PI * i) / 12)),
  );
  const hull = built(along('tape', rows));
  near(hull.tapeAt(0, 0), 0);
  expect(Math.abs(hull.length - 2)).toBeLessThan(1e-3);
  near(hull.radius(0.002, 0), Math.sqrt(0.002 * 1.998), 1e-2);
  near(hull.volume, (4 / 3) * Math.PI, 1e-4);
  near(hull.area, 4 * Math.PI, 1e-4);
});
