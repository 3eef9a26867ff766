import fc from 'fast-check';
import { expect, test } from 'vitest';
import { integrate } from '../../../src/numeric/ode.ts';
import { type Motion, motionOf } from '../../../src/physics/turning/motion.ts';
import { commandOf } from '../../../src/physics/turning/steer.ts';
import { finiteLength } from '../../../src/physics/turning/strips.ts';
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
  pairCraft,
  slippery,
  tailCraft,
  tailThruster,
  turning,
} from './turningCrafts.ts';

const motionAt = (craft: TurningCraft, throttle: number, steer: -1 | 0 | 1): Motion => {
  const { angles } = commandOf(craft, { throttle, steer: 0, vector: null });
  return motionOf(craft, commandOf(craft, { throttle, steer, vector: null }), angles);
};

const forcesAt = (motion: Motion, state: readonly number[]): number[] => {
  const into = new Float64Array(3);
  motion.forces(0, Float64Array.from(state), into);
  return [...into];
};

const ratesAt = (motion: Motion, state: readonly number[]): number[] => {
  const into = new Float64Array(6);
  motion.slope(0, Float64Array.from(state), into);
  return [...into];
};

function followed({ slope, arrivals }: Motion, from: readonly number[], until: number, relative = 1e-11) {
  const outcome = integrate(slope, 0, from, until, { relative, absolute: 1e-13, breaks: arrivals });
  if (outcome.status !== 'solved') throw new Error(outcome.why);
  return outcome.value;
}

// Munk's couple (k₂ − k₁) q V sin 2β on a 4 × 1 m spheroid, ρ 1.2, 2 m/s, β 10°: M. Munk, NACA TR 184 (1924); value computed
// from it, 1.338 N·m.
test('C(ν)ν holds the Munk couple', () => {
  const spheroid = turning(
    craftWith([battery, tailThruster()], { kind: 'spheroid', length: 4, diameter: 1 }),
  );
  const craft = slippery(spheroid);
  // Mass in proportion to air density: at 1.2 kg/m³.
  const perDensity = 1.2 / craft.density;
  const slip = (10 * Math.PI) / 180;
  const still = motionAt(craft, 0, 0);
  const [, , moment] = forcesAt(still, [2 * Math.cos(slip), 2 * Math.sin(slip), 0, 0, 0, 0]);
  expect(-moment! * perDensity).toBeCloseTo(1.338, 3);
});

test('at rest a thrust gives F/m ahead, and nothing else when it goes through the CB of an even craft', () => {
  const even = craftWith([
    { ...battery, place: { kind: 'axis', station: 1.5 } },
    tailThruster(1.5, { yaw: fixedAt(0) }),
  ]);
  const craft = slippery(turning(even));
  const rates = ratesAt(motionAt(craft, 1, 0), [0, 0, 0, 0, 0, 0]);
  near(rates[0]!, 0.6 / craft.mass.surge, 1e-12);
  expect(rates.slice(1).map(Math.abs)).toEqual([0, 0, 0, 0, 0]);
});

// Newton: with the coupled mass matrix the yaw acceleration is the moment about the virtual mass centre over the moment of
// inertia about it; solved here from M ν̇ = τ by Cramer's rule.
test('the first yaw acceleration at a tiny throttle is that of the mass matrix', () => {
  const craft = tailCraft();
  const { surge: a, sway: b, yaw: c, ahead: p, side: q } = craft.mass;
  const command = commandOf(craft, { throttle: 1e-6, steer: 1, vector: null });
  const [angle] = command.angles as [number];
  const thrust = 0.6e-6;
  const [x, y] = [thrust * Math.cos(angle), thrust * Math.sin(angle)];
  const n = (craft.cb - 2.95) * y;
  const determinant = a * b * c - a * p * p - b * q * q;
  const yaw = (a * b * n - a * p * y + b * q * x) / determinant;
  near(ratesAt(motionOf(craft, command), [0, 0, 0, 0, 0, 0])[2]!, yaw, 1e-12);
});

/** ρ = 0 and no gas: M of the solid mass alone. */
function inVacuum(craft: TurningCraft): TurningCraft {
  const { solid, ahead, side, solidYaw } = craft.mass;
  const [centreAhead, centreSide] = [ahead / solid, side / solid];
  const mass = { ...craft.mass, surge: solid, sway: solid, yaw: solidYaw, centreAhead, centreSide };
  const centreYaw = solidYaw - ahead * centreAhead - side * centreSide;
  return { ...slippery(craft), density: 0, mass: { ...mass, centreYaw } };
}

