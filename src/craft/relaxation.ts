/** One limit that a ballast plan has to keep, moved to another value. What a plan advises, in terms of the craft file. */
import type { Craft } from './craft.ts';
import type { Load, LoadOption, Slide } from './planningSchema.ts';

export type Relaxation = Target | HardpointLimit | SlideEnd | LoadSlideEnd | MorePieces | LoadAshore;

export type TargetKey = 'pitchTolerance' | 'heelTolerance' | 'heaviest' | 'lightest' | 'pendulumDepth';

/** A target: rad, kg of heaviness, or m. */
export interface Target {
  readonly kind: TargetKey;
  readonly to: number;
}

/** kg */
export interface HardpointLimit {
  readonly kind: 'hardpoint';
  readonly hardpoint: string;
  readonly to: number;
}

/** An end of a part's slide, station in m. */
export interface SlideEnd {
  readonly kind: 'slide';
  readonly part: string;
  readonly end: keyof Slide;
  readonly to: number;
}

/** An end of the stretch on which a load may go, station in m. */
export interface LoadSlideEnd {
  readonly kind: 'loadSlide';
  readonly load: string;
  readonly option: number;
  readonly end: keyof Slide;
  readonly to: number;
}

/** How many pieces of a mass there are. */
export interface MorePieces {
  readonly kind: 'pieces';
  readonly mass: number;
  readonly to: number;
}

/** A load that has to be carried need not be. */
export interface LoadAshore {
  readonly kind: 'ashore';
  readonly load: string;
}

/** Moves the limit, in place: replaces entries, changes none of them inside. A limit that is gone is passed over. */
export function relax(craft: Craft, relaxation: Relaxation): void {
  switch (relaxation.kind) {
    case 'hardpoint':
      replace(craft.hardpoints.byId, relaxation.hardpoint, (it) => ({ ...it, limit: relaxation.to }));
      break;
    case 'slide':
      replace(craft.parts.byId, relaxation.part, (it) => ({
        ...it,
        slide: it.slide && { ...it.slide, [relaxation.end]: relaxation.to },
      }));
      break;
    case 'loadSlide':
      replace(craft.loads.byId, relaxation.load, (it) => ({ ...it, options: stretched(it, relaxation) }));
      break;
    case 'ashore':
      replace(craft.loads.byId, relaxation.load, (it) => ({ ...it, must: false }));
      break;
    case 'pieces':
      craft.pieces = craft.pieces.map((it) =>
        it.mass === relaxation.mass ? { ...it, count: relaxation.to } : it,
      );
      break;
    default:
      craft.targets = withTarget(craft.targets, relaxation);
  }
}

const stretched = ({ options }: Load, { option: index, end, to }: LoadSlideEnd): LoadOption[] =>
  options.map((option, k) => (k === index && option.kind === 'slide' ? { ...option, [end]: to } : option));

/** The craft with the limit moved; what it does not touch stays the same objects. */
export function relaxed(craft: Craft, relaxation: Relaxation): Craft {
  const copy: Craft = { ...craft };
  for (const list of ['parts', 'hardpoints', 'loads'] as const) {
    Object.assign(copy, { [list]: { ...craft[list], byId: { ...craft[list].byId } } });
  }
  relax(copy, relaxation);
  return copy;
}

function replace<T>(byId: Record<string, T>, id: string, change: (entry: T) => T): void {
  const entry = byId[id];
  if (entry) byId[id] = change(entry);
}

function withTarget(targets: Craft['targets'], { kind, to }: Target): Craft['targets'] {
  switch (kind) {
    case 'pendulumDepth':
      return { ...targets, leastPendulumDepth: to };
    case 'heaviest':
      return { ...targets, heaviness: { ...targets.heaviness, most: to } };
    case 'lightest':
      return { ...targets, heaviness: { ...targets.heaviness, least: to } };
    default:
      return { ...targets, [kind]: to };
  }
}
