import type { Hull } from '../../../src/physics/hull/hull.ts';

/** What one would measure on a hull with pointed or rounded ends: `count` + 1 places along the tape, bunched toward the ends. */
export function measured(hull: Hull, count: number) {
  return Array.from({ length: count + 1 }, (_, i) => {
    const tape = (hull.seamLength / 2) * (1 - Math.cos((Math.PI * i) / count));
    const station = hull.stationAt(tape, 0);
    return { tape, station, girth: i === 0 || i === count ? 0 : hull.girth(station) };
  });
}
