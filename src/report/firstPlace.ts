/** Where a part of the catalogue is put first: somewhere usual for its kind, and not on top of another. */
import { type Craft, listed } from '../craft/craft.ts';
import { finOutline } from '../craft/finOutline.ts';
import type { Place } from '../craft/placeSchema.ts';
import type { Part } from '../craft/schema.ts';
import { stationOf, withStation } from '../craft/station.ts';
import type { Hull } from '../physics/hull/hull.ts';

type NewPart = Pick<Part, 'kind' | 'size' | 'fin'>;

/**
 * A thruster on the axis behind the tail tip; fins on the skin near the tail, top, starboard, port and keel in turn; a
 * camera ahead of the CB and all else under it, its top at the keel. What is in the way is passed aft.
 */
export function firstPlace(part: NewPart, { parts }: Pick<Craft, 'parts'>, hull: Hull): Place {
  const others = listed(parts);
  const places = usualPlaces(part, hull).map((place) => withStation(place, toMillimetre(stationOf(place))));
  const free = places.find((place) => !others.some((other) => covers(place, part, other)));
  return free ?? passedAft(places[0]!, part, others, hull);
}

const FIN_SHARE = 0.85;
const CAMERA_AHEAD = 0.12;
const FIN_CLOCKS = [0, Math.PI / 2, 1.5 * Math.PI, Math.PI];

function usualPlaces({ kind, size, fin }: NewPart, { length, cbStation }: Hull): Place[] {
  if (kind === 'thruster') return [{ kind: 'axis', station: length + size.length / 2 }];
  if (kind === 'fin') {
    const standoff = toMillimetre((fin ? finOutline(fin).span : size.height) / 2);
    return FIN_CLOCKS.map((clock) => ({ kind: 'skin', station: FIN_SHARE * length, clock, standoff }));
  }
  const ahead = kind === 'camera' ? CAMERA_AHEAD * length : 0;
  return [{ kind: 'keel', station: cbStation - ahead, drop: toMillimetre(size.height / 2) }];
}

/** Room between one part and the next, m. */
const BETWEEN = 0.01;

function passedAft(start: Place, part: NewPart, others: readonly Part[], { length }: Hull): Place {
  let place = start;
  for (const _ of others) {
    const inWay = others.find((other) => covers(place, part, other));
    if (!inWay) return place;
    const next = stationOf(inWay.place) + (inWay.size.length + part.size.length) / 2 + BETWEEN;
    place = withStation(place, toMillimetre(next));
  }
  // Where the keel is full it goes to where it would have gone first.
  return start.kind === 'axis' || stationOf(place) <= length ? place : start;
}

/** Whether the two lie over each other along the same line of the hull, and at one height below the keel. */
function covers(place: Place, { size }: NewPart, other: Part): boolean {
  const apart = Math.abs(stationOf(place) - stationOf(other.place));
  return sameLine(place, size, other) && apart < (size.length + other.size.length) / 2 + BETWEEN / 2;
}

function sameLine(place: Place, size: Part['size'], other: Part): boolean {
  if (place.kind === 'skin') return other.place.kind === 'skin' && place.clock === other.place.clock;
  if (place.kind !== 'keel') return place.kind === other.place.kind;
  if (other.place.kind !== 'keel') return false;
  return Math.abs(place.drop - other.place.drop) < (size.height + other.size.height) / 2;
}

const toMillimetre = (value: number): number => Number(value.toFixed(3));
