import fc from 'fast-check';
import { expect, test } from 'vitest';
import {
  angleSeenAs,
  angleTo,
  heldWithin,
  LONGEST_PX,
  limitArc,
  type ThrustArrow,
  type ThrustMark,
  type ThrustShown,
  thrustMarks,
  type Way,
} from '../../src/scene/thrustArrows.ts';

const arrow = (change: Partial<ThrustArrow> = {}): ThrustArrow => ({
  part: 'tail',
  copy: 0,
  name: 'Tail',
  at: [2.9, 0.1, -0.2],
  yaw: 0,
  pitch: 0,
  thrust: 0.4,
  diameter: 0.15,
  movesInYaw: true,
  movesInPitch: true,
  apart: false,
  ...change,
});

const SCALE = 240;
const all = () => true;
const marks = (arrows: readonly ThrustArrow[], way: Way, change: Partial<ThrustShown> = {}) =>
  thrustMarks(arrows, { way, scale: SCALE, shows: all, hands: all, ...change });
const one = (of: ThrustArrow, way: Way): ThrustMark => marks([of], way)[0]!;
const lengthOf = ({ at, tip }: ThrustMark) => Math.hypot(tip.u - at.u, tip.z - at.z) * SCALE;

const DEGREE = Math.PI / 180;
const turn = fc.double({ min: -179 * DEGREE, max: 179 * DEGREE, noNaN: true });

/** Thrust as a vector of length 1: forward, to starboard, up. */
const vector = (yaw: number, pitch: number) =>
  [Math.cos(pitch) * Math.cos(yaw), Math.cos(pitch) * Math.sin(yaw), Math.sin(pitch)] as const;

test('an arrow begins at its disc and points as the thrust does, seen from the side and from above', () => {
  expect(one(arrow(), 'pitch').at).toEqual({ u: 2.9, z: -0.2 });
  expect(one(arrow(), 'yaw').at).toEqual({ u: 0.1, z: -2.9 });
  fc.assert(
    fc.property(turn, turn, (yaw, pitch) => {
      const [ahead, starboard, up] = vector(yaw, pitch);
      for (const [way, u, z] of [
        ['pitch', -ahead, up],
        ['yaw', starboard, ahead],
      ] as const) {
        if (Math.hypot(u, z) < 0.01) continue;
        const { at, tip } = one(arrow({ yaw, pitch }), way);
        const [du, dz] = [tip.u - at.u, tip.z - at.z];
        expect(du * z - dz * u).toBeCloseTo(0, 9);
        expect(du * u + dz * z).toBeGreaterThan(0);
      }
    }),
  );
});

test('turned to where its own arrow points, thrust stays as it is', () => {
  fc.assert(
    fc.property(turn, turn, (yaw, pitch) => {
      fc.pre(Math.abs(Math.cos(yaw)) > 0.02 && Math.abs(Math.cos(pitch)) > 0.02);
      const side = one(arrow({ yaw, pitch }), 'pitch');
      expect(angleSeenAs('pitch', angleTo('pitch', side.at, side.tip), yaw)).toBeCloseTo(pitch, 7);
      const above = one(arrow({ yaw, pitch }), 'yaw');
      expect(angleSeenAs('yaw', angleTo('yaw', above.at, above.tip), pitch)).toBeCloseTo(yaw, 7);
    }),
  );
});

test('seen end-on, it can still be turned', () => {
  const upright = one(arrow({ pitch: Math.PI / 2, yaw: 0.4 }), 'yaw');
  expect(upright.angle).toBeCloseTo(0.4, 9);
  expect(lengthOf(upright)).toBeCloseTo(24, 9);
  expect(angleSeenAs('pitch', 0.7, Math.PI / 2)).toBeCloseTo(0.7, 9);
});

test('lengths are in proportion to thrust, the longest 60 px, none too short for a hand', () => {
  const [strong, half, weak] = marks(
    [
      arrow({ part: 'a', thrust: 2 }),
      arrow({ part: 'b', thrust: 1.5, at: [1, 0, 0] }),
      arrow({ part: 'c', thrust: 0.1, at: [2, 0, 0] }),
    ],
    'pitch',
  ) as [ThrustMark, ThrustMark, ThrustMark];
  expect(lengthOf(strong)).toBeCloseTo(LONGEST_PX, 9);
  expect(lengthOf(half)).toBeCloseTo(0.75 * LONGEST_PX, 9);
  expect(lengthOf(weak)).toBeCloseTo(24, 9);
  const powerless = marks([arrow({ thrust: 0 })], 'pitch')[0]!;
  expect(lengthOf(powerless)).toBeCloseTo(24, 9);
});

test('only what turns that way, and can be taken, has a handle; it lies beyond the tip', () => {
  const stiff = arrow({ movesInYaw: false });
  expect(one(stiff, 'yaw').handle).toBeNull();
  const { at, tip, handle } = one(stiff, 'pitch');
  expect(Math.hypot(handle!.u - at.u, handle!.z - at.z)).toBeGreaterThan(
    Math.hypot(tip.u - at.u, tip.z - at.z),
  );
  expect(marks([stiff], 'pitch', { hands: () => false })[0]!.handle).toBeNull();
  expect(marks([stiff], 'pitch', { shows: () => false })).toEqual([]);
});

test('pieces that lie on each other in a view have one arrow, others their own', () => {
  const pair = [arrow({ at: [1, 0.5, 0] }), arrow({ at: [1, -0.5, 0], copy: 1 })];
  expect(marks(pair, 'pitch')).toHaveLength(1);
  expect(marks(pair, 'yaw')).toHaveLength(2);
});

test('beyond its limits an angle is held at the nearer one, the shorter way round', () => {
  const limits = { least: -30 * DEGREE, most: 120 * DEGREE, set: 0, slew: 1 };
  const held = (degrees: number) => heldWithin(limits, degrees * DEGREE) / DEGREE;
  expect(held(17)).toBeCloseTo(17, 9);
  expect(held(130)).toBeCloseTo(120, 9);
  expect(held(-31)).toBeCloseTo(-30, 9);
  // 179° and −179° are two degrees apart; both are nearer to 120° than to −30°.
  expect(held(179)).toBeCloseTo(120, 9);
  expect(held(-179)).toBeCloseTo(120, 9);
});

test('the arc goes from limit to limit at the reach of the handle', () => {
  const limits = { least: -30 * DEGREE, most: 45 * DEGREE, set: 0, slew: 1 };
  for (const way of ['pitch', 'yaw'] as const) {
    const mark = one(arrow(), way);
    const arc = limitArc(mark, limits, 0);
    const reach = Math.hypot(mark.handle!.u - mark.at.u, mark.handle!.z - mark.at.z);
    for (const { u, z } of arc) expect(Math.hypot(u - mark.at.u, z - mark.at.z)).toBeCloseTo(reach, 9);
    expect(angleTo(way, mark.at, arc[0]!) / DEGREE).toBeCloseTo(-30, 6);
    expect(angleTo(way, mark.at, arc.at(-1)!) / DEGREE).toBeCloseTo(45, 6);
  }
});
