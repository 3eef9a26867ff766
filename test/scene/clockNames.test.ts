import fc from 'fast-check';
import { expect, test } from 'vitest';
import { clockNames, radiusAt } from '../../src/scene/clockNames.ts';
import { sectionOutline } from '../../src/scene/outline.ts';
import { around, overlaps } from '../../src/scene/rect.ts';
import { toWorld } from '../../src/scene/view.ts';
import { geometry, VIEW } from './fixture.ts';

const outline = sectionOutline(geometry().hull, 1.5);
const view = { ...VIEW, originX: 420, pivot: 0 };
const whole = (min: number, max: number) => fc.integer({ min, max });
const boxes = fc.array(
  fc.tuple(whole(0, 840), whole(0, 460)).map(([x, y]) => around({ x, y }, 20)),
  { maxLength: 30 },
);

test('on an empty section the four names stand inside it, at their clock angles', () => {
  const names = clockNames(outline, view, []);
  expect(names.map(({ text }) => text)).toEqual(['0°', '90°', '180°', '270°']);
  for (const { text, at, onGas } of names) {
    const { u, z } = toWorld(view, at);
    expect(((Math.atan2(u, z) * 180) / Math.PI + 360) % 360).toBeCloseTo(Number.parseInt(text, 10), 9);
    expect(Math.hypot(u, z)).toBeLessThan(radiusAt(outline, Number.parseInt(text, 10)));
    expect(onGas).toBe(true);
  }
});

test('a name covers nothing: it goes outside, farther in, or is left out', () => {
  fc.assert(
    fc.property(boxes, (taken) => {
      for (const { at } of clockNames(outline, view, taken)) {
        expect(taken.some((each) => overlaps(each, around(at, 7)))).toBe(false);
      }
    }),
  );
  const top = clockNames(outline, view, [])[0]!;
  const moved = clockNames(outline, view, [around(top.at, 8)])[0]!;
  expect(moved).toMatchObject({ text: '0°', onGas: false });
  expect(clockNames(outline, view, [{ left: 0, right: 840, top: 0, bottom: 460 }])).toEqual([]);
});
