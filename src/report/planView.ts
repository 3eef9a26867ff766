/** What a drawing needs of the ballast plan: where it puts things, what then hangs where, and the lines things may slide along. */
import { type Craft, listed } from '../craft/craft.ts';
import type { Place } from '../craft/placeSchema.ts';
import type { Fill, LeadPiece, Slide } from '../craft/planningSchema.ts';
import { stationOf, withStation } from '../craft/station.ts';
import { hungBallast, looseLoads, type Stowage, slidingParts, stowed } from '../craft/stowage.ts';
import type { CarryCurve, CarryPoint } from '../physics/ballast/carry.ts';
import type { PlanFound, PlannedLoad, PlannedWeight } from '../physics/ballast/plan.ts';
import { ballastMass } from '../physics/ballast/setting.ts';
import { positionOf } from '../physics/mass/position.ts';
import type { Geometry, Hull, PieceView, Vec3 } from './assessment.ts';

/** The plan as far as it is drawn and told. */
export type PlanToDraw = Pick<
  PlanFound,
  'craft' | 'weights' | 'slides' | 'loads' | 'deadBallast' | 'deadBallastToday'
>;

/** A stowage as a plan for the craft of now, whichever it was worked out for; what it names that is gone is passed over. */
export function stowageToDraw(today: Craft, stowage: Stowage): PlanToDraw {
  const craft = stowed(today, stowage);
  return {
    craft,
    weights: stowage.weights.flatMap((weight) => plannedWeight(today, weight)),
    slides: stowage.slides.flatMap(({ part, to }) => {
      const place = today.parts.byId[part]?.place;
      return place && stationOf(place) !== to ? [{ part, from: stationOf(place), to }] : [];
    }),
    loads: looseLoads(today).map(({ id }) => plannedLoad(today, craft, id)),
    deadBallast: ballastMass(listed(craft.parts)),
    deadBallastToday: ballastMass(listed(today.parts)),
  };
}

function plannedWeight(
  { hardpoints }: Craft,
  { hardpoint, pieces }: Stowage['weights'][number],
): PlannedWeight[] {
  const spot = hardpoints.byId[hardpoint];
  const mass = pieces.reduce((sum, piece) => sum + piece.mass * piece.count, 0);
  return spot ? [{ hardpoint, mass, pieces: spot.fill === 'pieces' ? pieces : [] }] : [];
}

function plannedLoad(today: Craft, then: Craft, load: string): PlannedLoad {
  const place = then.parts.byId[load]?.place ?? null;
  return {
    load,
    place,
    hardpoint: place && hardpointOf(then, load, place),
    placeToday: today.parts.byId[load]?.place ?? null,
  };
}

/** The hardpoint at which a load hangs, of those where it may; null when it hangs at none. */
export function hardpointOf({ loads, hardpoints }: Craft, load: string, place: Place): string | null {
  const spot = JSON.stringify(place);
  const at = loads.byId[load]?.options.find(
    (option) =>
      option.kind === 'hardpoint' && JSON.stringify(hardpoints.byId[option.hardpoint]?.place) === spot,
  );
  return at?.kind === 'hardpoint' ? at.hardpoint : null;
}

export type CarrySpot = Pick<CarryPoint, 'station' | 'mass' | 'deadBallast' | 'proven'>;

export interface CurveToDraw extends Pick<CarryCurve, 'complete'> {
  /** Nose to tail. */
  readonly points: readonly CarrySpot[];
}

/** A piece of a part that the plan puts somewhere else. */
export interface Ghost {
  /** As it is with the plan carried out. */
  readonly piece: PieceView;
  /** The middle of it today, m; null when it is ashore. */
  readonly from: Vec3 | null;
}

export interface HungWeight {
  readonly hardpoint: string;
  readonly at: Vec3;
  /** kg */
  readonly mass: number;
  /** Empty where ballast is cut to measure. */
  readonly pieces: readonly LeadPiece[];
}

export interface PlanView {
  readonly ghosts: readonly Ghost[];
  /** Middles today of the loads it leaves ashore. */
  readonly ashore: readonly { readonly load: string; readonly at: Vec3 }[];
  readonly weights: readonly HungWeight[];
}

/** Shorter moves are not seen, m. */
const LEAST_MOVE = 5e-4;

