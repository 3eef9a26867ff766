import fc from 'fast-check';
import { expect, test } from 'vitest';
import { type Craft, keyed } from '../../../src/craft/craft.ts';
import type { WireRun } from '../../../src/craft/schema.ts';
import { valueOrNull } from '../../../src/numeric/outcome.ts';
import type { Vec3 } from '../../../src/numeric/vector.ts';
import { craftStateOf } from '../../../src/physics/craftState.ts';
import { hullOf } from '../../../src/physics/hull/hullOf.ts';
import { addLeg, type Leg, noSums } from '../../../src/physics/mass/leg.ts';
import { type Branch, drawnBranch } from '../../../src/physics/mass/wirePath.ts';
import { fixtureCraft, partOf, wireOf } from '../../edit/craftFixture.ts';

const spheroid = valueOrNull(hullOf({ kind: 'spheroid', length: 3, diameter: 1 }))!;
const sphere = valueOrNull(hullOf({ kind: 'spheroid', length: 2, diameter: 2 }))!;
const lying = valueOrNull(hullOf({ kind: 'roundTwoSheet', flatDiameter: 1, stance: 'lying' }))!;

const branches = (wire: WireRun, craft: Craft = fixtureCraft()): readonly Branch[] =>
  valueOrNull(craftStateOf({ ...craft, wires: keyed([wire]) }))!.branches[wire.id]!;

/** Length, first and second moments of one leg. */
const leg = (given: Leg, hull = sphere) => {
  const sums = noSums();
  addLeg(sums, given, hull);
  const [length, ...rest] = sums;
  return { length, first: rest.slice(0, 3) as [number, number, number], second: rest.slice(3) };
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
  const rod = leg({ kind: 'straight', a: [1, 0, 0], b: [2, 0, 0] });
  expect(rod.length).toBeCloseTo(1, 12);
  expect(rod.second[0]! - rod.length * 1.5 ** 2).toBeCloseTo(1 / 12, 12);
});

test('round the girth of a sphere: half a circle has length πr and its centroid at 2r/π', () => {
  const half = leg({ kind: 'girth', station: 1, from: 0, sweep: Math.PI });
  expect(half.length).toBeCloseTo(Math.PI, 9);
  expect(Math.abs(half.first[1]) / half.length).toBeCloseTo(2 / Math.PI, 9);
  expect(half.second[1]! + half.second[2]!).toBeCloseTo(Math.PI, 9);
});

test('along the meridian of a sphere: a quarter of it, centroid 2r/π in from nose and waist', () => {
  const quarter = leg({ kind: 'meridian', from: 0, to: 1, clock: Math.PI });
  expect(quarter.length).toBeCloseTo(Math.PI / 2, 9);
  expect(1 - quarter.first[0] / quarter.length).toBeCloseTo(2 / Math.PI, 9);
  expect(quarter.first[2] / quarter.length).toBeCloseTo(-2 / Math.PI, 9);
});

test('round the girth goes the shorter way, and nowhere when it is there', () => {
  const at = (clock: number) =>
    ({ kind: 'loose', place: { kind: 'skin', station: 1.5, clock, standoff: 0 } }) as const;
  const round = (from: number, to: number) =>
    branches(wireOf('w', { from: at(from), to: at(to), path: { kind: 'skin', clock: to } }))[0]!.length;
  expect(round(0.1, 2 * Math.PI - 0.1)).toBeCloseTo(0.5 * 0.2, 9);
  expect(round(Math.PI, -Math.PI)).toBeCloseTo(0, 9);
});

test('the section of a lying round hull is no circle, and its girth is the hull’s own', () => {
  expect(
    2 * leg({ kind: 'girth', station: lying.length / 2, from: 0, sweep: Math.PI }, lying).length,
  ).toBeCloseTo(lying.girth(lying.length / 2), 2);
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
      const drawn = measured(drawnBranch(run!, spheroid));
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
