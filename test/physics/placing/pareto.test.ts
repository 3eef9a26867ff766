import fc from 'fast-check';
import { expect, test } from 'vitest';
import { unbeaten } from '../../../src/physics/placing/pareto.ts';

test('of a choice that is better in one thing and worse in another neither beats the other', () => {
  expect(
    unbeaten([
      [1, 2],
      [2, 1],
      [2, 2],
    ]),
  ).toEqual([true, true, false]);
});

test('equal choices stand or fall together, and what there is none of is worst', () => {
  const none = Number.POSITIVE_INFINITY;
  expect(
    unbeaten([
      [1, none],
      [1, none],
      [1, 5],
      [none, none],
    ]),
  ).toEqual([false, false, true, false]);
});

test('sorting and sweeping finds the same, at random', () => {
  const pair = fc.tuple(fc.integer({ min: 0, max: 9 }), fc.integer({ min: 0, max: 9 }));
  fc.assert(
    fc.property(fc.array(pair, { maxLength: 30 }), (pairs) => {
      // A rival for two figures: walked in order of the first, a pair stands when its second is the least yet.
      const stands = pairs.map(([a, b]) => !pairs.some(([c, d]) => (c === a && d < b) || (c < a && d <= b)));
      const least = new Map<number, number>();
      for (const [a, b] of pairs) least.set(a, Math.min(b, least.get(a) ?? b));
      let lowest = Number.POSITIVE_INFINITY;
      const front = new Set<string>();
      for (const a of [...least.keys()].sort((x, y) => x - y)) {
        const b = least.get(a)!;
        if (b < lowest) front.add(`${a},${b}`);
        lowest = Math.min(lowest, b);
      }
      const found = unbeaten(pairs);
      expect(found).toEqual(stands);
      expect(found).toEqual(pairs.map(([a, b]) => front.has(`${a},${b}`)));
    }),
  );
});

const tuple = fc.array(fc.integer({ min: 0, max: 6 }), { minLength: 3, maxLength: 3 });

test('with figures taken as equal there is always one that nothing beats, though they may go round in a ring', () => {
  // Each is 2 better than the next in one thing and 1 worse in the other two: without the sum each would be beaten.
  const ring = [
    [0, 2, 1],
    [2, 1, 0],
    [1, 0, 2],
  ];
  expect(unbeaten(ring, 1)).toEqual([true, true, true]);
  fc.assert(
    fc.property(fc.array(tuple, { minLength: 1, maxLength: 12 }), (choices) => {
      expect(unbeaten(choices, 1)).toContain(true);
      // What stands when every figure counts and is far from the rest stands here too.
      expect(unbeaten(choices, 0).map((stands, i) => !stands || unbeaten(choices, 6)[i])).not.toContain(
        false,
      );
    }),
  );
});
