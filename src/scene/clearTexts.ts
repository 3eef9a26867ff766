/** Words beside marks, each as near to its own as it can stand without covering another or what has to be seen. px */
import type { ScreenPoint } from './view.ts';

export interface Area {
  readonly left: number;
  readonly top: number;
  readonly right: number;
  readonly bottom: number;
}

export interface WantedText {
  readonly key: string;
  readonly width: number;
  readonly height: number;
  /** What it belongs to. */
  readonly box: Area;
}

export interface PlacedText {
  readonly key: string;
  readonly left: number;
  readonly top: number;
  /** From the text to its own, where it stands off; null where it stands next to it. */
  readonly leader: { readonly from: ScreenPoint; readonly to: ScreenPoint } | null;
}

const GAPS = [4, 18, 32, 48];

/** In the order wanted. One that finds no free place stands where it covers least, for it must be read. */
export function placeTexts(wanted: readonly WantedText[], taken: readonly Area[], frame: Area): PlacedText[] {
  const full = [...taken];
  return wanted.map((text) => {
    const spot = bestOf(candidates(text, frame), text.box, full);
    full.push(spot);
    return { key: text.key, left: spot.left, top: spot.top, leader: leaderOf(spot, text.box) };
  });
}

/** Below, above, aft and forward of its own, then the same farther off; always inside the frame. */
function candidates({ box, width, height }: WantedText, frame: Area): Area[] {
  const left = (box.left + box.right - width) / 2;
  const top = (box.top + box.bottom - height) / 2;
  return GAPS.flatMap((gap) => [
    [left, box.bottom + gap],
    [left, box.top - gap - height],
    [box.right + gap, top],
    [box.left - gap - width, top],
    [box.right + gap, box.bottom + gap],
    [box.left - gap - width, box.bottom + gap],
    [box.right + gap, box.top - gap - height],
    [box.left - gap - width, box.top - gap - height],
  ]).map(([x, y]) => {
    const l = Math.max(frame.left, Math.min(x!, frame.right - width));
    const t = Math.max(frame.top, Math.min(y!, frame.bottom - height));
    return { left: l, top: t, right: l + width, bottom: t + height };
  });
}

/** Price of a px of distance, in px² covered. */
const FAR = 5;

function bestOf(areas: readonly Area[], own: Area, full: readonly Area[]): Area {
  let best = areas[0]!;
  let least = Number.POSITIVE_INFINITY;
  for (const area of areas) {
    const { from, to } = between(area, own);
    const away = FAR * Math.hypot(to.x - from.x, to.y - from.y);
    const price = full.reduce((sum, other) => sum + shared(area, other), away);
    if (price < least) [best, least] = [area, price];
  }
  return best;
}

/** The nearest points of two areas: their middles where one lies over the other. */
function between(a: Area, b: Area): { from: ScreenPoint; to: ScreenPoint } {
  const [x, otherX] = nearest(a.left, a.right, b.left, b.right);
  const [y, otherY] = nearest(a.top, a.bottom, b.top, b.bottom);
  return { from: { x, y }, to: { x: otherX, y: otherY } };
}

function nearest(low: number, high: number, otherLow: number, otherHigh: number): [number, number] {
  if (high < otherLow) return [high, otherLow];
  if (otherHigh < low) return [low, otherHigh];
  const middle = (Math.max(low, otherLow) + Math.min(high, otherHigh)) / 2;
  return [middle, middle];
}

const NEXT_TO = 12;

function leaderOf(spot: Area, own: Area): PlacedText['leader'] {
  const ends = between(spot, own);
  return Math.hypot(ends.to.x - ends.from.x, ends.to.y - ends.from.y) > NEXT_TO ? ends : null;
}

const shared = (a: Area, b: Area): number =>
  Math.max(0, Math.min(a.right, b.right) - Math.max(a.left, b.left)) *
  Math.max(0, Math.min(a.bottom, b.bottom) - Math.max(a.top, b.top));
