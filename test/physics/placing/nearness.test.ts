/** Room about a propeller, against figures by hand on a cylinder and against a dense cloud of points. */
import fc from 'fast-check';
import { expect, test } from 'vitest';
import type { Vec3 } from '../../../src/numeric/vector.ts';
import { hullOf } from '../../../src/physics/hull/hullOf.ts';
import {
  type Box,
  footOf,
  gapToFellow,
  gapToPropeller,
  gapToSkin,
  passesThrough,
} from '../../../src/physics/placing/nearness.ts';
import { directionOf, HUB, lowestOf, type Sweep, sweepOf } from '../../../src/physics/placing/sweep.ts';
import type { Thruster } from '../../../src/physics/thrust/thrusters.ts';
import { degrees, FIXED, solvedValue, turning } from '../thrust/thrustFixture.ts';

/** 4 m long, 1 m across, ends cut off square. */
const CYLINDER = solvedValue(
  hullOf({
    kind: 'cylinder',
    diameter: 1,
    noseEnd: 'flat',
    noseLength: 0,
    middleLength: 4,
    tailEnd: 'flat',
    tailLength: 0,
  }),
);

const thrusterAt = (at: Vec3, change: Partial<Thruster> = {}): Thruster => ({
  part: 'thruster',
  copy: 0,
  name: 'Thruster',
  at,
  staticThrust: 1,
  pitchSpeed: 8,
  diameter: 0.2,
  figureOfMerit: null,
  reverse: 0,
  yaw: FIXED,
  pitch: FIXED,
  differ: 0,
  ...change,
});

const sweepAt = (at: Vec3, change: Partial<Thruster> = {}): Sweep => sweepOf(thrusterAt(at, change));

test.each([
  ['below, pushing straight', [2, 0, -0.7], {}, 0.1],
  ['below, turned in yaw, which leaves its height', [2, 0, -0.7], { yaw: turning() }, 0.1],
  ['beside, turned in pitch', [2, 0.65, 0], { pitch: turning(0, 80 * degrees) }, 0.05],
  ['cutting in from above', [1, 0, 0.55], {}, -0.05],
  ['behind the flat tail, square to it', [4.06, 0, 0], {}, 0.06],
  [
    'behind it, turned by 30°: half its radius forward',
    [4.06, 0, 0],
    { yaw: turning(0, 30 * degrees) },
    0.01,
  ],
  ['ahead of the flat nose', [-0.3, 0, 0], {}, 0.3],
] as const)('the gap to a cylinder: %s', (_, at, change, gap) => {
  expect(gapToSkin(sweepAt(at, change), CYLINDER, 0.01)).toBeCloseTo(gap, 9);
});

test('turned by 60° close behind the tail the blades cut into it', () => {
  expect(gapToSkin(sweepAt([4.06, 0, 0], { yaw: turning(0, 60 * degrees) }), CYLINDER, 0.01)).toBeLessThan(0);
});

test('beside a blunt nose the skin just aft is near, though none is square across', () => {
  // A disc in the plane of the nose, its rim 60 mm off the axis; 5 mm aft the spheroid is 61 mm across from the axis.
  const blunt = solvedValue(hullOf({ kind: 'spheroid', length: 2, diameter: 1.22 }));
  expect(blunt.radius(0.005, 0)).toBeCloseTo(0.061, 3);
  expect(gapToSkin(sweepAt([0, 0, -0.16]), blunt, 0.01)).toBeLessThan(0.006);
  expect(gapToSkin(sweepAt([-0.02, 0, -0.16]), blunt, 0.01)).toBeGreaterThan(0.01);
});

test('a disc about the tail, its rim outside, is struck by what passes through it', () => {
  const thin = { ...CYLINDER, radius: (x: number) => (x >= 0 && x <= 4 ? 0.02 : 0) };
  expect(gapToSkin(sweepAt([3.9, 0, 0]), thin, 0.01)).toBeLessThan(0);
});

/** Points of a disc, hub left out, far denser than those of the program. */
function cloud({ at, radius, normals }: Sweep): Vec3[] {
  return normals.flatMap((n) => {
    const side: Vec3 = Math.abs(n[2]) < 0.9 ? [n[1], -n[0], 0] : [0, n[2], -n[1]];
    const length = Math.hypot(...side);
    const e = side.map((each) => each / length) as unknown as Vec3;
    const f: Vec3 = [n[1] * e[2] - n[2] * e[1], n[2] * e[0] - n[0] * e[2], n[0] * e[1] - n[1] * e[0]];
    const rings = Array.from({ length: 41 }, (_, i) => radius * (HUB + ((1 - HUB) * i) / 40));
    return rings.flatMap((ring) =>
      Array.from({ length: 120 }, (_, k): Vec3 => {
        const [c, s] = [Math.cos((k * Math.PI) / 60), Math.sin((k * Math.PI) / 60)];
        return [0, 1, 2].map((i) => at[i]! + ring * (c * e[i]! + s * f[i]!)) as unknown as Vec3;
      }),
    );
  });
}

const double = (min: number, max: number) => fc.double({ min, max, noNaN: true });

const sweeps = fc
  .record({ yaw: double(-1.5, 1.5), pitch: double(-1.5, 1.5), radius: double(0.05, 0.3) })
  .map(({ yaw, pitch, radius }): Sweep => ({ at: [0, 0, 0], radius, normals: [directionOf(yaw, pitch)] }));

