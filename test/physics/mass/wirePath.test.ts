import fc from 'fast-check';
import { expect, test } from 'vitest';
import { type Craft, keyed } from '../../../src/craft/craft.ts';
import type { WireRun } from '../../../src/craft/schema.ts';
import { valueOrNull } from '../../../src/numeric/outcome.ts';
import type { Vec3 } from '../../../src/numeric/vector.ts';
import { hullOf } from '../../../src/physics/hull/hullOf.ts';
import { piecesOf } from '../../../src/physics/mass/pieces.ts';
import {
  type Branch,
  branchesOf,
  girthLeg,
  meridianLeg,
  straightLeg,
} from '../../../src/physics/mass/wirePath.ts';
import { fixtureCraft, partOf, wireOf } from '../../edit/craftFixture.ts';

const spheroid = valueOrNull(hullOf({ kind: 'spheroid', length: 3, diameter: 1 }))!;
const sphere = valueOrNull(hullOf({ kind: 'spheroid', length: 2, diameter: 2 }))!;
const lying = valueOrNull(hullOf({ kind: 'roundTwoSheet', flatDiameter: 1, stance: 'lying' }))!;

const branches = (wire: WireRun, craft: Craft = fixtureCraft(), hull = spheroid): Branch[] => {
  const pieces = Object.fromEntries(
    Object.values(craft.parts.byId).map((part) => [part.id, piecesOf(part, hull)]),
  );
  return branchesOf(wire, craft, pieces, hull);
};

/** Length and mean point of a drawn line: a rival that knows nothing of the hull. */
const measured = (points: readonly Vec3[]) => {
  let length = 0;
  const mean: [number, number, number] = [0, 0, 0];
  points.slice(1).forEach((b, i) => {
    const a = points[i]!;
    const ds = Math.hypot(b[0] - a[0], b[1] - a[1], b[2] - a[2]);
    length += ds;
    for (const k of [0, 1, 2] as const) mean[k] += (ds * (a[k] + b[k])) / 2;
  });
  return { length, mean: mean.map((each) => each / length) };
};

test('straight: length and second moments of a slender rod, m l²/12 about its middle', () => {
  const leg = straightLeg([1, 0, 0], [2, 0, 0]);
  expect(leg.length).toBe(1);
  expect(leg.second[0] - leg.length * 1.5 ** 2).toBeCloseTo(1 / 12, 12);
});

test('round the girth of a sphere: half a circle has length πr and its centroid at 2r/π', () => {
  const leg = girthLeg(1, 0, Math.PI, sphere);
  expect(leg.length).toBeCloseTo(Math.PI, 9);
  expect(Math.abs(leg.first[1]) / leg.length).toBeCloseTo(2 / Math.PI, 9);
  expect(leg.second[1] + leg.second[2]).toBeCloseTo(Math.PI, 9);
});

test('along the meridian of a sphere: a quarter of it, centroid 2r/π in from nose and waist', () => {
  const leg = meridianLeg(0, 1, Math.PI, sphere);
  expect(leg.length).toBeCloseTo(Math.PI / 2, 9);
  expect(1 - leg.first[0] / leg.length).toBeCloseTo(2 / Math.PI, 9);
  expect(leg.first[2] / leg.length).toBeCloseTo(-2 / Math.PI, 9);
});

test('round the girth goes the shorter way, and nowhere when it is there', () => {
  expect(girthLeg(1, 0.1, 2 * Math.PI - 0.1, sphere).length).toBeCloseTo(0.2, 9);
  expect(girthLeg(1, Math.PI, -Math.PI, sphere).length).toBe(0);
});

test('the section of a lying round hull is no circle, and its girth is the hull’s own', () => {
  expect(2 * girthLeg(lying.length / 2, 0, Math.PI, lying).length).toBeCloseTo(
    lying.girth(lying.length / 2),
    2,
  );
});

