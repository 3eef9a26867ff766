import fc from 'fast-check';
import { expect, test } from 'vitest';
import { leverageOf, longestArm, yaws } from '../../../src/physics/turning/leverage.ts';
import { near } from '../hull/near.ts';
import {
  anyCraft,
  battery,
  craftWith,
  degrees,
  fins,
  fixedAt,
  pairCraft,
  sidePair,
  tailCraft,
  tailThruster,
  turning,
} from './turningCrafts.ts';

test('one thruster in the tail: moment = thrust × distance aft of the CG × sine of its limit', () => {
  const craft = tailCraft();
  const { arm, yawMoment, shares } = leverageOf(craft, 0.5);
  const cg = craft.cb - craft.mass.cgAhead;
  const aft = 2.95 - cg;
  near(arm, aft, 1e-12);
  near(yawMoment, 0.5 * 0.6 * aft * Math.sin(40 * degrees), 1e-12);
  near(shares.vectoring, Math.sin(40 * degrees), 1e-12);
  near(shares.thrust, 0.5, 1e-12);
  near(shares.arm, aft / Math.max(cg, 3 - cg), 1e-12);
});

test('a thruster further out than the hull goes has the longest arm there is: its own', () => {
  const shareAt = (station: number) =>
    leverageOf(turning(craftWith([battery, tailThruster(station), fins()])), 1).shares.arm;
  for (const station of [-1, 4]) near(shareAt(station), 1, 1e-12);
  expect(shareAt(2.9)).toBeLessThan(1);
});

test('a pair throttled apart has its side for an arm', () => {
  const { arm, yawMoment } = leverageOf(pairCraft(), 1);
  near(arm, 0.55, 1e-12);
  near(yawMoment, 0.3 * 0.55 * (1 + 0.7), 1e-12);
});

test('in front of the CG the arm is negative; without vectoring or thrust apart there is none', () => {
  expect(leverageOf(turning(craftWith([battery, tailThruster(0.1)])), 1).arm).toBeLessThan(-1);
  const fixed = turning(craftWith([battery, tailThruster(2.9, { yaw: fixedAt(0) })]));
  expect(leverageOf(fixed, 1)).toMatchObject({ arm: 0, shares: { vectoring: 0, arm: 0, thrust: 0 } });
});

test('nose and tail together do not cancel: the arm is the mean of both', () => {
  const nose = { ...tailThruster(0.05), id: 'nose' };
  const craft = turning(craftWith([battery, tailThruster(2.95), nose, fins()]));
  const { arm, yawMoment } = leverageOf(craft, 1);
  near(Math.abs(arm), 1.45, 1e-9);
  near(yawMoment, 0.6 * 2.9 * Math.sin(40 * degrees), 1e-9);
});

// The air ahead of the CB is carried along sideways but not lengthwise, so that it drags the centre towards the CB.
test('the virtual mass centre lies between CB and CG', () => {
  fc.assert(
    fc.property(anyCraft, (file) => {
      const { cgAhead, centreAhead, cgSide, centreSide } = turning(file).mass;
      for (const [cg, centre] of [
        [cgAhead, centreAhead],
        [cgSide, centreSide],
      ] as const) {
        expect(centre * cg).toBeGreaterThanOrEqual(0);
        expect(Math.abs(centre)).toBeLessThanOrEqual(Math.abs(cg));
      }
    }),
  );
});

test('the moment is the product of its shares and of the greatest conceivable', () => {
  fc.assert(
    fc.property(anyCraft, fc.double({ min: 0.01, max: 1, noNaN: true }), (file, throttle) => {
      const craft = turning(file);
      const { arm, yawMoment, shares } = leverageOf(craft, throttle);
      if (!craft.thrusters.every(yaws)) return;
      const all = craft.thrusters.reduce((sum, { staticThrust }) => sum + staticThrust, 0);
      const product = shares.vectoring * shares.arm * shares.thrust * all * longestArm(craft, Math.abs(arm));
      expect(Math.abs(product - yawMoment)).toBeLessThan(1e-12);
    }),
  );
});

test('two sorts: only those with which the helm yaws count in arm and shares', () => {
  const craft = turning(craftWith([battery, sidePair(), tailThruster(2.9, { yaw: fixedAt(0) })]));
  const { arm, shares } = leverageOf(craft, 1);
  near(arm, 0.55, 1e-12);
  near(shares.thrust, 0.5, 1e-12);
});
