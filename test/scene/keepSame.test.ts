import { expect, test } from 'vitest';
import { placePart } from '../../src/edit/edits/parts.ts';
import { run } from '../../src/edit/history.ts';
import { sideFigure } from '../../src/scene/figure.ts';
import { FigureCache, keepSame, sameWire } from '../../src/scene/keepSame.ts';
import { craft, geometry } from './fixture.ts';

test('a list of equal things is the list it was; otherwise only what changed is new', () => {
  const same = (a: { n: number }, b: { n: number }) => a.n === b.n;
  const before = [{ n: 1 }, { n: 2 }];
  expect(keepSame(before, [{ n: 1 }, { n: 2 }], same)).toBe(before);
  const after = keepSame(before, [{ n: 1 }, { n: 3 }], same);
  expect(after[0]).toBe(before[0]);
  expect(after[1]).toEqual({ n: 3 });
  expect(keepSame(before, [{ n: 1 }], same)).toEqual([{ n: 1 }]);
});

test('moving one part makes one new figure, and leaves a wire run of others as it was', () => {
  const start = craft();
  const cache = new FigureCache(sideFigure);
  const before = cache.figures(start, geometry(start), 0.004);
  expect(cache.figures(start, geometry(start), 0.004)).toEqual(before);
  const { craft: moved } = run(start, placePart('camera', { kind: 'free', x: 1, y: 0.1, z: -0.6 }));
  const after = cache.figures(moved, geometry(moved), 0.004);
  expect(after.filter((figure, i) => figure !== before[i]).map(({ part }) => part)).toEqual(['camera']);
  expect(sameWire(geometry(start).wires[0]!, geometry(moved).wires[0]!)).toBe(true);
});

test('another scale draws every figure anew', () => {
  const start = craft();
  const cache = new FigureCache(sideFigure);
  const before = cache.figures(start, geometry(start), 0.004);
  const after = cache.figures(start, geometry(start), 0.005);
  expect(after.some((figure, i) => figure === before[i])).toBe(false);
});
