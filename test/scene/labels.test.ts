import fc from 'fast-check';
import { expect, test } from 'vitest';
import { LABEL_HEIGHT, placeLabels } from '../../src/scene/labels.ts';
import type { Rect } from '../../src/scene/rect.ts';

const FRAME: Rect = { left: 0, top: 0, right: 800, bottom: 400 };
const whole = (min: number, max: number) => fc.integer({ min, max });
const boxes = fc
  .tuple(whole(0, 780), whole(0, 380), whole(5, 90), whole(5, 60))
  .map(([left, top, width, height]) => ({ left, top, right: left + width, bottom: top + height }));

test('no label covers another, what it must keep clear, or the edge', () => {
  fc.assert(
    fc.property(
      fc.array(fc.tuple(boxes, whole(20, 160)), { maxLength: 40 }),
      fc.array(boxes, { maxLength: 5 }),
      (all, taken) => {
        const wanted = all.map(([box, width], i) => ({ id: `${i}`, text: `part ${i}`, width, box }));
        const labels = placeLabels(wanted, taken, FRAME);
        const rects = labels.map(({ id, x, y }) => {
          const { width } = wanted[Number(id)]!;
          return { left: x, right: x + width, top: y - LABEL_HEIGHT / 2, bottom: y + LABEL_HEIGHT / 2 };
        });
        rects.forEach((a, i) => {
          expect(
            a.left >= FRAME.left && a.right <= FRAME.right && a.top >= FRAME.top && a.bottom <= FRAME.bottom,
          ).toBe(true);
          for (const b of [...rects.slice(i + 1), ...taken]) {
            expect(a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom).toBe(false);
          }
        });
      },
    ),
  );
});

test('a part alone is named just below it', () => {
  const box = { left: 100, right: 140, top: 100, bottom: 120 };
  expect(placeLabels([{ id: 'a', text: 'A', width: 20, box }], [], FRAME)).toEqual([
    { id: 'a', text: 'A', x: 110, y: 120 + 4 + LABEL_HEIGHT / 2 },
  ]);
});
