import { expect, test } from 'vitest';
import type { Place } from '../../../src/craft/placeSchema.ts';
import { stationOf } from '../../../src/craft/station.ts';
import type { ThrusterData } from '../../../src/craft/thrustSchema.ts';
import { hullOfCraft } from '../../../src/physics/craftState.ts';
import { positionOf } from '../../../src/physics/mass/position.ts';
import { heldAt, placeAt, stationsOf, type ThrusterPart } from '../../../src/physics/placing/moved.ts';
import { gapToSkin } from '../../../src/physics/placing/nearness.ts';
import { clearanceOf, sweepOf } from '../../../src/physics/placing/sweep.ts';
import { thrustersOf } from '../../../src/physics/thrust/thrusters.ts';
import { craftWith, solvedValue, stateWith, thrusterPart, turning } from '../thrust/thrustFixture.ts';

const at = (place: Place, data: Partial<ThrusterData> = {}) => thrusterPart({ place }, data) as ThrusterPart;
const hull = solvedValue(hullOfCraft(craftWith([])));

test('stations go from nose to tail, and as far beyond either end as the thruster stands beyond one', () => {
  expect(stationsOf(at({ kind: 'axis', station: 1 }), hull, 5)).toEqual([0, 1, 2, 3, 4]);
  const boom = stationsOf(at({ kind: 'axis', station: 4.5 }), hull, 6);
  expect(boom).toEqual([-0.5, 0.5, 1.5, 2.5, 3.5, 4.5]);
  expect(stationsOf(at({ kind: 'axis', station: -0.5 }), hull, 6)).toEqual(boom);
});

test('skin and keel places follow the hull, free places keep side and height', () => {
  const skin = placeAt(at({ kind: 'skin', station: 1, clock: 1.5, standoff: 0.1 }), 3, hull);
  expect(skin).toEqual({ kind: 'skin', station: 3, clock: 1.5, standoff: 0.1 });
  const keel = placeAt(at({ kind: 'keel', station: 1, drop: 0.2 }), 3, hull);
  expect(keel).toEqual({ kind: 'keel', station: 3, drop: 0.2 });
  const free = placeAt(at({ kind: 'free', x: 1, y: 0.3, z: -0.6 }), 3, hull);
  expect(free).toEqual({ kind: 'free', x: 3, y: 0.3, z: -0.6 });
});

test('a thruster on the axis stays there beyond the ends', () => {
  const part = at({ kind: 'axis', station: 4.2 });
  expect(placeAt(part, 4.1, hull)).toEqual({ kind: 'axis', station: 4.1 });
  expect(placeAt(part, -0.2, hull)).toEqual({ kind: 'axis', station: -0.2 });
});

test.each([
  ['that only pushes straight', {}],
  ['that turns in yaw and pitch', { yaw: turning(), pitch: turning(0, 0.6) }],
])('inside the hull one %s is hung below the keel, clear of the skin', (_, data) => {
  const part = at({ kind: 'axis', station: 4.2 }, data);
  for (const station of [0.1, 0.5, 2, 3.5, 3.95]) {
    const place = placeAt(part, station, hull);
    expect(place.kind).toBe('keel');
    expect(stationOf(place)).toBe(station);
    const [thruster] = thrustersOf(stateWith([{ ...part, place }]));
    expect(gapToSkin(sweepOf(thruster!), hull, clearanceOf(0.2))).toBeGreaterThan(clearanceOf(0.2) - 1e-9);
  }
  const middle = positionOf(placeAt(part, 2, hull), hull);
  expect(middle[2]).toBeCloseTo(-(0.5 + 0.1 + clearanceOf(0.2)), 2);
});

test('held there it is locked, so that no plan moves it; nothing else of the craft is touched', () => {
  const craft = craftWith([at({ kind: 'axis', station: 4 })]);
  const part = craft.parts.byId.thruster!;
  const place: Place = { kind: 'axis', station: 1 };
  const held = heldAt(craft, part, place);
  expect(held.parts.byId.thruster).toEqual({ ...part, place, locked: true });
  expect({ ...held, parts: null }).toEqual({ ...craft, parts: null });
});
