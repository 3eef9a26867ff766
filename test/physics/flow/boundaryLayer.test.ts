import { expect, test } from 'vitest';
import type { HullShape } from '../../../src/craft/hullSchema.ts';
import { integrateFixed } from '../../../src/numeric/quadrature.ts';
import { standardAirAt } from '../../../src/physics/air/standardAtmosphere.ts';
import { kinematicViscosity } from '../../../src/physics/air/viscosity.ts';
import {
  type BoundaryLayer,
  boundaryLayerOf,
  type LayerOptions,
} from '../../../src/physics/flow/boundaryLayer.ts';
import type { HullFlow } from '../../../src/physics/flow/hullFlow.ts';
import { SHAPE_POWER } from '../../../src/physics/flow/layerGrowth.ts';
import { benchShapes } from '../../bench/shapes.ts';
import { nameOf, SHAPES } from '../hull/shapes.ts';
import { flowOf } from './flowOf.ts';

const NU = kinematicViscosity(standardAirAt(0));

function layerOf(flow: HullFlow, speed: number, options: LayerOptions = {}): BoundaryLayer {
  const layer = boundaryLayerOf(flow, speed, NU, options);
  if (layer.status !== 'solved') throw new Error(layer.why);
  return layer.value;
}

const spheroid = (fineness: number): HullShape => ({ kind: 'spheroid', length: fineness, diameter: 1 });

/** Drag coefficient on the volume to the power ⅔ from the momentum of the wake. */
const dragOf = (flow: HullFlow, { wakeArea }: BoundaryLayer): number =>
  (2 * wakeArea) / flow.hull.volume ** (2 / 3);

/** S. F. Hoerner, Fluid-Dynamic Drag (1965): streamline bodies on volume^(2/3). */
const hoerner = (reynolds: number, f: number): number =>
  reynolds ** (-1 / 6) * (0.172 * f ** (1 / 3) + 0.252 * f ** -1.2 + 1.032 * f ** -2.7);

test('Hoerner’s formula as printed: 0.03452 and 0.02352 at l/d 4', () => {
  expect(hoerner(1e6, 4)).toBeCloseTo(0.03452, 5);
  expect(hoerner(1e7, 4)).toBeCloseTo(0.02352, 5);
});

// A different model throughout, fitted to tests of rough and tripped bodies: agreement within 15 % is what one may ask.
test.each([3, 4, 5, 6])(
  'fineness %d, tripped near the nose: drag of the wake within 15 %% of Hoerner’s',
  (f) => {
    const flow = flowOf(spheroid(f));
    for (const reynolds of [5e5, 1e6, 3e6, 1e7]) {
      const drag = dragOf(flow, layerOf(flow, (reynolds * NU) / f, { trip: 0.05 * f }));
      expect(Math.abs(drag / hoerner(reynolds, f) - 1)).toBeLessThan(0.15);
    }
  },
);

test('left smooth, the layer drags less, the more so the slower the craft', () => {
  const flow = flowOf(spheroid(4));
  const gain = [0.5, 3, 10].map(
    (speed) => layerOf(flow, speed).wakeArea / layerOf(flow, speed, { trip: 0 }).wakeArea,
  );
  expect(gain[0]).toBeLessThan(0.7);
  expect(gain[1]).toBeGreaterThan(gain[0]!);
  expect(gain[2]).toBeGreaterThan(gain[1]!);
  expect(gain[2]).toBeLessThan(1);
});

const every: [string, HullShape][] = [
  ...Object.entries(benchShapes),
  ...SHAPES.map((shape): [string, HullShape] => [nameOf(shape), shape]),
];

test.each(every)('%s: from a crawl to a gale everything is finite and nothing negative', (_, shape) => {
  const flow = flowOf(shape);
  const { length, height } = flow.hull;
  for (const speed of [0.05, 1, 20]) {
    const { marks, wakeArea, transition, sliceAt } = layerOf(flow, speed);
    expect(wakeArea).toBeGreaterThan(0);
    expect(transition.station).toBeGreaterThanOrEqual(0);
    expect(transition.station).toBeLessThanOrEqual(length);
    expect(marks.length).toBe(flow.surface.length);
    for (const { momentumArea, thickness } of marks) {
      expect(Number.isFinite(momentumArea)).toBe(true);
      expect(momentumArea).toBeGreaterThanOrEqual(0);
      expect(thickness).toBeGreaterThanOrEqual(0);
      expect(thickness).toBeLessThan(2 * (length + height));
    }
    for (const share of [-0.2, 0, 1e-9, 0.5, 0.97, 1, 1 + 1e-9, 1.05, 3]) {
      const { skin, axialAt } = sliceAt(share * length);
      for (const away of [1e-9, 0.01, 0.3, 1])
        expect(Number.isFinite(axialAt(skin + away * height))).toBe(true);
    }
  }
});

