/** Edits of what the craft is as a whole: name, hull, film, gas, day, targets. */
import type { HullShape, HullSpec } from '../../craft/hullSchema.ts';
import type { Wish } from '../../craft/planningSchema.ts';
import type { Day, Film, Gas, Targets } from '../../craft/schema.ts';
import { type Edit, type Recipe, step } from '../edit.ts';

export const setName = (name: string): Edit =>
  step('Change name of the craft', (craft) => {
    craft.name = name;
  });

export const setNotes = (notes: string): Edit =>
  step('Change notes of the craft', (craft) => {
    craft.notes = notes;
  });

/** For drags of hull length and diameter: pass the recipe to `Drag.move`. */
export const reshape =
  (shape: HullShape): Recipe =>
  (craft) => {
    if (JSON.stringify(shape) !== JSON.stringify(craft.hull.shape)) craft.hull.shape = shape;
  };

export const setShape = (field: string, shape: HullShape): Edit => step(`Change ${field}`, reshape(shape));

export const chooseShape = (shape: HullShape): Edit => step('Change hull shape', reshape(shape));

export const setHull = (field: string, change: Partial<HullSpec>): Edit =>
  step(`Change ${field}`, (craft) => {
    Object.assign(craft.hull, change);
  });

export const setFilm = (field: string, change: Partial<Film>): Edit =>
  step(`Change ${field}`, (craft) => {
    Object.assign(craft.film, change);
  });

export const setGas = (field: string, change: Partial<Gas>): Edit =>
  step(`Change ${field}`, (craft) => {
    Object.assign(craft.gas, change);
  });

export const setDay = (field: string, day: Day): Edit =>
  step(`Change ${field}`, (craft) => {
    craft.day = day;
  });

export const setTargets = (field: string, change: Partial<Targets>): Edit =>
  step(`Change ${field}`, (craft) => {
    Object.assign(craft.targets, change);
  });

/** What the ballast plan looks for after least dead ballast, first wish first. */
export const setWishes = (wishes: readonly Wish[]): Edit =>
  step('Change wishes', (craft) => {
    if (wishes.join() !== craft.wishes.join()) craft.wishes = [...wishes];
  });
