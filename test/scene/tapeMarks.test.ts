import { expect, test } from 'vitest';
import { overlaps } from '../../src/scene/rect.ts';
import { axisMarks, tapeMarks, textsTaken, withoutCovered } from '../../src/scene/tapeMarks.ts';
import { toWorld } from '../../src/scene/view.ts';
import { geometry, VIEW } from './fixture.ts';

const { hull } = geometry();

test('tape ticks stand on the skin and point away from it; the first named says what and in which unit', () => {
  for (const view of [VIEW, { ...VIEW, tilt: 0.5 }]) {
    const marks = tapeMarks(hull, view, 'metric');
    for (const { foot, way } of marks) {
      const { u, z } = toWorld(view, foot);
      expect(z).toBeCloseTo(hull.radius(u, 0), 9);
      expect(Math.hypot(way.x, way.y)).toBeCloseTo(1, 9);
      const out = toWorld(view, { x: foot.x + way.x * 6, y: foot.y + way.y * 6 });
      expect(out.z).toBeGreaterThan(hull.radius(out.u, 0));
    }
    expect(marks.find(({ text }) => text !== null)!.text).toMatch(/^tape [\d.]+ m$/);
  }
});

test('the stations of a tilted hull stand along its axis', () => {
  const view = { ...VIEW, tilt: 0.5 };
  for (const { foot } of axisMarks(hull, view, 'metric')) expect(toWorld(view, foot).z).toBeCloseTo(0, 9);
});

test('the texts of one ruler do not lie on each other', () => {
  const rects = textsTaken(tapeMarks(hull, VIEW, 'metric'));
  expect(rects.length).toBeGreaterThan(3);
  rects.forEach((a, i) => {
    expect(rects.slice(i + 1).filter((b) => overlaps(a, b))).toEqual([]);
  });
});

test('a text that a part covers is left out, its tick and all others stay', () => {
  const marks = tapeMarks(hull, VIEW, 'metric');
  const [first, ...rest] = textsTaken(marks);
  const seen = withoutCovered(marks, [{ ...first!, left: first!.right - 3 }]);
  expect(textsTaken(seen)).toEqual(rest);
  expect(seen).toHaveLength(marks.length);
});
