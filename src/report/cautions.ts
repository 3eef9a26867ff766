/** Things to mind that belong to no single figure. */
import { listed } from '../craft/craft.ts';
import type { Place } from '../craft/placeSchema.ts';
import { kept } from '../numeric/kept.ts';
import type { CraftState } from '../physics/craftState.ts';
import { say } from '../units/sentence.ts';
import { insideWords } from './insideHull.ts';

/** A drag asks again at every frame, and moves few parts. */
const insideHull = kept(insideWords);

export function cautionsOf(state: CraftState): string[] {
  const { craft, air, hull } = state;
  const parts = listed(craft.parts);
  const outside = parts.filter(({ thruster, fin }) => thruster || fin);
  return [
    ...air.cautions,
    ...parts.flatMap(({ name, kind, place }) => beyondHull(name || kind, place, hull.length)),
    ...outside.flatMap((part) => insideHull(part, state.pieces[part.id]!, hull) ?? []),
    ...listed(craft.hardpoints).flatMap(({ name, place }) =>
      beyondHull(name || 'Hardpoint', place, hull.length),
    ),
    ...listed(craft.wires).flatMap(({ name, id }) =>
      state.branches[id]!.some(({ length }) => length === 0)
        ? [`${name || 'A wire run'} has no length: its ends are at one point.`]
        : [],
    ),
  ];
}

/** Only what hangs on the skin or keel needs hull there; a boom may reach beyond. */
function beyondHull(name: string, place: Place, length: number): string[] {
  if (place.kind === 'free' || place.kind === 'axis') return [];
  if (place.station >= 0 && place.station <= length) return [];
  return [
    `${name} is at station ${say(place.station, 'length')}, beyond the hull (0 to ${say(length, 'length')}): there is no skin to hang it on.`,
  ];
}