const boxes = fc
  .record({
    middle: fc.tuple(double(-0.4, 0.4), double(-0.4, 0.4), double(-0.4, 0.4)),
    roll: double(-3, 3),
    size: fc.record({ length: double(0.02, 0.5), width: double(0.02, 0.5), height: double(0.02, 0.5) }),
  })
  .map(({ middle, roll, size }): Box => ({ piece: { middle, roll }, size }));

/** Whether the dense cloud has a point in a box made so much larger, or smaller. */
function cloudIn(sweep: Sweep, { piece: { middle, roll }, size }: Box, grown: number): boolean {
  const [cos, sin] = [Math.cos(roll), Math.sin(roll)];
  return cloud(sweep).some(([x, y, z]) => {
    const [dy, dz] = [y - middle[1], z - middle[2]];
    // A piece on the skin has its height outward, at (sin roll, cos roll) of side and height.
    const [across, outward] = [dy * cos - dz * sin, dy * sin + dz * cos];
    return (
      Math.abs(x - middle[0]) <= size.length / 2 + grown &&
      Math.abs(across) <= size.width / 2 + grown &&
      Math.abs(outward) <= size.height / 2 + grown
    );
  });
}

test('blades pass through a box as a dense cloud of points does, to within the gaps of the cloud', () => {
  const seen = { through: 0, past: 0 };
  fc.assert(
    fc.property(sweeps, boxes, (sweep, box) => {
      const found = passesThrough(sweep, box);
      if (cloudIn(sweep, box, 0)) {
        seen.through++;
        expect(found).toBe(true);
      }
      if (!cloudIn(sweep, box, 0.012)) {
        seen.past++;
        expect(found).toBe(false);
      }
    }),
    { numRuns: 300, endOnFailure: true, seed: 11 },
  );
  expect(seen.through).toBeGreaterThan(50);
  expect(seen.past).toBeGreaterThan(50);
});

const besideCylinder = fc
  .record({ x: double(-0.3, 4.3), rho: double(0.3, 0.9), clock: double(0, 6.28) })
  .map(({ x, rho, clock }): Vec3 => [x, rho * Math.sin(clock), rho * Math.cos(clock)]);

test('a propeller cuts into a cylinder where a dense cloud of its points does, to within the gaps between points', () => {
  const seen = { cut: 0, clear: 0 };
  const grownBy = (sweep: Sweep, by: number) =>
    cloud(sweep).some(([x, y, z]) => x >= -by && x <= 4 + by && Math.hypot(y, z) < 0.5 + by);
  fc.assert(
    fc.property(sweeps, besideCylinder, (sweep, at) => {
      const there = { ...sweep, at };
      const gap = gapToSkin(there, CYLINDER, 0.01);
      if (grownBy(there, -0.03)) {
        seen.cut++;
        expect(gap).toBeLessThan(0);
      }
      if (!grownBy(there, 0.03)) {
        seen.clear++;
        expect(gap).toBeGreaterThan(0);
      }
    }),
    { numRuns: 200, endOnFailure: true, seed: 11 },
  );
  expect(seen.cut).toBeGreaterThan(15);
  expect(seen.clear).toBeGreaterThan(30);
});

test('what carries a propeller may come as near as its hub', () => {
  const mount: Box = {
    piece: { middle: [-0.01, 0, 0], roll: 0 },
    size: { length: 0.05, width: 0.02, height: 0.02 },
  };
  expect(passesThrough(sweepAt([0, 0, 0]), mount)).toBe(false);
  expect(passesThrough(sweepAt([0, 0, 0.06]), mount)).toBe(true);
});

test('between two propellers side by side, and one behind the other', () => {
  expect(gapToFellow(sweepAt([0, -0.15, 0]), sweepAt([0, 0.15, 0]))).toBeCloseTo(0.1, 12);
  expect(gapToPropeller(sweepAt([0, -0.15, 0]), sweepAt([0, 0.15, 0]), 0.2)).toBeCloseTo(0.1, 9);
  expect(gapToPropeller(sweepAt([0, 0, 0]), sweepAt([0.07, 0, 0]), 0.2)).toBeCloseTo(0.07, 9);
  expect(gapToPropeller(sweepAt([0, 0, 0]), sweepAt([3, 0, 0]), 0.2)).toBe(Number.POSITIVE_INFINITY);
});

test('between two that turn every way there is an answer, however many the directions', () => {
  const anyWay = { yaw: turning(-Math.PI, Math.PI), pitch: turning(-Math.PI, Math.PI) };
  const [one, other] = [sweepAt([0, 0, 0], anyWay), sweepAt([0, 0, 0.21], anyWay)];
  expect(gapToPropeller(one, other, 0.2)).toBeCloseTo(0.01, 9);
  expect(gapToPropeller(one, one, 0.2)).toBeCloseTo(0, 9);
});

test('a propeller reaches lowest while it pushes level; a box leaned over reaches down by its corner', () => {
  expect(lowestOf(sweepAt([0, 0, -1], { pitch: turning(0, 80 * degrees) }))).toBeCloseTo(-1.1, 12);
  const fixed = { least: 60 * degrees, most: 60 * degrees, set: 60 * degrees, slew: 0 };
  expect(lowestOf(sweepAt([0, 0, -1], { pitch: fixed }))).toBeCloseTo(-1.05, 12);
  const size = { length: 1, width: 0.2, height: 0.4 };
  expect(footOf({ piece: { middle: [0, 0, 1], roll: 0 }, size })).toBeCloseTo(0.8, 12);
  expect(footOf({ piece: { middle: [0, 0, 1], roll: Math.PI / 2 }, size })).toBeCloseTo(0.9, 12);
});
