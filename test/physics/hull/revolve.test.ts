import { expect, test } from 'vitest';
import type { Hull } from '../../../src/physics/hull/hull.ts';
import { meridianOf, type RevolvedShape } from '../../../src/physics/hull/hullOf.ts';
import { revolve } from '../../../src/physics/hull/revolve.ts';
import { near } from './near.ts';
import { nameOf, SHAPES } from './shapes.ts';

const revolved = SHAPES.filter((shape): shape is RevolvedShape => shape.kind !== 'roundTwoSheet');

function withTerms(shape: RevolvedShape, terms: number): Hull {
  const meridian = meridianOf(shape);
  if (meridian.status !== 'solved') throw new Error(meridian.why);
  return revolve(meridian.value, terms);
}

test.each(revolved.map((shape) => ({ name: nameOf(shape), shape })))(
  'twice the order changes no integral of $name by 1e-9',
  ({ shape }) => {
    const hull = withTerms(shape, 16);
    const finer = withTerms(shape, 32);
    for (const key of [
      'volume',
      'area',
      'filmArea',
      'seamLength',
      'planformArea',
      'cbStation',
      'skinStation',
    ] as const)
      near(hull[key], finer[key], 1e-11);
    for (const key of ['volumeInertia', 'skinInertia', 'seamInertia'] as const)
      hull[key].forEach((value, axis) => {
        near(value, finer[key][axis]!, 1e-11);
      });
  },
);

test.each(revolved.map((shape) => ({ name: nameOf(shape), shape })))(
  'twice the order moves no tape reading on $name by 1e-9 of the length',
  ({ shape }) => {
    const hull = withTerms(shape, 16);
    const finer = withTerms(shape, 32);
    for (let i = 0; i <= 50; i += 1) {
      const shift = Math.abs(
        hull.tapeAt((hull.length * i) / 50, 0) - finer.tapeAt((finer.length * i) / 50, 0),
      );
      expect(shift).toBeLessThan(1e-11 * hull.seamLength);
    }
  },
);
