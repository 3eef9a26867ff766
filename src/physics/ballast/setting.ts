/** What a plan may decide, gathered from the craft file: weights at hardpoints, slides, loads and where each may go. */
import { type Craft, listed } from '../../craft/craft.ts';
import type { Place } from '../../craft/placeSchema.ts';
import type { Fill, LeadPiece, Load, LoadOption, Slide } from '../../craft/planningSchema.ts';
import type { Part, WireRun } from '../../craft/schema.ts';
import { stationOf, withStation } from '../../craft/station.ts';
import { hungBallast, loadAsPart, looseLoads, slidingParts } from '../../craft/stowage.ts';
import { type Outcome, solved } from '../../numeric/outcome.ts';
import type { Vec3 } from '../../numeric/vector.ts';
import { type CraftState, craftStateOf } from '../craftState.ts';
import { positionOf } from '../mass/position.ts';
import { runsAt } from './share.ts';

export interface Setting {
  readonly craft: Craft;
  /** The craft as it is today. */
  readonly today: CraftState;
  readonly hardpoints: readonly WeightSpot[];
  readonly slides: readonly SlideChoice[];
  readonly loads: readonly LoadChoice[];
  /** Pieces of lead at hand, none with a count of 0. */
  readonly sizes: readonly LeadPiece[];
  /** Whether every plan must hold for every mass within its tolerance. */
  readonly robust: boolean;
  /** Where a load of any mass is tried, m; null when none is. */
  readonly trial: Vec3 | null;
}

export interface WeightSpot {
  readonly id: string;
  readonly name: string;
  readonly at: Vec3;
  /** Greatest mass there, and what of it is left beside ballast and loads that no plan may touch, kg. */
  readonly limit: number;
  readonly room: number;
  readonly fill: Fill;
}

export interface SlideChoice {
  readonly part: Part;
  readonly runs: readonly WireRun[];
  /** Stations, m. */
  readonly from: number;
  readonly to: number;
  readonly now: number;
}

export interface LoadChoice {
  readonly load: Load;
  readonly options: readonly LoadSite[];
  readonly runs: readonly WireRun[];
  /** The part that stands for it today; null when it is ashore. */
  readonly aboard: Part | null;
  /** Index of the option at which it is aboard; null when ashore or somewhere else. */
  readonly now: number | null;
}

export interface LoadSite {
  /** Id of the hardpoint; null on a slide. */
  readonly hardpoint: string | null;
  readonly place: Place;
  readonly slide: Slide | null;
}

export function settingOf(craft: Craft, robust: boolean): Outcome<Setting> {
  const today = craftStateOf(craft);
  if (today.status === 'infeasible') return today;
  const { hull } = today.value;
  return solved({
    craft,
    today: today.value,
    hardpoints: listed(craft.hardpoints).map(({ id, name, place, limit, fill }) => ({
      id,
      name,
      at: positionOf(place, hull),
      limit,
      room: Math.max(0, limit - heldAt(craft, place)),
      fill,
    })),
    slides: slidingParts(craft).map((part) => ({
      part,
      runs: runsAt(craft, part.id),
      ...part.slide,
      now: stationOf(part.place),
    })),
    loads: looseLoads(craft).map((load) => loadChoice(craft, load)),
    sizes: craft.pieces.filter(({ count }) => count > 0),
    robust,
    trial: null,
  });
}

/** Whether pieces or places are to be chosen, so that it is not enough to follow a slope. */
export const hasChoices = ({ hardpoints, sizes, loads }: Setting): boolean =>
  (sizes.length > 0 && hardpoints.some(({ fill }) => fill === 'pieces')) ||
  loads.some(({ load, options }) => !load.must || options.length > 1);

/** Ballast and loads at a place that no plan may touch, kg. */
function heldAt(craft: Craft, place: Place): number {
  const spot = JSON.stringify(place);
  const held = listed(craft.parts).filter(
    (part) =>
      (part.kind === 'ballast'
        ? part.locked
        : part.kind === 'load' && (part.locked || !craft.loads.byId[part.id])) &&
      JSON.stringify(part.place) === spot,
  );
  return held.reduce((sum, part) => sum + massOf(part), 0);
}

/** All its pieces, kg. */
export const massOf = ({ mass, copies }: Part): number => mass * (copies.kind === 'pair' ? 2 : copies.count);

function loadChoice(craft: Craft, load: Load): LoadChoice {
  const options = load.options.map((option) => siteOf(craft, option));
  const aboard = craft.parts.byId[load.id] ?? null;
  const now = aboard ? options.findIndex((site) => isAt(site, aboard.place)) : -1;
  return { load, options, runs: runsAt(craft, load.id), aboard, now: now < 0 ? null : now };
}

const siteOf = (craft: Craft, option: LoadOption): LoadSite =>
  option.kind === 'slide'
    ? { hardpoint: null, place: option.place, slide: { from: option.from, to: option.to } }
    : { hardpoint: option.hardpoint, place: craft.hardpoints.byId[option.hardpoint]!.place, slide: null };

function isAt({ place, slide }: LoadSite, at: Place): boolean {
  const spot = slide && place.kind === at.kind ? withStation(place, stationOf(at)) : place;
  const inside = !slide || (stationOf(at) >= slide.from && stationOf(at) <= slide.to);
  return inside && JSON.stringify(spot) === JSON.stringify(at);
}

/** The part that a load would be at a site and station. */
export const partAt = (
  { craft }: Setting,
  { load }: LoadChoice,
  site: LoadSite,
  station: number | null,
): Part =>
  loadAsPart(
    craft,
    load,
    site.slide && station !== null ? withStation(site.place, station) : { ...site.place },
    site.slide,
  );

/** Useful load that it counts as, kg: all its pieces. */
export const loadMass = ({ load, aboard }: LoadChoice): number => (aboard ? massOf(aboard) : load.mass);

/** Ballast that no plan may touch: locked, or hanging elsewhere than at a hardpoint. kg */
export function fixedBallast(craft: Craft): number {
  const hung = new Set([...hungBallast(craft).values()].flat());
  return ballastMass(listed(craft.parts).filter((part) => !hung.has(part)));
}

export const ballastMass = (parts: readonly Part[]): number =>
  parts.filter(({ kind }) => kind === 'ballast').reduce((sum, part) => sum + massOf(part), 0);
