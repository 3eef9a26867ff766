import fc from 'fast-check';
import { test } from 'vitest';
import { built } from './built.ts';
import { near } from './near.ts';

const proportions = fc.record({
  length: fc.double({ min: 0.05, max: 50, noNaN: true }),
  fineness: fc.double({ min: 1.05, max: 30, noNaN: true }),
});

// Closed forms: V = πLD²/6; S = 2πb²[1 + a/(b e) asin e]. Any table of mensuration.
test('volume, area and section figures of a prolate spheroid', () => {
  fc.assert(
    fc.property(proportions, ({ length, fineness }) => {
      const diameter = length / fineness;
      const hull = built({ kind: 'spheroid', length, diameter });
      const a = length / 2;
      const b = diameter / 2;
      const e = Math.sqrt(1 - (b / a) ** 2);
      near(hull.length, length);
      near(hull.volume, (Math.PI * length * diameter ** 2) / 6);
      near(hull.area, 2 * Math.PI * b * b * (1 + (a / (b * e)) * Math.asin(e)), 1e-11);
      near(hull.filmArea, hull.area);
      near(hull.planformArea, Math.PI * a * b);
      near(hull.frontalArea, Math.PI * b * b);
      near(hull.cbStation, a);
      near(hull.skinStation, a);
      near(hull.seamStation, a);
    }),
  );
});

// Solid ellipsoid about its centre: m(b² + c²)/5 and cyclic. Any handbook of mechanics.
test('moment of inertia of the air displaced by a spheroid', () => {
  const { volume, volumeInertia } = built({ kind: 'spheroid', length: 4, diameter: 1 });
  near(volumeInertia[0], (volume * (0.25 + 0.25)) / 5);
  near(volumeInertia[1], (volume * (4 + 0.25)) / 5);
  near(volumeInertia[2], volumeInertia[1]);
});

// Thin spherical shell: 2mR²/3; circle: length πR from pole to pole. Any handbook of mechanics.
test('a sphere: shell inertia, seams and skin path', () => {
  const R = 0.6;
  const hull = built({ kind: 'spheroid', length: 2 * R, diameter: 2 * R });
  near(hull.area, 4 * Math.PI * R * R);
  for (const inertia of hull.skinInertia) near(inertia, (2 / 3) * hull.area * R * R);
  near(hull.seamLength, Math.PI * R);
  // Half circle: ∫r² ds = R³π/2, about the axis; across ½∫r² + ∫x′² = R³(π/4 + π/2).
  near(hull.seamInertia[0], (Math.PI / 2) * R ** 3);
  near(hull.seamInertia[1], ((3 * Math.PI) / 4) * R ** 3);
  const quarter = hull.skinPath(0, R, 0);
  near(quarter.length, (Math.PI / 2) * R);
  near(quarter.r, R * R);
  near(quarter.x, R * R * (Math.PI / 2 - 1));
  near(quarter.rr, (R ** 3 * Math.PI) / 4);
  near(quarter.xr, R ** 3 / 2);
  near(quarter.xx, R ** 3 * ((3 * Math.PI) / 4 - 2));
  near(hull.tapeAt(0.3, 0), R * Math.acos(0.5));
  near(hull.stationAt(R * Math.acos(0.5), 0), 0.3);
});

// CB = a1 + 3/8 (a2 − a1): centroids of the halves weighted by their volumes (half-ellipsoid: 3/8 of its length).
test('CB of two half-spheroids, and of the mirrored hull', () => {
  fc.assert(
    fc.property(
      proportions,
      fc.double({ min: 0.1, max: 0.9, noNaN: true }),
      ({ length, fineness }, share) => {
        const diameter = length / fineness;
        const fore = Math.max(0.02, share * length);
        const aft = Math.max(0.02, length - fore);
        const hull = built({ kind: 'twoSpheroid', foreLength: fore, aftLength: aft, diameter });
        const mirrored = built({ kind: 'twoSpheroid', foreLength: aft, aftLength: fore, diameter });
        near(hull.cbStation, fore + (3 / 8) * (aft - fore));
        near(mirrored.cbStation, fore + aft - hull.cbStation);
        near(mirrored.skinStation, fore + aft - hull.skinStation);
        near(mirrored.volumeInertia[1], hull.volumeInertia[1], 1e-11);
      },
    ),
  );
});
