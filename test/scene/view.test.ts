import fc from 'fast-check';
import { expect, test } from 'vitest';
import {
  boxOf,
  fitted,
  GREATEST_SCALE,
  keptInSight,
  LEAST_SCALE,
  toScreen,
  toWorld,
  type View,
  zoomedAt,
} from '../../src/scene/view.ts';

const finite = (min: number, max: number) => fc.double({ min, max, noNaN: true });

const views: fc.Arbitrary<View> = fc.record({
  scale: finite(20, 4000),
  originX: finite(-2000, 2000),
  originY: finite(-2000, 2000),
  width: finite(200, 2000),
  height: finite(150, 1200),
  tilt: finite(-Math.PI, Math.PI),
  pivot: finite(0, 12),
});

const points = fc.record({ u: finite(-5, 15), z: finite(-5, 5) });
const spots = fc.record({ x: finite(-500, 2500), y: finite(-500, 1500) });

test('what is drawn and what is pointed at are inverse to each other', () => {
  fc.assert(
    fc.property(views, points, (view, point) => {
      const back = toWorld(view, toScreen(view, point));
      expect(back.u).toBeCloseTo(point.u, 8);
      expect(back.z).toBeCloseTo(point.z, 8);
    }),
  );
});

test('a view keeps lengths to scale whatever its tilt', () => {
  fc.assert(
    fc.property(views, points, points, (view, a, b) => {
      const [p, q] = [toScreen(view, a), toScreen(view, b)];
      expect(Math.hypot(p.x - q.x, p.y - q.y) / view.scale).toBeCloseTo(Math.hypot(a.u - b.u, a.z - b.z), 7);
    }),
  );
});

test('nose-up lifts the nose, which is on the left, and the CB stays where it is', () => {
  const level: View = { scale: 100, originX: 0, originY: 0, width: 400, height: 300, tilt: 0, pivot: 1.5 };
  const up = { ...level, tilt: 0.3 };
  expect(toScreen(up, { u: 0, z: 0 }).y).toBeLessThan(toScreen(level, { u: 0, z: 0 }).y);
  expect(toScreen(up, { u: 3, z: 0 }).y).toBeGreaterThan(toScreen(level, { u: 3, z: 0 }).y);
  expect(toScreen(up, { u: 1.5, z: 0 })).toEqual(toScreen(level, { u: 1.5, z: 0 }));
});

test('zooming keeps what lies under the pointer, and stays between its limits', () => {
  fc.assert(
    fc.property(views, spots, finite(0.01, 100), (view, at, factor) => {
      const zoomed = zoomedAt(view, at, factor);
      const [before, after] = [toWorld(view, at), toWorld(zoomed, at)];
      expect(after.u).toBeCloseTo(before.u, 6);
      expect(after.z).toBeCloseTo(before.z, 6);
      expect(zoomed.scale).toBeGreaterThanOrEqual(LEAST_SCALE);
      expect(zoomed.scale).toBeLessThanOrEqual(GREATEST_SCALE);
    }),
  );
});

test('a fit puts every point inside the margins and uses the room one way', () => {
  const margins = { left: 40, right: 60, top: 30, bottom: 50 };
  fc.assert(
    fc.property(views, fc.array(points, { minLength: 2, maxLength: 12 }), (view, all) => {
      const box = boxOf(all);
      fc.pre(box.right - box.left > 0.1 && box.top - box.bottom > 0.1);
      const fit = fitted(view, all, margins);
      const on = all.map((point) => toScreen(fit, point));
      const [xs, ys] = [on.map(({ x }) => x), on.map(({ y }) => y)];
      expect(Math.min(...xs)).toBeGreaterThan(margins.left - 1e-4);
      expect(Math.max(...xs)).toBeLessThan(view.width - margins.right + 1e-4);
      expect(Math.min(...ys)).toBeGreaterThan(margins.top - 1e-4);
      expect(Math.max(...ys)).toBeLessThan(view.height - margins.bottom + 1e-4);
      const wide = (Math.max(...xs) - Math.min(...xs)) / (view.width - 100);
      const high = (Math.max(...ys) - Math.min(...ys)) / (view.height - 80);
      if (fit.scale > LEAST_SCALE && fit.scale < GREATEST_SCALE)
        expect(Math.max(wide, high)).toBeCloseTo(1, 6);
    }),
  );
});

test('a view panned away comes back until some of the craft is seen, and is left alone otherwise', () => {
  const box = [
    { u: 0, z: -0.5 },
    { u: 3, z: 0.5 },
  ];
  fc.assert(
    fc.property(views, (view) => {
      const upright = { ...view, tilt: 0 };
      const kept = keptInSight(upright, box);
      const on = box.map((point) => toScreen(kept, point));
      expect(Math.max(...on.map(({ x }) => x))).toBeGreaterThan(59.999);
      expect(Math.min(...on.map(({ x }) => x))).toBeLessThan(view.width - 59.999);
      expect(keptInSight(kept, box).originX).toBeCloseTo(kept.originX, 6);
    }),
  );
});
