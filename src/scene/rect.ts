/** Upright boxes on the screen, px. */
import type { Figure } from './figure.ts';
import { type ScreenPoint, toScreen, type View } from './view.ts';

export interface Rect {
  readonly left: number;
  readonly top: number;
  readonly right: number;
  readonly bottom: number;
}

export const overlaps = (a: Rect, b: Rect): boolean =>
  a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom;

export function overlapArea(a: Rect, b: Rect): number {
  const across = Math.min(a.right, b.right) - Math.max(a.left, b.left);
  const down = Math.min(a.bottom, b.bottom) - Math.max(a.top, b.top);
  return across > 0 && down > 0 ? across * down : 0;
}

export const inside = (a: Rect, frame: Rect): boolean =>
  a.left >= frame.left && a.right <= frame.right && a.top >= frame.top && a.bottom <= frame.bottom;

export const around = ({ x, y }: ScreenPoint, reach: number): Rect => ({
  left: x - reach,
  right: x + reach,
  top: y - reach,
  bottom: y + reach,
});

/** The box of a figure on the screen, tilted as the view is. */
export function screenBox({ box: { left, right, bottom, top } }: Pick<Figure, 'box'>, view: View): Rect {
  const corners = [
    { u: left, z: bottom },
    { u: right, z: bottom },
    { u: right, z: top },
    { u: left, z: top },
  ].map((corner) => toScreen(view, corner));
  const xs = corners.map(({ x }) => x);
  const ys = corners.map(({ y }) => y);
  return { left: Math.min(...xs), right: Math.max(...xs), top: Math.min(...ys), bottom: Math.max(...ys) };
}
