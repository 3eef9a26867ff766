import fc from 'fast-check';
import { expect, test } from 'vitest';
import type { Place } from '../../../src/craft/placeSchema.ts';
import { valueOrNull } from '../../../src/numeric/outcome.ts';
import { hullOf } from '../../../src/physics/hull/hullOf.ts';
import { piecesOf } from '../../../src/physics/mass/pieces.ts';
import { clockOf, distanceFromAxis, positionOf } from '../../../src/physics/mass/position.ts';
import { placeAs } from '../../../src/report/placeAs.ts';
import { partOf } from '../../edit/craftFixture.ts';

const hull = valueOrNull(hullOf({ kind: 'spheroid', length: 3, diameter: 1 }))!;

test('below the keel of a spheroid: r(1.45 m) of a 3 × 1 m hull is ½√(1 − (0.05/1.5)²)', () => {
  const [x, y, z] = positionOf({ kind: 'keel', station: 1.45, drop: 0.04 }, hull);
  expect([x, y]).toEqual([1.45, 0]);
  expect(z).toBeCloseTo(-(0.5 * Math.sqrt(1 - (0.05 / 1.5) ** 2) + 0.04), 12);
});

test('clock angles: 0 top, 90° starboard, 180° keel', () => {
  const at = (clock: number) => positionOf({ kind: 'skin', station: 1.5, clock, standoff: 0.1 }, hull);
  [
    [at(0), [1.5, 0, 0.6]],
    [at(Math.PI / 2), [1.5, 0.6, 0]],
    [at(Math.PI), [1.5, 0, -0.6]],
    [at(1.5 * Math.PI), [1.5, -0.6, 0]],
  ].forEach(([found, expected]) => {
    found!.forEach((each, i) => {
      expect(each).toBeCloseTo(expected![i]!, 12);
    });
  });
});

const station = fc.double({ min: 0, max: 3, noNaN: true });
const skin = fc.record({
  kind: fc.constant('skin' as const),
  station,
  clock: fc.double({ min: 0, max: 6.28, noNaN: true }),
  standoff: fc.double({ min: 0.01, max: 0.3, noNaN: true }),
});
const keel = fc.record({
  kind: fc.constant('keel' as const),
  station,
  drop: fc.double({ min: 0.001, max: 1, noNaN: true }),
});

test('another kind of place for the same point is the same point', () => {
  fc.assert(
    fc.property(fc.oneof(skin, keel), (place: Place) => {
      const at = positionOf(place, hull);
      for (const kind of place.kind === 'keel'
        ? (['skin', 'free', 'keel'] as const)
        : (['skin', 'free'] as const)) {
        positionOf(placeAs(kind, at, hull), hull).forEach((each, i) => {
          expect(each).toBeCloseTo(at[i]!, 9);
        });
      }
      expect(positionOf(placeAs('axis', at, hull), hull)).toEqual([at[0], 0, 0]);
    }),
  );
});

test('a point above the keel line becomes a place on it', () => {
  expect(placeAs('keel', [1.5, 0, 0.2], hull)).toEqual({ kind: 'keel', station: 1.5, drop: 0 });
});

test('a pair is mirrored port–starboard', () => {
  const part = partOf('p', { place: { kind: 'free', x: 1, y: 0.3, z: -0.2 }, copies: { kind: 'pair' } });
  expect(piecesOf(part, hull).map(({ cg }) => cg)).toEqual([
    [1, 0.3, -0.2],
    [1, -0.3, -0.2],
  ]);
});

test('a ring stands evenly round the axis, so its CG is on it', () => {
  fc.assert(
    fc.property(skin, fc.integer({ min: 2, max: 12 }), (place, count) => {
      const pieces = piecesOf(partOf('r', { place, copies: { kind: 'ring', count } }), hull);
      expect(pieces).toHaveLength(count);
      const sum = (i: 1 | 2) => pieces.reduce((total, { cg }) => total + cg[i], 0);
      expect(sum(1)).toBeCloseTo(0, 9);
      expect(sum(2)).toBeCloseTo(0, 9);
      for (const { middle, roll } of pieces) {
        expect(distanceFromAxis(middle)).toBeCloseTo(distanceFromAxis(pieces[0]!.middle), 9);
        expect(Math.cos(clockOf(middle) - roll)).toBeCloseTo(1, 9);
      }
    }),
  );
});

test('the CG of a piece lies its offset aft of its middle', () => {
  const [piece] = piecesOf(partOf('boom', { cgOffset: -0.2 }), hull);
  expect(piece!.cg[0] - piece!.middle[0]).toBeCloseTo(-0.2, 12);
});

test('several at one place are several', () => {
  expect(piecesOf(partOf('x', { copies: { kind: 'together', count: 4 } }), hull)).toHaveLength(4);
});