test('the wake keeps its momentum area, at the tail and a length behind it', () => {
  const flow = flowOf(benchShapes.naca4);
  const { length } = flow.hull;
  const { sliceAt, wakeArea } = layerOf(flow, 3);
  for (const station of [1.001 * length, 1.1 * length, 2 * length]) {
    const { thickness, axialAt } = sliceAt(station);
    const atEdge = axialAt(thickness * (1 + 1e-12));
    const carried = integrateFixed(
      (z) => {
        const rho = thickness * z ** 7;
        const f = axialAt(rho) / atEdge;
        return 2 * Math.PI * rho * f * (1 - f) * 7 * thickness * z ** 6;
      },
      0,
      1,
      24,
    );
    const { axial, radial } = flow.velocityAt(station, thickness);
    expect((carried * Math.hypot(axial, radial) ** SHAPE_POWER) / wakeArea).toBeCloseTo(1, 3);
  }
});

test('layer and wake meet at the tail, and the speed is whole at the edge', () => {
  for (const shape of [benchShapes.spheroid, benchShapes.naca4, benchShapes.gores]) {
    const flow = flowOf(shape);
    const { length } = flow.hull;
    const { sliceAt } = layerOf(flow, 3);
    const [before, behind] = [sliceAt(length * (1 - 1e-7)), sliceAt(length * (1 + 1e-7))];
    expect(Math.abs(before.thickness / behind.thickness - 1)).toBeLessThan(0.01);
    for (const station of [0.3 * length, 0.9 * length, 1.05 * length]) {
      const { skin, thickness, axialAt } = sliceAt(station);
      const edge = skin + thickness;
      expect(axialAt(edge - 1e-7)).toBeCloseTo(axialAt(edge + 1e-7), 4);
      expect(axialAt(skin + 0.1 * thickness)).toBeLessThan(axialAt(edge));
      expect(axialAt(skin)).toBe(0);
    }
  }
});

test('only the Reynolds number counts: twice as long at half the speed, twice as thick', () => {
  const [small, large] = [flowOf(spheroid(4)), flowOf({ kind: 'spheroid', length: 8, diameter: 2 })];
  const [thin, thick] = [layerOf(small, 3), layerOf(large, 1.5)];
  expect(thick.transition.cause).toBe(thin.transition.cause);
  for (const share of [0.2, 0.5, 0.9, 1.1])
    expect(thick.sliceAt(8 * share).thickness / thin.sliceAt(4 * share).thickness).toBeCloseTo(2, 4);
});

test('along the middle of a long cylinder it is the layer of a flat plate', () => {
  const flow = flowOf({
    kind: 'cylinder',
    diameter: 4,
    noseEnd: 'ogive',
    noseLength: 4,
    middleLength: 12,
    tailEnd: 'ogive',
    tailLength: 4,
  });
  const { marks } = layerOf(flow, 10, { trip: 0 });
  const mark = marks.reduce((best, each) =>
    Math.abs(each.station - 10) < Math.abs(best.station - 10) ? each : best,
  );
  const theta = mark.momentumArea / (2 * Math.PI * mark.radius);
  // The nose, on which the layer spreads as it grows, counts for less than its length.
  const plate = 0.0366 * mark.tape * ((10 * mark.tape) / NU) ** -0.2;
  expect(theta / plate).toBeGreaterThan(0.75);
  expect(theta / plate).toBeLessThan(1.05);
});

test('a trip aft of where the layer turns by itself changes nothing', () => {
  const flow = flowOf(spheroid(4));
  expect(layerOf(flow, 5, { trip: 3.9 }).wakeArea).toBe(layerOf(flow, 5).wakeArea);
  expect(layerOf(flow, 5, { trip: 0.1 }).transition.cause).toBe('trip');
});

test('cautions: smooth until it leaves the skin; leaving a blunt tail; none for a good tail at speed', () => {
  const blunt = flowOf({ kind: 'spheroid', length: 1.2, diameter: 1 });
  expect(layerOf(blunt, 0.5).cautions).toEqual([
    expect.stringMatching(/stays smooth as far as station/),
    expect.stringMatching(/likely to leave the skin at station/),
  ]);
  expect(layerOf(flowOf(benchShapes.naca4), 15).cautions).toEqual([]);
});

test('a craft at rest has no layer, and says so', () => {
  const none = boundaryLayerOf(flowOf(spheroid(4)), 0, NU);
  expect(none.status).toBe('infeasible');
});
