/**
 * The curve of what can be carried where, on the station scale of the side view: an area as high as the most useful load at each
 * station, a line for the dead ballast that it leaves, both on one axis of masses; bands where nothing can hang. px.
 */

import type { CarrySpot, CurveToDraw } from '../report/planView.ts';
import { formatNumber } from '../units/format.ts';
import { unitOf } from '../units/units.ts';
import { roundUp } from './roundScale.ts';
import type { UnitSystem } from './subject.ts';
import type { ScreenPoint, View } from './view.ts';

export interface SpotOnPage {
  readonly x: number;
  /** Heights of the load and of the ballast; null where nothing can hang. */
  readonly load: number | null;
  readonly ballast: number | null;
}

export interface CarryPage {
  /** One for each point of the curve. */
  readonly spots: readonly SpotOnPage[];
  /** One run of points for each stretch without a gap. */
  readonly loads: readonly (readonly ScreenPoint[])[];
  readonly ballast: readonly (readonly ScreenPoint[])[];
  readonly gaps: readonly Band[];
  /** The stretch not worked out yet. */
  readonly waiting: Band | null;
  readonly ticks: readonly { readonly y: number; readonly label: string }[];
  readonly foot: number;
  readonly left: number;
  readonly right: number;
}

export interface Band {
  readonly left: number;
  readonly right: number;
}

export interface PlotRoom {
  /** Of the plot itself: the highest mass and no mass. */
  readonly top: number;
  readonly foot: number;
}

type Scale = Pick<View, 'scale' | 'originX'>;

const xOf = ({ scale, originX }: Scale, station: number): number => originX + station * scale;

/** `length`: of the hull, m. */
export function layCarry(
  { points, complete }: CurveToDraw,
  view: Scale,
  length: number,
  { top, foot }: PlotRoom,
  units: UnitSystem,
): CarryPage {
  const most = Math.max(0, ...points.flatMap(({ mass, deadBallast }) => [mass ?? 0, deadBallast ?? 0]));
  const ticks = massTicks(most, units);
  const full = Math.max(most, ticks.at(-1)?.at ?? 0) || 1;
  const yOf = (mass: number) => foot - ((foot - top) * mass) / full;
  const runs = runsOf(points);
  const drawn = (value: (spot: CarrySpot) => number | null) =>
    runs
      .filter((run) => run[0]!.mass !== null)
      .map((run) => run.map((spot) => ({ x: xOf(view, spot.station), y: yOf(value(spot) ?? 0) })));
  const [left, right] = [xOf(view, 0), xOf(view, length)];
  const last = points.at(-1);
  const height = (mass: number | null) => (mass === null ? null : yOf(mass));
  return {
    spots: points.map(({ station, mass, deadBallast }) => ({
      x: xOf(view, station),
      load: height(mass),
      ballast: height(deadBallast),
    })),
    loads: drawn(({ mass }) => mass),
    ballast: drawn(({ deadBallast }) => deadBallast),
    gaps: runs.filter((run) => run[0]!.mass === null).map((run) => bandOf(run, points, view)),
    waiting: complete ? null : { left: last ? xOf(view, last.station) : left, right },
    ticks: ticks.map(({ at, label }) => ({ y: yOf(at), label })),
    ...{ foot, left, right },
  };
}

/** Neighbouring points that can, or cannot, hold a load. */
function runsOf(points: readonly CarrySpot[]): CarrySpot[][] {
  const runs: CarrySpot[][] = [];
  for (const point of points) {
    const run = runs.at(-1);
    if (run && (run[0]!.mass === null) === (point.mass === null)) run.push(point);
    else runs.push([point]);
  }
  return runs;
}

/** A gap reaches to the last station on either side that is none. */
function bandOf(run: readonly CarrySpot[], points: readonly CarrySpot[], view: Scale): Band {
  const before = points[points.indexOf(run[0]!) - 1] ?? run[0]!;
  const after = points[points.indexOf(run.at(-1)!) + 1] ?? run.at(-1)!;
  return { left: xOf(view, before.station), right: xOf(view, after.station) };
}

const MOST_TICKS = 3;

/** Nought and up to three round masses, the highest not below the most, kg. */
export function massTicks(most: number, units: UnitSystem): { at: number; label: string }[] {
  if (!(most > 0)) return [];
  const unit = unitOf('mass', units);
  const step = roundUp(unit.toDisplay(most) / MOST_TICKS);
  const count = Math.ceil(unit.toDisplay(most) / step - 1e-9);
  const decimals = Math.max(0, -Math.floor(Math.log10(step) + 1e-9));
  return Array.from({ length: count + 1 }, (_, i) => ({
    at: unit.si * i * step,
    label:
      i === count ? `${formatNumber(i * step, decimals)} ${unit.symbol}` : formatNumber(i * step, decimals),
  }));
}

export interface Stationed {
  /** m */
  readonly station: number;
}

/** Index of the point nearest to an x; null off the hull, or when there is none. */
export function spotAt(points: readonly Stationed[], view: Scale, x: number): number | null {
  const station = (x - view.originX) / view.scale;
  const reach = points.length > 1 ? points[1]!.station - points[0]!.station : Number.POSITIVE_INFINITY;
  let best: number | null = null;
  let least = reach;
  points.forEach((point, i) => {
    const away = Math.abs(point.station - station);
    if (away <= least) [best, least] = [i, away];
  });
  return best;
}

/** Where a key moves the station: arrows by one point, with Shift or by page by ten, Home and End to the ends. Null for other keys. */
export function spotAfter(key: string, shift: boolean, at: number, count: number): number | null {
  const by = shift ? 10 : 1;
  const moves: Readonly<Record<string, number>> = {
    ArrowLeft: at - by,
    ArrowDown: at - by,
    ArrowRight: at + by,
    ArrowUp: at + by,
    PageDown: at - 10,
    PageUp: at + 10,
    Home: 0,
    End: count - 1,
  };
  const to = Object.hasOwn(moves, key) ? moves[key]! : null;
  return to === null ? null : Math.min(count - 1, Math.max(0, to));
}
