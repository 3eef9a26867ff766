import { expect, test } from 'vitest';
import type { HullShape } from '../../../src/craft/hullSchema.ts';
import { integrateFixed } from '../../../src/numeric/quadrature.ts';
import { type HullFlow, hullFlowOf } from '../../../src/physics/flow/hullFlow.ts';
import { ellipsoidAddedMass } from '../../../src/physics/hull/addedMass.ts';
import { benchShapes } from '../../bench/shapes.ts';
import { built } from '../hull/built.ts';
import { nameOf, SHAPES } from '../hull/shapes.ts';
import { skinSpeed, velocityOff } from './exactSpheroid.ts';
import { flowOf, reversed } from './flowOf.ts';

const spheroid = (fineness: number): HullShape => ({ kind: 'spheroid', length: fineness, diameter: 1 });
const FINENESSES = [0.6, 1, 2, 4, 8, 20];

// Lamb 1932, § 114: exactSpheroid.ts. The issue asks for 1 % over the skin and 0.3 % at the waist.
test.each(FINENESSES)(
  'fineness %d: the speed over the whole skin is (1 + k₁) cos(slope), within 1e-4 U',
  (f) => {
    const { surface } = flowOf(spheroid(f));
    for (const { station, ratio } of surface.slice(1, -1))
      expect(Math.abs(ratio - skinSpeed(f / 2, 0.5, station - f / 2))).toBeLessThan(1e-4);
  },
);

test.each(FINENESSES)('fineness %d: (1 + k₁)U at the waist, within 1e-4 (exact, from memory)', (f) => {
  const waist = flowOf(spheroid(f)).velocityAt(f / 2, 0.5 + 1e-7);
  expect(Math.abs(waist.axial / (1 + ellipsoidAddedMass(f / 2, 0.5, 0.5).surge) - 1)).toBeLessThan(1e-4);
  expect(Math.abs(waist.radial)).toBeLessThan(1e-4);
});

test('ball: 3/2 sin θ over the skin', () => {
  for (const { station, ratio } of flowOf(spheroid(1)).surface) {
    const sin = Math.sqrt(Math.max(0, 1 - (1 - 2 * station) ** 2));
    expect(Math.abs(ratio - 1.5 * sin)).toBeLessThan(1e-5);
  }
});

test.each(FINENESSES)(
  'fineness %d: the exact flow off the skin, from a millionth of the length away',
  (f) => {
    const { velocityAt } = flowOf(spheroid(f));
    for (const angle of [0.02, 0.3, 1, 1.6, 2.5, 3.13])
      for (const away of [1e-6, 1e-3, 0.02, 0.1, 0.5, 3]) {
        const x = -(f / 2) * Math.cos(angle) * (1 + away);
        const rho = 0.5 * Math.sin(angle) * (1 + away);
        const exact = velocityOff(f / 2, 0.5, x, rho);
        const found = velocityAt(x + f / 2, rho);
        expect(Math.hypot(found.axial - exact.axial, found.radial - exact.radial)).toBeLessThan(2e-4);
      }
  },
);

test('ball: on the axis ahead and behind 1 − (a/x)³', () => {
  const { velocityAt } = flowOf({ kind: 'spheroid', length: 2, diameter: 2 });
  for (const x of [1.01, 1.2, 2, 5]) {
    expect(velocityAt(1 - x, 0).axial).toBeCloseTo(1 - x ** -3, 6);
    expect(velocityAt(1 + x, 0).axial).toBeCloseTo(1 - x ** -3, 6);
    expect(velocityAt(1 - x, 0).radial).toBe(0);
  }
});

const every: [string, HullShape][] = [
  ...Object.entries(benchShapes),
  ...SHAPES.map((shape): [string, HullShape] => [nameOf(shape), shape]),
];

/** Outflow of the disturbance through a tin round the hull, as a share of the stream through its front. */
function leak({ hull, velocityAt }: HullFlow): number {
  const [fore, aft, radius] = [-0.3 * hull.length, 1.4 * hull.length, hull.height];
  const end = (x: number) =>
    integrateFixed((rho) => 2 * Math.PI * rho * velocityAt(x, rho).axial, 0, radius, 8, 4);
  const side = integrateFixed((x) => 2 * Math.PI * radius * velocityAt(x, radius).radial, fore, aft, 8, 12);
  return (side + end(aft) - end(fore)) / (Math.PI * radius * radius);
}

test.each(every)('%s: as much air leaves a tin round the hull as enters it', (_, shape) => {
  expect(Math.abs(leak(flowOf(shape)))).toBeLessThan(1e-4);
});

test.each(every)(
  '%s: finite, at rest at the tips, aft along the skin, which is that of the hull',
  (_, shape) => {
    const { hull, surface, velocityAt } = flowOf(shape);
    expect(surface[0]).toEqual({ station: 0, tape: 0, radius: 0, ratio: 0 });
    expect(surface.at(-1)!.ratio).toBe(0);
    expect(surface.length).toBeGreaterThan(40);
    surface.slice(1).forEach(({ station, tape, radius, ratio }, i) => {
      expect(tape).toBeGreaterThan(surface[i]!.tape);
      expect(ratio).toBeGreaterThanOrEqual(0);
      expect(ratio).toBeLessThan(6);
      // Beside the station too, since at a step or an end the outline is nearly upright.
      const beside = [-1, 0, 1].map((step) =>
        Math.sqrt(hull.sectionArea(station + step * 2e-3 * hull.height) / Math.PI),
      );
      if (station > 0 && station < hull.length) {
        expect(radius).toBeGreaterThan(Math.min(...beside) - 1e-3 * hull.height);
        expect(radius).toBeLessThan(Math.max(...beside) + 1e-3 * hull.height);
      }
    });
    const { axial, radial } = velocityAt(1.02 * hull.length, 0.01 * hull.height);
    expect(Number.isFinite(axial + radial)).toBe(true);
  },
);

