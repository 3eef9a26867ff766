import fc from 'fast-check';
import { expect, test } from 'vitest';
import { clearSpot, rectsAlong, spotBeside } from '../../src/scene/clearSpot.ts';
import { marksTaken, sideMarks } from '../../src/scene/marks.ts';
import { around, overlaps, screenBox } from '../../src/scene/rect.ts';
import { frontGround, sideGround } from '../canvas/ground.ts';
import { craft, PARTS, VIEW } from './fixture.ts';

const VIEW_SIZE = { width: VIEW.width, height: VIEW.height };
const READOUT = { width: 270, height: 100 };

test('wherever a part is dragged to, the readout covers neither it, nor CB, CG and the line between them', () => {
  fc.assert(
    fc.property(fc.double({ min: 0.2, max: 2.8, noNaN: true }), (station) => {
      const parts = PARTS.map((each) =>
        each.id === 'battery' ? { ...each, place: { kind: 'keel' as const, station, drop: 0.04 } } : each,
      );
      const { figures, geometry, view } = sideGround(craft(parts)).scene();
      const battery = figures.find(({ part }) => part === 'battery')!;
      const clear = [screenBox(battery, view), ...marksTaken(sideMarks(view, geometry))];
      const { rect } = clearSpot(VIEW_SIZE, READOUT, { clear });
      expect(clear.filter((each) => overlaps(each, rect))).toEqual([]);
      const beside = spotBeside(VIEW_SIZE, READOUT, clear[0]!, { clear });
      expect(clear.filter((each) => overlaps(each, beside))).toEqual([]);
    }),
    { numRuns: 40 },
  );
});

test('the spot is kept while it is free, and left when it is not', () => {
  const first = clearSpot(VIEW_SIZE, READOUT, { clear: [around({ x: 20, y: 20 }, 10)] });
  expect(first.index).toBe(1);
  expect(clearSpot(VIEW_SIZE, READOUT, { clear: [] }, first.index)).toEqual(first);
  const covered = clearSpot(VIEW_SIZE, READOUT, { clear: [around({ x: 800, y: 20 }, 10)] }, first.index);
  expect(covered.index).toBe(0);
});

test('what had better stay in sight decides between free spots', () => {
  const rather = [around({ x: 20, y: 20 }, 10), around({ x: 800, y: 20 }, 10)];
  expect(clearSpot(VIEW_SIZE, READOUT, { clear: [], rather }).index).toBe(2);
});

test('boxes along a line leave no gap', () => {
  const boxes = rectsAlong({ x: 0, y: 0 }, { x: 90, y: 40 }, 4);
  for (let i = 0; i <= 100; i++) {
    const [x, y] = [0.9 * i, 0.4 * i];
    expect(boxes.some((b) => x >= b.left && x <= b.right && y >= b.top && y <= b.bottom)).toBe(true);
  }
});

test('a box on the screen holds the figure', () => {
  const { figures, view } = frontGround().scene();
  for (const figure of figures) {
    const { left, right, top, bottom } = screenBox(figure, view);
    expect(right - left).toBeCloseTo((figure.box.right - figure.box.left) * view.scale, 6);
    expect(bottom - top).toBeCloseTo((figure.box.top - figure.box.bottom) * view.scale, 6);
  }
});
