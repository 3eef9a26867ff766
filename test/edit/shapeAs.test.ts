import fc from 'fast-check';
import { expect, test } from 'vitest';
import { type HullShape, SHAPE_KINDS, shapeSchema } from '../../src/craft/hullSchema.ts';
import { extentOf, shapeAs, withRowAfter } from '../../src/edit/shapeAs.ts';

const spheroid = fc
  .record({
    length: fc.double({ min: 0.3, max: 12, noNaN: true }),
    fineness: fc.double({ min: 1, max: 8, noNaN: true }),
  })
  .map(({ length, fineness }): HullShape => ({ kind: 'spheroid', length, diameter: length / fineness }));
const kind = fc.constantFrom(...SHAPE_KINDS);

test('every form turned into every other is one the loading gate takes', () => {
  fc.assert(
    fc.property(spheroid, kind, kind, (start, first, second) => {
      const shape = shapeAs(second, shapeAs(first, start));
      expect(shape.kind).toBe(second);
      expect(shapeSchema.safeParse(shape).error).toBeUndefined();
    }),
  );
});

test('length stays to a millimetre in a metre, and diameter where the form has one of its own', () => {
  fc.assert(
    fc.property(spheroid, kind, (start, to) => {
      const before = extentOf(start);
      const after = extentOf(shapeAs(to, start));
      // A pattern's outline is a chain of chords, so its length comes out a little short.
      const share = to === 'gores' || to === 'twoSheet' ? 0.01 : 1e-3;
      expect(Math.abs(after.length - before.length)).toBeLessThan(share * before.length);
      if (to !== 'roundTwoSheet') {
        expect(Math.abs(after.diameter - before.diameter)).toBeLessThan(share * before.diameter);
      }
    }),
  );
});

test('a form of the same kind is left alone', () => {
  fc.assert(
    fc.property(spheroid, kind, (start, to) => {
      const shape = shapeAs(to, start);
      expect(shapeAs(to, shape)).toBe(shape);
    }),
  );
});

test('the greatest hull allowed still gives forms that are allowed', () => {
  for (const to of SHAPE_KINDS) {
    const shape = shapeAs(to, { kind: 'spheroid', length: 50, diameter: 50 });
    expect(shapeSchema.safeParse(shape).error, to).toBeUndefined();
  }
});

test('a cylinder measured by girth along the tape keeps its girth and length', () => {
  // Two metres of straight tube of 1 m girth between flat ends: r = 1/2π, each end 0.15915 m of tape.
  const r = 1 / (2 * Math.PI);
  const rows = [
    { at: 0, size: 0 },
    { at: r, size: 1 },
    { at: r + 2, size: 1 },
    { at: 2 * r + 2, size: 0 },
  ];
  const extent = extentOf({ kind: 'offsets', along: 'tape', across: 'girth', rows });
  expect(extent.length).toBeCloseTo(2, 9);
  expect(extent.diameter).toBeCloseTo(1 / Math.PI, 9);
});

test('a new row stands half way to the next, and past the last as far on again', () => {
  const rows = [
    { at: 0, size: 0 },
    { at: 1, size: 0.4 },
    { at: 3, size: 0.6 },
  ];
  expect(withRowAfter(rows, 1)[2]).toEqual({ at: 2, size: 0.5 });
  expect(withRowAfter(rows, 2)[3]).toEqual({ at: 5, size: 0.8 });
  expect(withRowAfter(rows, 0)).toHaveLength(4);
});
