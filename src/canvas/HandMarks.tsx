/** What shows the hand what it can do and is doing: selection, hover, handles, guides, the marquee box. */
import type { Context } from 'konva/lib/Context.js';
import { Shape } from 'react-konva/es/ReactKonvaCore.js';
import type { Figure } from '../scene/figure.ts';
import { BRACKET_PX, DOT_PX, type Line } from '../scene/grip.ts';
import type { Palette } from '../scene/palette.ts';
import type { ScreenPoint } from '../scene/view.ts';
import { fontOf, trace, traceOnScreen, writeOn } from './paint.ts';

export interface OutlinesProps {
  readonly selected: readonly Figure[];
  readonly hovered: readonly Figure[];
  readonly selectedLines: readonly Line[];
  readonly palette: Palette;
  /** Size of a pixel, m: drawn in metres under the transform of the view. */
  readonly px: number;
}

/** Brass round what is selected, thinner round what is under the pointer. */
export function Outlines({ selected, hovered, selectedLines, palette, px }: OutlinesProps) {
  return (
    <Shape
      sceneFunc={(context) => {
        context.lineJoin = 'round';
        context.strokeStyle = palette.brass;
        for (const figure of hovered) outline(context, figure, 1.5 * px, 4 * px);
        for (const figure of selected) outline(context, figure, 2.5 * px, BRACKET_PX * px);
        context.lineWidth = 3.5 * px;
        for (const { at } of selectedLines) {
          trace(context, at, false);
          context.stroke();
        }
      }}
    />
  );
}

function outline(context: Context, { box }: Figure, width: number, gap: number): void {
  const { left, right, bottom, top } = box;
  const corner = Math.min(gap * 2, (right - left) / 2 + gap, (top - bottom) / 2 + gap);
  const [l, r, b, t] = [left - gap, right + gap, bottom - gap, top + gap];
  context.lineWidth = width;
  for (const [u, z, du, dz] of [
    [l, b, corner, corner],
    [r, b, -corner, corner],
    [r, t, -corner, -corner],
    [l, t, corner, -corner],
  ] as const) {
    context.beginPath();
    context.moveTo(u + du, z);
    context.lineTo(u, z);
    context.lineTo(u, z + dz);
    context.stroke();
  }
}

export interface Handle {
  readonly at: ScreenPoint;
  /** The way it can be dragged, on the screen, of length 1. */
  readonly way: ScreenPoint;
  /** Under the pointer or in hand. */
  readonly lit: boolean;
  /** A round bead in the ink of thrust, for what turns thrust; else a lozenge. */
  readonly bead?: boolean;
}

export interface HandMarksProps {
  readonly handles: readonly Handle[];
  /** Each on a stalk from its true end. */
  readonly wireEnds: readonly { readonly at: ScreenPoint; readonly end: ScreenPoint }[];
  readonly guide: { readonly from: ScreenPoint; readonly to: ScreenPoint; readonly label: string } | null;
  readonly marquee: { readonly from: ScreenPoint; readonly to: ScreenPoint } | null;
  readonly palette: Palette;
}

export function HandMarks({ handles, wireEnds, guide, marquee, palette }: HandMarksProps) {
  return (
    <Shape
      sceneFunc={(context) => {
        for (const each of handles) (each.bead ? bead : lozenge)(context, each, palette);
        for (const each of wireEnds) wireEnd(context, each, palette);
        if (guide) guideLine(context, guide, palette);
        if (marquee) rubber(context, marquee, palette);
      }}
    />
  );
}

/** A lozenge with an arrow either way. */
function lozenge(context: Context, { at, way, lit }: Handle, palette: Palette): void {
  const point = pointer(at, way);
  context.strokeStyle = palette.brass;
  context.fillStyle = lit ? palette.brass : palette.paper;
  context.lineWidth = 1.8;
  traceOnScreen(context, [point(-6, 0), point(0, 4.5), point(6, 0), point(0, -4.5)], true);
  context.fill();
  context.stroke();
  wings(context, point, 9);
}

/** A round bead with an arrow either way. */
function bead(context: Context, { at, way, lit }: Handle, palette: Palette): void {
  context.beginPath();
  context.arc(at.x, at.y, 5.5, 0, 2 * Math.PI, false);
  context.strokeStyle = palette.thrust;
  context.fillStyle = lit ? palette.thrust : palette.paper;
  context.lineWidth = 2.2;
  context.fill();
  context.stroke();
  context.lineWidth = 1.5;
  wings(context, pointer(at, way), 9.5);
}

type Pointer = (along: number, across: number) => ScreenPoint;

const pointer =
  (at: ScreenPoint, way: ScreenPoint): Pointer =>
  (along, across) => ({
    x: at.x + way.x * along - way.y * across,
    y: at.y + way.y * along + way.x * across,
  });

function wings(context: Context, point: Pointer, from: number): void {
  for (const end of [-1, 1]) {
    const out = (from + 4) * end;
    traceOnScreen(context, [point(from * end, -4), point(out, 0), point(from * end, 4)], false);
    context.stroke();
  }
}

function wireEnd(context: Context, { at, end }: HandMarksProps['wireEnds'][number], palette: Palette): void {
  context.beginPath();
  context.arc(end.x, end.y, 2.5, 0, 2 * Math.PI, false);
  context.fillStyle = palette.brass;
  context.fill();
  context.beginPath();
  context.arc(at.x, at.y, DOT_PX, 0, 2 * Math.PI, false);
  context.fillStyle = palette.paper;
  context.fill();
  context.strokeStyle = palette.brass;
  context.lineWidth = 2.5;
  context.stroke();
}

function guideLine(
  context: Context,
  { from, to, label }: NonNullable<HandMarksProps['guide']>,
  palette: Palette,
): void {
  context.save();
  context.setLineDash([4, 3]);
  context.strokeStyle = palette.brass;
  context.lineWidth = 1;
  traceOnScreen(context, [from, to], false);
  context.stroke();
  context.restore();
  context.font = fontOf(11, 600);
  context.textAlign = 'left';
  context.textBaseline = 'top';
  writeOn(context, label, { x: from.x + 5, y: from.y + 4 }, palette.brass, palette.paper);
}

function rubber(
  context: Context,
  { from, to }: { from: ScreenPoint; to: ScreenPoint },
  palette: Palette,
): void {
  context.beginPath();
  context.rect(from.x, from.y, to.x - from.x, to.y - from.y);
  context.globalAlpha = 0.2;
  context.fillStyle = palette.brass;
  context.fill();
  context.globalAlpha = 1;
  context.strokeStyle = palette.brass;
  context.lineWidth = 1;
  context.stroke();
}
