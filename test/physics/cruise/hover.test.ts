import fc from 'fast-check';
import { expect, test } from 'vitest';
import { supportedAttitude } from '../../../src/physics/balance/support.ts';
import type { CraftState } from '../../../src/physics/craftState.ts';
import { hoverOf } from '../../../src/physics/cruise/hover.ts';
import { thrustersOf } from '../../../src/physics/thrust/thrusters.ts';
import { STANDARD_GRAVITY } from '../../../src/units/constants.ts';
import { partOf } from '../../edit/craftFixture.ts';
import { degrees, solvedValue, stateWith, thrusterOf, turning } from '../thrust/thrustFixture.ts';
import { balanced } from './cruiseFixture.ts';

const free = { pitch: turning(0, 179 * degrees), reverse: 0.5 };

/** Force up, force ahead and moment left over, every mass, the lift and every thruster by itself, in the world's axes. */
function leftOver(state: CraftState): number[] {
  const { pitch, vector, share, reversed, parts } = solvedValue(hoverOf(state));
  const [sin, cos] = [Math.sin(pitch), Math.cos(pitch)];
  const sums = [0, 0, 0];
  const add = ([x, , z]: readonly number[], ahead: number, up: number) => {
    const [forward, high] = [(2 - x!) * cos - z! * sin, (2 - x!) * sin + z! * cos];
    sums[0]! += up;
    sums[1]! += ahead;
    sums[2]! += forward * up - high * ahead;
  };
  for (const { mass, cg } of state.bodies) add(cg, 0, -mass * STANDARD_GRAVITY);
  add([2, 0, 0], 0, state.loading.grossLift * STANDARD_GRAVITY);
  for (const { part, at, staticThrust, reverse } of thrustersOf(state)) {
    if (!parts.includes(part)) continue;
    const thrust = share * staticThrust * (reversed ? -reverse : 1);
    add(at, thrust * Math.cos(vector + pitch), thrust * Math.sin(vector + pitch));
  }
  return sums;
}

test('force by force and moment by moment nothing is left over; it is the attitude of a craft carried there', () => {
  const spot = fc.double({ min: -0.3, max: 0.3, noNaN: true });
  fc.assert(
    fc.property(spot, spot, fc.double({ min: -0.08, max: 0.08, noNaN: true }), (x, z, heaviness) => {
      const state = balanced({
        heaviness,
        aft: 0.01,
        thrusterAft: x,
        thrusterHeight: z,
        thruster: free,
        parts: [
          partOf('second', {
            place: { kind: 'free', x: 1, y: 0, z: -0.5 },
            thruster: thrusterOf({ ...free, thrust: { kind: 'measured', staticThrust: 0.5 } }),
          }),
        ],
      });
      for (const left of leftOver(state)) expect(left).toBeCloseTo(0, 5);
      const centre = [(2 + x + 0.5 * 1) / 1.5, 0, (z - 0.5 * 0.5) / 1.5] as const;
      const carried = solvedValue(supportedAttitude(state.loading, centre)).pitch;
      const { pitch } = solvedValue(hoverOf(state));
      if (Math.abs(carried) < Math.PI / 2) expect(pitch).toBeCloseTo(carried, 9);
    }),
    { numRuns: 50 },
  );
});

test('a level craft with thrust at the CB hovers level, thrust straight up; a light one holds itself down', () => {
  const at = (heaviness: number, thruster = free) =>
    solvedValue(hoverOf(balanced({ heaviness, thrusterAft: 0, thruster })));
  const heavy = at(0.05);
  expect(heavy).toMatchObject({ reversed: false, parts: ['thruster'], available: 1 });
  expect(heavy.pitch).toBeCloseTo(0, 9);
  expect(heavy.vector).toBeCloseTo(90 * degrees, 9);
  expect(heavy.needed).toBeCloseTo(0.05 * STANDARD_GRAVITY, 9);
  expect(heavy.share).toBeCloseTo(heavy.needed, 9);
  expect(at(-0.05).vector).toBeCloseTo(-90 * degrees, 9);
  // Only upward to turn: the light craft runs it backwards.
  const upward = { ...free, pitch: { least: 0, most: 100 * degrees, set: 0, slew: 1 } };
  expect(at(-0.04, upward)).toMatchObject({ reversed: true, available: 0.5 });
  expect(at(-0.04, upward).vector).toBeCloseTo(90 * degrees, 9);
});

