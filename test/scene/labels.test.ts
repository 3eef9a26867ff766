import fc from 'fast-check';
import { expect, test } from 'vitest';
import { nextLabels } from '../../src/scene/keptLabels.ts';
import { LABEL_HEIGHT, type Label, placeLabels, type Wanted } from '../../src/scene/labels.ts';
import { inside, overlaps, type Rect } from '../../src/scene/rect.ts';

const FRAME: Rect = { left: 0, top: 0, right: 800, bottom: 400 };
const whole = (min: number, max: number) => fc.integer({ min, max });
const boxes = fc
  .tuple(whole(0, 780), whole(0, 380), whole(5, 90), whole(5, 60))
  .map(([left, top, width, height]) => ({ left, top, right: left + width, bottom: top + height }));

const rectOf = ({ x, y }: Label, width: number): Rect => ({
  left: x,
  right: x + width,
  top: y - LABEL_HEIGHT / 2,
  bottom: y + LABEL_HEIGHT / 2,
});
const named = (id: string, box: Rect, width = 40): Wanted => ({ id, text: id, width, box });
const on = (all: readonly Wanted[], taken: readonly Rect[] = []) => ({
  taken,
  boxes: all,
  frame: FRAME,
});

test('no label covers another, what it must keep clear, or the edge; each has a line unless it stands next to its part', () => {
  fc.assert(
    fc.property(
      fc.array(fc.tuple(boxes, whole(20, 160)), { maxLength: 30 }),
      fc.array(boxes, { maxLength: 5 }),
      (all, taken) => {
        const wanted = all.map(([box, width], i) => named(`${i}`, box, width));
        const labels = placeLabels(wanted, on(wanted, taken));
        const rects = labels.map((label) => rectOf(label, wanted[Number(label.id)]!.width));
        rects.forEach((a, i) => {
          expect(inside(a, FRAME)).toBe(true);
          for (const b of [...rects.slice(i + 1), ...taken]) expect(overlaps(a, b)).toBe(false);
          const { box } = wanted[Number(labels[i]!.id)]!;
          const near = { left: box.left - 6, right: box.right + 6, top: box.top - 6, bottom: box.bottom + 6 };
          const { leader } = labels[i]!;
          if (!overlaps(near, a)) expect(leader).not.toBeNull();
          if (!leader) return;
          const dot = { left: leader.to.x, right: leader.to.x, top: leader.to.y, bottom: leader.to.y };
          expect(inside(dot, box)).toBe(true);
        });
      },
    ),
  );
});

test('a part alone is named just below it, without a line', () => {
  const alone = named('a', { left: 100, right: 140, top: 100, bottom: 120 }, 20);
  expect(placeLabels([alone], on([alone]))).toEqual([
    { id: 'a', text: 'a', x: 110, y: 120 + 4 + LABEL_HEIGHT / 2, leader: null },
  ]);
});

test('a part within another is named outside that other, with a line to itself', () => {
  const pod = named('pod', { left: 200, right: 420, top: 150, bottom: 220 });
  const cell = named('cell', { left: 280, right: 320, top: 175, bottom: 195 });
  const labels = placeLabels([pod, cell], on([pod, cell]));
  expect(labels).toHaveLength(2);
  const label = labels.find(({ id }) => id === 'cell')!;
  expect(overlaps(rectOf(label, 40), pod.box)).toBe(false);
  expect(label.leader).not.toBeNull();
});

test('in a crowd all twelve are named', () => {
  const crowd = Array.from({ length: 12 }, (_, i) => {
    const [left, top] = [300 + 18 * (i % 6), 180 + 16 * Math.floor(i / 6)];
    return named(`part ${i}`, { left, top, right: left + 15, bottom: top + 12 }, 44);
  });
  expect(placeLabels(crowd, on(crowd))).toHaveLength(12);
});

test('where nothing fits within reach there is no name', () => {
  const part = named('a', { left: 390, right: 410, top: 190, bottom: 210 });
  const wall = { left: 200, right: 600, top: 20, bottom: 380 };
  expect(placeLabels([part], on([part], [wall]))).toEqual([]);
});

test('names stay where they are while a hand is at work, and come back to the same when nothing changed', () => {
  const all = ['a', 'b', 'c'].map((id, i) =>
    named(id, { left: 100 + 90 * i, right: 130 + 90 * i, top: 100, bottom: 120 }),
  );
  const ask = (wanted: readonly Wanted[], busy: boolean, taken: readonly Rect[] = []) => ({
    wanted,
    ground: () => on(wanted, taken),
    busy,
    hovered: null,
  });
  const first = nextLabels(null, ask(all, false));
  expect(nextLabels(first, ask([...all], false))).toBe(first);
  const held = nextLabels(first, ask(all.slice(1), true, [FRAME]));
  expect(held.labels).toEqual(first.labels.slice(1));
  expect(nextLabels(held, ask(all, false)).labels).toEqual(first.labels);
  expect(nextLabels(first, ask(all, false, [FRAME])).labels).toEqual([]);
});

test('the part under the pointer is named before all others when it had no name', () => {
  const room: Rect = { left: 0, right: 60, top: 0, bottom: 44 };
  const wanted = [
    named('a', { left: 10, right: 40, top: 0, bottom: 10 }),
    named('b', { left: 10, right: 40, top: 10, bottom: 20 }),
  ];
  const ground = () => ({ taken: [], boxes: wanted, frame: { ...room, bottom: 40 } });
  const ids = (hovered: string | null) =>
    nextLabels(null, { wanted, ground, busy: false, hovered }).labels.map(({ id }) => id);
  expect(ids(null)).toContain('a');
  expect(ids(null)).not.toContain('b');
  expect(ids('b')).toContain('b');
});
