/** A 4 × 1 m spheroid in standard sea-level air with what thrust and drag need, each test changing what it is about. */
import { blankCraft } from '../../../src/craft/blank.ts';
import { type Craft, keyed } from '../../../src/craft/craft.ts';
import type { HullShape } from '../../../src/craft/hullSchema.ts';
import type { Part } from '../../../src/craft/schema.ts';
import type { ThrusterData, Vectoring } from '../../../src/craft/thrustSchema.ts';
import type { Outcome } from '../../../src/numeric/outcome.ts';
import { type CraftState, craftStateOf } from '../../../src/physics/craftState.ts';
import { partOf } from '../../edit/craftFixture.ts';

export const degrees = Math.PI / 180;

export const SPHEROID: HullShape = { kind: 'spheroid', length: 4, diameter: 1 };

export const FIXED: Vectoring = { least: 0, most: 0, set: 0, slew: 0 };

export const turning = (set = 0, most = 90 * degrees): Vectoring => ({ least: -most, most, set, slew: 3 });

export const thrusterOf = (change: Partial<ThrusterData> = {}): ThrusterData => ({
  thrust: { kind: 'measured', staticThrust: 1 },
  diameter: 0.2,
  pitchSpeed: { kind: 'given', speed: 8 },
  reverse: 0.5,
  yaw: FIXED,
  pitch: FIXED,
  differential: false,
  ...change,
});

export const craftWith = (parts: readonly Part[], shape: HullShape = SPHEROID): Craft => ({
  ...blankCraft('Thrust', shape, 4),
  day: { kind: 'standard', elevation: 0 },
  parts: keyed(parts),
});

export const solvedValue = <T>(outcome: Outcome<T>): T => {
  if (outcome.status === 'infeasible') throw new Error(outcome.why);
  return outcome.value;
};

export const stateWith = (parts: readonly Part[], shape: HullShape = SPHEROID): CraftState =>
  solvedValue(craftStateOf(craftWith(parts, shape)));

export const thrusterPart = (change: Partial<Part> = {}, data: Partial<ThrusterData> = {}): Part =>
  partOf('thruster', {
    kind: 'thruster',
    place: { kind: 'axis', station: 4 },
    thruster: thrusterOf(data),
    ...change,
  });

export const finPart = (change: Partial<Part> = {}): Part =>
  partOf('fins', {
    kind: 'fin',
    mass: 0.03,
    place: { kind: 'skin', station: 3.5, clock: 0, standoff: 0.15 },
    copies: { kind: 'ring', count: 4 },
    fin: { area: 0.12, aspectRatio: 1.2 },
    ...change,
  });
