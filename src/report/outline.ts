/** The outline of a hull along its keel, in plain functions, for whoever traces it. */
import type { Hull } from '../physics/hull/hull.ts';
import { KEEL } from '../physics/mass/position.ts';

export interface KeelOutline {
  /** Tape distance of the tail tip, m. */
  readonly tape: number;
  /** m, at a station, m. */
  radius(station: number): number;
  /** m, at a tape distance, m. */
  stationAt(tape: number): number;
}

export const keelOutline = (hull: Hull): KeelOutline => ({
  tape: hull.tapeAt(hull.length, KEEL),
  radius: (station) => hull.radius(station, KEEL),
  stationAt: (tape) => hull.stationAt(tape, KEEL),
});
