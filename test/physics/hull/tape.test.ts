import fc from 'fast-check';
import { expect, test } from 'vitest';
import type { Hull, SkinPath } from '../../../src/physics/hull/hull.ts';
import { built } from './built.ts';
import { nameOf, SHAPES } from './shapes.ts';

const cases = SHAPES.map((shape) => ({ name: nameOf(shape), hull: built(shape) }));
/**
 * Shares of the length: an end, or not within a millionth of one. Nearer to a blunt tip the station cannot tell the
 * tape distance: there the tape goes as the root of the station, and half the digits are lost.
 */
const share = fc.oneof(fc.constantFrom(0, 1), fc.double({ min: 1e-6, max: 1 - 1e-6, noNaN: true }));
const clocks = fc.double({ min: -7, max: 7, noNaN: true });
const PATH = ['length', 'x', 'r', 'xx', 'xr', 'rr'] as const;

test.each(cases)('tape ↔ station on $name: back to the same place within 1e-12 of the length', ({ hull }) => {
  fc.assert(
    fc.property(share, fc.constantFrom(0, 0.4, 1.3, Math.PI / 2, 2.9), (part, clock) => {
      const station = part * hull.length;
      const tape = hull.tapeAt(station, clock);
      expect(Math.abs(hull.stationAt(tape, clock) - station)).toBeLessThanOrEqual(1e-12 * hull.length);
    }),
  );
});

test.each(cases)(
  'tape grows with the station on $name, at least as fast, and clamps at the ends',
  ({ hull }) => {
    let before = hull.tapeAt(0, 1);
    for (let i = 1; i <= 200; i += 1) {
      const tape = hull.tapeAt((hull.length * i) / 200, 1);
      expect(tape - before).toBeGreaterThanOrEqual((hull.length / 200) * (1 - 1e-9));
      before = tape;
    }
    expect(hull.tapeAt(-1, 1)).toBe(hull.tapeAt(0, 1));
    expect(hull.tapeAt(hull.length + 1, 1)).toBe(hull.tapeAt(hull.length, 1));
    expect(hull.stationAt(-1, 1)).toBe(0);
    expect(hull.stationAt(100, 1)).toBeCloseTo(hull.length, 12);
    expect(hull.radius(-0.01, 1)).toBe(0);
    expect(hull.radius(hull.length + 0.01, 1)).toBe(0);
  },
);

test.each(cases)('a skin path on $name is the sum of its parts, in either order', ({ hull }) => {
  fc.assert(
    fc.property(share, share, fc.constantFrom(0, 0.7, 2.2), (a, b, clock) => {
      const [from, to] = [a * hull.length, b * hull.length];
      const path = hull.skinPath(from, to, clock);
      const back = hull.skinPath(to, from, clock);
      const middle = (from + to) / 2;
      const first = hull.skinPath(from, middle, clock);
      const second = hull.skinPath(middle, to, clock);
      const scale = 1e-12 * (1 + hull.length) ** 3;
      for (const key of PATH) {
        expect(Math.abs(path[key] - back[key])).toBeLessThanOrEqual(scale);
        expect(Math.abs(path[key] - first[key] - second[key])).toBeLessThanOrEqual(scale);
      }
      expect(path.length).toBeGreaterThanOrEqual(Math.abs(to - from) - scale);
    }),
  );
});

/** The same sums over many short chords through radius(). */
function chordSums(hull: Hull, from: number, to: number, clock: number): SkinPath {
  const sums = { length: 0, x: 0, r: 0, xx: 0, xr: 0, rr: 0 };
  const n = 20_000;
  for (let i = 0; i < n; i += 1) {
    const x0 = from + ((to - from) * i) / n;
    const x1 = from + ((to - from) * (i + 1)) / n;
    const [r0, r1] = [hull.radius(x0, clock), hull.radius(x1, clock)];
    const [x, r, chord] = [(x0 + x1) / 2, (r0 + r1) / 2, Math.hypot(x1 - x0, r1 - r0)];
    sums.length += chord;
    sums.x += x * chord;
    sums.r += r * chord;
    sums.xx += x * x * chord;
    sums.xr += x * r * chord;
    sums.rr += r * r * chord;
  }
  return sums;
}

test.each(cases)('a skin path on $name is what many short chords add up to', ({ hull }) => {
  const [from, to, clock] = [0.08 * hull.length, 0.93 * hull.length, 0.8];
  const path = hull.skinPath(from, to, clock);
  const chords = chordSums(hull, from, to, clock);
  for (const key of PATH) expect(Math.abs(path[key] - chords[key])).toBeLessThanOrEqual(1e-6 * chords[key]);
});

test.each(cases)('section area and girth of $name are those of a polygon through radius()', ({ hull }) => {
  for (const part of [0.03, 0.3, 0.5, 0.8]) {
    const station = part * hull.length;
    const n = 2000;
    let area = 0;
    let girth = 0;
    for (let k = 0; k < n; k += 1) {
      const [a, b] = [(2 * Math.PI * k) / n, (2 * Math.PI * (k + 1)) / n];
      const [p, q] = [hull.radius(station, a), hull.radius(station, b)];
      area += (p * q * Math.sin(b - a)) / 2;
      girth += Math.hypot(p * Math.sin(a) - q * Math.sin(b), p * Math.cos(a) - q * Math.cos(b));
    }
    expect(Math.abs(hull.sectionArea(station) - area)).toBeLessThanOrEqual(2e-5 * area);
    expect(Math.abs(hull.girth(station) - girth)).toBeLessThanOrEqual(2e-5 * girth);
  }
});

test.each(cases)('$name is symmetric about both planes through its axis', ({ hull }) => {
  fc.assert(
    fc.property(share, clocks, (part, clock) => {
      const station = part * hull.length;
      const r = hull.radius(station, clock);
      const slack = 1e-9 * hull.height;
      expect(Math.abs(hull.radius(station, -clock) - r)).toBeLessThanOrEqual(slack);
      expect(Math.abs(hull.radius(station, Math.PI - clock) - r)).toBeLessThanOrEqual(slack);
    }),
  );
});

test.each(cases)('stations for drawing $name rise from end to end and follow the outline', ({ hull }) => {
  const stations = hull.drawStations(60);
  expect(stations[0]).toBe(0);
  expect(stations.at(-1)).toBeCloseTo(hull.length, 12);
  expect(stations.length).toBeGreaterThanOrEqual(30);
  expect(stations.length).toBeLessThanOrEqual(80);
  for (let i = 1; i < stations.length; i += 1) {
    const [x0, x1] = [stations[i - 1]!, stations[i]!];
    expect(x1).toBeGreaterThan(x0);
    const sag = hull.radius((x0 + x1) / 2, 0) - (hull.radius(x0, 0) + hull.radius(x1, 0)) / 2;
    const rise = hull.radius(x1, 0) - hull.radius(x0, 0);
    const offChord = (sag * (x1 - x0)) / Math.hypot(x1 - x0, rise);
    expect(Math.abs(offChord)).toBeLessThan(0.005 * hull.height);
  }
});
