import fc from 'fast-check';
import { expect, test } from 'vitest';
import {
  clockOf,
  keelAt,
  onSection,
  sectionOutline,
  sideOutline,
  widestStation,
} from '../../src/scene/outline.ts';
import { geometry } from './fixture.ts';

const { hull } = geometry();

/** Area by the shoelace formula, without its sign. */
const areaOf = (points: readonly { u: number; z: number }[]): number =>
  Math.abs(
    points.reduce((sum, a, i) => {
      const b = points[(i + 1) % points.length]!;
      return sum + a.u * b.z - b.u * a.z;
    }, 0),
  ) / 2;

test('the side outline is closed and holds the area of the ellipse it shows', () => {
  const outline = sideOutline(hull, 400);
  expect(outline[0]!.u).toBeCloseTo(0, 9);
  expect(outline.at(-1)!.u).toBeCloseTo(0, 9);
  // π a b, elementary geometry
  expect(areaOf(outline)).toBeCloseTo(Math.PI * 1.5 * 0.5, 3);
});

test('the section outline holds the section area of the hull', () => {
  for (const station of [0.3, 1.5, 2.8]) {
    expect(areaOf(sectionOutline(hull, station, 720))).toBeCloseTo(hull.sectionArea(station), 4);
  }
});

test('clock angles run clockwise from the top as seen from astern: 90° is starboard, on the right', () => {
  expect(onSection(Math.PI / 2, 1).u).toBeCloseTo(1, 12);
  expect(onSection(0, 1).z).toBeCloseTo(1, 12);
  fc.assert(
    fc.property(fc.double({ min: 0.001, max: 6.28, noNaN: true }), (clock) => {
      expect(clockOf(onSection(clock, 0.7))).toBeCloseTo(clock, 9);
    }),
  );
});

test('the keel lies below the axis on the hull and on it beyond', () => {
  expect(keelAt(hull, 1.5)).toBeCloseTo(-0.5, 9);
  expect(Math.abs(keelAt(hull, 9))).toBe(0);
});

test('the widest station of a spheroid is its middle', () => {
  expect(Math.abs(widestStation(hull) - 1.5)).toBeLessThan(0.03);
});
