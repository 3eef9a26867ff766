/** Edits of parts. Positions that only the hull knows are handed in, so that an edit needs no physics. */
import { type Craft, listed } from '../../craft/craft.ts';
import { finOfBox, isBoxed } from '../../craft/firstFigures.ts';
import { freeId } from '../../craft/ids.ts';
import type { Place } from '../../craft/placeSchema.ts';
import type { Slide } from '../../craft/planningSchema.ts';
import { LIMITS } from '../../craft/quantities.ts';
import type { Part } from '../../craft/schema.ts';
import { stationOf } from '../../craft/station.ts';
import { taken } from '../../craft/stowage.ts';
import { takeOut } from '../../craft/takeOut.ts';
import { type Edit, type Recipe, step } from '../edit.ts';
import { placed, shifted, stretched } from '../place.ts';

export type PartFields = Omit<Part, 'id'>;

/** Enough of a part to find it and to call it by its name. */
export type PartCalled = Pick<Part, 'id' | 'name' | 'kind'>;

export const calledPart = ({ name, kind }: Omit<PartCalled, 'id'>): string => name || kind;

/** Adds a part at the end of the list, under an id made from its name. */
export const addPart = (fields: PartFields): Edit => addParts([fields], `Add ${calledPart(fields)}`);

export const addParts = (all: readonly PartFields[], label = `Add ${all.length} parts`): Edit =>
  step(label, (craft) => {
    for (const fields of all) insert(craft, fields, craft.parts.order.length);
  });

function insert(craft: Craft, fields: PartFields, index: number): void {
  const id = freeId(fields.name || fields.kind, taken(craft));
  craft.parts.byId[id] = { id, ...fields };
  craft.parts.order.splice(index, 0, id);
}

/** A copy stands this far aft of its original, m, so that it is seen. */
const APART = 0.02;

/**
 * Copies parts, each right after its original in the list and a little aft of it in space where the hull still
 * reaches. `hullLength` in m; null while the hull cannot be formed.
 */
export const duplicateParts = (ids: readonly string[], what: string, hullLength: number | null): Edit =>
  step(`Duplicate ${what}`, (craft) => {
    for (const id of ids) {
      const { id: _, ...original } = craft.parts.byId[id]!;
      const fields = structuredCloneOf(original);
      const aft = shifted(fields.place, APART);
      const place =
        hullLength !== null && stationOf(aft) <= hullLength ? placed(fields.place, aft) : fields.place;
      const name = copyName(fields.name, new Set(listed(craft.parts).map((part) => part.name)));
      insert(craft, { ...fields, name, place, locked: false }, craft.parts.order.indexOf(id) + 1);
    }
  });

/** A name has room for 200 characters. */
const LONGEST_BASE = 190;

/** "Camera" → "Camera copy" → "Camera copy 2"; a part without a name has none to copy. */
function copyName(name: string, names: ReadonlySet<string>): string {
  if (name === '') return '';
  const base = name.replace(/ copy(?: \d+)?$/, '').slice(0, LONGEST_BASE);
  for (let n = 1; ; n++) {
    const copy = n === 1 ? `${base} copy` : `${base} copy ${n}`;
    if (!names.has(copy)) return copy;
  }
}

const structuredCloneOf = <T>(value: T): T => JSON.parse(JSON.stringify(value));

/** Takes parts away. A wire run that ended at one stays, its end loose where the part was. */
export const removeParts = (ids: readonly string[], what: string): Edit =>
  step(`Remove ${what}`, (craft) => takeOut(craft, ids));

/** Sets fields of one part. `field` names what is typed, for the undo button. */
export const setPart = (part: PartCalled, field: string, change: Partial<PartFields>): Edit =>
  step(`Change ${field} of ${calledPart(part)}`, (craft) => alter(craft.parts.byId[part.id]!, change));

/** Sets the same fields of several parts: lock, kind, source of mass. */
export const setParts = (ids: readonly string[], label: string, change: Partial<PartFields>): Edit =>
  step(label, (craft) => {
    for (const id of ids) alter(craft.parts.byId[id]!, change);
  });

/**
 * What becomes a fin is one as large as its box, and a fin as large as its box stays so when the box changes. What is a
 * fin no more loses figures that are only those of its box, and keeps others, should it become one again.
 */
function alter(part: Part, change: Partial<PartFields>): void {
  const boxed = part.fin !== null && isBoxed(part.fin, part.size);
  Object.assign(part, change);
  if (change.kind === 'fin') part.fin ??= finOfBox(part.size);
  else if (change.kind && boxed) part.fin = null;
  if (change.size && boxed) part.fin = finOfBox(part.size) ?? part.fin;
}

/** A weighed mass replaces the planned one; its tolerance becomes the scale's. */
export const markWeighed = (part: PartCalled, mass: number, massTolerance: number): Edit =>
  step(`Weigh ${calledPart(part)}`, (craft) => {
    Object.assign(craft.parts.byId[part.id]!, { mass, massTolerance, massSource: 'weighed' });
  });

/** Puts the list in another order. */
export const sortParts = (order: readonly string[]): Edit =>
  step('Sort parts', (craft) => {
    craft.parts.order = [...order];
  });

/** Puts a part at a place. For drags: pass the recipe to `Drag.move`. */
export const placePart =
  (id: string, place: Place): Recipe =>
  (craft) => {
    const part = craft.parts.byId[id]!;
    part.place = placed(part.place, place);
  };

/** Gives a part a slide, or takes it away. For drags of its ends: pass the recipe to `Drag.move`. */
export const stretchSlide =
  (id: string, slide: Slide | null): Recipe =>
  (craft) => {
    const part = craft.parts.byId[id]!;
    part.slide = slide && stretched(part.slide, slide);
  };

export const setSlide = (part: PartCalled, slide: Slide | null): Edit =>
  step(`${slide ? 'Change' : 'Remove'} the slide of ${calledPart(part)}`, stretchSlide(part.id, slide));

/** Shifts parts along the hull, keeping their kind of place; locked ones stay. */
export const shiftParts =
  (ids: readonly string[], by: number): Recipe =>
  (craft) => {
    for (const id of ids) {
      const part = craft.parts.byId[id]!;
      if (!part.locked) part.place = placed(part.place, shifted(part.place, by));
    }
  };

/** Whether there is room for so many more parts. */
export const hasRoom = (craft: Craft, more: number): boolean =>
  craft.parts.order.length + more <= LIMITS.parts;
