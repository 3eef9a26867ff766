/** The rulers: stations along the foot of the view, or along the axis when it is tilted; tape distance along the top of the skin. */
import type { Context } from 'konva/lib/Context.js';
import { memo } from 'react';
import { Shape } from 'react-konva/es/ReactKonvaCore.js';
import type { Palette } from '../scene/palette.ts';
import { rulerUnit, stationTicks, tapeTicks } from '../scene/ruler.ts';
import type { Geometry, UnitSystem } from '../scene/subject.ts';
import { type ScreenPoint, toScreen, toWorld, type View } from '../scene/view.ts';
import { fontOf, writeOn } from './paint.ts';

export interface RulersProps {
  readonly hull: Geometry['hull'];
  readonly view: View;
  readonly palette: Palette;
  readonly units: UnitSystem;
}

/** Height of the strip along the foot, px. */
export const FOOT = 24;
const LARGE = 9;
const SMALL = 4;
const LABEL = 18;
/** Beyond this a label stands beside its tick, not centred on it. */
const STEEP = 0.4;

/** Those on the hull itself. */
export const HullRulers = memo(({ hull, view, palette, units }: RulersProps) => (
  <Shape
    sceneFunc={(context) => {
      prepare(context, palette);
      tapeRuler(context, hull, view, palette, units);
      if (view.tilt !== 0) axisRuler(context, hull, view, palette, units);
    }}
  />
));

/** The one along the foot, on a strip of its own. */
export const FootRuler = memo(({ view, palette, units }: Omit<RulersProps, 'hull'>) => (
  <Shape
    sceneFunc={(context) => {
      prepare(context, palette);
      context.fillStyle = palette.paper;
      context.fillRect(0, view.height - FOOT, view.width, FOOT);
      footRuler(context, view, palette, units);
    }}
  />
));

function prepare(context: Context, palette: Palette): void {
  context.font = fontOf(11);
  context.textAlign = 'center';
  context.textBaseline = 'middle';
  context.strokeStyle = palette.inkSoft;
  context.lineWidth = 1;
}

function footRuler(context: Context, view: View, palette: Palette, units: UnitSystem): void {
  const y = Math.round(view.height - FOOT) + 0.5;
  const from = toWorld(view, { x: 0, y }).u;
  const to = toWorld(view, { x: view.width, y }).u;
  line(context, { x: 0, y }, { x: view.width, y });
  for (const { at, label } of stationTicks(from, to, view.scale, units)) {
    const x = Math.round(toScreen(view, { u: at, z: 0 }).x) + 0.5;
    line(context, { x, y }, { x, y: y + (label ? LARGE - 2 : SMALL) });
    if (label && x > 8 && x < view.width - 8) write(context, label, { x, y: y + 15 }, palette);
  }
  context.textAlign = 'left';
  write(context, `station, ${rulerUnit(units)}`, { x: 6, y: y - 10 }, palette);
}

function axisRuler(
  context: Context,
  hull: Geometry['hull'],
  view: View,
  palette: Palette,
  units: UnitSystem,
): void {
  const down = { x: -Math.sin(view.tilt), y: Math.cos(view.tilt) };
  for (const { at, label } of stationTicks(0, hull.length, view.scale, units)) {
    tickAlong(context, toScreen(view, { u: at, z: 0 }), down, label, palette);
  }
}

function tapeRuler(
  context: Context,
  hull: Geometry['hull'],
  view: View,
  palette: Palette,
  units: UnitSystem,
): void {
  let named = false;
  for (const { at, station, label } of tapeTicks(hull, 0, view.scale, units)) {
    const foot = toScreen(view, { u: station, z: hull.radius(station, 0) });
    const first = label !== null && at > 0 && !named;
    if (first) named = true;
    const text = first ? `tape ${label} ${rulerUnit(units)}` : at > 0 ? label : null;
    tickAlong(context, foot, outwardAt(hull, station, view), text, palette);
  }
}

/** Square to the skin on top, on the screen. */
function outwardAt(hull: Geometry['hull'], station: number, view: View): ScreenPoint {
  const reach = hull.length / 400;
  const before = Math.max(0, station - reach);
  const after = Math.min(hull.length, station + reach);
  const a = toScreen(view, { u: before, z: hull.radius(before, 0) });
  const b = toScreen(view, { u: after, z: hull.radius(after, 0) });
  const run = Math.hypot(b.x - a.x, b.y - a.y) || 1;
  return { x: (b.y - a.y) / run, y: (a.x - b.x) / run };
}

function tickAlong(
  context: Context,
  foot: ScreenPoint,
  way: ScreenPoint,
  label: string | null,
  palette: Palette,
): void {
  const reach = label ? LARGE : SMALL;
  context.strokeStyle = palette.inkSoft;
  context.lineWidth = 1;
  line(context, foot, { x: foot.x + way.x * reach, y: foot.y + way.y * reach });
  if (!label) return;
  context.textAlign = way.x < -STEEP ? 'right' : way.x > STEEP ? 'left' : 'center';
  const far = context.textAlign === 'center' ? LABEL : LARGE + 4;
  write(context, label, { x: foot.x + way.x * far, y: foot.y + way.y * far }, palette);
}

function line(context: Context, a: ScreenPoint, b: ScreenPoint): void {
  context.beginPath();
  context.moveTo(a.x, a.y);
  context.lineTo(b.x, b.y);
  context.stroke();
}

function write(context: Context, text: string, at: ScreenPoint, palette: Palette): void {
  writeOn(context, text, at, palette.inkSoft, palette.paper);
  context.strokeStyle = palette.inkSoft;
  context.lineWidth = 1;
}
