/** Edits of the useful loads that a plan may take aboard, and of where each may go. */
import { freeId } from '../../craft/ids.ts';
import type { Load, LoadOption } from '../../craft/planningSchema.ts';
import { taken } from '../../craft/stowage.ts';
import { type Edit, type Recipe, runOf, step } from '../edit.ts';
import { placed, stretched } from '../place.ts';

export type LoadFields = Omit<Load, 'id'>;

export const addLoad = (fields: LoadFields): Edit =>
  step(`Add ${fields.name || 'load'}`, (craft) => {
    const id = freeId(fields.name || 'load', taken(craft));
    craft.loads.byId[id] = { id, ...fields };
    craft.loads.order.push(id);
  });

/** Takes loads off the list. One that is aboard stays aboard, as a part like any other. */
export const removeLoads = (ids: readonly string[]): Edit =>
  step(ids.length === 1 ? 'Remove load' : `Remove ${ids.length} loads`, (craft) => {
    for (const id of ids) delete craft.loads.byId[id];
    craft.loads.order = craft.loads.order.filter((id) => !ids.includes(id));
  });

export const setLoad = (id: string, field: string, change: Partial<Omit<LoadFields, 'options'>>): Edit =>
  runOf(`load ${id} ${field}`, `Change ${field}`, (craft) => {
    Object.assign(craft.loads.byId[id]!, change);
  });

export const reorderLoad = (id: string, index: number): Edit =>
  step('Reorder loads', (craft) => {
    craft.loads.order = craft.loads.order.filter((each) => each !== id);
    craft.loads.order.splice(index, 0, id);
  });

export const addLoadOption = (id: string, option: LoadOption): Edit =>
  step('Add a place for the load', (craft) => {
    craft.loads.byId[id]!.options.push(option);
  });

/** Changes a place where a load may go. For drags of its slide: pass the recipe to `Drag.move`. */
export const changeLoadOption =
  (id: string, index: number, option: LoadOption): Recipe =>
  (craft) => {
    const { options } = craft.loads.byId[id]!;
    const before = options[index]!;
    const next = option.kind === 'slide' ? slideWithin(before, option) : option;
    if (JSON.stringify(next) !== JSON.stringify(before)) options[index] = next;
  };

const slideWithin = (before: LoadOption, option: LoadOption & { kind: 'slide' }): LoadOption => ({
  kind: 'slide',
  place: placed(before.kind === 'slide' ? before.place : option.place, option.place),
  ...stretched(null, option),
});

export const setLoadOption = (id: string, index: number, option: LoadOption): Edit =>
  runOf(`load ${id} option ${index}`, 'Change where the load may go', changeLoadOption(id, index, option));

export const removeLoadOption = (id: string, index: number): Edit =>
  step('Remove a place for the load', (craft) => {
    craft.loads.byId[id]!.options.splice(index, 1);
  });
