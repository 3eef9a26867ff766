import fc from 'fast-check';
import { expect, test } from 'vitest';
import { type BoundaryLayer, boundaryLayerOf } from '../../../src/physics/flow/boundaryLayer.ts';
import type { HullFlow } from '../../../src/physics/flow/hullFlow.ts';
import { type Inflow, inflowAt } from '../../../src/physics/flow/inflow.ts';
import { ellipsoidAddedMass } from '../../../src/physics/hull/addedMass.ts';
import { benchShapes } from '../../bench/shapes.ts';
import { flowOf } from './flowOf.ts';

function layerOf(flow: HullFlow, speed: number): BoundaryLayer {
  const layer = boundaryLayerOf(flow, speed, 1.46e-5);
  if (layer.status !== 'solved') throw new Error(layer.why);
  return layer.value;
}

// Stream function of a ball in a stream (Lamb 1932, § 96): ψ = ½ϱ²[1 − (a/R)³], so a disc round the axis at x from the
// middle has the mean axial speed 2ψ/ϱ² = 1 − a³/(x² + ϱ²)^{3/2}.
test('ball: the exact mean over a disc round the axis, ahead and behind', () => {
  const flow = flowOf({ kind: 'spheroid', length: 2, diameter: 2 });
  for (const x of [-3, -1.3, 1.05, 1.6])
    for (const radius of [0.1, 0.8, 2]) {
      const { ratio, potentialRatio } = inflowAt(flow, null, { at: [1 + x, 0, 0], diameter: 2 * radius });
      expect(potentialRatio).toBeCloseTo(1 - (x * x + radius * radius) ** -1.5, 5);
      expect(ratio).toBe(potentialRatio);
    }
});

test('a small disc beside the waist of a spheroid feels (1 + k₁)U', () => {
  const flow = flowOf({ kind: 'spheroid', length: 4, diameter: 1 });
  const { potentialRatio } = inflowAt(flow, null, { at: [2, 0.505, 0], diameter: 0.005 });
  expect(potentialRatio).toBeCloseTo(1 + ellipsoidAddedMass(2, 0.5, 0.5).surge, 2);
});

const flow = flowOf(benchShapes.naca4);
const layer = layerOf(flow, 3);
const { length } = flow.hull;
const place = fc.record({
  station: fc.double({ min: -1, max: 6, noNaN: true }),
  away: fc.double({ min: 0, max: 2, noNaN: true }),
  clock: fc.double({ min: 0, max: 6.28, noNaN: true }),
  diameter: fc.double({ min: 0.05, max: 1.5, noNaN: true }),
});

test('wherever the disc is: shares within 0 … 1, a speed near that of the craft, port like starboard', () => {
  fc.assert(
    fc.property(place, ({ station, away, clock, diameter }) => {
      const at = (side: number): Inflow =>
        inflowAt(flow, layer, {
          at: [station, side * away * Math.sin(clock), away * Math.cos(clock)],
          diameter,
        });
      const [port, starboard] = [at(-1), at(1)];
      expect(port).toEqual(starboard);
      expect(port.wakeShare).toBeGreaterThanOrEqual(-1e-12);
      expect(port.insideShare).toBeGreaterThanOrEqual(0);
      expect(port.wakeShare + port.insideShare).toBeLessThanOrEqual(1 + 1e-9);
      expect(port.ratio).toBeGreaterThanOrEqual(0);
      expect(port.ratio).toBeLessThan(1.2);
      if (port.wakeShare === 0 && port.insideShare < 1)
        expect(port.ratio).toBeCloseTo(port.potentialRatio, 12);
    }),
    { numRuns: 60 },
  );
});

test('a disc wholly inside the hull gets no air; one that pokes out is known by its share inside', () => {
  expect(inflowAt(flow, layer, { at: [1.2, 0, 0], diameter: 0.3 })).toEqual({
    ratio: 0,
    potentialRatio: 0,
    wakeShare: 0,
    insideShare: 1,
  });
  const skin = flow.hull.radius(1.2, 0);
  const across = inflowAt(flow, layer, { at: [1.2, skin, 0], diameter: 0.3 });
  expect(across.insideShare).toBeGreaterThan(0.4);
  expect(across.insideShare).toBeLessThan(0.5);
  expect(across.ratio).toBeGreaterThan(0.5);
});

test('far from the hull it is the free stream', () => {
  for (const at of [
    [-60, 0, 0],
    [2, 50, 0],
  ] as const)
    expect(inflowAt(flow, layer, { at, diameter: 0.4 }).ratio).toBeCloseTo(1, 3);
});

test('common practice, no source: slow air in front of the nose and behind the tail, fast air beside the waist', () => {
  const ratioAt = (station: number, side: number) =>
    inflowAt(flow, layer, { at: [station, side, 0], diameter: 0.3 }).ratio;
  expect(ratioAt(-0.1, 0)).toBeLessThan(0.85);
  expect(ratioAt(1.02 * length, 0)).toBeLessThan(0.85);
  expect(ratioAt(0.3 * length, 0.8)).toBeGreaterThan(1.04);
});

test('behind the tail a small disc is all in the wake, a larger one meets faster air', () => {
  const [small, large] = [0.2, 1.2].map((diameter) =>
    inflowAt(flow, layer, { at: [1.05 * length, 0, 0], diameter }),
  );
  expect(small!.wakeShare).toBeCloseTo(1, 12);
  expect(large!.wakeShare).toBeLessThan(0.6);
  expect(small!.ratio).toBeLessThan(small!.potentialRatio);
  expect(large!.ratio).toBeGreaterThan(small!.ratio);
});

test('on a hull that is not round the skin on the side of the disc decides whether the blades strike', () => {
  const lying = flowOf(benchShapes.roundTwoSheet);
  const { height, breadth, length: whole } = lying.hull;
  const beside = (side: number, up: number) =>
    inflowAt(lying, null, { at: [whole / 2, side, up], diameter: 0.1 }).insideShare;
  expect(beside(breadth / 2 - 0.06, 0)).toBe(1);
  expect(beside(breadth / 2 + 0.06, 0)).toBe(0);
  expect(beside(0, height / 2 + 0.06)).toBe(0);
});
