/** What the thrust as set does about the CG, seen from above: which way it turns the nose, and its levers. Pixels. */
import type { Context } from 'konva/lib/Context.js';
import { memo } from 'react';
import { Shape } from 'react-konva/es/ReactKonvaCore.js';
import type { Lever, YawMark } from '../scene/above.ts';
import type { Palette } from '../scene/palette.ts';
import type { Rect } from '../scene/rect.ts';
import { type ScreenPoint, toScreen, type View } from '../scene/view.ts';
import { fontOf, textWidth, traceOnScreen, writeOn } from './paint.ts';
import type { Size } from './useSize.ts';

export interface YawMarksProps {
  readonly yaw: YawMark;
  readonly view: View;
  readonly palette: Palette;
  /** Where the hull is narrow enough for a lever beside it, px. */
  readonly beside: number;
}

const FONT = fontOf(11.5);
const BOLD = fontOf(11.5, 600);

export const YawMarks = memo(({ yaw, view, palette, beside }: YawMarksProps) => (
  <Shape
    sceneFunc={(context) => {
      for (const lever of yaw.levers) measure(context, lever, view, palette, beside);
      if (yaw.sense !== 0) sense(context, view, yaw, palette);
      caption(context, yaw.words, view, palette);
    }}
  />
));

/** Smaller in a small pane, px. */
const radiusIn = ({ width, height }: View): number =>
  Math.max(24, Math.min(30, 0.13 * Math.min(width, height)));
/** Either side of straight ahead, rad. */
const SWEEP = 0.95;
const HEAD = 8;

/** An arc over the nose side of the CG with a head at the end to which the nose goes. */
function sense(context: Context, view: View, { at, sense: way }: YawMark, palette: Palette): void {
  const { x, y } = toScreen(view, at);
  const whole = radiusIn(view);
  const on = (angle: number, radius = whole) => ({
    x: x + radius * Math.sin(way * angle),
    y: y - radius * Math.cos(angle),
  });
  const steps = Array.from({ length: 25 }, (_, i) => on(-SWEEP + (2 * SWEEP * i) / 24));
  const back = SWEEP - HEAD / whole;
  const head = [on(SWEEP + 0.1), on(back, whole + 4.5), on(back, whole - 4.5)];
  for (const [ink, more] of [
    [palette.gas, 3],
    [palette.thrust, 0],
  ] as const) {
    context.strokeStyle = ink;
    context.fillStyle = ink;
    context.lineWidth = 2.2 + more;
    traceOnScreen(context, steps, false);
    context.stroke();
    traceOnScreen(context, head, true);
    context.lineWidth = 0.8 + more;
    context.stroke();
    context.fill();
  }
}

/** Of the last line above the foot of the pane, and between two. */
const FOOT = 12;
const LINE = 14;
const EDGE = 4;

/** Where it stands, on two lines at most. */
export const captionTaken = ({ width, height }: Size): Rect => ({
  left: 0,
  right: width,
  top: height - FOOT - 1.5 * LINE,
  bottom: height,
});

/** On one line where it fits. */
function caption(context: Context, words: readonly string[], view: View, palette: Palette): void {
  const whole = words.join(', ');
  const lines = textWidth(whole, FONT) < view.width - 2 * EDGE ? [whole] : words;
  context.font = FONT;
  context.textAlign = 'center';
  context.textBaseline = 'middle';
  lines.forEach((line, i) => {
    const y = view.height - FOOT - LINE * (lines.length - 1 - i);
    writeOn(context, line, { x: view.width / 2, y }, palette.thrust, palette.paper);
  });
}

const TICK = 4;

/** A line with a tick at either end and its length along it; a thin leg from what it measures. */
function measure(context: Context, lever: Lever, view: View, palette: Palette, beside: number): void {
  const [cg, thrust] = [toScreen(view, lever.from), toScreen(view, lever.to)];
  const along = lever.from.u === lever.to.u;
  const off = along ? { x: beside, y: 0 } : { x: 0, y: ATHWART };
  const [a, b] = [cg, thrust].map(({ x, y }) => (along ? { x: beside, y } : { x, y: y + off.y })) as [
    ScreenPoint,
    ScreenPoint,
  ];
  context.strokeStyle = palette.thrust;
  context.lineWidth = 0.8;
  context.globalAlpha = 0.5;
  for (const leg of [
    [cg, a],
    [thrust, b],
  ] as const) {
    traceOnScreen(context, leg, false);
    context.stroke();
  }
  context.globalAlpha = 1;
  context.lineWidth = 1.2;
  const tick = along ? { x: TICK, y: 0 } : { x: 0, y: TICK };
  for (const line of [
    [a, b],
    ...[a, b].map(({ x, y }) => [
      { x: x - tick.x, y: y - tick.y },
      { x: x + tick.x, y: y + tick.y },
    ]),
  ]) {
    traceOnScreen(context, line, false);
    context.stroke();
  }
  write(context, lever.words, { x: (a.x + b.x) / 2, y: (a.y + b.y) / 2 }, along, palette);
}

const ATHWART = 26;

function write(context: Context, words: string, at: ScreenPoint, along: boolean, palette: Palette): void {
  context.save();
  context.font = BOLD;
  context.textAlign = 'center';
  context.textBaseline = 'middle';
  context.translate(at.x, at.y);
  if (along) context.rotate(-Math.PI / 2);
  writeOn(context, words, { x: 0, y: along ? -8 : 9 }, palette.thrust, palette.paper);
  context.restore();
}
