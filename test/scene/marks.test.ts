import fc from 'fast-check';
import { expect, test } from 'vitest';
import { bobOutline, frontMarks, sideMarks } from '../../src/scene/marks.ts';
import { craft, geometry, PARTS, part, VIEW } from './fixture.ts';

/** Without anything to one side: it floats even, so that the pitch is all there is. */
const of = geometry(
  craft(
    PARTS.filter(({ id }) => id !== 'camera'),
    [],
  ),
);

test('drawn level, the line leans by the pitch at which it floats', () => {
  const marks = sideMarks({ ...VIEW, pivot: of.cb[0] }, of);
  expect(marks.lean).toBeCloseTo(of.attitude!.pitch, 6);
});

test('drawn as it floats, the line is plumb', () => {
  const marks = sideMarks({ ...VIEW, pivot: of.cb[0], tilt: of.attitude!.pitch }, of);
  expect(marks.lean).toBeCloseTo(0, 6);
  expect(marks.bob!.y).toBeGreaterThan(marks.ring.y);
});

test('from astern the bob hangs to the side that is heavy, and plumb once heeled', () => {
  const heavy = geometry(craft([...PARTS, part('pod', { kind: 'free', x: 1.5, y: 0.4, z: -0.3 })]));
  const view = { ...VIEW, pivot: 0 };
  expect(frontMarks(view, heavy).lean).toBeGreaterThan(0.01);
  expect(heavy.attitude!.heel).toBeGreaterThan(0);
  // Heel and pitch mix a little when both are large; the fixture's heel is small.
  expect(Math.abs(frontMarks({ ...view, tilt: heavy.attitude!.heel }, heavy).lean)).toBeLessThan(0.05);
});

test('the bob points away from its ring and has the size asked for', () => {
  fc.assert(
    fc.property(fc.double({ min: -3.1, max: 3.1, noNaN: true }), (lean) => {
      const outline = bobOutline({ x: 100, y: 50 }, lean, 20);
      const farthest = outline.reduce((a, b) =>
        Math.hypot(a.x - 100, a.y - 50) > Math.hypot(b.x - 100, b.y - 50) ? a : b,
      );
      const way = (farthest.x - 100) * Math.sin(lean) + (farthest.y - 50) * Math.cos(lean);
      expect(way).toBeGreaterThan(17);
      expect(way).toBeLessThan(20);
    }),
  );
});
