/** Where a place is in space, for places that are not in the geometry of the craft. */
import type { Place } from '../craft/placeSchema.ts';
import type { Vec3 } from '../numeric/vector.ts';
import { positionOf } from '../physics/mass/position.ts';
import type { Assessment } from './assessment.ts';

/** m; null while the hull cannot be formed. */
export const pointOf = (place: Place, { geometry }: Assessment): Vec3 | null =>
  geometry.status === 'solved' ? positionOf(place, geometry.hull) : null;
