/** Edits of hardpoints and of the point that carries the heaviness. */
import { BLANK_HARDPOINT } from '../../craft/blank.ts';
import { type Craft, listed } from '../../craft/craft.ts';
import { freeId } from '../../craft/ids.ts';
import type { Place } from '../../craft/placeSchema.ts';
import type { Hardpoint } from '../../craft/schema.ts';
import { hungBallast } from '../../craft/stowage.ts';
import { type Edit, type Recipe, runOf, step } from '../edit.ts';
import { placed, shifted } from '../place.ts';

export const addHardpoint = (name: string, place: Place): Edit =>
  step(`Add ${name || 'hardpoint'}`, (craft) => {
    const id = freeId(name || 'hardpoint', craft.hardpoints.byId);
    craft.hardpoints.byId[id] = { id, name, place, ...BLANK_HARDPOINT };
    craft.hardpoints.order.push(id);
  });

/** Takes hardpoints away, as places for loads too; the last one stays, and the lead goes to the first left when its own goes. */
export const removeHardpoints = (ids: readonly string[]): Edit =>
  step(ids.length === 1 ? 'Remove hardpoint' : `Remove ${ids.length} hardpoints`, (craft) => {
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

export const renameHardpoint = (id: string, name: string): Edit =>
  runOf(`hardpoint ${id} name`, 'Change name', (craft) => {
    craft.hardpoints.byId[id]!.name = name;
  });

/** Sets its limit or whether it takes pieces. `field` names what is typed. */
export const setHardpoint = (
  id: string,
  field: string,
  change: Partial<Pick<Hardpoint, 'limit' | 'fill'>>,
): Edit =>
  runOf(`hardpoint ${id} ${field}`, `Change ${field}`, (craft) => {
    Object.assign(craft.hardpoints.byId[id]!, change);
  });

/** Moves it; ballast that hangs there goes along. */
export const placeHardpoint =
  (id: string, place: Place): Recipe =>
  (craft: Craft) => {
    const hardpoint = craft.hardpoints.byId[id]!;
    const next = placed(hardpoint.place, place);
    if (next === hardpoint.place) return;
    for (const part of hungBallast(craft).get(id) ?? []) part.place = { ...next };
    hardpoint.place = next;
  };

export const moveHardpoint = (id: string, place: Place): Edit =>
  runOf(`hardpoint ${id} place`, 'Move hardpoint', placeHardpoint(id, place));

export const nudgeHardpoints = (ids: readonly string[], by: number): Edit =>
  runOf(`nudge ${ids.join(' ')}`, 'Nudge hardpoint', (craft) => {
    for (const id of ids) placeHardpoint(id, shifted(craft.hardpoints.byId[id]!.place, by))(craft);
  });

export const setLeadAt = (id: string): Edit =>
  step('Choose hardpoint', (craft) => {
    craft.leadAt = id;
  });

export const setSupport = (support: Place | null): Edit =>
  runOf('support', support ? 'Set the support point' : 'Remove the support point', (craft) => {
    craft.support = support;
  });
