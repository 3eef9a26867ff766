/** Where a box of text can stand in a view without covering what the eye is on. px. */
import { overlapArea, type Rect } from './rect.ts';

export interface Extent {
  readonly width: number;
  readonly height: number;
}

const EDGE = 6;

/** The corners of the view, then the middles of its edges, as left top corners for a box of that size. */
function spotsOf(view: Extent, box: Extent): { left: number; top: number }[] {
  const right = Math.max(EDGE, view.width - box.width - EDGE);
  const bottom = Math.max(EDGE, view.height - box.height - EDGE);
  return [
    [EDGE, EDGE],
    [right, EDGE],
    [right, bottom],
    [EDGE, bottom],
    [right / 2, EDGE],
    [right / 2, bottom],
    [EDGE, bottom / 2],
    [right, bottom / 2],
  ].map(([left, top]) => ({ left: left!, top: top! }));
}

const rectAt = ({ left, top }: { left: number; top: number }, { width, height }: Extent): Rect => ({
  left,
  top,
  right: left + width,
  bottom: top + height,
});

const covered = (rect: Rect, clear: readonly Rect[]): number =>
  clear.reduce((sum, each) => sum + overlapArea(rect, each), 0);

export interface InSight {
  /** What must stay in sight. */
  readonly clear: readonly Rect[];
  /** What had better stay in sight. */
  readonly rather?: readonly Rect[];
}

export interface Spot {
  readonly index: number;
  readonly rect: Rect;
}

/** Covering what must stay in sight weighs so much more than covering the rest. */
const WEIGHT = 1000;

const cost = (rect: Rect, { clear, rather = [] }: InSight): number =>
  WEIGHT * covered(rect, clear) + covered(rect, rather);

/**
 * The corner (or middle of an edge) that covers least. The one taken last is kept while it covers nothing that must stay in
 * sight, so that the text does not jump about.
 */
export function clearSpot(view: Extent, box: Extent, ground: InSight, last: number | null = null): Spot {
  const spots = spotsOf(view, box).map((at, index) => ({ index, rect: rectAt(at, box) }));
  const kept = last === null ? undefined : spots[last];
  if (kept && covered(kept.rect, ground.clear) === 0) return kept;
  return cheapest(spots, ground);
}

const GAP = 10;

const between = (value: number, low: number, high: number): number => Math.max(low, Math.min(value, high));

/** Beside a thing and not on it: aft, forward, below, above, at either end; else a corner. */
export function spotBeside(view: Extent, box: Extent, thing: Rect, ground: InSight): Rect {
  const [aft, fore] = [thing.right + GAP, thing.left - GAP - box.width];
  const [below, above] = [thing.bottom + GAP, thing.top - GAP - box.height];
  const near = [
    [aft, below],
    [aft, above],
    [fore, below],
    [fore, above],
    [aft, thing.top],
    [fore, thing.top],
    [thing.left, below],
    [thing.left, above],
    [thing.right - box.width, above],
  ].map(([left, top], index) => ({
    index,
    rect: rectAt(
      {
        left: between(left!, EDGE, view.width - box.width - EDGE),
        top: between(top!, EDGE, view.height - box.height - EDGE),
      },
      box,
    ),
  }));
  const clear = [...ground.clear, thing];
  const best = cheapest(near, { ...ground, clear });
  return covered(best.rect, clear) === 0 ? best.rect : clearSpot(view, box, { ...ground, clear }).rect;
}

/** The first of the cheapest. */
const cheapest = (spots: readonly Spot[], ground: InSight): Spot =>
  spots
    .map((spot) => ({ spot, price: cost(spot.rect, ground) }))
    .reduce((best, each) => (each.price < best.price ? each : best)).spot;

/** Small boxes along a line, so that what stays clear of them stays clear of it. */
export function rectsAlong(
  from: { readonly x: number; readonly y: number },
  to: { readonly x: number; readonly y: number },
  reach: number,
): Rect[] {
  const count = Math.max(1, Math.ceil(Math.hypot(to.x - from.x, to.y - from.y) / (2 * reach)));
  return Array.from({ length: count + 1 }, (_, i) => {
    const x = from.x + ((to.x - from.x) * i) / count;
    const y = from.y + ((to.y - from.y) * i) / count;
    return { left: x - reach, right: x + reach, top: y - reach, bottom: y + reach };
  });
}
