/** Edits of the useful loads that a plan may take aboard, and of where each may go. */
import { freeId } from '../../craft/ids.ts';
import type { Load, LoadOption } from '../../craft/planningSchema.ts';
import { taken } from '../../craft/stowage.ts';
import { type Edit, type Recipe, step } from '../edit.ts';
import { placed, stretched } from '../place.ts';

export type LoadFields = Omit<Load, 'id'>;

/** Enough of a load to find it and to call it by its name. */
export type LoadCalled = Pick<Load, 'id' | 'name'>;

const called = ({ name }: Pick<Load, 'name'>): string => name || 'load';

export const addLoad = (fields: LoadFields): Edit =>
  step(`Add ${called(fields)}`, (craft) => {
    const id = freeId(fields.name || 'load', taken(craft));
    craft.loads.byId[id] = { id, ...fields };
    craft.loads.order.push(id);
  });

/** Takes loads off the list. One that is aboard stays aboard, as a part like any other. */
export const removeLoads = (ids: readonly string[], what: string): Edit =>
  step(`Remove ${what}`, (craft) => {
    for (const id of ids) delete craft.loads.byId[id];
    craft.loads.order = craft.loads.order.filter((id) => !ids.includes(id));
  });

export const setLoad = (
  { id, name }: LoadCalled,
  field: string,
  change: Partial<Omit<LoadFields, 'options'>>,
): Edit =>
  step(`Change ${field} of ${called({ name })}`, (craft) => {
    Object.assign(craft.loads.byId[id]!, change);
  });

export const addLoadOption = (load: LoadCalled, option: LoadOption): Edit =>
  step(`Add a place for ${called(load)}`, (craft) => {
    craft.loads.byId[load.id]!.options.push(option);
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

export const setLoadOption = (load: LoadCalled, index: number, option: LoadOption): Edit =>
  step(`Change where ${called(load)} may go`, changeLoadOption(load.id, index, option));

export const removeLoadOption = (load: LoadCalled, index: number): Edit =>
  step(`Remove a place for ${called(load)}`, (craft) => {
    craft.loads.byId[load.id]!.options.splice(index, 1);
  });
