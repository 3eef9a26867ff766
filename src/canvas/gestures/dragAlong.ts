/** How a place follows the hand in the side view, snapped, alone or with the rest of what is selected. */
import type { Place } from '../../craft/placeSchema.ts';
import type { Recipe } from '../../edit/edit.ts';
import { placeHardpoint } from '../../edit/edits/hardpoints.ts';
import { shiftParts } from '../../edit/edits/parts.ts';
import { shifted } from '../../edit/place.ts';
import { atStation, draggedInSide, sharedStep, stationOfPlace } from '../../scene/dragPlace.ts';
import { snapped, stationRule, stationTargets } from '../../scene/snap.ts';
import { toWorld } from '../../scene/view.ts';
import type { Guide } from '../overlay.ts';
import { type Company, placesOf } from './company.ts';
import type { Step } from './dragging.ts';
import { type Ground, type Hand, type Scene, unsnapped } from './gesture.ts';

/** Up or down by less than this many px leaves the drop below the keel as it is. */
const DEAD_BAND_PX = 12;

interface Following {
  readonly place: Place;
  readonly guide: Guide | null;
}

/** Where a place goes, by the hand's way from `down` to where it is; snapped unless Alt is held. */
export function follow(
  ground: Ground,
  start: Scene,
  down: Hand,
  hand: Hand,
  place: Place,
  moving: ReadonlySet<string>,
): Following {
  const { view } = ground.scene();
  const { hull } = start.geometry;
  const from = toWorld(start.view, down);
  const to = toWorld(view, hand);
  const step = { du: to.u - from.u, dz: to.z - from.z, deadBand: DEAD_BAND_PX / view.scale };
  const free = draggedInSide(place, hull, step);
  const { value, to: target } = snapped(
    stationOfPlace(free),
    stationTargets(start.craft, start.geometry, moving),
    stationRule(view.scale, start.units, unsnapped(ground, hand)),
  );
  return { place: atStation(free, hull, value), guide: target && { along: 'station', ...target } };
}

/** The whole company goes as far aft as the place in hand. */
export function together(start: Scene, company: Company, before: Place, { place, guide }: Following): Step {
  const asked = stationOfPlace(place) - stationOfPlace(before);
  const by = sharedStep(placesOf(start.craft, company), start.geometry.hull, asked);
  const recipe: Recipe = (craft) => {
    shiftParts(company.parts, by)(craft);
    for (const id of company.hardpoints) {
      placeHardpoint(id, shifted(craft.hardpoints.byId[id]!.place, by))(craft);
    }
  };
  return { recipe, show: { guide: by === asked ? guide : null } };
}
