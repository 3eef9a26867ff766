/** Whether the stations of rows to be added look as if they were meant in another unit. Pure. */

import { stationOf } from '../../craft/station.ts';
import type { PartFields } from '../../edit/edits/parts.ts';

/** All within this share of the hull's length from the nose tip: hardly a craft, likely a unit mistaken. */
const CROWDED = 0.01;

export type StationDoubt = 'crowded' | 'beyond' | null;

/** `hullLength` in m. `crowded`: all at the very nose. `beyond`: some are not on the hull. */
export function stationDoubt(parts: readonly PartFields[], hullLength: number): StationDoubt {
  const stations = parts.map(({ place }) => Math.abs(stationOf(place)));
  const farthest = Math.max(0, ...stations);
  if (farthest > hullLength) return 'beyond';
  return farthest > 0 && farthest <= CROWDED * hullLength ? 'crowded' : null;
}