test('a run along the keel from battery to tail thruster, leg by leg', () => {
  const [run] = branches(wireOf('power'));
  // Battery: 30 mm up to the keel. Thruster on the axis at 2.97 m: out to the keel there, r = ½√(1 − (1.47/1.5)²).
  const out = 0.5 * Math.sqrt(1 - (1.47 / 1.5) ** 2);
  expect(run!.length).toBeCloseTo(0.03 + spheroid.skinPath(1.3, 2.97, Math.PI).length + out, 9);
  expect(run!.mass).toBeCloseTo(run!.length * 0.004 * 3 * 1.05, 12);
});

test('length and CG agree with the line as drawn', () => {
  const loose = fc.record({
    kind: fc.constant('loose' as const),
    place: fc.record({
      kind: fc.constant('free' as const),
      x: fc.double({ min: 0.1, max: 2.9, noNaN: true }),
      y: fc.double({ min: -0.6, max: 0.6, noNaN: true }),
      z: fc.double({ min: -0.6, max: 0.6, noNaN: true }),
    }),
  });
  const path = fc.oneof(
    fc.constant({ kind: 'straight' as const }),
    fc.record({ kind: fc.constant('skin' as const), clock: fc.double({ min: 0, max: 6.28, noNaN: true }) }),
  );
  fc.assert(
    fc.property(loose, loose, path, (from, to, route) => {
      const [run] = branches(wireOf('w', { from, to, path: route }));
      fc.pre(run!.length > 0.01);
      const drawn = measured(run!.points);
      expect(drawn.length / run!.length).toBeCloseTo(1, 2);
      run!.cg.forEach((each, i) => {
        expect(each).toBeCloseTo(drawn.mean[i]!, 1);
      });
    }),
  );
});

test('the two ways round give the same mass and CG', () => {
  const wire = wireOf('w', { to: { kind: 'part', part: 'fins' } });
  const [there] = branches(wire);
  const [back] = branches({ ...wire, from: wire.to, to: wire.from });
  expect(back!.mass).toBeCloseTo(there!.mass, 12);
  back!.cg.forEach((each, i) => {
    expect(each).toBeCloseTo(there!.cg[i]!, 12);
  });
});

test('a run to a ring has a branch for each piece', () => {
  expect(branches(wireOf('w', { to: { kind: 'part', part: 'fins' } }))).toHaveLength(3);
});

test('a run to a pair is mirrored: the craft does not heel for it', () => {
  const wire = wireOf('w', { to: { kind: 'part', part: 'lights' }, path: { kind: 'skin', clock: 2.5 } });
  const [starboard, port] = branches(wire);
  expect(port!.mass).toBeCloseTo(starboard!.mass, 12);
  expect(port!.cg[1]).toBeCloseTo(-starboard!.cg[1], 12);
});

test('several pieces at one place are one end', () => {
  const craft = fixtureCraft();
  const parts = keyed([
    ...Object.values(craft.parts.byId),
    partOf('cells', { copies: { kind: 'together', count: 3 } }),
  ]);
  expect(branches(wireOf('w', { from: { kind: 'part', part: 'cells' } }), { ...craft, parts })).toHaveLength(
    1,
  );
});

test('a run from a part to itself has no length and no mass, and still a place', () => {
  const self = { kind: 'part', part: 'thruster' } as const;
  const [run] = branches(wireOf('w', { from: self, to: self, path: { kind: 'straight' } }));
  expect(run).toMatchObject({ mass: 0, length: 0, cg: [2.97, 0, 0] });
});

test('it follows when a part moves', () => {
  const craft = fixtureCraft();
  const moved = keyed([
    partOf('thruster', { place: { kind: 'axis', station: 2 } }),
    craft.parts.byId.battery!,
  ]);
  const [before] = branches(wireOf('power'), craft);
  const [after] = branches(wireOf('power'), { ...craft, parts: moved });
  expect(after!.length).toBeLessThan(before!.length);
  expect(after!.cg[0]).toBeLessThan(before!.cg[0]);
});
