/**
 * A thruster moved along the hull: which stations are tried, and where it sits at each.
 *
 * From nose to tail, and beyond either end by as much as it stands beyond one today. Skin and keel places follow the
 * hull, a free place keeps side and height. On the axis a thruster has room only beyond the ends; between them it is
 * tried below the keel, as near as its propeller allows. Wire runs follow, since they name the part.
 */
import type { Craft } from '../../craft/craft.ts';
import type { Place } from '../../craft/placeSchema.ts';
import type { Part } from '../../craft/schema.ts';
import { stationOf, withStation } from '../../craft/station.ts';
import type { ThrusterData } from '../../craft/thrustSchema.ts';
import type { Hull } from '../hull/hull.ts';
import { KEEL } from '../mass/position.ts';
import { clearanceOf } from './sweep.ts';

export type ThrusterPart = Part & { readonly thruster: ThrusterData };

/** Nose to tail in equal steps, m. */
export function stationsOf({ place }: Part, { length }: Hull, count: number): number[] {
  const beyond = Math.max(0, -stationOf(place), stationOf(place) - length);
  const last = Math.max(1, count - 1);
  return Array.from({ length: count }, (_, i) => (length + 2 * beyond) * (i / last) - beyond);
}

export function placeAt(part: ThrusterPart, station: number, hull: Hull): Place {
  const inside = part.place.kind === 'axis' && station > 0 && station < hull.length;
  return inside
    ? { kind: 'keel', station, drop: dropAt(part, station, hull) }
    : withStation(part.place, station);
}

/** How far below the keel line the propeller clears the hull, and the thruster itself lies outside. */
function dropAt({ thruster, size }: ThrusterPart, station: number, hull: Hull): number {
  const { diameter, yaw, pitch } = thruster;
  const turned = Math.max(...[yaw, pitch].flatMap(({ least, most }) => [-least, most]));
  const clearance = clearanceOf(diameter);
  const reach = (diameter / 2) * Math.sin(Math.min(turned, Math.PI / 2)) + clearance;
  const keel = Math.max(
    ...Array.from({ length: SAMPLES }, (_, i) => hull.radius(station + reach * (i / HALF - 1), KEEL)),
  );
  return Math.max(size.height / 2, keel - hull.radius(station, KEEL) + diameter / 2 + clearance);
}

const HALF = 4;
const SAMPLES = 2 * HALF + 1;

/** The craft with the part there and kept there: no plan may slide it or put it elsewhere. */
export function heldAt(craft: Craft, part: Part, place: Place): Craft {
  const held: Part = { ...part, place, locked: true };
  return { ...craft, parts: { ...craft.parts, byId: { ...craft.parts.byId, [part.id]: held } } };
}