test.each(every)('%s: twice as many panels change the waist and the wake by less than 0.2 %%', (_, shape) => {
  const [coarse, fine] = [flowOf(shape), flowOf(shape, 2)];
  expect(fine.surface.length).toBeGreaterThan(1.4 * coarse.surface.length);
  const { length, height } = coarse.hull;
  for (const [x, rho] of [
    [-0.05, 0.1],
    [0.5, 0.6],
    [0.9, 0.55],
    [1.05, 0.05],
    [1.2, 0.2],
  ] as const) {
    const [a, b] = [coarse, fine].map(({ velocityAt }) => velocityAt(x * length, rho * height));
    expect(Math.abs(a!.axial - b!.axial)).toBeLessThan(2e-3);
    expect(Math.abs(a!.radial - b!.radial)).toBeLessThan(2e-3);
  }
});

test.each([benchShapes.twoSpheroid, benchShapes.series58, benchShapes.cylinder, SHAPES[9]!])(
  'tail first is the same flow mirrored: $kind',
  (shape) => {
    const [ahead, astern] = [flowOf(shape), flowOf(reversed(shape))];
    const { length, height } = ahead.hull;
    for (const share of [-0.2, 0.05, 0.3, 0.5, 0.7, 0.95, 1.1])
      for (const rho of [0.55, 0.8]) {
        const there = ahead.velocityAt(share * length, rho * height);
        const back = astern.velocityAt((1 - share) * length, rho * height);
        expect(Math.abs(there.axial - back.axial)).toBeLessThan(2e-4);
        expect(Math.abs(there.radial + back.radial)).toBeLessThan(2e-4);
      }
    const fastest = (flow: HullFlow) => Math.max(...flow.surface.map(({ ratio }) => ratio));
    expect(Math.abs(fastest(ahead) - fastest(astern))).toBeLessThan(0.02);
  },
);

test('far away the disturbance falls as the third power of the distance, to the dipole of its added mass', () => {
  const flow = flowOf(benchShapes.naca4);
  const { hull, velocityAt } = flow;
  const carried = flow.addedMass();
  if (carried.status !== 'solved') throw new Error(carried.why);
  // Lamb 1932, § 121a (from memory): dipole moment (V + m/ρ)/(4π); broadside the axial part is moment/R³.
  const moment = (hull.volume * (1 + carried.value.surge)) / (4 * Math.PI);
  for (const away of [20, 40, 80]) {
    const R = away * hull.length;
    expect((velocityAt(hull.cbStation, R).axial - 1) * R ** 3).toBeCloseTo(moment, 2);
  }
});

test('a long cylinder: past its ends the air runs along the middle as if there were no hull', () => {
  const slowdown = [5, 15, 45].map((middleLength) => {
    const shape: HullShape = {
      ...(benchShapes.cylinder as Extract<HullShape, { kind: 'cylinder' }>),
      middleLength,
    };
    return flowOf(shape).velocityAt(0.8 + middleLength / 2, 0.6 + 1e-6).axial - 1;
  });
  expect(Math.abs(slowdown[0]!)).toBeLessThan(0.02);
  expect(Math.abs(slowdown[1]!)).toBeLessThan(Math.abs(slowdown[0]!) / 4);
  expect(Math.abs(slowdown[2]!)).toBeLessThan(Math.abs(slowdown[1]!) / 4);
});

test('tape distance is that of the hull', () => {
  for (const shape of [benchShapes.naca4, benchShapes.cylinder, benchShapes.gores, benchShapes.myring]) {
    const { hull, surface } = flowOf(shape);
    for (const { station, tape } of surface.filter(
      (mark) => mark.station > 0.01 && mark.station < hull.length - 0.01,
    ))
      expect(Math.abs(tape - hull.tapeAt(station, 0))).toBeLessThan(2e-4 * hull.seamLength);
  }
});

test('size does not matter', () => {
  const [small, large] = [
    flowOf({ kind: 'spheroid', length: 0.03, diameter: 0.01 }),
    flowOf({ kind: 'spheroid', length: 30, diameter: 10 }),
  ];
  small.surface.forEach(({ ratio, tape }, i) => {
    expect(ratio).toBeCloseTo(large.surface[i]!.ratio, 6);
    expect(1000 * tape).toBeCloseTo(large.surface[i]!.tape, 9);
  });
});

test('worked out once for a hull, with a caution where it is not round', () => {
  const hull = built(benchShapes.roundTwoSheet);
  expect(hullFlowOf(hull)).toBe(hullFlowOf(hull));
  const [odd, round] = [flowOf(benchShapes.roundTwoSheet), flowOf(benchShapes.myring)];
  expect(odd.cautions).toEqual([expect.stringMatching(/not round in section/)]);
  expect(round.cautions).toEqual([]);
});
