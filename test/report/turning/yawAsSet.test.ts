import fc from 'fast-check';
import { expect, test } from 'vitest';
import type { Vec3 } from '../../../src/numeric/vector.ts';
import { craftStateOf } from '../../../src/physics/craftState.ts';
import { arrowsOf, type ThrustArrow } from '../../../src/report/turning/arrows.ts';
import { yawAsSet } from '../../../src/report/turning/yawAsSet.ts';
import { DEGREE, fixed, pairCraft, tailCraft, thrusterData, upTo } from './turningCrafts.ts';

const arrow = (change: Partial<ThrustArrow>): ThrustArrow => ({
  part: 'thruster',
  copy: 0,
  name: 'Thruster',
  at: [2.9, 0, 0],
  yaw: 0,
  pitch: 0,
  thrust: 0.4,
  diameter: 0.15,
  movesInYaw: true,
  movesInPitch: true,
  apart: false,
  ...change,
});

const CG: Vec3 = [1.6, 0.02, -0.2];

const turn = fc.double({ min: -Math.PI, max: Math.PI, noNaN: true });
const metre = fc.double({ min: -3, max: 3, noNaN: true });

test('the moment is that of the force vector about the CG: lever × force, its component down', () => {
  fc.assert(
    fc.property(metre, metre, metre, turn, turn, (x, y, z, yaw, pitch) => {
      // Axes aft, starboard, up are right-handed; forward is −aft.
      const force = [
        -Math.cos(pitch) * Math.cos(yaw) * 0.4,
        Math.cos(pitch) * Math.sin(yaw) * 0.4,
        Math.sin(pitch) * 0.4,
      ] as const;
      const lever = [x - CG[0], y - CG[1], z - CG[2]] as const;
      const up = lever[0] * force[1] - lever[1] * force[0];
      expect(yawAsSet([arrow({ at: [x, y, z], yaw, pitch })], CG).moment).toBeCloseTo(-up, 12);
    }),
  );
});

test('a tail thruster turned to port yaws the nose to starboard, a nose tractor the other way; mirrored, mirrored', () => {
  const mid: Vec3 = [1.5, 0, 0];
  const tail = arrow({ yaw: -20 * DEGREE });
  expect(yawAsSet([tail], mid).moment).toBeCloseTo(0.4 * 1.4 * Math.sin(20 * DEGREE), 12);
  expect(yawAsSet([{ ...tail, yaw: 20 * DEGREE }], mid).moment).toBeCloseTo(
    -yawAsSet([tail], mid).moment,
    12,
  );
  expect(yawAsSet([{ ...tail, at: [0, 0, 0] }], mid).moment).toBeLessThan(0);
});

test('the arm is + aft, weighed by thrust, and of what turns in yaw alone', () => {
  const nose = arrow({ at: [0.1, 0, 0], thrust: 0.1 });
  const fixedOne = arrow({ at: [2, 0, 0], movesInYaw: false });
  const { arm, side } = yawAsSet([arrow({}), nose, fixedOne], [1.5, 0, 0]);
  expect(arm).toBeCloseTo((0.4 * 1.4 - 0.1 * 1.4) / 0.5, 12);
  expect(side).toBeNull();
  expect(yawAsSet([fixedOne], CG).arm).toBeNull();
});

test('a pair alike does not yaw a craft whose CG is amidships; its lever is its side', () => {
  const state = craftStateOf(pairCraft());
  if (state.status === 'infeasible') throw new Error(state.why);
  const yaw = yawAsSet(arrowsOf(state.value), [1.5, 0, -0.1]);
  expect(yaw.moment).toBeCloseTo(0, 12);
  expect(yaw).toMatchObject({ arm: null, side: expect.closeTo(0.6, 9) });
});

test('arrows are made of each piece with what it can do', () => {
  const arrowsFor = (craft: Parameters<typeof craftStateOf>[0]) => {
    const state = craftStateOf(craft);
    if (state.status === 'infeasible') throw new Error(state.why);
    return arrowsOf(state.value);
  };
  const thruster = thrusterData({ yaw: { ...upTo(60), set: 0.3 }, pitch: fixed });
  expect(arrowsFor(tailCraft({ thruster }))).toEqual([
    expect.objectContaining({
      part: 'thruster',
      yaw: 0.3,
      pitch: 0,
      thrust: 0.4,
      movesInYaw: true,
      movesInPitch: false,
      apart: false,
    }),
  ]);
  expect(arrowsFor(pairCraft()).map(({ copy, at, apart }) => [copy, at[1], apart])).toEqual([
    [0, 0.6, true],
    [1, -0.6, true],
  ]);
  expect(arrowsFor(tailCraft({ thruster: null }))).toEqual([]);
});
