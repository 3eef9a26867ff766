/** Craft that turn in one way each, for tests: a 3 m spheroid with what moves it. */
import { type Craft, keyed, listed } from '../../../src/craft/craft.ts';
import type { Part } from '../../../src/craft/schema.ts';
import type { ThrusterData, Vectoring } from '../../../src/craft/thrustSchema.ts';
import { assess } from '../../../src/report/assess.ts';
import { partOf, wireOf } from '../../edit/craftFixture.ts';
import { workedExample } from '../workedExample.ts';

export const DEGREE = Math.PI / 180;

export const fixed: Vectoring = { least: 0, most: 0, set: 0, slew: 0 };

export const upTo = (degrees: number): Vectoring => ({
  least: -degrees * DEGREE,
  most: degrees * DEGREE,
  set: 0,
  slew: 6,
});

export const thrusterData = (change: Partial<ThrusterData> = {}): ThrusterData => ({
  thrust: { kind: 'measured', staticThrust: 0.4 },
  diameter: 0.15,
  pitchSpeed: { kind: 'given', speed: 8 },
  reverse: 0.6,
  yaw: fixed,
  pitch: fixed,
  differential: false,
  ...change,
});

export const withParts = (craft: Craft, ...parts: readonly Part[]): Craft => {
  const ids = new Set(parts.map(({ id }) => id));
  return { ...craft, parts: keyed([...listed(craft.parts).filter(({ id }) => !ids.has(id)), ...parts]) };
};

const tailThruster = (change: Partial<Part> = {}): Part =>
  partOf('thruster', {
    kind: 'thruster',
    name: 'Tail thruster',
    mass: 0.11,
    massTolerance: 0,
    place: { kind: 'axis', station: 3.05 },
    thruster: thrusterData({ yaw: upTo(60), pitch: upTo(40) }),
    ...change,
  });

/** The worked example, its tail thruster turning in yaw and pitch, with four fins and wires to the battery. */
export const tailCraft = (change: Partial<Part> = {}): Craft => ({
  ...withParts(
    workedExample(),
    tailThruster(change),
    partOf('fins', {
      kind: 'fin',
      name: 'Fins',
      mass: 0.024,
      massTolerance: 0,
      place: { kind: 'skin', station: 2.62, clock: Math.PI / 4, standoff: 0.1 },
      copies: { kind: 'ring', count: 4 },
      fin: { area: 0.05, aspectRatio: 1.2 },
    }),
  ),
  wires: keyed([wireOf('power')]),
});

/** The same with the lead on that levels it. */
export function levelCraft(change: Partial<Part> = {}): Craft {
  const craft = tailCraft(change);
  const mass = assess(craft).rows['lead.mass']!.value!;
  return withParts(
    craft,
    partOf('lead', { kind: 'ballast', mass, massTolerance: 0, place: { kind: 'axis', station: 0.05 } }),
  );
}

/** A pair at the sides of the middle, throttled apart. */
export const pairCraft = (): Craft =>
  withParts(
    workedExample(),
    tailThruster({
      name: 'Side thrusters',
      mass: 0.055,
      place: { kind: 'free', x: 1.5, y: 0.6, z: 0 },
      copies: { kind: 'pair' },
      thruster: thrusterData({ differential: true }),
    }),
  );

/** A thruster that only pushes ahead. */
export const straightCraft = (): Craft => tailCraft({ thruster: thrusterData() });

/** A thruster of which nothing is known but that it is one. */
export const unknownCraft = (): Craft => tailCraft({ thruster: null });
