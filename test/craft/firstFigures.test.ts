import fc from 'fast-check';
import { expect, test } from 'vitest';
import { finOutline } from '../../src/craft/finOutline.ts';
import { finOfBox, firstThruster, isBoxed } from '../../src/craft/firstFigures.ts';
import { finSchema, thrusterSchema } from '../../src/craft/thrustSchema.ts';

const side = fc.double({ min: 0, max: 50, noNaN: true });
const box = fc.record({ length: side, width: side, height: side });

test('the first figures pass the gate, whatever the box', () => {
  fc.assert(
    fc.property(box, (size) => {
      expect(thrusterSchema.safeParse(firstThruster(size)).success).toBe(true);
      const fin = finOfBox(size);
      expect(fin === null || finSchema.safeParse(fin).success).toBe(true);
    }),
  );
});

test('a thruster starts from the larger side of its box, and a larger one pushes harder', () => {
  expect(firstThruster({ width: 0.1, height: 0.23 }).diameter).toBe(0.23);
  const thrusts = [0.045, 0.1, 0.23, 0.5].map((width) => {
    const { thrust } = firstThruster({ width, height: 0 });
    return thrust.kind === 'measured' ? thrust.staticThrust : 0;
  });
  expect(thrusts).toEqual(thrusts.toSorted((a, b) => a - b));
  expect(thrusts[2]).toBeCloseTo(35 * Math.PI * 0.115 ** 2, 1);
});

test('a fin of a box has its outline', () => {
  const fin = finOfBox({ length: 0.4, height: 0.2 })!;
  const { span, chord } = finOutline(fin);
  expect(span).toBeCloseTo(0.2, 9);
  expect(chord).toBeCloseTo(0.4, 9);
  expect(isBoxed(fin, { length: 0.4, height: 0.2 })).toBe(true);
  expect(isBoxed(fin, { length: 0.4, height: 0.21 })).toBe(false);
  expect(isBoxed(fin, { length: 0, height: 0 })).toBe(false);
});
