/** How much of a craft a plan disturbs. */
import { type Craft, listed } from '../craft/craft.ts';
import type { Place } from '../craft/placeSchema.ts';
import { stationOf } from '../craft/station.ts';

/** Moves shorter than this do not count, m. */
const LEAST_MOVE = 5e-4;

/** Parts, ballast apart, that are somewhere else, new, or gone. */
export function movedParts(today: Craft, then: Craft): number {
  const solid = (craft: Craft) => listed(craft.parts).filter(({ kind }) => kind !== 'ballast');
  const moved = solid(then).filter(({ id, place }) => {
    const before = today.parts.byId[id]?.place;
    return !before || isElsewhere(before, place);
  });
  const gone = solid(today).filter(({ id }) => !then.parts.byId[id]);
  return moved.length + gone.length;
}

export const isElsewhere = (a: Place, b: Place): boolean =>
  a.kind !== b.kind || Math.abs(stationOf(a) - stationOf(b)) > LEAST_MOVE;
