import fc from 'fast-check';
import { expect, test } from 'vitest';
import { commandOf, momentOf, momentPerThrust } from '../../../src/physics/turning/steer.ts';
import type { TurningCraft } from '../../../src/physics/turning/turningCraft.ts';
import { near } from '../hull/near.ts';
import {
  anyCraft,
  battery,
  craftWith,
  degrees,
  fins,
  mirroredCraft,
  pairCraft,
  sidePair,
  tailCraft,
  tailThruster,
  turning,
  within,
} from './turningCrafts.ts';

const command = (craft: TurningCraft, steer: number, vector: number | null = null) =>
  commandOf(craft, { throttle: 0.8, steer, vector });

test('a thruster in the tail turns its thrust to port to yaw the craft to starboard, one in the nose to starboard', () => {
  expect(command(tailCraft(), 1).angles).toEqual([-40 * degrees]);
  expect(command(tailCraft(), -1).angles).toEqual([40 * degrees]);
  expect(command(turning(craftWith([battery, tailThruster(0.1)])), 1).angles).toEqual([40 * degrees]);
  expect(momentOf(tailCraft(), command(tailCraft(), 1))).toBeGreaterThan(0);
});

test('beyond ±90° it is not turned, though its limits go further', () => {
  const wide = turning(craftWith([battery, tailThruster(2.9, { yaw: within(160 * degrees) })]));
  near(command(wide, 1).angles[0]!, -Math.PI / 2, 1e-9);
});

test('a pair throttled apart: full ahead to port, what it can do backwards to starboard', () => {
  const { shares } = command(pairCraft(), 1);
  // The first piece is the starboard one.
  expect(pairCraft().thrusters.map(({ at }) => at[1])).toEqual([0.55, -0.55]);
  near(shares[0]!, -0.7 * 0.8);
  near(shares[1]!, 0.8);
  const half = command(pairCraft(), 0.5).shares;
  near(half[0]!, 0.5 * (0.8 - 0.7 * 0.8));
  near(half[1]!, 0.8);
});

test('no other angles and shares within the limits give a greater yaw moment at rest', () => {
  fc.assert(
    fc.property(anyCraft, fc.array(fc.nat(1000), { minLength: 3, maxLength: 3 }), (file, pick) => {
      const craft = turning(file);
      const greatest = momentOf(craft, command(craft, 1));
      const { yaw } = craft.thrusters[0]!;
      const [least, most] = [Math.max(yaw.least, -Math.PI / 2), Math.min(yaw.most, Math.PI / 2)];
      const angle = least + ((most - least) * pick[0]!) / 1000;
      // Pieces of a part turn alike; of a pair throttled apart one gives less, or pushes back.
      const shares = craft.thrusters.map(({ reverse, differ }, i) =>
        differ !== 0 && i === pick[1]! % 2 ? 0.8 * (-reverse + ((1 + reverse) * pick[2]!) / 1000) : 0.8,
      );
      const angles = craft.thrusters.map(() => angle);
      const other = momentOf(craft, { shares, angles });
      expect(other).toBeLessThanOrEqual(greatest + 1e-9);
    }),
  );
});

test('mirrored craft, mirrored command', () => {
  fc.assert(
    fc.property(anyCraft, fc.double({ min: 0, max: 1, noNaN: true }), (file, steer) => {
      const [here, there] = [turning(file), turning(mirroredCraft(file))];
      const [to, fro] = [command(here, steer), command(there, -steer)];
      for (const [i, angle] of to.angles.entries()) expect(angle).toBeCloseTo(-fro.angles[i]!, 9);
      for (const [i, share] of to.shares.entries()) expect(share).toBeCloseTo(fro.shares[i]!, 9);
    }),
  );
});

test('an angle asked for holds for every thruster that turns in yaw, within its limits, and throttles none apart', () => {
  const craft = turning(craftWith([battery, tailThruster(), sidePair(), fins()]));
  const { angles, shares } = command(craft, 0, 1);
  expect(angles).toEqual([40 * degrees, 0, 0]);
  expect(shares).toEqual([0.8, 0.8, 0.8]);
});

test('one that has a range but no slew rate stays as it is set', () => {
  const stuck = { least: -1, most: 1, set: 0.3, slew: 0 };
  const craft = turning(craftWith([battery, tailThruster(2.9, { yaw: stuck })]));
  for (const steer of [-1, 0, 1]) expect(command(craft, steer).angles).toEqual([0.3]);
  expect(command(craft, 0, -0.9).angles).toEqual([0.3]);
});

test('straight ahead is 0, or as near to it as the limits allow', () => {
  const aside = { least: 0.2, most: 1, set: 0.5, slew: 1 };
  const craft = turning(craftWith([battery, tailThruster(2.9, { yaw: aside })]));
  expect(command(craft, 0).angles).toEqual([0.2]);
});

test('moment per newton: lever times sine aft, side times cosine abeam', () => {
  const craft = tailCraft();
  const [thruster] = craft.thrusters;
  const aft = 2.95 - (craft.cb - craft.mass.cgAhead);
  near(momentPerThrust(craft, thruster!, -30 * degrees), aft / 2, 1e-9);
});
