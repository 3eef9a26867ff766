/** Zooming: the wheel about the pointer, two fingers about their middle. What is under them stays there. */
import { panned, type ScreenPoint, zoomedAt } from '../../scene/view.ts';
import type { Gesture, Ground, Hand } from './gesture.ts';
import { slide } from './pan.ts';

export interface Wheel {
  readonly deltaX: number;
  readonly deltaY: number;
  /** 0: px, 1: lines, 2: pages. */
  readonly deltaMode: number;
  readonly shiftKey: boolean;
  readonly ctrlKey: boolean;
}

const PX_PER_LINE = 16;
/** One notch of a common wheel, 100 px, zooms by a fifth. */
const ZOOM_PER_PX = Math.log(1.2) / 100;
/** Pinching on a trackpad comes as a wheel with Ctrl in small steps. */
const PINCH_GAIN = 5;

/** The wheel zooms; with Shift, or turned sideways, it moves along the hull. */
export function wheel(ground: Ground, at: ScreenPoint, { deltaX, deltaY, deltaMode, ...keys }: Wheel): void {
  const px = deltaMode === 0 ? 1 : deltaMode === 1 ? PX_PER_LINE : 20 * PX_PER_LINE;
  const sideways = Math.abs(deltaX) > Math.abs(deltaY);
  if (keys.shiftKey || sideways) slide(ground, -px * (sideways ? deltaX : deltaY), 0);
  else zoom(ground, at, Math.exp(-deltaY * px * ZOOM_PER_PX * (keys.ctrlKey ? PINCH_GAIN : 1)));
}

const zoom = (ground: Ground, at: ScreenPoint, factor: number): void =>
  ground.setView((view) => zoomedAt(view, at, factor));

export interface Pinch {
  move(a: ScreenPoint, b: ScreenPoint): void;
}

/** Two fingers: their middle carries the drawing, their distance zooms it. */
export function pinch(ground: Ground, a: ScreenPoint, b: ScreenPoint): Pinch {
  let last = spanOf(a, b);
  return {
    move: (c, d) => {
      const next = spanOf(c, d);
      const { x, y, across } = last;
      last = next;
      ground.setView((view) => zoomedAt(panned(view, next.x - x, next.y - y), next, next.across / across));
    },
  };
}

const spanOf = (a: ScreenPoint, b: ScreenPoint) => ({
  x: (a.x + b.x) / 2,
  y: (a.y + b.y) / 2,
  across: Math.max(1, Math.hypot(a.x - b.x, a.y - b.y)),
});

/** A hand that does nothing until it is lifted: what is left of two fingers. */
export const idle = (): Gesture => ({
  move: (_: Hand) => undefined,
  end: () => undefined,
  cancel: () => undefined,
});
