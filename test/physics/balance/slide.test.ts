import fc from 'fast-check';
import { expect, test } from 'vitest';
import { blankCraft } from '../../../src/craft/blank.ts';
import { type Craft, keyed, listed } from '../../../src/craft/craft.ts';
import type { Place } from '../../../src/craft/placeSchema.ts';
import { withStation } from '../../../src/craft/station.ts';
import { valueOrNull } from '../../../src/numeric/outcome.ts';
import { hangOf } from '../../../src/physics/balance/loading.ts';
import { levellingStation } from '../../../src/physics/balance/slide.ts';
import { craftStateOf } from '../../../src/physics/craftState.ts';
import { fixtureCraft, partOf } from '../../edit/craftFixture.ts';

const stateOf = (craft: Craft) => valueOrNull(craftStateOf(craft))!;

/** The craft with the part at a station. */
const moved = (craft: Craft, id: string, station: number): Craft => ({
  ...craft,
  parts: keyed(
    listed(craft.parts).map((part) =>
      part.id === id ? { ...part, place: withStation(part.place, station) } : part,
    ),
  ),
});

test('put where it says, the part levels the craft, its wires following', () => {
  const mass = fc.double({ min: 0.05, max: 0.5, noNaN: true });
  fc.assert(
    fc.property(mass, fc.double({ min: 0, max: 3, noNaN: true }), (weight, station) => {
      const given = fixtureCraft();
      const parts = keyed(
        listed(given.parts).map((part) => (part.id === 'battery' ? { ...part, mass: weight } : part)),
      );
      const craft = moved({ ...given, parts }, 'battery', station);
      const answer = levellingStation(stateOf(craft), craft.parts.byId.battery!);
      if (answer.status === 'infeasible') return;
      // A hundredth of a millimetre of a part of half a kilogram and its wires.
      expect(Math.abs(hangOf(stateOf(moved(craft, 'battery', answer.value)).loading)[0])).toBeLessThan(1e-5);
    }),
  );
});

/** A weightless hull 300 long with its CB at 150, and point masses on the axis: the FAA examples scaled by 1/10 in length. */
const bare = (masses: Readonly<Record<string, readonly [mass: number, station: number]>>): Craft => {
  const craft = blankCraft('', { kind: 'spheroid', length: 30, diameter: 6 }, 30);
  const point = { size: { length: 0, width: 0, height: 0 } };
  const at = (station: number): Place => ({ kind: 'free', x: station, y: 0, z: -1 });
  return {
    ...craft,
    film: { ...craft.film, arealDensity: 0 },
    parts: keyed(
      Object.entries(masses).map(([id, [weight, station]]) =>
        partOf(id, { ...point, mass: weight, place: at(station) }),
      ),
    ),
  };
};

test('FAA Pilot’s Handbook of Aeronautical Knowledge, ch. 9: 100 of 8000 moved from 3.0 to 15.0 shifts the CG by 0.15', () => {
  // The rest of the load stands so that the CG is 0.15 forward of the CB at 15; moving the 100 to 15.0 brings it back.
  const rest = (8000 * (15 - 0.15) - 100 * 3) / 7900;
  const craft = bare({ rest: [7.9, rest], bag: [0.1, 3] });
  const answer = levellingStation(stateOf(craft), craft.parts.byId.bag!);
  expect(answer.status === 'solved' && answer.value).toBeCloseTo(15, 3);
});

test('a part too light to do it: says by how much it stays out of level', () => {
  const craft = bare({ rest: [1, 20], bag: [0.001, 3] });
  const answer = levellingStation(stateOf(craft), craft.parts.byId.bag!);
  expect(answer).toMatchObject({ status: 'infeasible', why: expect.stringContaining('momentMass}') });
});
