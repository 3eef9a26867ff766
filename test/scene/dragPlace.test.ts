import fc from 'fast-check';
import { expect, test } from 'vitest';
import type { Place } from '../../src/craft/placeSchema.ts';
import {
  atStation,
  draggedInSide,
  heldInFront,
  isMirrored,
  movedInFront,
  sharedStep,
  stationOfPlace,
  wayInFront,
} from '../../src/scene/dragPlace.ts';
import { onSection } from '../../src/scene/outline.ts';
import { geometry } from './fixture.ts';

const { hull } = geometry();
const number = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const places: fc.Arbitrary<Place> = fc.oneof(
  fc.record({
    kind: fc.constant('skin' as const),
    station: number(0, 3),
    clock: number(0, 6.28),
    standoff: number(-0.1, 0.3),
  }),
  fc.record({ kind: fc.constant('keel' as const), station: number(0, 3), drop: number(0, 0.5) }),
  fc.record({ kind: fc.constant('axis' as const), station: number(-1, 4) }),
  fc.record({ kind: fc.constant('free' as const), x: number(-1, 4), y: number(-1, 1), z: number(-1, 1) }),
);

test('a place keeps its kind, and what needs skin or keel stays on the hull', () => {
  fc.assert(
    fc.property(places, number(-9, 9), number(-9, 9), (place, du, dz) => {
      const next = draggedInSide(place, hull, { du, dz, deadBand: 0.02 });
      expect(next.kind).toBe(place.kind);
      if (next.kind === 'skin' || next.kind === 'keel') {
        expect(next.station).toBeGreaterThanOrEqual(0);
        expect(next.station).toBeLessThanOrEqual(hull.length);
      }
      if (next.kind === 'keel') expect(next.drop).toBeGreaterThanOrEqual(0);
      if (next.kind === 'skin' && place.kind === 'skin') {
        expect([next.clock, next.standoff]).toEqual([place.clock, place.standoff]);
      }
    }),
  );
});

test('a small slip up or down leaves the drop, a larger one follows the hand', () => {
  const place: Place = { kind: 'keel', station: 1, drop: 0.1 };
  expect(draggedInSide(place, hull, { du: 0.3, dz: 0.04, deadBand: 0.05 })).toEqual({
    ...place,
    station: 1.3,
  });
  expect(draggedInSide(place, hull, { du: 0, dz: -0.15, deadBand: 0.05 })).toMatchObject({ drop: 0.2 });
});

test('round the skin the clock angle turns as far as the hand does, the other way for the mirrored piece', () => {
  const place: Place = { kind: 'skin', station: 1, clock: 1, standoff: 0.05 };
  const starboard = wayInFront(onSection(1, 0.5), onSection(1.4, 0.8));
  expect(movedInFront(place, starboard, false)).toMatchObject({ clock: expect.closeTo(1.4, 9) });
  const port = wayInFront(onSection(-1, 0.5), onSection(-1.4, 0.5));
  expect(movedInFront(place, port, true)).toMatchObject({
    clock: expect.closeTo(1.4, 9),
    station: 1,
    standoff: 0.05,
  });
});

test('in the front view a free place goes athwart and up, mirrored for the port piece; the axis stays', () => {
  const place: Place = { kind: 'free', x: 1, y: 0.2, z: 0 };
  const way = wayInFront({ u: 0, z: 0 }, { u: 0.1, z: -0.3 });
  expect(movedInFront(place, way, false)).toEqual({ ...place, y: expect.closeTo(0.3, 12), z: -0.3 });
  expect(movedInFront(place, way, true)).toMatchObject({ y: 0.1 });
  const axis: Place = { kind: 'axis', station: 2 };
  expect(movedInFront(axis, way, false)).toBe(axis);
  expect(heldInFront(axis)).toContain('axis');
  expect(heldInFront(place)).toBeNull();
});

test('only the second piece of a pair is mirrored', () => {
  expect([0, 1].map((copy) => isMirrored({ kind: 'pair' }, copy))).toEqual([false, true]);
  expect(isMirrored({ kind: 'ring', count: 3 }, 1)).toBe(false);
});

test('several places go together until the first that needs the hull would run off it', () => {
  fc.assert(
    fc.property(fc.array(places, { minLength: 1, maxLength: 8 }), number(-5, 5), (all, by) => {
      const step = sharedStep(all, hull, by);
      expect(Math.abs(step)).toBeLessThanOrEqual(Math.abs(by));
      for (const place of all) {
        if (place.kind !== 'skin' && place.kind !== 'keel') continue;
        expect(place.station + step).toBeGreaterThanOrEqual(-1e-12);
        expect(place.station + step).toBeLessThanOrEqual(hull.length + 1e-12);
      }
    }),
  );
});

test('a snapped station is kept on the hull where it has to be', () => {
  fc.assert(
    fc.property(places, number(-2, 5), (place, station) => {
      const at = stationOfPlace(atStation(place, hull, station));
      const bound = place.kind === 'skin' || place.kind === 'keel';
      expect(at).toBe(bound ? Math.min(hull.length, Math.max(0, station)) : station);
    }),
  );
});
