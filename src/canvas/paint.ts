/** Strokes on a Konva context: paths in metres under the transform of the view, and text in px. */
import type { Context } from 'konva/lib/Context.js';
import type { Palette } from '../scene/palette.ts';
import type { Path } from '../scene/path.ts';
import type { PlanePoint, ScreenPoint, View } from '../scene/view.ts';

export const FONT = "system-ui, 'Segoe UI', Roboto, 'Helvetica Neue', 'DejaVu Sans', sans-serif";
export const fontOf = (px: number, weight: 400 | 600 = 400): string => `${weight} ${px}px ${FONT}`;

/** The transform under which metres of the plane land where `toScreen` puts them. */
export const worldTransform = ({ scale, originX, originY, tilt, pivot }: View) => ({
  x: originX + pivot * scale,
  y: originY,
  offsetX: pivot,
  scaleX: scale,
  scaleY: -scale,
  rotation: (tilt * 180) / Math.PI,
});

export function trace(context: Context, points: readonly PlanePoint[], closed: boolean): void {
  context.beginPath();
  points.forEach(({ u, z }, i) => {
    if (i === 0) context.moveTo(u, z);
    else context.lineTo(u, z);
  });
  if (closed) context.closePath();
}

export function traceOnScreen(context: Context, points: readonly ScreenPoint[], closed: boolean): void {
  trace(
    context,
    points.map(({ x, y }) => ({ u: x, z: y })),
    closed,
  );
}

/** Gas within its skin; `px`: size of a pixel in the unit of the context. */
export function paintHull(
  context: Context,
  outline: readonly PlanePoint[],
  { gas, skin }: Pick<Palette, 'gas' | 'skin'>,
  px: number,
): void {
  trace(context, outline, true);
  context.fillStyle = gas;
  context.fill();
  context.strokeStyle = skin;
  context.lineWidth = 1.5 * px;
  context.stroke();
}

/** The hull's axis, dashed, in the ink in hand. */
export function paintAxis(context: Context, from: PlanePoint, to: PlanePoint, px: number): void {
  trace(context, [from, to], false);
  context.setLineDash([14 * px, 5 * px, 3 * px, 5 * px]);
  context.lineWidth = px;
  context.globalAlpha = 0.6;
  context.stroke();
}

export interface Inks {
  readonly fill: string;
  readonly edge: string;
  /** Stroke width in the unit of the context. */
  readonly width: number;
}

/** Body filled and edged; dark parts filled with the edge's ink, thinly; lines as strokes. */
export function paintPaths(context: Context, paths: readonly Path[], { fill, edge, width }: Inks): void {
  context.lineWidth = width;
  context.lineJoin = 'round';
  context.strokeStyle = edge;
  for (const { points, closed, tone } of paths) {
    trace(context, points, closed);
    if (tone === 'body') {
      context.fillStyle = fill;
      context.fill();
    } else if (tone === 'dark') {
      const alpha = context.globalAlpha;
      context.fillStyle = edge;
      context.globalAlpha = alpha * 0.45;
      context.fill();
      context.globalAlpha = alpha;
    }
    context.stroke();
  }
}

/** Text with a halo of the ground behind it, so that lines under it do not disturb. */
export function writeOn(context: Context, text: string, at: ScreenPoint, ink: string, halo: string): void {
  context.lineJoin = 'round';
  context.lineWidth = 3;
  context.strokeStyle = halo;
  context.strokeText(text, at.x, at.y);
  context.fillStyle = ink;
  context.fillText(text, at.x, at.y);
}

/** Less than this holds no three letters, px. */
const LEAST_ROOM = 20;

/** The text, shortened with an ellipsis to a width in px; null when not even a few letters fit. */
export function shortened(text: string, font: string, room: number): string | null {
  if (room < LEAST_ROOM) return null;
  if (textWidth(text, font) <= room) return text;
  for (let letters = text.length - 1; letters >= 3; letters--) {
    const cut = `${text.slice(0, letters).trimEnd()}…`;
    if (textWidth(cut, font) <= room) return cut;
  }
  return null;
}

let measuring: CanvasRenderingContext2D | null = null;
const widths = new Map<string, number>();
const MOST_WIDTHS = 5000;

/** Width of a text, px. */
export function textWidth(text: string, font: string): number {
  const key = `${font} ${text}`;
  const known = widths.get(key);
  if (known !== undefined) return known;
  measuring ??= document.createElement('canvas').getContext('2d')!;
  measuring.font = font;
  const { width } = measuring.measureText(text);
  if (widths.size >= MOST_WIDTHS) widths.clear();
  widths.set(key, width);
  return width;
}
