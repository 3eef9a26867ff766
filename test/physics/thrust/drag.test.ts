import fc from 'fast-check';
import { expect, test } from 'vitest';
import { kinematicViscosity } from '../../../src/physics/air/viscosity.ts';
import { dragFineness, dragOf, volumeDragCoefficient } from '../../../src/physics/thrust/drag.ts';
import { plateDrag, plateFriction } from '../../../src/physics/thrust/plateDrag.ts';
import { partOf } from '../../edit/craftFixture.ts';
import { finPart, stateWith } from './thrustFixture.ts';

// Hoerner, Fluid-Dynamic Drag, 1965, ch. 6: the formula published, these two values computed from it.
test.each([
  [1e6, 0.03452],
  [1e7, 0.02352],
])('Hoerner: at Re %f and l/d 4 the drag coefficient on volume is %f', (reynolds, coefficient) => {
  expect(Math.abs(volumeDragCoefficient(reynolds, 4) - coefficient)).toBeLessThan(1e-5);
});

// NACA TR-397: whole airships at full scale, with cars and fins, 0.023 at best and up to 0.045; their Re a few 1e7 to 1e8 (from memory).
test('a bare hull at full scale has less drag than the best of whole airships, and not by half', () => {
  for (const fineness of [4, 5.5, 8]) {
    expect(volumeDragCoefficient(5e7, fineness)).toBeLessThan(0.023);
    expect(volumeDragCoefficient(5e7, fineness)).toBeGreaterThan(0.023 / 2);
  }
});

test('hull drag is the coefficient at its own Reynolds number, on V^(2/3), from first to last', () => {
  const state = stateWith([]);
  const drag = dragOf(state);
  const { density } = state.air;
  for (const u of [0.2, 1, 4, 12]) {
    const reynolds = (u * 4) / kinematicViscosity(state.air);
    expect(drag.reynolds(u)).toBeCloseTo(reynolds, 6);
    const wanted = 0.5 * density * u * u * state.hull.volume ** (2 / 3) * volumeDragCoefficient(reynolds, 4);
    expect(drag.hull(u) / wanted).toBeCloseTo(1, 12);
  }
  // 4 × 1 m spheroid at sea level, 2 m/s: Re 5.48e5, C_DV 0.03816, V^(2/3) 1.6366 m²; worked by hand.
  expect(drag.hull(2)).toBeCloseTo(0.5 * 1.225 * 4 * 1.6366 * 0.03816, 3);
});

test('a round two-sheet balloon counts by the circle of its frontal area, between its height and its breadth', () => {
  const { hull } = stateWith([], { kind: 'roundTwoSheet', flatDiameter: 1, stance: 'lying' });
  expect(hull.length / dragFineness(hull)).toBeGreaterThan(hull.height);
  expect(hull.length / dragFineness(hull)).toBeLessThan(hull.breadth);
  expect((Math.PI / 4) * (hull.length / dragFineness(hull)) ** 2).toBeCloseTo(hull.frontalArea, 12);
});

test('a plate edge-on: Blasius at Re 1e5 is 0.0042, mixed friction at 1e7 is 0.0028, continuous at transition', () => {
  // H. Schlichting, Boundary-Layer Theory, fig. 21.2 (from memory, to the reading of a graph).
  expect(plateFriction(1e5)).toBeCloseTo(0.0042, 5);
  expect(plateFriction(1e7)).toBeCloseTo(0.0028, 4);
  expect(plateFriction(5e5 - 1)).toBeCloseTo(plateFriction(5e5), 5);
});

test('four fins have the drag of four plates, and none of their own when the file gives a drag area', () => {
  const state = stateWith([finPart()]);
  const one = plateDrag(0.12, 1.2, state.air.density, kinematicViscosity(state.air));
  expect(dragOf(state).fins(3)).toBeCloseTo(4 * one(3), 12);
  const given = dragOf(stateWith([finPart({ dragArea: 0.002 })]));
  expect(given.fins(3)).toBe(0);
  expect(given.pods(3)).toBeCloseTo(0.5 * state.air.density * 9 * 0.008, 12);
});

const box = { length: 0.2, width: 0.1, height: 0.08 };
const under = { kind: 'keel', station: 2, drop: 0.05 } as const;

test('drag areas: given, reckoned for what hangs outside, nil for the rest', () => {
  const parts = [
    partOf('gondola', { kind: 'gondola', place: under, size: box }),
    partOf('cameras', {
      kind: 'camera',
      place: { kind: 'free', x: 1.5, y: 0.2, z: -0.6 },
      copies: { kind: 'pair' },
      size: box,
    }),
    partOf('inside', { kind: 'sensor', place: { kind: 'axis', station: 2 }, size: box }),
    partOf('battery', { kind: 'battery', place: under, size: box }),
    partOf('frame', { kind: 'fitting', place: under, dragArea: 0.003 }),
    partOf('fairing', { kind: 'gondola', place: under, size: box, dragArea: 0 }),
  ];
  const drag = dragOf(stateWith(parts));
  expect(drag.podParts.map(({ part, reckoned }) => [part, reckoned])).toEqual([
    ['gondola', true],
    ['cameras', true],
    ['frame', false],
  ]);
  expect(drag.podParts[1]!.at).toEqual([1.5, 0, -0.6]);
  expect(drag.podArea).toBeCloseTo(3 * 0.8 * 0.008 + 0.003, 12);
});

test('drag is odd in speed, grows with it, and is the sum of its parts', () => {
  const drag = dragOf(
    stateWith([finPart(), partOf('gondola', { kind: 'gondola', place: under, size: box })]),
  );
  const speed = fc.double({ min: 0, max: 30, noNaN: true });
  fc.assert(
    fc.property(speed, speed, (a, b) => {
      expect(drag.at(-a)).toBeCloseTo(-drag.at(a), 12);
      expect(drag.at(a)).toBeCloseTo(drag.hull(a) + drag.fins(a) + drag.pods(a), 12);
      if (a < b) expect(drag.at(a)).toBeLessThanOrEqual(drag.at(b));
    }),
  );
  expect(drag.at(0)).toBe(0);
});

test('it says where the formula is a guess: slow, fast, stubby', () => {
  const slender = dragOf(stateWith([]));
  expect(slender.cautions(2)).toEqual([]);
  expect(slender.cautions(0)).toEqual([]);
  expect(slender.cautions(0.1)).toEqual([expect.stringContaining('27,000, below 100,000')]);
  expect(slender.cautions(400)).toEqual([expect.stringContaining('above 100,000,000')]);
  const ball = dragOf(stateWith([], { kind: 'spheroid', length: 1.5, diameter: 1 }));
  expect(ball.cautions(2)).toEqual([expect.stringContaining('times as long as it is thick')]);
});
