/** The station of a place, whatever its kind. */
import type { Place } from './placeSchema.ts';

export const stationOf = (place: Place): number => (place.kind === 'free' ? place.x : place.station);

export const withStation = (place: Place, station: number): Place =>
  place.kind === 'free' ? { ...place, x: station } : { ...place, station };
