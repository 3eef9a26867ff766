/**
 * A stowage: where every planned weight, slide and load is. What a ballast plan proposes, in terms of the craft file,
 * and how the craft looks once it is carried out.
 *
 * Ballast hangs at a hardpoint when it is a part of kind ballast, not locked, at the very place of the hardpoint. A
 * load is aboard when a part has its id.
 */
import { type Craft, listed } from './craft.ts';
import { freeId } from './ids.ts';
import type { Place } from './placeSchema.ts';
import type { LeadPiece, Load, Slide } from './planningSchema.ts';
import { LIMITS } from './quantities.ts';
import type { Hardpoint, Part } from './schema.ts';
import { withStation } from './station.ts';
import { takeOut } from './takeOut.ts';

export interface Stowage {
  /** Ballast by hardpoint; a hardpoint that is not named has none. */
  readonly weights: readonly { readonly hardpoint: string; readonly pieces: readonly LeadPiece[] }[];
  /** Stations of sliding parts, m; a part that is not named stays. */
  readonly slides: readonly { readonly part: string; readonly to: number }[];
  /** The loads carried; one that is not named is left ashore. */
  readonly loads: readonly StowedLoad[];
}

export interface StowedLoad {
  readonly load: string;
  readonly place: Place;
  /** The stretch along which it may move further; null at a hardpoint. */
  readonly slide: Slide | null;
}

/** Carries a stowage out, in place: replaces entries, changes none of them inside. What it names that is gone is passed over. */
export function stow(craft: Craft, { weights, slides, loads }: Stowage): void {
  for (const { part, to } of slides) slideTo(craft, part, to);
  const ashore = looseLoads(craft).filter(({ id }) => !loads.some(({ load }) => load === id));
  takeOut(
    craft,
    ashore.map(({ id }) => id).filter((id) => id in craft.parts.byId),
  );
  for (const load of loads) takeAboard(craft, load);
  const hung = hungBallast(craft);
  for (const hardpoint of listed(craft.hardpoints)) {
    const wanted = weights.find((each) => each.hardpoint === hardpoint.id)?.pieces ?? [];
    hang(craft, hardpoint, wanted, hung.get(hardpoint.id) ?? []);
  }
}

/** The craft once the stowage is carried out; what it does not touch stays the same objects. */
export function stowed(craft: Craft, stowage: Stowage): Craft {
  const { parts, wires } = craft;
  const copy: Craft = {
    ...craft,
    parts: { byId: { ...parts.byId }, order: parts.order },
    wires: { byId: { ...wires.byId }, order: wires.order },
  };
  stow(copy, stowage);
  return copy;
}

/** Loads a plan may decide on: all but those aboard as a locked part. */
export const looseLoads = (craft: Craft): Load[] =>
  listed(craft.loads).filter(({ id }) => !craft.parts.byId[id]?.locked);

/** Parts a plan may slide. Those that stand for loads are placed as loads. */
export const slidingParts = (craft: Craft): (Part & { slide: Slide })[] =>
  listed(craft.parts).filter(
    (part): part is Part & { slide: Slide } =>
      part.slide !== null && !part.locked && !craft.loads.byId[part.id],
  );

/** The parts that are ballast hanging at hardpoints, by hardpoint; of hardpoints at one place the first has them. */
export function hungBallast(craft: Craft): Map<string, Part[]> {
  const first = new Map<string, string>();
  for (const { id, place } of listed(craft.hardpoints)) {
    const spot = JSON.stringify(place);
    if (!first.has(spot)) first.set(spot, id);
  }
  const hung = new Map<string, Part[]>();
  for (const part of listed(craft.parts)) {
    if (part.kind !== 'ballast' || part.locked) continue;
    const hardpoint = first.get(JSON.stringify(part.place));
    if (hardpoint) hung.set(hardpoint, [...(hung.get(hardpoint) ?? []), part]);
  }
  return hung;
}

/** The part that stands for a load at a place: the one aboard moved there, or a new one. */
export const loadAsPart = (craft: Craft, load: Load, place: Place, slide: Slide | null): Part => {
  const aboard = craft.parts.byId[load.id];
  if (aboard) return { ...aboard, place, slide };
  return {
    ...blankWeight(load.id, load.name, load.mass, place),
    kind: 'load',
    massTolerance: load.massTolerance,
    massSource: 'estimated',
    size: { length: 0.05, width: 0.04, height: 0.03 },
    slide,
  };
};

function slideTo(craft: Craft, id: string, to: number): void {
  const part = craft.parts.byId[id];
  if (part) put(craft, { ...part, place: withStation(part.place, to) });
}

function takeAboard(craft: Craft, { load, place, slide }: StowedLoad): void {
  const known = craft.loads.byId[load];
  if (known) put(craft, loadAsPart(craft, known, place, slide));
}

/** Puts a part in, or in the place of the one with its id; one that is already as it should be stays untouched. */
function put(craft: Craft, part: Part): void {
  const before = craft.parts.byId[part.id];
  if (!before) craft.parts.order = [...craft.parts.order, part.id];
  if (JSON.stringify(before) !== JSON.stringify(part)) craft.parts.byId[part.id] = part;
}

/** Ballast already there is changed before any is added or taken away. */
function hang(
  craft: Craft,
  hardpoint: Hardpoint,
  wanted: readonly LeadPiece[],
  there: readonly Part[],
): void {
  const whole = wanted.flatMap(inParts);
  whole.forEach((piece, i) => {
    put(craft, ballastPart(craft, hardpoint, piece, there[i]));
  });
  takeOut(
    craft,
    there.slice(whole.length).map(({ id }) => id),
  );
}

/** One part stands for at most so many pieces. */
function inParts({ mass, count }: LeadPiece): LeadPiece[] {
  const full = Math.floor(count / LIMITS.copies);
  const rest = count % LIMITS.copies;
  const counts = [...Array<number>(full).fill(LIMITS.copies), ...(rest > 0 ? [rest] : [])];
  return counts.map((each) => ({ mass, count: each }));
}

function ballastPart(craft: Craft, { id, name, place }: Hardpoint, piece: LeadPiece, there?: Part): Part {
  const title = `${name || id} lead`;
  const weight = there ?? blankWeight(freeId(title, taken(craft)), title, 0, { ...place });
  const copies: Part['copies'] = { kind: 'together', count: piece.count };
  return { ...weight, mass: piece.mass, massTolerance: 0, copies, cgOffset: 0 };
}

const blankWeight = (id: string, name: string, mass: number, place: Place): Part => ({
  id,
  kind: 'ballast',
  name,
  mass,
  massTolerance: 0,
  massSource: 'weighed',
  place,
  copies: { kind: 'together', count: 1 },
  size: { length: 0.02, width: 0.02, height: 0.01 },
  cgOffset: 0,
  locked: false,
  slide: null,
  thruster: null,
  fin: null,
  dragArea: null,
  notes: '',
});

/** Ids that a new part may not have. */
export const taken = ({ parts, loads }: Craft): Record<string, unknown> => ({ ...loads.byId, ...parts.byId });
