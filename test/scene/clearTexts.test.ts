import fc from 'fast-check';
import { expect, test } from 'vitest';
import { placeTexts } from '../../src/scene/clearTexts.ts';

const FRAME = { left: 0, top: 0, right: 600, bottom: 400 };
const box = fc
  .record({ x: fc.integer({ min: 0, max: 580 }), y: fc.integer({ min: 0, max: 380 }) })
  .map(({ x, y }) => ({ left: x, top: y, right: x + 20, bottom: y + 20 }));

test('words stay in the frame', () => {
  fc.assert(
    fc.property(fc.array(box, { maxLength: 12 }), fc.array(box, { maxLength: 12 }), (boxes, taken) => {
      const wanted = boxes.map((each, i) => ({ key: `${i}`, width: 80, height: 15, box: each }));
      const placed = placeTexts(wanted, taken, FRAME);
      expect(placed.map(({ key }) => key)).toEqual(wanted.map(({ key }) => key));
      for (const { left, top } of placed) {
        expect(left >= 0 && left <= 520 && top >= 0 && top <= 385).toBe(true);
      }
    }),
  );
});

test('below its own when that is free, elsewhere when it is not', () => {
  const own = { left: 290, top: 190, right: 310, bottom: 210 };
  const wanted = [{ key: 'a', width: 60, height: 15, box: own }];
  expect(placeTexts(wanted, [], FRAME)).toEqual([{ key: 'a', left: 270, top: 214, leader: null }]);
  const below = { left: 200, top: 211, right: 400, bottom: 400 };
  const [moved] = placeTexts(wanted, [below, own], FRAME);
  expect(moved!.top + 15).toBeLessThanOrEqual(211);
  const two = placeTexts([...wanted, { ...wanted[0]!, key: 'b' }], [], FRAME);
  expect(two[1]).not.toMatchObject({ left: 270, top: 214 });
});

test('one that has to stand off points to its own', () => {
  const own = { left: 290, top: 190, right: 310, bottom: 210 };
  const around = { left: 215, top: 150, right: 385, bottom: 240 };
  const [text] = placeTexts([{ key: 'a', width: 60, height: 15, box: own }], [around], FRAME);
  expect(text!.leader!.to).toMatchObject({ x: 300 });
  expect(Math.abs(text!.leader!.from.y - 200)).toBeGreaterThan(40);
});
