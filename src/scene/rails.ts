/**
 * Slides as rails: the line along which a part may slide or a load may hang, with a stop at either end. A stop is taken by its
 * knob, which stands off the rail, clear of the part itself.
 */
import type { Craft } from '../craft/craft.ts';
import type { Place } from '../craft/placeSchema.ts';
import type { Slide } from '../craft/planningSchema.ts';
import type { Hull } from '../report/assessment.ts';
import { type SlideOwner, slideLines } from '../report/planView.ts';
import type { Figure } from './figure.ts';
import { fromSide } from './flatten.ts';
import { type PlanePoint, type ScreenPoint, toScreen, type View } from './view.ts';

export interface Rail {
  readonly owner: SlideOwner;
  readonly name: string;
  readonly place: Place;
  readonly slide: Slide;
  readonly line: readonly PlanePoint[];
  /** Which way is off the craft: up or down. */
  readonly out: 1 | -1;
}

export type SlideEnd = 'from' | 'to';

export interface Knob {
  readonly rail: Rail;
  readonly end: SlideEnd;
  /** Where the rail ends, and where the hand takes it. */
  readonly stop: PlanePoint;
  readonly at: PlanePoint;
}

/** Those to draw: of parts always, of loads while planning, for they are nothing on the craft yet. */
export const railsShown = (rails: readonly Rail[], planning: boolean): Rail[] =>
  rails.filter(({ owner }) => planning || owner.kind === 'part');

/** Of the side view. */
export const railsOf = (craft: Craft, hull: Hull): Rail[] =>
  slideLines(craft, hull).map(({ line, ...rest }) => {
    const flat = line.map(fromSide);
    const middle = flat[Math.floor(flat.length / 2)]!;
    return { ...rest, line: flat, out: middle.z > 1e-9 ? 1 : -1 };
  });

/** Whether two look the same and move the same thing. */
export const sameRail = (a: Rail, b: Rail): boolean =>
  a.name === b.name &&
  a.place === b.place &&
  a.slide.from === b.slide.from &&
  a.slide.to === b.slide.to &&
  JSON.stringify(a.owner) === JSON.stringify(b.owner) &&
  a.line.length === b.line.length &&
  a.line.every((point, i) => samePoint(point, b.line[i]!));

export const sameKnob = (a: Knob, b: Knob): boolean =>
  a.rail === b.rail && a.end === b.end && samePoint(a.at, b.at);

const samePoint = (a: PlanePoint, b: PlanePoint): boolean => a.u === b.u && a.z === b.z;

/** The part that stands for the rail in the drawing: the part itself, or the load aboard. */
export const partOf = ({ owner }: Pick<Rail, 'owner'>): string => owner.id;

/**
 * Whether its stops can be taken: when its part is selected. A load that is ashore cannot be, so that its stops can while no part is.
 */
export const isOpen = (rail: Rail, craft: Craft, selected: readonly string[]): boolean =>
  selected.includes(partOf(rail)) ||
  (selected.length === 0 && rail.owner.kind === 'load' && !(rail.owner.id in craft.parts.byId));

/** How far a knob stands off the rail, and off its part where that lies over the stop; least gap between two knobs. px */
const OFF_RAIL = 22;
const OFF_PART = 14;
const APART = 26;
/** Room for a knob and the station beside it. */
const LABEL = 60;
/** Reach of a knob to a pointer and to a fingertip: the latter has a target of 32 px across. */
const MOUSE_REACH = 9;
const TOUCH_REACH = 16;

export function knobsOf(rail: Rail, figures: readonly Figure[], scale: number): Knob[] {
  const { slide, line, out } = rail;
  const spread = Math.max(0, APART - (slide.to - slide.from) * scale) / 2 / scale;
  return (['from', 'to'] as const).map((end) => {
    const stop = line.at(end === 'from' ? 0 : -1)!;
    const u = stop.u + (end === 'from' ? -spread : spread);
    const off = Math.max(OFF_RAIL / scale, ...clearances(rail, figures, u, stop.z, scale));
    return { rail, end, stop, at: { u, z: stop.z + out * off } };
  });
}

/** The knobs of several rails, one that would cover another moved farther off. */
export function knobsOfAll(rails: readonly Rail[], figures: readonly Figure[], scale: number): Knob[] {
  const [beside, apart] = [LABEL / scale, (0.7 * OFF_RAIL) / scale];
  const knobs: Knob[] = [];
  for (const knob of rails.flatMap((rail) => knobsOf(rail, figures, scale))) {
    let { at } = knob;
    const covers = (other: Knob) =>
      other.rail !== knob.rail && Math.abs(other.at.u - at.u) < beside && Math.abs(other.at.z - at.z) < apart;
    while (knobs.some(covers)) at = { ...at, z: at.z + knob.rail.out * apart };
    knobs.push({ ...knob, at });
  }
  return knobs;
}

/** How far a knob at a station has to stand off to clear the pieces of its part. */
function clearances(rail: Rail, figures: readonly Figure[], u: number, z: number, scale: number): number[] {
  const beside = OFF_PART / scale;
  return figures
    .filter(({ part, box }) => part === partOf(rail) && u > box.left - beside && u < box.right + beside)
    .map(({ box }) => (rail.out > 0 ? box.top - z : z - box.bottom) + beside)
    .filter((off) => off < (10 * OFF_RAIL) / scale);
}

/** The knob under the hand, the nearest within its reach. */
export function knobAt(
  knobs: readonly Knob[],
  view: View,
  { x, y, touch }: ScreenPoint & { readonly touch: boolean },
): Knob | null {
  let least = touch ? TOUCH_REACH : MOUSE_REACH;
  let best: Knob | null = null;
  for (const knob of knobs) {
    const at = toScreen(view, knob.at);
    const away = Math.hypot(at.x - x, at.y - y);
    if (away <= least) [best, least] = [knob, away];
  }
  return best;
}

export const knobKey = ({ rail: { owner }, end }: Pick<Knob, 'rail' | 'end'>): string =>
  `${owner.kind} ${owner.id} ${owner.kind === 'load' ? owner.option : ''} ${end}`;