const start = fc.tuple(double(-3, 3), double(-3, 3), double(-2, 2));

test('without air a free craft is Newton’s: its CG goes straight on, its spin stays', () => {
  fc.assert(
    fc.property(anyCraft, start, (file, velocity) => {
      const craft = inVacuum(turning(file));
      const { cgAhead, cgSide } = craft.mass;
      const motion = motionAt(craft, 0, 0);
      const from = [...velocity, 0.3, -0.2, 0.4];
      const cgOf = ([, , , x, y, heading]: ArrayLike<number> & Iterable<number>) => {
        const [cos, sin] = [Math.cos(heading!), Math.sin(heading!)];
        return [x! + cgAhead * cos - cgSide * sin, y! + cgAhead * sin + cgSide * cos];
      };
      const speedOf = ([u, v, r, , , heading]: ArrayLike<number> & Iterable<number>) => {
        const [along, across] = [u! - r! * cgSide, v! + r! * cgAhead];
        const [cos, sin] = [Math.cos(heading!), Math.sin(heading!)];
        return [along * cos - across * sin, along * sin + across * cos];
      };
      const { last } = followed(motion, from, 4);
      const [before, pace] = [cgOf(from), speedOf(from)];
      for (const i of [0, 1]) {
        expect(Math.abs(cgOf(last)[i]! - before[i]! - 4 * pace[i]!)).toBeLessThan(1e-8);
        expect(Math.abs(speedOf(last)[i]! - pace[i]!)).toBeLessThan(1e-9);
      }
      expect(Math.abs(last[2]! - velocity[2])).toBeLessThan(1e-9);
      expect(Math.abs(last[5]! - 0.4 - 4 * velocity[2])).toBeLessThan(1e-8);
    }),
    { numRuns: 30 },
  );
});

// Lamb, Hydrodynamics (1932), § 124: in air without friction and without forces, impulse and its moment stay the same in space.
test('in air without drag the impulse of craft and air stays, in space', () => {
  fc.assert(
    fc.property(anyCraft, start, (file, velocity) => {
      const craft = slippery(turning(file));
      const { surge, sway, yaw, ahead, side } = craft.mass;
      const impulse = ([u, v, r, x, y, heading]: ArrayLike<number> & Iterable<number>) => {
        const [along, across] = [surge * u! - side * r!, sway * v! + ahead * r!];
        const [cos, sin] = [Math.cos(heading!), Math.sin(heading!)];
        const [px, py] = [along * cos - across * sin, along * sin + across * cos];
        return [px, py, x! * py - y! * px + ahead * v! - side * u! + yaw * r!];
      };
      const from = [...velocity, 0, 0, 0];
      const { last } = followed(motionAt(craft, 0, 0), from, 3);
      const [before, after] = [impulse(from), impulse(last)];
      for (const [i, each] of before.entries()) expect(Math.abs(after[i]! - each)).toBeLessThan(1e-8);
    }),
    { numRuns: 30 },
  );
});

test('without thrust the energy of motion never grows', () => {
  const energy = ({ mass: { surge, sway, yaw, ahead, side } }: TurningCraft, state: ArrayLike<number>) => {
    const [u, v, r] = [state[0]!, state[1]!, state[2]!];
    return 0.5 * (surge * u * u + sway * v * v + yaw * r * r) + (ahead * v - side * u) * r;
  };
  fc.assert(
    fc.property(anyCraft, start, (file, velocity) => {
      const craft = turning(file);
      const motion = followed(motionAt(craft, 0, 0), [...velocity, 0, 0, 0], 20, 1e-10);
      let before = energy(craft, motion.at(0));
      expect(before).toBeGreaterThanOrEqual(0);
      for (let t = 0.1; t <= 20; t += 0.1) {
        const now = energy(craft, motion.at(t));
        expect(now).toBeLessThanOrEqual(before * (1 + 1e-9) + 1e-13);
        before = now;
      }
    }),
    { numRuns: 30 },
  );
});

