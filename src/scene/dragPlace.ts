/**
 * Where a place goes when the hand moves it: each kind keeps what it is. On the skin the clock angle (side view) or the
 * station (front view) stays; below the keel it stays below the keel; on the axis, on the axis; a free one goes
 * anywhere. All m and rad, from the place at the start of the drag.
 */
import type { Place } from '../craft/placeSchema.ts';
import type { Copies } from '../craft/schema.ts';
import type { Hull } from '../report/assessment.ts';
import { clockOf, onHull } from './outline.ts';
import type { PlanePoint } from './view.ts';

export interface SideStep {
  /** Aft and up, m. */
  readonly du: number;
  readonly dz: number;
  /** Up or down by less than this leaves a drop as it is, so that a drag along the keel stays one. m */
  readonly deadBand: number;
}

const beyond = (step: number, deadBand: number): number =>
  Math.sign(step) * Math.max(0, Math.abs(step) - deadBand);

/** Dragged in the side view. */
export function draggedInSide(place: Place, hull: Hull, { du, dz, deadBand }: SideStep): Place {
  switch (place.kind) {
    case 'skin':
      return { ...place, station: onHull(hull, place.station + du) };
    case 'keel':
      return {
        ...place,
        station: onHull(hull, place.station + du),
        drop: Math.max(0, place.drop - beyond(dz, deadBand)),
      };
    case 'axis':
      return { ...place, station: place.station + du };
    case 'free':
      return { ...place, x: place.x + du, z: place.z + dz };
  }
}

/** A step in the front view as the hand goes: round the axis, rad clockwise; to starboard and up, m. */
export interface FrontWay {
  readonly turn: number;
  readonly du: number;
  readonly dz: number;
}

/** From where a thing was taken hold of to where the hand is now, both seen from astern, m. */
export const wayInFront = (from: PlanePoint, to: PlanePoint): FrontWay => ({
  turn: clockOf(to) - clockOf(from),
  du: to.u - from.u,
  dz: to.z - from.z,
});

/** Moved that way in the front view, each kind of place as far as it goes; `mirrored`: by the mirrored piece of a pair. */
export function movedInFront(place: Place, { turn, du, dz }: FrontWay, mirrored: boolean): Place {
  const sense = mirrored ? -1 : 1;
  switch (place.kind) {
    case 'skin':
      return { ...place, clock: place.clock + sense * turn };
    case 'keel':
      return { ...place, drop: Math.max(0, place.drop - dz) };
    case 'axis':
      return place;
    case 'free':
      return { ...place, y: place.y + sense * du, z: place.z + dz };
  }
}

/** Whether a piece is the mirrored one of a pair. */
export const isMirrored = (copies: Copies, copy: number): boolean => copies.kind === 'pair' && copy === 1;

/** Why a hand cannot move a thing of that kind of place in the front view; null when it can. */
export const heldInFront = (place: Place): string | null =>
  place.kind === 'axis' ? 'sits on the hull axis: move it along in the side view, or change its place' : null;

/** The place at a station it snapped to, still on the hull where it has to be. */
export function atStation(place: Place, hull: Hull, station: number): Place {
  if (place.kind === 'free') return { ...place, x: station };
  return { ...place, station: place.kind === 'axis' ? station : onHull(hull, station) };
}

/** How far several places can go aft together, up to `by` m, before one that needs skin or keel runs off the hull. */
export function sharedStep(places: readonly Place[], hull: Hull, by: number): number {
  const rooms = places.flatMap((place) =>
    place.kind === 'skin' || place.kind === 'keel'
      ? [by < 0 ? Math.max(0, place.station) : Math.max(0, hull.length - place.station)]
      : [],
  );
  return Math.sign(by) * Math.min(Math.abs(by), ...rooms);
}

export const stationOfPlace = (place: Place): number => (place.kind === 'free' ? place.x : place.station);
