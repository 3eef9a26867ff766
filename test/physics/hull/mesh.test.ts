import { expect, test } from 'vitest';
import type { HullShape } from '../../../src/craft/hullSchema.ts';
import { built } from './built.ts';
import { extrapolatedSums } from './meshSums.ts';
import { near } from './near.ts';
import { nameOf, SHAPES } from './shapes.ts';

/** The mesh itself is good to about 1e-5; a corner between its stations costs it more. */
const toleranceFor = ({ kind }: HullShape): number => (kind === 'cylinder' ? 1e-4 : 3e-5);

test.each(SHAPES.map((shape) => ({ name: nameOf(shape), shape })))(
  'a mesh laid over radius() has the volume, CB, area and inertia of $name',
  ({ shape }) => {
    const hull = built(shape);
    const tolerance = toleranceFor(shape);
    const mesh = extrapolatedSums(hull, 120, 40);
    const cb = mesh.volumeX / mesh.volume;
    const along = mesh.volumeXX - mesh.volume * cb * cb;
    near(mesh.volume, hull.volume, tolerance);
    near(mesh.area, hull.area, tolerance);
    expect(Math.abs(cb - hull.cbStation)).toBeLessThan(tolerance * hull.length);
    near(mesh.volumeYY + mesh.volumeZZ, hull.volumeInertia[0], tolerance);
    near(mesh.volumeZZ + along, hull.volumeInertia[1], tolerance);
    near(along + mesh.volumeYY, hull.volumeInertia[2], tolerance);
    if (hull.filmArea < hull.area * (1 + 1e-9))
      expect(Math.abs(mesh.areaX / mesh.area - hull.skinStation)).toBeLessThan(tolerance * hull.length);
  },
);

// Pappus: volume = path of the half-section's centroid × its area; the half-section as a polygon (shoelace).
test.each(
  SHAPES.filter(({ kind }) => kind !== 'roundTwoSheet').map((shape) => ({ name: nameOf(shape), shape })),
)('volume of $name by the theorem of Pappus', ({ shape }) => {
  const hull = built(shape);
  const n = 4000;
  const stations = Array.from(
    { length: n + 1 },
    (_, i) => (hull.length / 2) * (1 - Math.cos((Math.PI * i) / n)),
  );
  let area = 0;
  let moment = 0;
  for (let i = 0; i < n; i += 1) {
    const [x0, x1] = [stations[i]!, stations[i + 1]!];
    const [r0, r1] = [hull.radius(x0, 0), hull.radius(x1, 0)];
    const twice = (x1 - x0) * (r0 + r1);
    area += twice / 2;
    // A trapezium's centroid height is (r0² + r0 r1 + r1²)/(3 (r0 + r1)).
    moment += ((x1 - x0) * (r0 * r0 + r0 * r1 + r1 * r1)) / 6;
  }
  near(2 * Math.PI * (moment / area) * area, hull.volume, 2e-6);
  near(2 * area, hull.planformArea, 2e-6);
});
