/** Crafts that turn, for tests: a 3 m hull with a battery under it and, as asked, thrusters and fins. */
import fc from 'fast-check';
import { blankCraft } from '../../../src/craft/blank.ts';
import { type Craft, keyed } from '../../../src/craft/craft.ts';
import type { HullShape } from '../../../src/craft/hullSchema.ts';
import type { Part } from '../../../src/craft/schema.ts';
import type { ThrusterData, Vectoring } from '../../../src/craft/thrustSchema.ts';
import { craftStateOf } from '../../../src/physics/craftState.ts';
import type { Drag } from '../../../src/physics/thrust/drag.ts';
import { type TurningCraft, turningCraftOf } from '../../../src/physics/turning/turningCraft.ts';
import { partOf } from '../../edit/craftFixture.ts';

export const degrees = Math.PI / 180;

/** One object, so that the hull is formed once. */
export const SHAPE: HullShape = { kind: 'spheroid', length: 3, diameter: 1 };

export const fixedAt = (set: number): Vectoring => ({ least: set, most: set, set, slew: 0 });
export const within = (limit: number, slew = 3): Vectoring => ({ least: -limit, most: limit, set: 0, slew });

export const thrusterData = (change: Partial<ThrusterData> = {}): ThrusterData => ({
  thrust: { kind: 'measured', staticThrust: 0.6 },
  diameter: 0.15,
  pitchSpeed: { kind: 'given', speed: 9 },
  reverse: 0,
  yaw: fixedAt(0),
  pitch: fixedAt(0),
  differential: false,
  ...change,
});

export const battery: Part = partOf('battery', {
  kind: 'battery',
  mass: 0.55,
  place: { kind: 'keel', station: 1.3, drop: 0.03 },
});

export const tailThruster = (station = 2.95, change: Partial<ThrusterData> = {}): Part =>
  partOf('thruster', {
    kind: 'thruster',
    mass: 0.12,
    place: { kind: 'axis', station },
    thruster: thrusterData({ yaw: within(40 * degrees), ...change }),
  });

/** At half the breadth on either side, throttled apart. */
export const sidePair = (change: Partial<ThrusterData> = {}, station = 1.4): Part =>
  partOf('pair', {
    kind: 'thruster',
    mass: 0.06,
    place: { kind: 'free', x: station, y: 0.55, z: 0 },
    copies: { kind: 'pair' },
    thruster: thrusterData({
      thrust: { kind: 'measured', staticThrust: 0.3 },
      reverse: 0.7,
      differential: true,
      ...change,
    }),
  });

/** Four, crosswise. */
export const fins = (area = 0.06, station = 2.6): Part =>
  partOf('fins', {
    kind: 'fin',
    mass: 0.02,
    place: { kind: 'skin', station, clock: 0, standoff: 0.1 },
    copies: { kind: 'ring', count: 4 },
    fin: { area, aspectRatio: 1.2 },
  });

export const craftWith = (parts: readonly Part[], shape: HullShape = SHAPE): Craft => ({
  ...blankCraft('Turns', shape, 3),
  parts: keyed([...parts]),
});

export function turning(craft: Craft): TurningCraft {
  const state = craftStateOf(craft);
  if (state.status !== 'solved') throw new Error(state.why);
  const reduced = turningCraftOf(state.value);
  if (reduced.status !== 'solved') throw new Error(reduced.why);
  return reduced.value;
}

export const tailCraft = (): TurningCraft => turning(craftWith([battery, tailThruster(), fins()]));
export const pairCraft = (): TurningCraft => turning(craftWith([battery, sidePair(), fins()]));
/** In front, pulling. */
export const noseCraft = (): TurningCraft => turning(craftWith([battery, tailThruster(0.02), fins()]));
/** Two under the gondola, turned in yaw alike. */
export const gondolaCraft = (): TurningCraft =>
  turning(
    craftWith([
      battery,
      fins(),
      partOf('pods', {
        kind: 'thruster',
        mass: 0.05,
        place: { kind: 'free', x: 1.2, y: 0.2, z: -0.6 },
        copies: { kind: 'pair' },
        thruster: thrusterData({ yaw: within(80 * degrees) }),
      }),
    ]),
  );

