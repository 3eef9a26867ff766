/** CB and CG: the ring from which the craft hangs, the bob on its line, and the plumb from which it leans. Pixels. */
import type { Context } from 'konva/lib/Context.js';
import { Shape } from 'react-konva/es/ReactKonvaCore.js';
import { type BalanceMarks, bobOutline } from '../scene/marks.ts';
import type { Palette } from '../scene/palette.ts';
import { fontOf, traceOnScreen, writeOn } from './paint.ts';

const RING = 8;
const BOB = 17;
/** Below this lean the plumb would only thicken the line, rad. */
const SEEN_LEAN = 0.01;
/** Shorter than this there is no room for the lean's arc, px. */
const ROOM = 44;

export interface BalanceMarkProps {
  readonly marks: BalanceMarks;
  readonly palette: Palette;
  /** "6.2°", written at the arc; null for none. */
  readonly angle: string | null;
}

export function BalanceMark({ marks, palette, angle }: BalanceMarkProps) {
  return (
    <Shape
      sceneFunc={(context) => {
        if (Math.abs(marks.lean) > SEEN_LEAN && marks.bob) plumb(context, marks, palette, angle);
        if (marks.bob) bob(context, marks, palette);
        ring(context, marks, palette);
      }}
    />
  );
}

function ring(context: Context, { ring: { x, y } }: BalanceMarks, palette: Palette): void {
  context.beginPath();
  context.arc(x, y, RING, 0, 2 * Math.PI, false);
  context.lineWidth = 6;
  context.strokeStyle = palette.paper;
  context.stroke();
  context.lineWidth = 3.5;
  context.strokeStyle = palette.ring;
  context.stroke();
  context.font = fontOf(13, 600);
  context.textAlign = 'right';
  context.textBaseline = 'middle';
  writeOn(context, 'CB', { x: x - RING - 6, y: y - RING - 3 }, palette.ring, palette.gas);
}

function bob(context: Context, { ring: from, bob: at, lean, line }: BalanceMarks, palette: Palette): void {
  if (!at) return;
  const way = { x: Math.sin(lean), y: Math.cos(lean) };
  if (line > RING) {
    traceOnScreen(context, [{ x: from.x + way.x * RING, y: from.y + way.y * RING }, at], false);
    context.strokeStyle = palette.bob;
    context.lineWidth = 1.8;
    context.stroke();
  }
  traceOnScreen(context, bobOutline(at, lean, BOB), true);
  context.lineJoin = 'round';
  context.lineWidth = 4;
  context.strokeStyle = palette.paper;
  context.stroke();
  context.fillStyle = palette.bob;
  context.fill();
  context.font = fontOf(13, 600);
  context.textAlign = lean > 0 ? 'left' : 'right';
  context.textBaseline = 'middle';
  writeOn(context, 'CG', { x: at.x + (lean > 0 ? 15 : -15), y: at.y }, palette.bob, palette.gas);
}

/** Where the line would hang, and how far it is from there. */
function plumb(
  context: Context,
  { ring: from, lean, line }: BalanceMarks,
  palette: Palette,
  angle: string | null,
): void {
  const reach = Math.max(line, ROOM + 8);
  context.save();
  context.setLineDash([2, 4]);
  context.strokeStyle = palette.inkSoft;
  context.lineWidth = 1.2;
  traceOnScreen(context, [from, { x: from.x, y: from.y + reach }], false);
  context.stroke();
  context.restore();
  if (angle === null || line < ROOM) return;
  const radius = Math.min(0.6 * line, 70);
  const down = Math.PI / 2;
  context.beginPath();
  context.arc(from.x, from.y, radius, down - Math.max(lean, 0), down - Math.min(lean, 0), false);
  context.strokeStyle = palette.inkSoft;
  context.stroke();
  context.font = fontOf(12);
  context.textAlign = lean > 0 ? 'right' : 'left';
  const at = { x: from.x + (lean > 0 ? -6 : 6), y: from.y + radius };
  writeOn(context, angle, at, palette.ink, palette.gas);
}
