import fc from 'fast-check';
import { test } from 'vitest';
import { built } from './built.ts';
import { near } from './near.ts';
import { enlarged, nameOf, SHAPES } from './shapes.ts';

test.each(SHAPES.map((shape) => ({ name: nameOf(shape), shape })))(
  '$name made k times as large: lengths × k, areas × k², volume × k³, inertia of film × k⁴, of air × k⁵',
  ({ shape }) => {
    const hull = built(shape);
    fc.assert(
      fc.property(fc.double({ min: 0.2, max: 8, noNaN: true }), (k) => {
        const large = built(enlarged(shape, k));
        for (const key of [
          'length',
          'height',
          'breadth',
          'seamLength',
          'cbStation',
          'skinStation',
          'seamStation',
        ] as const)
          near(large[key], k * hull[key], 1e-9);
        for (const key of ['area', 'filmArea', 'frontalArea', 'planformArea'] as const)
          near(large[key], k ** 2 * hull[key], 1e-9);
        near(large.volume, k ** 3 * hull.volume, 1e-9);
        near(large.tapeAt(0.3 * large.length, 0.5), k * hull.tapeAt(0.3 * hull.length, 0.5), 1e-9);
        for (const axis of [0, 1, 2] as const) {
          near(large.volumeInertia[axis], k ** 5 * hull.volumeInertia[axis], 1e-9);
          near(large.skinInertia[axis], k ** 4 * hull.skinInertia[axis], 1e-9);
          near(large.seamInertia[axis], k ** 3 * hull.seamInertia[axis], 1e-9);
        }
      }),
      { numRuns: 20 },
    );
  },
);
