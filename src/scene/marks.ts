/**
 * The marks of balance. The CB is a ring from which the craft hangs; the CG a plumb bob on a line from that ring. Drawn in
 * the attitude in which it floats the line stands plumb; drawn level it leans by the pitch (or the heel).
 */
import { rectsAlong } from './clearSpot.ts';
import { around, type Rect } from './rect.ts';
import type { Geometry } from './subject.ts';
import { type PlanePoint, type ScreenPoint, toScreen, type View } from './view.ts';

export interface BalanceMarks {
  readonly ring: ScreenPoint;
  /** The tip of the bob's line is the CG itself; null without solid mass. */
  readonly bob: ScreenPoint | null;
  /** Lean of the line from plumb, rad, + when the bob hangs to the right; 0 without a bob. */
  readonly lean: number;
  /** px from ring to bob. */
  readonly line: number;
}

/** For the side view. */
export const sideMarks = (view: View, { cb, cg }: Geometry): BalanceMarks =>
  marksAt(view, { u: cb[0], z: cb[2] }, cg && { u: cg[0], z: cg[2] });

/** For the front view. */
export const frontMarks = (view: View, { cb, cg }: Geometry): BalanceMarks =>
  marksAt(view, { u: cb[1], z: cb[2] }, cg && { u: cg[1], z: cg[2] });

function marksAt(view: View, cb: PlanePoint, cg: PlanePoint | null): BalanceMarks {
  const ring = toScreen(view, cb);
  if (!cg) return { ring, bob: null, lean: 0, line: 0 };
  const bob = toScreen(view, cg);
  const dx = bob.x - ring.x;
  const dy = bob.y - ring.y;
  return { ring, bob, lean: Math.atan2(dx, dy), line: Math.hypot(dx, dy) };
}

/** Outline of a bob hanging from its line, px about the CG, its point away from the ring. */
export function bobOutline(at: ScreenPoint, lean: number, size: number): ScreenPoint[] {
  const half = [
    [0.16, -0.62],
    [0.16, -0.42],
    [0.5, -0.3],
    [0.5, 0.02],
    [0.3, 0.36],
    [0.07, 0.9],
  ] as const;
  const outline = [...half, ...half.map(([x, y]) => [-x, y] as const).reverse()];
  const cos = Math.cos(lean);
  const sin = Math.sin(lean);
  return outline.map(([x, y]) => ({
    x: at.x + size * (x * cos + y * sin),
    y: at.y + size * (y * cos - x * sin),
  }));
}

/** What the marks take up with their names, and the line between them. px. */
export const marksTaken = ({ ring, bob, lean }: BalanceMarks): Rect[] => [
  { ...around(ring, 14), left: ring.x - 38, top: ring.y - 20 },
  ...(bob
    ? [
        { ...around(bob, 18), [lean > 0 ? 'right' : 'left']: bob.x + (lean > 0 ? 42 : -42) },
        ...rectsAlong(ring, bob, 4),
      ]
    : []),
];
