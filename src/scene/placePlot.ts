/**
 * A placement study on the station scale of the side view: one strip for each curve, one below the other, each with its name and a
 * scale of its own; bands where the propeller would strike something; where the thruster is today and where it is best. px.
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
  /** The stretch not worked out yet. */
  readonly waiting: Band | null;
  readonly left: number;
  readonly right: number;
}

export interface StripRoom {
  readonly top: number;
  readonly foot: number;
}

type Scale = Pick<View, 'scale' | 'originX'>;

const xOf = ({ scale, originX }: Scale, station: number): number => originX + station * scale;

/** Between strips, so that a curve at the foot of one and at the top of the next stay apart. */
const GAP = 6;

/** `length`: of the hull, m. */
export function layPlace(
  { points, today, complete }: StudyToDraw,
  view: Scale,
  length: number,
  { top, foot }: StripRoom,
  units: UnitSystem,
): PlacePage {
  const stations = points.map(({ station }) => xOf(view, station));
  const high = (foot - top + GAP) / CURVES.length;
  const strips = CURVES.map((curve, i) =>
    stripOf(curve, points, today, stations, { top: top + i * high, foot: top + (i + 1) * high - GAP }, units),
  );
  const [left, right] = [xOf(view, 0), xOf(view, length)];
  return {
    strips,
    stations,
    best: points.flatMap(({ best }, i) => (best ? [i] : [])),
    today: today && xOf(view, today.station),
    struck: struckBands(points, stations),
    waiting: complete ? null : { left: stations.at(-1) ?? left, right },
    left,
    right,
  };
}

function stripOf(
  curve: Curve,
  points: readonly StudySpot[],
  today: StudySpot | null,
  stations: readonly number[],
  { top, foot }: StripRoom,
  units: UnitSystem,
): Strip {
  const values = points.map(curve.value);
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
function struckBands(points: readonly StudySpot[], stations: readonly number[]): Band[] {
  const bands: { left: number; right: number }[] = [];
  points.forEach(({ strikes }, i) => {
    if (!strikes) return;
    const x = stations[i]!;
    const [before, after] = [stations[i - 1] ?? x, stations[i + 1] ?? x];
    const last = bands.at(-1);
    if (last && points[i - 1]!.strikes) last.right = (x + after) / 2;
    else bands.push({ left: (before + x) / 2, right: (x + after) / 2 });
  });
  return bands;
}

interface Extent {
  readonly width: number;
  readonly height: number;
}

/** Where in its strip a name hides least of the curve: at either end or in the middle, above or below. */
export function nameSpot(
  { heights, top, foot }: Strip,
  { stations, left, right }: PlacePage,
  pane: number,
  { width, height }: Extent,
): { readonly left: number; readonly top: number } {
  const [from, to] = [Math.max(left, 0) + 4, Math.min(right, pane) - 4 - width];
  const spots = [from, to, (from + to) / 2].flatMap((x) =>
    [top, foot - height].map((y) => ({ left: x, top: y })),
  );
  const hidden = (spot: { left: number; top: number }): number =>
    heights.filter((y, i) => {
      const x = stations[i]!;
      return (
        y !== null &&
        x > spot.left - 4 &&
        x < spot.left + width + 4 &&
        y > spot.top - 3 &&
        y < spot.top + height + 3
      );
    }).length;
  return spots.reduce((best, spot) => (hidden(spot) < hidden(best) ? spot : best));
}
