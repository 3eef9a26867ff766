/**
 * Where a place is in space: x station aft of the nose tip, y side to starboard, z height above the axis, m.
 * Clock angle θ from the top towards starboard: y = ρ sin θ, z = ρ cos θ with ρ the distance from the axis.
 */
import type { Place } from '../../craft/placeSchema.ts';
import type { Vec3 } from '../../numeric/vector.ts';
import type { Hull } from '../hull/hull.ts';

export const KEEL = Math.PI;

/** The point at distance ρ from the axis. */
export const onClock = (station: number, rho: number, clock: number): Vec3 => [
  station,
  // The keel and the top lie in the plane of symmetry exactly, not to within the rounding of π.
  clock === KEEL ? 0 : rho * Math.sin(clock),
  rho * Math.cos(clock),
];

export const clockOf = ([, y, z]: Vec3): number => Math.atan2(y, z);

export const distanceFromAxis = ([, y, z]: Vec3): number => Math.hypot(y, z);

export function positionOf(place: Place, hull: Hull): Vec3 {
  switch (place.kind) {
    case 'skin':
      return onClock(place.station, hull.radius(place.station, place.clock) + place.standoff, place.clock);
    case 'keel':
      return [place.station, 0, -(hull.radius(place.station, KEEL) + place.drop)];
    case 'axis':
      return [place.station, 0, 0];
    case 'free':
      return [place.x, place.y, place.z];
  }
}

/** Turned about the hull axis by an angle, + towards greater clock angles. */
export function turnedAboutAxis([x, y, z]: Vec3, by: number): Vec3 {
  const [sin, cos] = [Math.sin(by), Math.cos(by)];
  return [x, y * cos + z * sin, z * cos - y * sin];
}

export const mirrored = ([x, y, z]: Vec3): Vec3 => [x, -y, z];