test('the mirrored craft under the mirrored helm goes the mirrored way, to rounding', () => {
  const mirrored = [1, -1, -1, 1, -1, -1];
  fc.assert(
    fc.property(anyCraft, start, double(0, 3), (file, velocity, t) => {
      const [here, there] = [motionAt(turning(file), 1, 1), motionAt(turning(mirroredCraft(file)), 1, -1)];
      const state = [...velocity, 1, 2, 0.3];
      const rates = [here, there].map(({ slope }, i) => {
        const into = new Float64Array(6);
        slope(
          t,
          Float64Array.from(state, (each, k) => (i === 0 ? each : mirrored[k]! * each)),
          into,
        );
        return into;
      });
      const size = Math.hypot(...rates[0]!);
      for (const [k, way] of mirrored.entries()) {
        expect(Math.abs(rates[0]![k]! - way * rates[1]![k]!)).toBeLessThanOrEqual(1e-12 * size);
      }
    }),
  );
});

test('and so it stays while it is followed', () => {
  const file = craftWith([battery, tailThruster(2.8), fins()]);
  const here = followed(motionAt(turning(file), 1, 1), [2, 0.3, 0.1, 0, 0, 0], 20).last;
  const there = followed(motionAt(turning(mirroredCraft(file)), 1, -1), [2, -0.3, -0.1, 0, 0, 0], 20).last;
  for (const [i, way] of [1, -1, -1, 1, -1, -1].entries()) {
    expect(Math.abs(here[i]! - way * there[i]!)).toBeLessThan(1e-9);
  }
});

test('thrust along the axis through the CB of an even craft never yaws it', () => {
  const craft = turning(
    craftWith([battery, tailThruster(2.95, { yaw: fixedAt(0) }), { ...fins(), copies: { kind: 'pair' } }]),
  );
  const { last } = followed(motionAt(craft, 1, 1), [0, 0, 0, 0, 0, 0], 100, 1e-8);
  expect(last[3]).toBeGreaterThan(100);
  for (const i of [1, 2, 4, 5]) expect(Math.abs(last[i]!)).toBe(0);
});

// Half a turn of a cylinder about its middle: closed form in strips.test.ts.
test('a cylinder spinning about its middle is slowed by ½ρ C_d D r² L⁴/32', () => {
  const shape = {
    kind: 'cylinder',
    diameter: 0.5,
    noseEnd: 'flat',
    noseLength: 0,
    middleLength: 3,
    tailEnd: 'flat',
    tailLength: 0,
  } as const;
  const craft = turning(craftWith([battery, tailThruster()], shape));
  const wanted = (0.5 * craft.density * 1.2 * finiteLength(6) * 0.5 * 0.7 ** 2 * 3 ** 4) / 32;
  const [, , moment] = forcesAt(motionAt(craft, 0, 0), [0, 0, -0.7, 0, 0, 0]);
  near(moment!, wanted, 1e-9);
});

test('a fin in the plane of the turn does nothing, one at 45° does half of an upright one at small angles', () => {
  const withFin = (clock: number) =>
    turning(
      craftWith([
        { ...battery, place: { kind: 'axis', station: 1.5 } },
        tailThruster(1.5),
        {
          ...fins(),
          copies: { kind: 'together', count: 1 },
          place: { kind: 'skin', station: 2.6, clock, standoff: 0.1 },
        },
      ]),
    );
  const sideOf = (craft: TurningCraft) =>
    forcesAt(motionAt({ ...slippery(craft), fins: craft.fins }, 0, 0), [3, 1e-9, 0, 0, 0, 0])[1]!;
  const upright = sideOf(withFin(0));
  near(sideOf(withFin(Math.PI / 4)), upright / 2, 1e-6);
  expect(Math.abs(sideOf(withFin(Math.PI / 2)))).toBeLessThan(1e-12 * Math.abs(upright));
  expect(upright).toBeLessThan(0);
});

test('thrust is lost by the advance along the thruster’s own axis, which yawing brings about too', () => {
  const pair = pairCraft();
  const { staticThrust, pitchSpeed } = pair.thrusters[0]!;
  // Port and starboard piece at half full thrust forward each while the craft spins at r: 0.55 r ahead on the port side.
  const motion = motionAt({ ...slippery(pair) }, 1, 0);
  const [, , moment] = forcesAt(motion, [0, 0, 1, 0, 0, 0]);
  // The port piece (0.55 m) loses 0.55/9 of its thrust, the starboard one is pushed back and loses none.
  near(moment!, -0.55 * staticThrust * (0.55 / pitchSpeed), 1e-9);
});
