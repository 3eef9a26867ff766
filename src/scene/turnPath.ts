/**
 * The path of a turn seen from above: where the craft heads at the start is up, starboard then is to the right. A plane
 * point is u to starboard, z ahead, m. The path is that of the CB, from which the hull is drawn: ahead and to starboard of it.
 */
import type { Track, Turn } from '../report/turning/turns.ts';
import { formatNumber, formatQuantity } from '../units/format.ts';
import { inUnits } from '../units/sentence.ts';
import { type UnitSystem, unitOf } from '../units/units.ts';
import { fromAbove } from './flatten.ts';
import { sameVector } from './keepSame.ts';
import { planOutline } from './outline.ts';
import { rulerUnit, spacing } from './ruler.ts';
import type { Geometry } from './subject.ts';
import type { ThrustArrow } from './thrustArrows.ts';
import { turnedWords } from './thrustWords.ts';
import { fitted, type PlanePoint, type View } from './view.ts';

export type { Track, Turn };

/** One manoeuvre to be looked at. */
export interface Run {
  readonly label: string;
  /** Null when there is none, and `why` says so. */
  readonly track: Track | null;
  readonly why: string;
  /** What leads up to it. */
  readonly before: Track | null;
}

export function runsOf({ fromRest, fromCruise, stop }: Turn, units: UnitSystem): Run[] {
  const cruise = fromCruise.status === 'solved' ? fromCruise.value.track : null;
  return [
    runOf('From rest', fromRest, null, units),
    runOf('From cruise', fromCruise, null, units),
    runOf('Stopping', stop, cruise, units),
  ];
}

type Sailed = Turn['fromRest'] | Turn['stop'];

const runOf = (label: string, sailed: Sailed, before: Track | null, units: UnitSystem): Run =>
  sailed.status === 'solved'
    ? { label, track: sailed.value.track, why: '', before }
    : {
        label,
        track: null,
        why: inUnits([sailed.why, sailed.remedy].filter(Boolean).join(' '), units),
        before,
      };

/** The craft as it is drawn on its path, about its CB. */
export interface Sailor {
  readonly outline: readonly PlanePoint[];
  readonly nose: PlanePoint;
  /** Where thrust begins, and how much there is at full throttle, N; in the order of the thrusters of a track. */
  readonly thrust: readonly { readonly at: PlanePoint; readonly most: number }[];
}

export function sailorOf({ hull, cb, thrust }: Geometry): Sailor {
  const middle = fromAbove(cb);
  const aboutCb = ({ u, z }: PlanePoint): PlanePoint => ({ u: u - middle.u, z: z - middle.z });
  return {
    outline: planOutline(hull, OUTLINE_POINTS).map(aboutCb),
    nose: aboutCb({ u: 0, z: 0 }),
    thrust: thrust.map(({ at, thrust: most }) => ({ at: aboutCb(fromAbove(at)), most })),
  };
}

/** Whether two begin at one place and push alike, whichever way they are turned. */
export const sameThrust = (a: ThrustArrow, b: ThrustArrow): boolean =>
  a.thrust === b.thrust && sameVector(a.at, b.at);

const OUTLINE_POINTS = 40;

/** Where the craft is at a moment of a track, and how it moves. */
export interface Stand {
  /** Of the CB. */
  readonly at: PlanePoint;
  /** rad, + to starboard */
  readonly heading: number;
  /** m/s, whichever way */
  readonly speed: number;
  /** rad/s, + to starboard */
  readonly yawRate: number;
  /** Of each thruster: share of full throttle, and angle in yaw, rad. */
  readonly thrusters: readonly { readonly share: number; readonly angle: number }[];
}

export const durationOf = ({ time }: Track): number => time.at(-1) ?? 0;

/** At a time, s, held within the track; between its points in a straight line. */
export function standAt(track: Track, time: number): Stand {
  const last = track.time.length - 1;
  const whole = durationOf(track);
  const place = whole > 0 ? Math.min(Math.max(time / whole, 0), 1) * last : 0;
  const [i, j] = [Math.floor(place), Math.ceil(place)];
  const of = (values: readonly number[]) => values[i]! + (values[j]! - values[i]!) * (place - i);
  return {
    at: { u: of(track.y), z: of(track.x) },
    heading: of(track.heading),
    speed: Math.hypot(of(track.u), of(track.v)),
    yawRate: of(track.r),
    thrusters: track.thrusters.map(({ share, angles }) => ({ share, angle: of(angles) })),
  };
}

/** A point of the craft, ahead and to starboard of its CB, where it is at that moment. */
export function placedAt({ at, heading }: Pick<Stand, 'at' | 'heading'>, { u, z }: PlanePoint): PlanePoint {
  const [cos, sin] = [Math.cos(heading), Math.sin(heading)];
  return { u: at.u + u * cos + z * sin, z: at.z + z * cos - u * sin };
}

