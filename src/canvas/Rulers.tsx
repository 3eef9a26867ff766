/** The rulers: stations along the foot of the view, or along the axis when it is tilted; tape distance along the top of the skin. */
import type { Context } from 'konva/lib/Context.js';
import { memo } from 'react';
import { Shape } from 'react-konva/es/ReactKonvaCore.js';
import type { Palette } from '../scene/palette.ts';
import type { Rect } from '../scene/rect.ts';
import { rulerUnit, stationTicks } from '../scene/ruler.ts';
import type { UnitSystem } from '../scene/subject.ts';
import type { RulerMark } from '../scene/tapeMarks.ts';
import { type ScreenPoint, toScreen, toWorld, type View } from '../scene/view.ts';
import { fontOf, writeOn } from './paint.ts';

export interface FootRulerProps {
  readonly view: View;
  readonly palette: Palette;
  readonly units: UnitSystem;
}

/** Height of the strip along the foot, px. */
export const FOOT = 24;
const LARGE = 9;
const SMALL = 4;

/** Those on the hull itself. */
export const HullRulers = memo(({ marks, palette }: { marks: readonly RulerMark[]; palette: Palette }) => (
  <Shape
    sceneFunc={(context) => {
      prepare(context, palette);
      for (const mark of marks) draw(context, mark, palette);
    }}
  />
));

/** The one along the foot, on a strip of its own. */
export const FootRuler = memo(({ view, palette, units }: FootRulerProps) => (
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

/** What the name of the foot's ruler takes up. */
export const footNameTaken = ({ height }: View): Rect => ({
  left: 0,
  right: 76,
  top: height - FOOT - 19,
  bottom: height - FOOT,
});

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

function draw(context: Context, { foot, way, reach, text, align, at }: RulerMark, palette: Palette): void {
  context.strokeStyle = palette.inkSoft;
  context.lineWidth = 1;
  line(context, foot, { x: foot.x + way.x * reach, y: foot.y + way.y * reach });
  if (text === null) return;
  context.textAlign = align;
  write(context, text, at, palette);
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
