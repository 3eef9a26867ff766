/** Places as edits change them: always inside what the craft file allows, and the same object when nothing moved. */
import type { Place } from '../craft/placeSchema.ts';
import type { Slide } from '../craft/planningSchema.ts';
import { LIMITS } from '../craft/quantities.ts';
import { stationOf, withStation } from '../craft/station.ts';

const TURN = 2 * Math.PI;
const clamp = (value: number, low: number, high: number): number => Math.min(high, Math.max(low, value));
/** Rounds to 1 nm, so that a drag leaves short numbers in the file. */
const tidy = (value: number): number => Math.round(value * 1e9) / 1e9 + 0;
const coordinate = (value: number): number => tidy(clamp(value, -LIMITS.length, LIMITS.length));

/** A clock angle brought to 0 … 2π. */
export const turned = (clock: number): number => tidy(clock - TURN * Math.floor(clock / TURN));

export const shifted = (place: Place, by: number): Place => withStation(place, stationOf(place) + by);

/** `next` brought within limits; `before` itself when they are equal, so that no history entry is made. */
export function placed(before: Place, next: Place): Place {
  const kept = within(next);
  return JSON.stringify(kept) === JSON.stringify(before) ? before : kept;
}

const FIRST_SHARE = 0.1;

/** A first slide for a part: a tenth of the hull either way, not beyond its ends. */
export function slideAbout(station: number, hullLength: number): Slide {
  const reach = FIRST_SHARE * hullLength;
  return {
    from: coordinate(Math.min(station, Math.max(0, station - reach))),
    to: coordinate(Math.max(station, Math.min(hullLength, station + reach))),
  };
}

/** A slide brought within limits, its ends in order; `before` itself when they are equal. */
export function stretched(before: Slide | null, { from, to }: Slide): Slide {
  const [fore, aft] = [coordinate(Math.min(from, to)), coordinate(Math.max(from, to))];
  return before && before.from === fore && before.to === aft ? before : { from: fore, to: aft };
}

function within(place: Place): Place {
  switch (place.kind) {
    case 'skin':
      return {
        kind: 'skin',
        station: coordinate(place.station),
        clock: turned(place.clock),
        standoff: coordinate(place.standoff),
      };
    case 'keel':
      return { kind: 'keel', station: coordinate(place.station), drop: Math.max(0, coordinate(place.drop)) };
    case 'axis':
      return { kind: 'axis', station: coordinate(place.station) };
    case 'free':
      return { kind: 'free', x: coordinate(place.x), y: coordinate(place.y), z: coordinate(place.z) };
  }
}
