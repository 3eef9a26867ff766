/**
 * Where a thruster had better sit: it is moved through every station from nose to tail, and at each the ballast is planned
 * anew and the craft with that plan turned, blown at from the side and flown ahead.
 */
import { type Craft, listed } from '../../craft/craft.ts';
import type { Place } from '../../craft/placeSchema.ts';
import { stationOf } from '../../craft/station.ts';
import type { LinearSolver } from '../../numeric/linearProgram/result.ts';
import { infeasible, type Outcome, solved } from '../../numeric/outcome.ts';
import { type CraftState, craftStateOf } from '../craftState.ts';
import type { TurnAsked } from '../turning/asked.ts';
import { BallastAlong } from './ballastAt.ts';
import { type FiguresAt, figuresAlong } from './figures.ts';
import { heldAt, placeAt, stationsOf, type ThrusterPart } from './moved.ts';
import { judged, type PlacedPoint } from './placedPoint.ts';
import { type Meant, meantOf, strikesOf } from './strikes.ts';

export interface StudyOptions {
  /** How many stations, first and last among them, ≥ 2. Default 61. */
  readonly stations?: number;
  /** How it is flown. Default full throttle, hardest to starboard, from the steady speed. */
  readonly asked?: TurnAsked;
  /** Of a study of the same that was stopped: the stations it had done, nose first, which are not worked out again. */
  readonly done?: readonly PlacedPoint[];
  /** Told about every twentieth of the way. */
  readonly onProgress?: (progress: StudyProgress) => void;
  readonly shouldStop?: () => boolean;
}

export interface StudyProgress {
  /** 0 … 1 */
  readonly share: number;
  /** Nose first, so far; `best` among these. */
  readonly points: readonly PlacedPoint[];
  readonly today: PlacedPoint;
}

export interface PlacementStudy {
  readonly part: string;
  /** Nose first. */
  readonly points: readonly PlacedPoint[];
  /** The thruster where it is now, the ballast planned for that too. */
  readonly today: PlacedPoint;
  /** False when it was stopped before the last station. */
  readonly complete: boolean;
}

const USUAL: TurnAsked = { throttle: 1, vector: null, speed: null };
/** How often progress is told. */
const TOLD = 20;

/** Infeasible only when the hull cannot be formed, or the part is no thruster of which anything is known. */
export function placementStudy(
  craft: Craft,
  part: string,
  solver: LinearSolver,
  options: StudyOptions = {},
): Outcome<PlacementStudy> {
  const moving = thrusterParts(craft).find(({ id }) => id === part);
  if (!moving) return infeasible('There are no thrust figures for this part.', whoHas(craft));
  const state = craftStateOf(craft);
  if (state.status === 'infeasible') return state;
  const ballast = new BallastAlong(solver);
  try {
    const meant = meantOf(state.value, part);
    return solved(studyOf({ craft, moving, state: state.value, meant, ballast, options }));
  } finally {
    ballast.dispose();
  }
}

/** The parts that can be moved by a study. */
export const thrusterParts = ({ parts }: Craft): ThrusterPart[] =>
  listed(parts).filter((part): part is ThrusterPart => part.thruster !== null);

function whoHas(craft: Craft): string {
  const parts = thrusterParts(craft).map(({ id, name }) => (name ? `${id} (${name})` : id));
  return parts.length > 0
    ? `Parts that have them: ${parts.join(', ')}.`
    : 'No part of this craft has any: enter the thrust of a thruster first.';
}

interface Study {
  readonly craft: Craft;
  readonly moving: ThrusterPart;
  /** Of the craft as it is. */
  readonly state: CraftState;
  readonly meant: Meant;
  readonly ballast: BallastAlong;
  readonly options: StudyOptions;
}

function studyOf(study: Study): PlacementStudy {
  const { moving, state, options } = study;
  const { stations = 61, asked = USUAL, done = [], onProgress, shouldStop } = options;
  const figuresAt = figuresAlong(state, moving.id, asked);
  const today = pointAt(study, figuresAt, moving.place);
  const points = [...done];
  let told = done.length / stations;
  const result = (complete: boolean): PlacementStudy => ({
    part: moving.id,
    ...judged(points, today),
    complete,
  });
  for (const station of stationsOf(moving, state.hull, stations).slice(done.length)) {
    if (shouldStop?.()) return result(false);
    const point = pointAt(study, figuresAt, placeAt(moving, station, state.hull));
    // Asked to stop meanwhile, the search for a plan may have broken off.
    if (shouldStop?.()) return result(false);
    points.push({ ...point, wireChange: point.wire - today.wire });
    const share = points.length / stations;
    if (share < 1 && share < told + 1 / TOLD) continue;
    told = share;
    onProgress?.({ share, ...judged(points, today) });
  }
  return result(true);
}

function pointAt(
  { craft, moving, meant, ballast, options }: Study,
  figuresAt: FiguresAt,
  place: Place,
): PlacedPoint {
  const held = heldAt(craft, moving, place);
  const plan = ballast.at(held, options.shouldStop);
  const state = 'why' in plan ? stateOf(held) : plan.state;
  const found =
    'why' in plan
      ? { ballast: null, ballastProven: false, stowage: null, why: plan.why }
      : { ballast: plan.mass, ballastProven: plan.proven, stowage: plan.stowage, why: '' };
  return {
    station: stationOf(place),
    place,
    ...found,
    wire: wireOf(state),
    wireChange: 0,
    ...figuresAt(state),
    ...strikesOf(state, moving.id, meant),
    best: false,
  };
}

/** The hull is that of the craft given, which could be formed. */
function stateOf(craft: Craft): CraftState {
  const state = craftStateOf(craft);
  if (state.status === 'infeasible') throw new Error(state.why);
  return state.value;
}

const wireOf = ({ branches }: CraftState): number =>
  Object.values(branches)
    .flat()
    .reduce((sum, { mass }) => sum + mass, 0);
