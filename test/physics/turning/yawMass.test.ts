import fc from 'fast-check';
import { expect, test } from 'vitest';
import { craftStateOf } from '../../../src/physics/craftState.ts';
import { motionOf } from '../../../src/physics/turning/motion.ts';
import { commandOf } from '../../../src/physics/turning/steer.ts';
import { near } from '../hull/near.ts';
import { anyCraft, battery, craftWith, slippery, tailThruster, turning } from './turningCrafts.ts';

// Fineness 3: k₁ 0.122, k₂ 0.803, k′ 0.465 in Lamb's table (R&M 623, 1918; at 2.99, ±0.0025).
test('added mass is Lamb’s share of the displaced air, beside solid mass and gas', () => {
  const craft = craftWith([battery, tailThruster()]);
  const state = craftStateOf(craft);
  if (state.status !== 'solved') throw new Error(state.why);
  const { air, hull, gasDensity } = state.value;
  const mass = turning(craft).mass;
  const moving = mass.solid + gasDensity * hull.volume;
  const displaced = air.density * hull.volume;
  expect(Math.abs((mass.surge - moving) / displaced - 0.122)).toBeLessThan(0.003);
  expect(Math.abs((mass.sway - moving) / displaced - 0.803)).toBeLessThan(0.003);
  // A spheroid of air about its short axis: m (a² + b²)/5.
  const airInertia = (displaced * (1.5 ** 2 + 0.5 ** 2)) / 5;
  expect(Math.abs(mass.airYaw / airInertia - 0.465)).toBeLessThan(0.005);
  near(mass.gasYaw, (gasDensity * hull.volume * (1.5 ** 2 + 0.5 ** 2)) / 5, 1e-9);
});

test('the CG lies ahead of the CB by as much as its station is less', () => {
  const { cb, mass } = turning(craftWith([{ ...battery, mass: 50 }, tailThruster()]));
  near(cb, 1.5, 1e-9);
  expect(mass.cgAhead).toBeGreaterThan(0.19);
  expect(mass.cgAhead).toBeLessThan(0.2);
  near(mass.ahead, mass.solid * mass.cgAhead, 1e-12);
});

/** Yaw acceleration at rest by a force at a point of the craft, from M as the motion has it. */
test('a force through the virtual mass centre does not yaw the craft, whatever its direction', () => {
  fc.assert(
    fc.property(anyCraft, fc.double({ min: -3, max: 3, noNaN: true }), (file, angle) => {
      const craft = slippery(turning(file));
      const { centreAhead, centreSide } = craft.mass;
      const at = [craft.cb - centreAhead, centreSide, 0] as const;
      const pushed = {
        ...craft,
        thrusters: craft.thrusters.slice(0, 1).map((each) => ({
          ...each,
          at,
          differ: 0 as const,
          pitch: { least: 0, most: 0, set: 0, slew: 0 },
          yaw: { least: angle, most: angle, set: angle, slew: 0 },
        })),
      };
      const command = commandOf(pushed, { throttle: 1, steer: 0, vector: null });
      const rates = new Float64Array(6);
      motionOf(pushed, command).slope(0, new Float64Array(6), rates);
      expect(Math.hypot(rates[0]!, rates[1]!)).toBeGreaterThan(0.01);
      expect(Math.abs(rates[2]!)).toBeLessThan(1e-12);
    }),
  );
});
