/** Edits of wire runs. */

import { freeId } from '../../craft/ids.ts';
import type { WireEnd, WireRun } from '../../craft/schema.ts';
import { type Edit, type Recipe, step } from '../edit.ts';

export type WireFields = Omit<WireRun, 'id'>;

export const addWire = (fields: WireFields): Edit =>
  step(`Add ${fields.name || 'wire run'}`, (craft) => {
    const id = freeId(fields.name || 'wire', craft.wires.byId);
    craft.wires.byId[id] = { id, ...fields };
    craft.wires.order.push(id);
  });

export const removeWires = (ids: readonly string[], what: string): Edit =>
  step(`Remove ${what}`, (craft) => {
    for (const id of ids) delete craft.wires.byId[id];
    craft.wires.order = craft.wires.order.filter((id) => !ids.includes(id));
  });

export const setWire = (
  { id, name }: Pick<WireRun, 'id' | 'name'>,
  field: string,
  change: Partial<WireFields>,
): Edit =>
  step(`Change ${field} of ${name || 'wire run'}`, (craft) => {
    Object.assign(craft.wires.byId[id]!, change);
  });

/** Joins one end to a part, or leaves it loose at a place. For drags: pass the recipe to `Drag.move`. */
export const joinWire =
  (id: string, side: 'from' | 'to', end: WireEnd): Recipe =>
  (craft) => {
    craft.wires.byId[id]![side] = end;
  };
