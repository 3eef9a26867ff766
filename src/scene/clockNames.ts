/** Clock angles round the section from astern: their ticks, and the four names, each where it covers nothing. px. */
import { onSection } from './outline.ts';
import { around, inside, overlaps, type Rect } from './rect.ts';
import { type PlanePoint, type ScreenPoint, toScreen, type View } from './view.ts';

export interface ClockName {
  readonly text: string;
  readonly at: ScreenPoint;
  readonly onGas: boolean;
}

const NAMED = [0, 90, 180, 270];
const HALF_WIDTH = 15;
const HALF_HEIGHT = 7;
/** Inside, outside, then farther in and out, px from the skin. */
const EITHER_SIDE = [-20, 18, -36, 32];
const OUTSIDE = [18, 32];
/** On a smaller section the names inside would lie on each other, px. */
const LEAST_RADIUS = 62;

/** Distance from the axis of a closed outline, clockwise from the top, evenly. m */
export function radiusAt(outline: readonly PlanePoint[], degrees: number): number {
  const { u, z } = outline[Math.round((outline.length * degrees) / 360) % outline.length]!;
  return Math.hypot(u, z);
}

/** Those that are free somewhere. `taken` is kept clear. */
export function clockNames(outline: readonly PlanePoint[], view: View, taken: readonly Rect[]): ClockName[] {
  const frame = { left: 0, top: 0, right: view.width, bottom: view.height };
  const full = [...taken];
  return NAMED.flatMap((degrees) => {
    const radius = radiusAt(outline, degrees);
    const offs = radius * view.scale > LEAST_RADIUS ? EITHER_SIDE : OUTSIDE;
    const spots = offs.map((off) => ({
      off,
      at: toScreen(view, onSection((degrees * Math.PI) / 180, radius + off / view.scale)),
    }));
    const free = spots.find(({ at }) => {
      const rect = boxAt(at);
      return inside(rect, frame) && !full.some((each) => overlaps(each, rect));
    });
    if (!free) return [];
    full.push(boxAt(free.at));
    return [{ text: `${degrees}°`, at: free.at, onGas: free.off < 0 }];
  });
}

const boxAt = (at: ScreenPoint): Rect => ({
  ...around(at, HALF_HEIGHT),
  left: at.x - HALF_WIDTH,
  right: at.x + HALF_WIDTH,
});