const GHOST_STEP = Math.PI / 6;
const MOST_GHOSTS = 24;

/** The first and the last moment, and one at every 30° of heading between. */
export function ghostsOf(track: Track): Stand[] {
  const from = track.heading[0] ?? 0;
  const turned = (heading: number) => Math.floor(Math.abs(heading - from) / GHOST_STEP + 1e-9);
  const times = track.time.filter(
    (_, i) => i > 0 && turned(track.heading[i]!) > Math.max(...track.heading.slice(0, i).map(turned)),
  );
  return [0, ...times.slice(0, MOST_GHOSTS), durationOf(track)].map((time) => standAt(track, time));
}

export const pathOf = ({ x, y }: Track): PlanePoint[] => x.map((z, i) => ({ u: y[i]!, z }));

/** A bar of a round length. */
export interface ScaleBar {
  readonly px: number;
  readonly words: string;
}

/** What stands still while a run is played. */
export interface TurnPage {
  readonly view: View;
  readonly path: readonly PlanePoint[];
  readonly before: readonly PlanePoint[];
  readonly ghosts: readonly (readonly PlanePoint[])[];
  readonly bar: ScaleBar;
}

const MARGIN = 18;
/** For the bar and its length. */
const FOOT = 34;
const LEAST_BAR = 56;

/** Null before the pane has a size. */
export function layTurn(
  track: Track,
  before: Track | null,
  { outline }: Sailor,
  { width, height }: { readonly width: number; readonly height: number },
  units: UnitSystem,
): TurnPage | null {
  if (width === 0 || height === 0) return null;
  const ghosts = ghostsOf(track).map((stand) => outline.map((point) => placedAt(stand, point)));
  const [path, lead] = [pathOf(track), before ? pathOf(before) : []];
  const start: View = { scale: 1, originX: 0, originY: 0, width, height, tilt: 0, pivot: 0 };
  const margins = { left: MARGIN, right: MARGIN, top: MARGIN, bottom: FOOT };
  const view = fitted(start, [...path, ...ghosts.flat()], margins);
  const { step, decimals } = spacing(view.scale, units, LEAST_BAR);
  const length = formatNumber(unitOf('length', units).toDisplay(step), decimals);
  return {
    view,
    path,
    before: lead,
    ghosts,
    bar: { px: step * view.scale, words: `${length} ${rulerUnit(units)}` },
  };
}

/** An arrow of thrust where the craft is, as long as it pushes; backwards when thrust is reversed. */
export function thrustAt(
  { thrust }: Sailor,
  stand: Stand,
  longest: number,
): { readonly at: PlanePoint; readonly tip: PlanePoint }[] {
  const greatest = Math.max(0, ...thrust.map(({ most }) => most));
  return thrust.flatMap(({ at, most }, i) => {
    const now = stand.thrusters[i];
    if (!now || now.share === 0 || greatest === 0) return [];
    const length = (longest * now.share * most) / greatest;
    const way = { u: at.u + length * Math.sin(now.angle), z: at.z + length * Math.cos(now.angle) };
    return [{ at: placedAt(stand, at), tip: placedAt(stand, way) }];
  });
}

export interface Figure {
  readonly name: string;
  readonly value: string;
}

/** The moment in figures. */
export const standFigures = (stand: Stand, time: number, units: UnitSystem): Figure[] => [
  { name: 'Time', value: formatQuantity(time, 'time', units) },
  { name: 'Heading', value: turnedWords('yaw', stand.heading, units) },
  { name: 'Speed', value: formatQuantity(stand.speed, 'speed', units) },
  { name: 'Yaw rate', value: formatQuantity(Math.abs(stand.yawRate), 'yawRate', units) },
];

/** The whole run in words. */
export function runInWords({ label, track, why }: Run, units: UnitSystem): string {
  if (!track) return `${label}: ${why}`;
  const [from, to] = [standAt(track, 0), standAt(track, durationOf(track))];
  const length = (value: number) => formatQuantity(Math.abs(value), 'length', units);
  const [ahead, side] = [to.at.z - from.at.z, to.at.u - from.at.u];
  return [
    `${label}: in ${formatQuantity(durationOf(track), 'time', units)} it yaws ${turnedWords('yaw', to.heading - from.heading, units)}`,
    `and moves ${length(ahead)} ${ahead < 0 ? 'back' : 'ahead'} and ${length(side)} to ${side < 0 ? 'port' : 'starboard'}, as it headed at the start of the turn.`,
  ].join(' ');
}
