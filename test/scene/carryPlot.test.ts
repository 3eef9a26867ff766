import { expect, test } from 'vitest';
import type { CarrySpot, CurveToDraw } from '../../src/report/planView.ts';
import { layCarry, massTicks, spotAfter, spotAt } from '../../src/scene/carryPlot.ts';

const spot = (station: number, mass: number | null): CarrySpot => ({
  station,
  mass,
  deadBallast: mass === null ? null : 0.01,
  proven: true,
});
const curve: CurveToDraw = {
  points: [spot(0, 0.2), spot(1, 0.1), spot(2, null), spot(3, null), spot(4, 0.05)],
  complete: true,
};
const view = { scale: 100, originX: 50 };
const room = { top: 20, foot: 120 };

test('stations lie where the side view has them, masses on one axis from the foot up', () => {
  const page = layCarry(curve, view, 4, room, 'metric');
  expect(page.loads.map((run) => run.map(({ x }) => x))).toEqual([[50, 150], [450]]);
  expect(page.loads[0]![0]!.y).toBe(20);
  expect(page.loads[0]![1]!.y).toBe(70);
  expect(page.ballast[0]![0]!.y).toBe(115);
  expect(page.spots[2]).toEqual({ x: 250, load: null, ballast: null });
  expect(page.ticks[0]).toEqual({ y: 120, label: '0' });
});

test('where nothing can hang there is a gap, as far as the neighbours that can hold something', () => {
  expect(layCarry(curve, view, 4, room, 'metric').gaps).toEqual([{ left: 150, right: 450 }]);
  const nowhere = { points: [spot(0, null), spot(4, null)], complete: true };
  const page = layCarry(nowhere, view, 4, room, 'metric');
  expect([page.loads, page.gaps, page.ticks]).toEqual([[], [{ left: 50, right: 450 }], []]);
});

test('what is not worked out yet is told apart from a gap', () => {
  const part = { points: curve.points.slice(0, 2), complete: false };
  expect(layCarry(part, view, 4, room, 'metric')).toMatchObject({
    gaps: [],
    waiting: { left: 150, right: 450 },
  });
  expect(layCarry({ points: [], complete: false }, view, 4, room, 'metric').waiting).toEqual({
    left: 50,
    right: 450,
  });
});

test.each([
  [0.25, 'metric', ['0', '100', '200', '300 g']],
  [0.0075, 'metric', ['0', '5', '10 g']],
  [0.0012, 'metric', ['0.0', '0.5', '1.0', '1.5 g']],
  [0, 'metric', []],
] as const)('%s kg has round masses on its axis', (most, units, labels) => {
  expect(massTicks(most, units).map(({ label }) => label)).toEqual(labels);
});

test('the highest mass of the axis is not below the most, in either system', () => {
  for (let most = 0.0003; most < 40; most *= 1.37) {
    for (const units of ['metric', 'imperial'] as const) {
      const ticks = massTicks(most, units);
      expect(ticks.at(-1)!.at).toBeGreaterThanOrEqual(most * (1 - 1e-6));
      expect(ticks.length).toBeLessThanOrEqual(4);
    }
  }
});

test('the pointer reads the nearest station, and nothing off the hull', () => {
  expect(spotAt(curve.points, view, 149)).toBe(1);
  expect(spotAt(curve.points, view, 201)).toBe(2);
  expect(spotAt(curve.points, view, 700)).toBeNull();
  expect(spotAt([], view, 100)).toBeNull();
});

test('arrows, pages, Home and End move the station and stop at the ends; other keys do not', () => {
  expect(spotAfter('ArrowRight', false, 3, 101)).toBe(4);
  expect(spotAfter('ArrowLeft', true, 3, 101)).toBe(0);
  expect(spotAfter('PageUp', false, 95, 101)).toBe(100);
  expect(spotAfter('Home', false, 50, 101)).toBe(0);
  expect(spotAfter('End', false, 50, 101)).toBe(100);
  expect(spotAfter('constructor', false, 50, 101)).toBeNull();
});
