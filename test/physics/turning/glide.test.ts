import { expect, test } from 'vitest';
import { commandsOf, cruiseSpeedOf, straightAt } from '../../../src/physics/turning/asked.ts';
import { type Glide, glideOf } from '../../../src/physics/turning/glide.ts';
import { motionOf } from '../../../src/physics/turning/motion.ts';
import { quarterTurn } from '../../../src/physics/turning/quarterTurn.ts';
import { sail } from '../../../src/physics/turning/sail.ts';
import { commandOf } from '../../../src/physics/turning/steer.ts';
import type { TurningCraft } from '../../../src/physics/turning/turningCraft.ts';
import { near } from '../hull/near.ts';
import {
  battery,
  craftWith,
  fins,
  fixedAt,
  pairCraft,
  tailCraft,
  tailThruster,
  turning,
} from './turningCrafts.ts';

const ASKED = { throttle: 1, vector: null, speed: null };

function glide(craft: TurningCraft): Glide {
  const { straight, turn } = commandsOf(craft, ASKED);
  const speed = cruiseSpeedOf(craft, ASKED);
  return glideOf(craft, quarterTurn(craft, straightAt(speed, straight), turn), speed);
}

const shut = (craft: TurningCraft) => commandOf(craft, { throttle: 0, steer: 0, vector: null });

test('Munk against fins: together they are what the motion has at a small angle of slip', () => {
  const craft = tailCraft();
  const { munk, fins: fin, speed } = glide(craft).stability;
  const slip = 1e-5;
  const sums = new Float64Array(3);
  motionOf(craft, shut(craft)).forces(0, Float64Array.of(speed, slip * speed, 0), sums);
  // Slip to starboard: a moment to starboard brings the nose to where the craft goes.
  near(sums[2]! / slip, munk + fin, 1e-3);
  expect(munk).toBeLessThan(0);
  expect(fin).toBeGreaterThan(0);
});

test('whether it keeps its heading is as a small disturbance shows: with large fins yes, with small ones or none not', () => {
  const verdicts = [0.001, 0.06, 0.5, 0.8].map((area) => {
    const craft = turning(craftWith([battery, tailThruster(), fins(area)]));
    const { stability } = glide(craft);
    const { angles } = shut(craft);
    // Drag would stop it before it could show: at constant speed.
    const steady = { ...craft, drag: { ...craft.drag, at: () => 0 } };
    const sailed = sail(steady, { state: [stability.speed, 1e-6, 0, 0, 0, 0], angles }, shut(craft), {
      until: 30,
    });
    if (sailed.status !== 'solved') throw new Error(sailed.why);
    const [, v, r] = sailed.value.trajectory.last;
    expect(Math.hypot(v!, 3 * r!) < 1e-6).toBe(stability.keepsHeading);
    return stability.keepsHeading;
  });
  expect(verdicts).toEqual([false, false, true, true]);
});

test('yaw halves, then falls to a tenth; the angle is what the motion shows', () => {
  for (const craft of [tailCraft(), pairCraft()]) {
    const { after } = glide(craft);
    if (after.status !== 'solved') throw new Error(after.why);
    const { halving, angle, time, track } = after.value;
    expect(halving).toBeLessThan(time);
    near(track.r.at(-1)!, track.r[0]! / 10, 1e-6);
    near(Math.abs(track.heading.at(-1)! - track.heading[0]!), angle, 1e-9);
    near(track.time.at(-1)!, time);
    const at = Math.round((240 * halving) / time);
    expect(Math.abs(track.r[at]! / track.r[0]! - 0.5)).toBeLessThan(0.02);
  }
});

test('spinning on the spot, larger fins stop the yaw sooner', () => {
  const after = (area: number) => {
    const craft = turning(craftWith([battery, tailThruster(), fins(area)]));
    const { angles } = shut(craft);
    const { straight } = commandsOf(craft, ASKED);
    const sailed = sail(craft, { state: [0, 0, 1, 0, 0, 0], angles }, straight, { until: 1e-9 });
    const glided = glideOf(craft, sailed, 3).after;
    if (glided.status !== 'solved') throw new Error(glided.why);
    return glided.value;
  };
  const [small, large] = [after(0.03), after(0.15)];
  expect(large.halving).toBeLessThan(small.halving);
  expect(large.angle).toBeLessThan(small.angle);
});

test('it says that there is no control, and whether the craft keeps its heading', () => {
  expect(glide(tailCraft()).notes).toEqual([
    expect.stringContaining('no control'),
    expect.stringContaining('does not keep its heading'),
  ]);
  const fixed = turning(craftWith([battery, tailThruster(2.9, { yaw: fixedAt(0) }), fins(0.6)]));
  const { after, notes } = glide(fixed);
  expect(after.status).toBe('infeasible');
  expect(notes[1]).toContain('it keeps its heading');
});
