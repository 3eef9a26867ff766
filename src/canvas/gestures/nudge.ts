/**
 * The arrow keys as edits: 1 mm, with Shift 10 mm. Left and right go along the hull in the side view and round it
 * (or athwart) in the front view and from above; up and down go along the hull from above, where the nose is up, and
 * elsewhere as far as the kind of place allows. On the skin, up is outward or inward, whichever is up there; on the axis
 * nothing goes up.
 */
import type { Place } from '../../craft/placeSchema.ts';
import { type Edit, runOf } from '../../edit/edit.ts';
import { placeHardpoint } from '../../edit/edits/hardpoints.ts';
import { placePart } from '../../edit/edits/parts.ts';
import { shifted } from '../../edit/place.ts';
import { idsOf, type Selection } from '../../edit/selection.ts';

export type Facing = 'side' | 'front' | 'above';
export type Nudge = (place: Place) => Place;

const STEP = 0.001;
const LEAP = 0.01;

/** In the front view one step round the skin is a tenth of a degree, a leap one degree. */
const CLOCK_STEP = (0.1 * Math.PI) / 180;
const CLOCK_LEAP = Math.PI / 180;

export function nudgeFor(key: string, shift: boolean, facing: Facing): Nudge | null {
  const by = shift ? LEAP : STEP;
  switch (key) {
    case 'ArrowLeft':
      return facing === 'side' ? along(-by) : round(-1, by, shift);
    case 'ArrowRight':
      return facing === 'side' ? along(by) : round(1, by, shift);
    case 'ArrowUp':
      return facing === 'above' ? along(-by) : up(by);
    case 'ArrowDown':
      return facing === 'above' ? along(by) : up(-by);
    default:
      return null;
  }
}

const along =
  (by: number): Nudge =>
  (place) =>
    shifted(place, by);

const up =
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

/** To starboard (+1) or port (−1): over the top that is clockwise, under the keel the other way. */
const round =
  (way: 1 | -1, by: number, leap: boolean): Nudge =>
  (place) => {
    if (place.kind === 'free') return { ...place, y: place.y + way * by };
    if (place.kind !== 'skin') return place;
    const sense = Math.cos(place.clock) < 0 ? -way : way;
    return { ...place, clock: place.clock + sense * (leap ? CLOCK_LEAP : CLOCK_STEP) };
  };

/** One edit that nudges all parts and hardpoints selected, locked parts excepted; null when there are none. */
export function nudgeEdit(selection: Selection, nudge: Nudge): Edit | null {
  const [parts, hardpoints] = [idsOf(selection, 'part'), idsOf(selection, 'hardpoint')];
  const count = parts.length + hardpoints.length;
  if (count === 0) return null;
  const label = count > 1 ? `Nudge ${count} things` : parts.length ? 'Nudge part' : 'Nudge hardpoint';
  return runOf(`nudge ${parts} ${hardpoints}`, label, (craft) => {
    for (const id of parts) {
      const part = craft.parts.byId[id]!;
      if (!part.locked) placePart(id, nudge(part.place))(craft);
    }
    for (const id of hardpoints) placeHardpoint(id, nudge(craft.hardpoints.byId[id]!.place))(craft);
  });
}

/** The part before or after the one selected last, in the builder's order; the first or last when none is. */
export function neighbour(order: readonly string[], selection: Selection, way: 1 | -1): Selection {
  if (order.length === 0) return [];
  const last = idsOf(selection, 'part').at(-1);
  const at = last === undefined ? (way > 0 ? -1 : order.length) : order.indexOf(last);
  return [{ kind: 'part', id: order[(at + way + order.length) % order.length]! }];
}