export const noDrag = (drag: Drag): Drag => ({ ...drag, at: () => 0 });

/** Nothing but its inertia: no drag of any kind, no fins. */
export const slippery = (craft: TurningCraft): TurningCraft => ({
  ...craft,
  fins: [],
  strips: { ahead: Float64Array.of(), drag: Float64Array.of() },
  drag: noDrag(craft.drag),
});

/** Port and starboard exchanged. */
export const mirroredCraft = (craft: Craft): Craft => ({
  ...craft,
  parts: keyed(
    craft.parts.order.map((id) => {
      const part = craft.parts.byId[id]!;
      const { place, thruster } = part;
      return {
        ...part,
        place:
          place.kind === 'free'
            ? { ...place, y: -place.y }
            : place.kind === 'skin'
              ? { ...place, clock: -place.clock }
              : place,
        thruster: thruster && { ...thruster, yaw: mirroredYaw(thruster.yaw) },
      };
    }),
  ),
});

const mirroredYaw = ({ least, most, set, slew }: Vectoring): Vectoring => ({
  least: -most,
  most: -least,
  set: -set,
  slew,
});

/** Evenly spread: fast-check's own doubles crowd at the ends. */
export const double = (min: number, max: number): fc.Arbitrary<number> =>
  fc.noBias(fc.integer({ min: 0, max: 1_000_000 })).map((n) => min + ((max - min) * n) / 1_000_000);

/** Any craft that is lopsided, with thrusters and fins anywhere. */
export const anyCraft: fc.Arbitrary<Craft> = fc
  .record({
    battery: fc.record({ x: double(0.5, 2.5), y: double(-0.3, 0.3), z: double(-0.6, 0.2) }),
    mass: double(0.1, 1.5),
    thruster: fc.record({ x: double(0, 3), y: double(-0.6, 0.6), z: double(-0.6, 0.6) }),
    limits: fc.tuple(double(-1.6, 0), double(0, 1.6)),
    slew: double(0.2, 6),
    pitch: double(-1, 1),
    reverse: double(0, 1),
    apart: fc.boolean(),
    fin: fc.record({ station: double(0.2, 2.9), clock: double(-3, 3), area: double(0, 0.15) }),
    finCount: fc.integer({ min: 1, max: 5 }),
  })
  .map((given) =>
    craftWith([
      { ...battery, mass: given.mass, place: { kind: 'free', ...given.battery } },
      partOf('thruster', {
        mass: 0.1,
        place: { kind: 'free', ...given.thruster },
        copies: given.apart ? { kind: 'pair' } : { kind: 'together', count: 1 },
        thruster: thrusterData({
          yaw: { least: given.limits[0], most: given.limits[1], set: 0, slew: given.slew },
          pitch: fixedAt(given.pitch),
          reverse: given.reverse,
          differential: given.apart,
        }),
      }),
      {
        ...fins(given.fin.area),
        place: { kind: 'skin', station: given.fin.station, clock: given.fin.clock, standoff: 0.1 },
        copies: { kind: 'ring', count: Math.max(2, given.finCount) },
      },
    ]),
  );

/** A pure couple on a craft without drag, CG in the CB: N/I is its yaw acceleration, for ever. */
export function coupled(): { craft: TurningCraft; acceleration: number } {
  const even = turning(
    craftWith([{ ...battery, place: { kind: 'axis', station: 1.5 } }, sidePair({ reverse: 1 }, 1.5)]),
  );
  const slick = slippery(even);
  const craft = { ...slick, thrusters: slick.thrusters.map((each) => ({ ...each, pitchSpeed: 1e12 })) };
  return { craft, acceleration: (2 * 0.3 * 0.55) / craft.mass.yaw };
}
