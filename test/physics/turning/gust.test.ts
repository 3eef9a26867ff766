import fc from 'fast-check';
import { expect, test } from 'vitest';
import { gustHeld, gustMoments, hardestGust, STRONGEST } from '../../../src/physics/turning/gust.ts';
import { motionOf } from '../../../src/physics/turning/motion.ts';
import { commandOf } from '../../../src/physics/turning/steer.ts';
import type { TurningCraft } from '../../../src/physics/turning/turningCraft.ts';
import { near } from '../hull/near.ts';
import {
  anyCraft,
  battery,
  craftWith,
  double,
  fins,
  fixedAt,
  mirroredCraft,
  sidePair,
  slippery,
  tailCraft,
  tailThruster,
  turning,
} from './turningCrafts.ts';

// Munk's moment alone, (k₂ − k₁)ρV u w, against a couple that does not fade with advance: M. Munk, NACA TR 184 (1924).
test('a slippery hull holds the gust whose Munk moment its couple equals', () => {
  const slick = slippery(turning(craftWith([battery, sidePair({ reverse: 1 })])));
  const craft = { ...slick, thrusters: slick.thrusters.map((each) => ({ ...each, pitchSpeed: 1e12 })) };
  const { surge, sway } = craft.mass;
  near(gustHeld(craft, 1, 3), (0.6 * 0.55) / ((sway - surge) * 3), 1e-6);
  near(gustHeld(craft, 0.5, 3), (0.3 * 0.55) / ((sway - surge) * 3), 1e-6);
  expect(gustHeld(craft, 1, 0)).toBe(STRONGEST);
});

/** Whether hard to one side it begins to yaw to starboard and hard to the other to port, or not at all. */
function holds(craft: TurningCraft, throttle: number, u: number, v: number): boolean {
  const spin = (steer: -1 | 1) => {
    const rates = new Float64Array(6);
    const command = commandOf(craft, { throttle, steer, vector: null });
    motionOf(craft, command).slope(0, Float64Array.of(u, v, 0, 0, 0, 0), rates);
    return rates[2]!;
  };
  return Math.max(spin(1), spin(-1)) >= -1e-9 && Math.min(spin(1), spin(-1)) <= 1e-9;
}

test('up to the gust held the craft can keep from yawing, a little beyond it cannot, by its own accelerations', () => {
  fc.assert(
    fc.property(anyCraft, double(0, 4), double(0.1, 1), (file, u, throttle) => {
      const craft = turning(file);
      const held = gustHeld(craft, throttle, u);
      for (let i = 1; i < 40 && held > 0; i += 1) {
        const w = (held * i) / 40;
        expect(holds(craft, throttle, u, w) && holds(craft, throttle, u, -w)).toBe(true);
      }
      if (held === STRONGEST) return;
      const w = 1.001 * held + 1e-3;
      // A gust barely not held may be held again beyond: look close by.
      expect(holds(craft, throttle, u, w) && holds(craft, throttle, u, -w)).toBe(false);
    }),
    { numRuns: 60 },
  );
});

test('from either side alike, so the mirrored craft holds as much', () => {
  fc.assert(
    fc.property(anyCraft, double(0, 4), (file, u) => {
      const [here, there] = [turning(file), turning(mirroredCraft(file))].map((each) => gustHeld(each, 1, u));
      expect(Math.abs(here! - there!)).toBeLessThan(1e-6 * (1 + here!));
    }),
    { numRuns: 40 },
  );
});

test('a longer arm and more throttle hold more; in cruise larger fins help, at rest they are in the way', () => {
  const heldAt = (station: number, throttle = 1, area = 0.06, u = 3) =>
    gustHeld(turning(craftWith([battery, tailThruster(station), fins(area)])), throttle, u);
  expect(heldAt(2.95)).toBeGreaterThan(heldAt(2.4));
  expect(heldAt(2.95, 1)).toBeGreaterThan(heldAt(2.95, 0.6));
  expect(heldAt(2.95, 1, 0.3)).toBeGreaterThan(heldAt(2.95, 1, 0.06));
  expect(heldAt(2.95, 1, 0.3, 0)).toBeLessThan(heldAt(2.95, 1, 0.06, 0));
});

test('without anything that yaws it the craft holds none', () => {
  const fixed = turning(craftWith([battery, tailThruster(2.9, { yaw: fixedAt(0) }), fins()]));
  expect(gustHeld(fixed, 1, 3)).toBeLessThan(1e-9);
  expect(gustHeld(tailCraft(), 0, 3)).toBeLessThan(1e-9);
});

test('the hardest gust up to the one just held leaves nothing to spare', () => {
  const craft = tailCraft();
  for (const u of [0, 1, 3]) {
    const held = gustHeld(craft, 1, u);
    near(hardestGust(craft, 1, u, held).ratio, 1, 1e-6);
    expect(hardestGust(craft, 1, u, 0.5 * held).ratio).toBeGreaterThan(1);
    expect(hardestGust(craft, 1, u, 2 * held).ratio).toBeLessThan(1);
  }
});

test('the moments: Munk turns the nose away from where it goes, thrust either way', () => {
  const { air, starboard, port } = gustMoments(tailCraft(), 1, 3)(0.2);
  expect(air).toBeLessThan(0);
  expect(starboard).toBeGreaterThan(0);
  expect(port).toBeLessThan(0);
});
