/**
 * A placement study on the station scale of the side view: one strip for each curve, one below the other, each with its name and a
 * scale of its own; bands where the propeller would strike something or no ballast plan can be made; where the thruster is today and where it is best. px.
 */
import type { PlacedPoint } from '../report/turning/studies.ts';
import type { Quantity } from '../units/units.ts';
import { scaleOf } from './roundScale.ts';
import type { UnitSystem } from './subject.ts';
import type { ScreenPoint, View } from './view.ts';

/** A station as far as it is drawn and told. */
export type StudySpot = Pick<
  PlacedPoint,
  | 'station'
  | 'ballast'
  | 'wire'
  | 'timeTo90'
  | 'gustHeld'
  | 'perWatt'
  | 'radius'
  | 'cruisePitch'
  | 'why'
  | 'cautions'
  | 'strikes'
  | 'best'
>;

export interface StudyToDraw {
  /** Nose to tail. */
  readonly points: readonly StudySpot[];
  readonly today: StudySpot | null;
  readonly complete: boolean;
}

export interface Curve {
  readonly name: string;
  readonly quantity: Quantity;
  /** Which way is better. */
  readonly better: 'less' | 'more';
  /** Values beyond so many times the least are drawn at the top: where the arm is nil the time has no end. */
  readonly cap?: number;
  value(spot: StudySpot): number | null;
}

export const CURVES: readonly Curve[] = [
  {
    name: 'Lead and wire',
    quantity: 'mass',
    better: 'less',
    value: ({ ballast, wire }) => (ballast === null ? null : ballast + wire),
  },
  { name: 'Time to 90°', quantity: 'time', better: 'less', cap: 4, value: ({ timeTo90 }) => timeTo90 },
  { name: 'Side gust held', quantity: 'speed', better: 'more', value: ({ gustHeld }) => gustHeld },
  { name: 'Thrust per watt', quantity: 'ratio', better: 'more', value: ({ perWatt }) => perWatt },
];

export interface Band {
  readonly left: number;
  readonly right: number;
}

export interface Strip {
  readonly curve: Curve;
  readonly top: number;
  readonly foot: number;
  /** Numbers at the top and the foot of its scale, the top one with the unit. */
  readonly high: string;
  readonly low: string;
  /** One run of points for each stretch without a gap. */
  readonly runs: readonly (readonly ScreenPoint[])[];
  /** Height at each station of the study; null where there is no figure. */
  readonly heights: readonly (number | null)[];
  readonly today: number | null;
}

export interface PlacePage {
  readonly strips: readonly Strip[];
  /** x of each station of the study. */
  readonly stations: readonly number[];
  /** Indices of the stations that nothing beats. */
  readonly best: readonly number[];
  readonly today: number | null;
  /** Where the propeller would strike. */
  readonly struck: readonly Band[];
  /** Where there is no ballast plan. */
  readonly unplanned: readonly Band[];
  /** The stretch not worked out yet. */
  readonly waiting: Band | null;
  readonly left: number;
  readonly right: number;
  readonly names: NamesAt;
}

/** Where the names of the curves stand: fore of the nose, or each on a line of its own above its curve. */
export type NamesAt = 'beside' | 'above';

export interface StripRoom {
  readonly top: number;
  readonly foot: number;
}

type Scale = Pick<View, 'scale' | 'originX'>;

const xOf = ({ scale, originX }: Scale, station: number): number => originX + station * scale;

/** Between strips, so that a curve at the foot of one and at the top of the next stay apart. */
const GAP = 6;

/** Height of a line of names. */
export const NAME_LINE = 12;
/** Between a name and what is beside it. */
export const NAME_APART = 8;

/** `widest`: of the names. */
export const namesAt = ({ points }: StudyToDraw, view: Scale, widest: number): NamesAt =>
  xOf(view, Math.min(0, points[0]?.station ?? 0)) >= widest + 2 * NAME_APART ? 'beside' : 'above';

/** `length`: of the hull, m. */
export function layPlace(
  { points, today, complete }: StudyToDraw,
  view: Scale,
  length: number,
  { top, foot }: StripRoom,
  units: UnitSystem,
  names: NamesAt = 'beside',
): PlacePage {
  const stations = points.map(({ station }) => xOf(view, station));
  const high = (foot - top + GAP) / CURVES.length;
  const head = names === 'above' ? NAME_LINE : 0;
  const strips = CURVES.map((curve, i) => {
    const strip = { top: top + i * high + head, foot: top + (i + 1) * high - GAP };
    return stripOf(curve, points, today, stations, strip, units);
  });
  const [left, right] = [xOf(view, 0), xOf(view, length)];
  return {
    strips,
    stations,
    best: points.flatMap(({ best }, i) => (best ? [i] : [])),
    today: today && xOf(view, today.station),
    struck: bandsOf(points, stations, ({ strikes }) => strikes),
    unplanned: bandsOf(points, stations, withoutPlan),
    waiting: complete ? null : { left: stations.at(-1) ?? left, right },
    left,
    right,
    names,
  };
}

const withoutPlan = ({ ballast }: StudySpot): boolean => ballast === null;

function stripOf(
  curve: Curve,
  points: readonly StudySpot[],
  today: StudySpot | null,
  stations: readonly number[],
  { top, foot }: StripRoom,
  units: UnitSystem,
): Strip {
  // Without a plan the figures are of another craft: that of today.
  const values = points.map((point) => (withoutPlan(point) ? null : curve.value(point)));
  const now = today && curve.value(today);
  const known = [...values, now].filter((value) => value !== null);
  const most = (curve.cap ?? Number.POSITIVE_INFINITY) * Math.min(...known);
  const capped = known.some((value) => value > most);
  const held = known.map((value) => (capped ? Math.min(value, most) : value));
  const scale = scaleOf(held, curve.quantity, units);
  const height = (value: number | null): number | null => {
    if (value === null) return null;
    return Math.max(top, foot - ((foot - top) * (value - scale.low)) / (scale.high - scale.low));
  };
  const heights = values.map(height);
  return {
    curve,
    top,
    foot,
    high: capped ? `${scale.labels.high} +` : scale.labels.high,
    low: scale.labels.low,
    runs: runsOf(stations, heights),
    heights,
    today: height(now),
  };
}

function runsOf(stations: readonly number[], heights: readonly (number | null)[]): ScreenPoint[][] {
  const runs: ScreenPoint[][] = [];
  heights.forEach((y, i) => {
    if (y === null) return;
    const at = { x: stations[i]!, y };
    if (i > 0 && heights[i - 1] !== null) runs.at(-1)!.push(at);
    else runs.push([at]);
  });
  return runs;
}

/** Each station stands for the stretch half-way to its neighbours. */
function bandsOf(
  points: readonly StudySpot[],
  stations: readonly number[],
  isIn: (spot: StudySpot) => boolean,
): Band[] {
  const bands: { left: number; right: number }[] = [];
  points.forEach((point, i) => {
    if (!isIn(point)) return;
    const x = stations[i]!;
    const [before, after] = [stations[i - 1] ?? x, stations[i + 1] ?? x];
    const last = bands.at(-1);
    if (last && isIn(points[i - 1]!)) last.right = (x + after) / 2;
    else bands.push({ left: (before + x) / 2, right: (x + after) / 2 });
  });
  return bands;
}
