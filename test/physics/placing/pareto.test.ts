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
