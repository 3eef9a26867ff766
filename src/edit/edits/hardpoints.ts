/** Edits of hardpoints and of the point that carries the heaviness. */
import { BLANK_HARDPOINT } from '../../craft/blank.ts';
import { type Craft, listed } from '../../craft/craft.ts';
import { freeId } from '../../craft/ids.ts';
import type { Place } from '../../craft/placeSchema.ts';
import type { Hardpoint } from '../../craft/schema.ts';
import { hungBallast } from '../../craft/stowage.ts';
import { type Edit, type Recipe, step } from '../edit.ts';
import { placed } from '../place.ts';

export const addHardpoint = (name: string, place: Place): Edit =>
  step(`Add ${name || 'hardpoint'}`, (craft) => {
    const id = freeId(name || 'hardpoint', craft.hardpoints.byId);
    craft.hardpoints.byId[id] = { id, name, place, ...BLANK_HARDPOINT };
    craft.hardpoints.order.push(id);
  });

/** Takes hardpoints away, as places for loads too; the last one stays, and the lead goes to the first left when its own goes. */
export const removeHardpoints = (ids: readonly string[], what: string): Edit =>
  step(`Remove ${what}`, (craft) => {
    const left = craft.hardpoints.order.filter((id) => !ids.includes(id));
    if (left.length === 0) return;
    for (const id of craft.hardpoints.order) if (ids.includes(id)) delete craft.hardpoints.byId[id];
    craft.hardpoints.order = left;
    if (ids.includes(craft.leadAt)) craft.leadAt = left[0]!;
    for (const load of listed(craft.loads)) {
      const kept = load.options.filter((each) => each.kind === 'slide' || !ids.includes(each.hardpoint));
      if (kept.length < load.options.length) load.options = kept;
    }
  });

/** Sets fields of one hardpoint, as typed: a place out of bounds is refused, not brought back in. Ballast goes along. */
export const setHardpoint = (
  { id, name }: Pick<Hardpoint, 'id' | 'name'>,
  field: string,
  change: Partial<Omit<Hardpoint, 'id'>>,
): Edit =>
  step(`Change ${field} of ${name || 'hardpoint'}`, (craft) => {
    if (change.place) takeAlong(craft, id, change.place);
    Object.assign(craft.hardpoints.byId[id]!, change);
  });

/** Puts a hardpoint at a place; ballast that hangs there goes along. For drags: pass the recipe to `Drag.move`. */
export const placeHardpoint =
  (id: string, place: Place): Recipe =>
  (craft) => {
    const hardpoint = craft.hardpoints.byId[id]!;
    const next = placed(hardpoint.place, place);
    if (next === hardpoint.place) return;
    takeAlong(craft, id, next);
    hardpoint.place = next;
  };

/** Ballast hangs where its hardpoint is. */
function takeAlong(craft: Craft, hardpoint: string, to: Place): void {
  for (const part of hungBallast(craft).get(hardpoint) ?? []) part.place = { ...to };
}

export const setLeadAt = (id: string): Edit =>
  step('Choose hardpoint', (craft) => {
    craft.leadAt = id;
  });

/** Moves the support point. For drags: pass the recipe to `Drag.move`. */
export const placeSupport =
  (place: Place): Recipe =>
  (craft) => {
    if (craft.support) craft.support = placed(craft.support, place);
  };

export const setSupport = (support: Place | null): Edit =>
  step(support ? 'Set the support point' : 'Remove the support point', (craft) => {
    craft.support = support;
  });
