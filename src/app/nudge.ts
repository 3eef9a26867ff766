/** The arrow keys: along the hull, and up or down as far as a thing's kind of place lets it. */
import type { Place } from '../craft/placeSchema.ts';
import { type Edit, runOf } from '../edit/edit.ts';
import { placeHardpoint } from '../edit/edits/hardpoints.ts';
import { placePart } from '../edit/edits/parts.ts';
import { shifted } from '../edit/place.ts';
import { idsOf, type Selection } from '../edit/selection.ts';

export const NUDGE = 0.001;
export const LEAP = 0.01;

export type Nudge = (place: Place) => Place;

/** `by` metres aft. */
export const along =
  (by: number): Nudge =>
  (place) =>
    shifted(place, by);

/** `by` metres up. On the skin that is outward or inward, whichever is up there; on the axis nothing moves. */
export const up =
  (by: number): Nudge =>
  (place) => {
    switch (place.kind) {
      case 'keel':
        return { ...place, drop: place.drop - by };
      case 'skin':
        return { ...place, standoff: place.standoff + (Math.cos(place.clock) < 0 ? -by : by) };
      case 'free':
        return { ...place, z: place.z + by };
      case 'axis':
        return place;
    }
  };

/** One edit that nudges all parts and hardpoints selected, locked parts excepted; null when there are none. */
export function nudge(selection: Selection, move: Nudge): Edit | null {
  const [parts, hardpoints] = [idsOf(selection, 'part'), idsOf(selection, 'hardpoint')];
  const count = parts.length + hardpoints.length;
  if (count === 0) return null;
  const label = count > 1 ? `Nudge ${count} things` : parts.length ? 'Nudge part' : 'Nudge hardpoint';
  return runOf(`nudge ${parts} ${hardpoints}`, label, (craft) => {
    for (const id of parts) {
      const part = craft.parts.byId[id]!;
      if (!part.locked) placePart(id, move(part.place))(craft);
    }
    for (const id of hardpoints) placeHardpoint(id, move(craft.hardpoints.byId[id]!.place))(craft);
  });
}
