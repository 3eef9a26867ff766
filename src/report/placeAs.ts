/** The same point given as another kind of place. */
import type { Place, PlaceKind } from '../craft/placeSchema.ts';
import type { Vec3 } from '../numeric/vector.ts';
import type { Hull } from '../physics/hull/hull.ts';
import { clockOf, distanceFromAxis, KEEL } from '../physics/mass/position.ts';

/**
 * The place of that kind nearest to the point. `skin` and `free` keep the point; `keel` keeps station and height (not
 * above the keel line); `axis` keeps the station.
 */
export function placeAs(kind: PlaceKind, at: Vec3, hull: Hull): Place {
  const [x, y, z] = at;
  switch (kind) {
    case 'free':
      return { kind, x, y, z };
    case 'axis':
      return { kind, station: x };
    case 'keel':
      return { kind, station: x, drop: Math.max(0, -z - hull.radius(x, KEEL)) };
    case 'skin': {
      const rho = distanceFromAxis(at);
      const clock = rho > 0 ? (clockOf(at) + 2 * Math.PI) % (2 * Math.PI) : 0;
      return { kind, station: x, clock, standoff: rho - hull.radius(x, clock) };
    }
  }
}

/**
 * The place that a builder who chooses another kind means: the same point, but never one buried under the skin that was
 * chosen. A list stepped through with the arrow keys passes the axis on its way to the skin.
 */
export function placeChosen(kind: PlaceKind, at: Vec3, hull: Hull): Place {
  const place = placeAs(kind, at, hull);
  return place.kind === 'skin' ? { ...place, standoff: Math.max(0, place.standoff) } : place;
}
