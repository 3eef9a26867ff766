/** Ticks of tape distance along the top of the skin, and of stations along the axis: where each stands and what it says. px. */
import type { Hull } from '../report/assessment.ts';
import type { UnitSystem } from '../units/units.ts';
import { overlaps, type Rect } from './rect.ts';
import { rulerUnit, stationTicks, tapeTicks } from './ruler.ts';
import { type ScreenPoint, toScreen, type View } from './view.ts';

export interface RulerMark {
  readonly foot: ScreenPoint;
  /** The way the tick goes, of length 1. */
  readonly way: ScreenPoint;
  readonly reach: number;
  readonly text: string | null;
  readonly align: 'left' | 'center' | 'right';
  /** Where the text stands. */
  readonly at: ScreenPoint;
}

const LARGE = 9;
const SMALL = 4;
const LABEL = 18;
/** Beyond this a label stands beside its tick, not centred on it. */
const STEEP = 0.4;

function markAt(foot: ScreenPoint, way: ScreenPoint, text: string | null, large: boolean): RulerMark {
  const align = way.x < -STEEP ? 'right' : way.x > STEEP ? 'left' : 'center';
  const far = align === 'center' ? LABEL : LARGE + 4;
  const at = { x: foot.x + way.x * far, y: foot.y + way.y * far };
  return { foot, way, reach: large ? LARGE : SMALL, text, align, at };
}

/** The first one named says what it measures, and in what. */
export function tapeMarks(hull: Hull, view: View, units: UnitSystem): RulerMark[] {
  let named = false;
  return tapeTicks(hull, 0, view.scale, units).map(({ at, station, label }) => {
    const foot = toScreen(view, { u: station, z: hull.radius(station, 0) });
    const first = label !== null && at > 0 && !named;
    if (first) named = true;
    const text = first ? `tape ${label} ${rulerUnit(units)}` : at > 0 ? label : null;
    return markAt(foot, outwardAt(hull, station, view), text, text !== null);
  });
}

/** Stations along the axis of a tilted hull. */
export function axisMarks(hull: Hull, view: View, units: UnitSystem): RulerMark[] {
  const down = { x: -Math.sin(view.tilt), y: Math.cos(view.tilt) };
  return stationTicks(0, hull.length, view.scale, units).map(({ at, label }) =>
    markAt(toScreen(view, { u: at, z: 0 }), down, label, label !== null),
  );
}

/** Square to the skin on top, on the screen. */
function outwardAt(hull: Hull, station: number, view: View): ScreenPoint {
  const reach = hull.length / 400;
  const before = Math.max(0, station - reach);
  const after = Math.min(hull.length, station + reach);
  const a = toScreen(view, { u: before, z: hull.radius(before, 0) });
  const b = toScreen(view, { u: after, z: hull.radius(after, 0) });
  const run = Math.hypot(b.x - a.x, b.y - a.y) || 1;
  return { x: (b.y - a.y) / run, y: (a.x - b.x) / run };
}

/** Mean width of a letter of the rulers. */
const LETTER = 6.4;
const HALF_HEIGHT = 7;

function textRect({ text, align, at: { x, y } }: RulerMark): Rect | null {
  if (text === null) return null;
  const width = text.length * LETTER;
  const left = align === 'left' ? x : align === 'right' ? x - width : x - width / 2;
  return { left, right: left + width, top: y - HALF_HEIGHT, bottom: y + HALF_HEIGHT };
}

/** What the texts take up. */
export const textsTaken = (marks: readonly RulerMark[]): Rect[] =>
  marks.flatMap((mark) => textRect(mark) ?? []);

/** Without the texts that a part would cover in half. */
export const withoutCovered = (marks: readonly RulerMark[], boxes: readonly Rect[]): RulerMark[] =>
  marks.map((mark) => {
    const rect = textRect(mark);
    return rect && boxes.some((box) => overlaps(box, rect)) ? { ...mark, text: null } : mark;
  });
