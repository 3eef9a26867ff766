import { expect, test } from 'vitest';
import { catalogue } from '../../src/catalogue/catalogue.ts';
import type { PartEntry } from '../../src/catalogue/schema.ts';
import type { PartKind } from '../../src/craft/schema.ts';
import { stationOf } from '../../src/craft/station.ts';
import { positionOf } from '../../src/physics/mass/position.ts';
import { firstPlace } from '../../src/report/firstPlace.ts';
import { depthInside } from '../../src/report/insideHull.ts';
import { craft, geometry, part } from '../scene/fixture.ts';

const { hull } = geometry();
const none = craft([], []);
const entry = (kind: PartKind) => catalogue.parts.find((each) => each.kind === kind)!;
const asPart = ({ kind, size, fin }: PartEntry) => ({ kind, size, fin: fin ?? null });

test('every part of the catalogue has a place of its kind: thrust behind the tail, fins on the skin before it, a camera ahead of the CB', () => {
  const first = (kind: PartKind) => firstPlace(asPart(entry(kind)), none, hull);
  expect(first('thruster')).toMatchObject({ kind: 'axis' });
  expect(stationOf(first('thruster'))).toBeGreaterThan(hull.length);
  expect(first('fin')).toMatchObject({ kind: 'skin', clock: 0 });
  for (const kind of ['battery', 'gondola'] as const) {
    expect(first(kind)).toMatchObject({ kind: 'keel', drop: expect.closeTo(entry(kind).size.height / 2, 3) });
    expect(stationOf(first(kind))).toBeCloseTo(hull.cbStation, 3);
  }
  expect(stationOf(first('camera'))).toBeLessThan(hull.cbStation - 0.1);
  for (const each of catalogue.parts) {
    const { thruster } = each;
    const full = thruster ? { ...thruster, yaw: straight, pitch: straight, differential: false } : null;
    const at = positionOf(firstPlace(asPart(each), none, hull), hull);
    expect(depthInside({ thruster: full, fin: each.fin ?? null }, at, hull)).toBe(0);
  }
});

const straight = { least: 0, most: 0, set: 0, slew: 0 };

test('parts added one after the other do not lie on each other, and fins go round the hull', () => {
  for (const kind of ['battery', 'thruster', 'fin'] as const) {
    const made = asPart(entry(kind));
    const parts: ReturnType<typeof part>[] = [];
    for (let i = 0; i < 6; i++) {
      parts.push(part(`p${i}`, firstPlace(made, craft(parts, []), hull), made));
    }
    const spots = parts.map(({ place }) => positionOf(place, hull));
    for (const [i, a] of spots.entries()) {
      for (const b of spots.slice(i + 1)) {
        expect(Math.hypot(...a.map((each, axis) => each - b[axis]!))).toBeGreaterThan(0.02);
      }
    }
    const clocks = parts.map(({ place }) => (place.kind === 'skin' ? place.clock : null));
    if (kind === 'fin') expect(new Set(clocks.slice(0, 4)).size).toBe(4);
    else expect(spots.map(([x]) => x)).toEqual(spots.map(([x]) => x).toSorted((a, b) => a - b));
  }
});

test('what hangs well below the keel is in nobody’s way, what touches it is', () => {
  const made = asPart(entry('battery'));
  const { cbStation } = hull;
  const hung = (drop: number) => part('hung', { kind: 'keel', station: cbStation, drop });
  const station = (drop: number) => stationOf(firstPlace(made, craft([hung(drop)], []), hull));
  expect(station(0.3)).toBeCloseTo(cbStation, 3);
  expect(station(0)).toBeGreaterThan(cbStation + 0.05);
});