/** `today` and `then`: where everything is without and with the plan. */
export function planView(plan: PlanToDraw, today: Geometry, then: Geometry): PlanView {
  const moved = new Set([
    ...plan.slides.map(({ part }) => part),
    ...plan.loads.filter(({ place }) => place).map(({ load }) => load),
  ]);
  const middleToday = ({ part, copy }: PieceView) =>
    today.pieces.find((piece) => piece.part === part && piece.copy === copy)?.middle ?? null;
  return {
    ghosts: then.pieces
      .filter(({ part }) => moved.has(part))
      .map((piece) => ({ piece, from: middleToday(piece) }))
      .filter(({ piece, from }) => !from || distance(piece.middle, from) >= LEAST_MOVE),
    ashore: plan.loads
      .filter(({ place }) => !place)
      .flatMap(({ load }) => {
        const piece = today.pieces.find(({ part }) => part === load);
        return piece ? [{ load, at: piece.middle }] : [];
      }),
    weights: plan.weights.flatMap((weight) => {
      const at = today.hardpoints.find(({ hardpoint }) => hardpoint === weight.hardpoint)?.at;
      return at ? [{ ...weight, at }] : [];
    }),
  };
}

const distance = (a: Vec3, b: Vec3): number => Math.hypot(a[0] - b[0], a[1] - b[1], a[2] - b[2]);

export interface HardpointFill {
  readonly hardpoint: string;
  /** What hangs there, ballast and loads, and the most that may, kg. */
  readonly mass: number;
  readonly limit: number;
  readonly fill: Fill;
}

/** How full the hardpoints of a craft are: today's of the craft itself, the plan's of the craft that it makes. */
export function hardpointFills(craft: Craft): HardpointFill[] {
  const ballast = hungBallast(craft);
  return listed(craft.hardpoints).map(({ id, place, limit, fill }) => ({
    hardpoint: id,
    mass: ballastMass(ballast.get(id) ?? []) + loadsAt(craft, id, place),
    limit,
    fill,
  }));
}

/** Loads aboard at the very place of a hardpoint at which they may hang, kg. */
function loadsAt({ loads, parts }: Craft, hardpoint: string, place: Place): number {
  const spot = JSON.stringify(place);
  return listed(loads)
    .filter(({ options }) =>
      options.some((each) => each.kind === 'hardpoint' && each.hardpoint === hardpoint),
    )
    .map(({ id }) => parts.byId[id])
    .filter((part) => part !== undefined && JSON.stringify(part.place) === spot)
    .reduce((sum, part) => sum + part!.mass * (part!.copies.kind === 'pair' ? 2 : part!.copies.count), 0);
}

/** A stretch along which a part may slide or a load may hang. */
export interface SlideLine {
  readonly owner: SlideOwner;
  readonly name: string;
  readonly place: Place;
  readonly slide: Slide;
  /** From its foremost station to its aftmost, m. */
  readonly line: readonly Vec3[];
}

export type SlideOwner =
  | { readonly kind: 'part'; readonly id: string }
  /** `option`: which of the places where the load may go. */
  | { readonly kind: 'load'; readonly id: string; readonly option: number };

/** Those that a plan may use: not of locked parts. A load aboard moves along the places given for the load. */
export const slideLines = (craft: Craft, hull: Hull): SlideLine[] => [
  ...slidingParts(craft).map(
    ({ id, name, kind, place, slide }): SlideLine => ({
      owner: { kind: 'part', id },
      name: name || kind,
      place,
      slide,
      line: alongPlace(place, slide, hull),
    }),
  ),
  ...looseLoads(craft).flatMap(({ id, name, options }) =>
    options.flatMap((option, i): SlideLine[] => {
      if (option.kind === 'hardpoint') return [];
      const { place, from, to } = option;
      const slide = { from, to };
      const owner = { kind: 'load', id, option: i } as const;
      return [{ owner, name: name || 'load', place, slide, line: alongPlace(place, slide, hull) }];
    }),
  ),
];

const STEPS = 24;

/** On the skin along the skin, below the keel along the keel at its drop; straight on the axis and where it is free. */
export function alongPlace(place: Place, { from, to }: Slide, hull: Hull): Vec3[] {
  const steps = place.kind === 'skin' || place.kind === 'keel' ? STEPS : 1;
  return Array.from({ length: steps + 1 }, (_, i) =>
    positionOf(withStation(place, from + ((to - from) * i) / steps), hull),
  );
}