test('a thruster that cannot be turned that far takes no part', () => {
  const fixed = partOf('tail', { place: { kind: 'axis', station: 4 }, thruster: thrusterOf() });
  const hover = solvedValue(
    hoverOf(balanced({ heaviness: 0.05, thrusterAft: 0, thruster: free, parts: [fixed] })),
  );
  expect(hover.parts).toEqual(['thruster']);
  expect(hover.pitch).toBeCloseTo(0, 9);
});

test('a craft without heaviness needs none, whatever its thrusters can do', () => {
  const { pitch, needed } = solvedValue(hoverOf(balanced({ aft: 0.02 })));
  expect(needed).toBeCloseTo(0, 9);
  expect(pitch).toBeCloseTo(Math.atan2(0.02, 0.1), 6);
});

test('why not, with amounts: no thruster, angle out of reach, too little thrust, too steep', () => {
  const why = (state: CraftState) => {
    const hover = hoverOf(state);
    return hover.status === 'infeasible' ? hover.why : '';
  };
  expect(why(stateWith([]))).toBe('No part has the figures of a thruster.');
  expect(why(balanced({ heaviness: 0.05 }))).toMatch(
    /heavy by \{0\.49.* force\}, which the thrust has to carry at .* can only stand at \{0 angle\}/,
  );
  const half = { pitch: turning(0, 60 * degrees) };
  expect(why(balanced({ heaviness: -0.05, thrusterAft: 0, thruster: half }))).toMatch(
    /light by \{0\.49.* force\} and has to be held down at .*-1\.57.* angle.*can turn from \{-1\.047.* to \{1\.047/,
  );
  expect(why(balanced({ heaviness: 0.2, thrusterAft: 0, thruster: free }))).toMatch(
    /Hovering takes \{1\.96.* force\}.*give \{1 force\}/,
  );
  expect(why(balanced({ heaviness: 0.1, thrusterAft: 2, thruster: { pitch: turning(0, 3) } }))).toMatch(
    /heavy by \{0\.98.* force\}; carried by its thrusters it would stand at/,
  );
});

test('short of upright by less than 5° it hovers at its limit and drifts; by more it is refused', () => {
  const upTo = (angle: number, heaviness = 0.05) =>
    hoverOf(balanced({ heaviness, thrusterAft: 0, thruster: { pitch: turning(0, angle * degrees) } }));
  const needed = 0.05 * STANDARD_GRAVITY;
  for (const [angle, heaviness, way] of [
    [87, 0.05, 'ahead'],
    [87, -0.05, 'ahead'],
    [85.1, 0.05, 'ahead'],
  ] as const) {
    const { vector, share, available, sideways, cautions } = solvedValue(upTo(angle, heaviness));
    expect(Math.abs(vector)).toBeCloseTo(angle * degrees, 9);
    // What is left of the thrust carries the weight, and the rest pushes ahead.
    expect(share * available * Math.sin(angle * degrees)).toBeCloseTo(needed, 9);
    expect(sideways).toBeCloseTo(needed / Math.tan(angle * degrees), 9);
    expect(cautions).toEqual([expect.stringMatching(new RegExp(`pushes the craft ${way}.*drifts`))]);
  }
  expect(solvedValue(upTo(90)).cautions).toEqual([]);
  expect(upTo(84.9).status).toBe('infeasible');
});

test('a light craft is told how much to hang on, a heavy one how much to take off', () => {
  const remedy = (heaviness: number) => {
    const hover = hoverOf(balanced({ heaviness, thrusterAft: 0 }));
    return hover.status === 'infeasible' ? hover.remedy : '';
  };
  expect(remedy(0.05)).toMatch(/take off \{0\.05\d* mass\}|take off \{0\.0499\d* mass\}/);
  expect(remedy(-0.05)).toMatch(/hang on \{0\.05\d* mass\}|hang on \{0\.0499\d* mass\}/);
});
