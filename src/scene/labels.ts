/**
 * Names beside parts, placed one after the other where they cost least: near the part, off other parts, off each other. A name that
 * does not stand next to its part has a fine line to it; one that fits nowhere near is left out. px.
 */
import { around, inside, overlapArea, overlaps, type Rect } from './rect.ts';
import type { ScreenPoint } from './view.ts';

export interface Wanted {
  readonly id: string;
  readonly text: string;
  readonly width: number;
  /** What it names. */
  readonly box: Rect;
}

export interface Label {
  readonly id: string;
  readonly text: string;
  /** Left edge and middle line of the text. */
  readonly x: number;
  readonly y: number;
  /** From the text to what it names; null when it stands next to it. */
  readonly leader: { readonly from: ScreenPoint; readonly to: ScreenPoint } | null;
}

/** Where a piece of a part is. */
export interface PartBox {
  readonly id: string;
  readonly box: Rect;
}

/** What lies about: `taken` is never covered, `boxes` of parts if it can be helped. */
export interface LabelGround {
  readonly taken: readonly Rect[];
  readonly boxes: readonly PartBox[];
  readonly frame: Rect;
}

export const LABEL_HEIGHT = 15;
/** Beyond so many, only what is selected or under the pointer is named. */
export const MOST_LABELS = 40;

/** Rings round the part, px off it: beyond the last the name would no longer be taken for its own. */
const RINGS = [4, 14, 26, 40, 56];
/** Lines of text up or down, for names that stand in a column beside the part. */
const ROWS = [1, -1, 2, -2, 3, -3];
const NEXT_TO = 6;
/** Prices, in px of distance: of covering a part (or being on it) whole, and of a side that is not below. */
const ON_PART = 70;
const SIDE = 1.5;
const LAST_SIDE = 15;
/** Dearer than this a name does more harm than good. */
const MOST_PRICE = 100;

interface Candidate {
  readonly rect: Rect;
  /** Of where it is, without what is there. */
  readonly price: number;
}

/** Round the part, below first; those farther off later. */
function candidates({ box, width }: Wanted): Candidate[] {
  const midX = (box.left + box.right) / 2 - width / 2;
  const midY = (box.top + box.bottom) / 2 - LABEL_HEIGHT / 2;
  return RINGS.flatMap((gap) => {
    const [aft, fore] = [box.right + gap, box.left - gap - width];
    const [below, above] = [box.bottom + gap, box.top - gap - LABEL_HEIGHT];
    const spots: readonly (readonly [number, number])[] = [
      [midX, below],
      [midX, above],
      [aft, midY],
      [fore, midY],
      [box.right, below],
      [box.left - width, below],
      [box.right, above],
      [box.left - width, above],
      [midX + width / 2, below],
      [midX - width / 2, below],
      [midX + width / 2, above],
      [midX - width / 2, above],
      [aft, below],
      [fore, below],
      [aft, above],
      [fore, above],
      ...ROWS.flatMap((row) => [
        [aft, midY + row * LABEL_HEIGHT] as const,
        [fore, midY + row * LABEL_HEIGHT] as const,
      ]),
    ];
    return spots.map(([left, top], side) => ({
      rect: { left, top, right: left + width, bottom: top + LABEL_HEIGHT },
      price: gap + SIDE * Math.min(side, LAST_SIDE),
    }));
  }).sort((a, b) => a.price - b.price);
}

const between = (value: number, low: number, high: number): number => Math.min(high, Math.max(low, value));

/** From the edge of the text to just inside the edge of what it names. */
function leaderOf(rect: Rect, box: Rect): { from: ScreenPoint; to: ScreenPoint } {
  const inset = Math.min(3, (box.right - box.left) / 2, (box.bottom - box.top) / 2);
  const middle = { x: (rect.left + rect.right) / 2, y: (rect.top + rect.bottom) / 2 };
  const to = {
    x: between(middle.x, box.left + inset, box.right - inset),
    y: between(middle.y, box.top + inset, box.bottom - inset),
  };
  return { from: { x: between(to.x, rect.left, rect.right), y: between(to.y, rect.top, rect.bottom) }, to };
}

const distance = (a: Rect, b: Rect): number =>
  Math.hypot(
    Math.max(a.left - b.right, b.left - a.right, 0),
    Math.max(a.top - b.bottom, b.top - a.bottom, 0),
  );

const STEP = 5;
/** What lies so near the end of the line, in steps, may lie on the part itself. */
const END = 2;

function crosses({ from, to }: NonNullable<Label['leader']>, rects: readonly Rect[]): boolean {
  const count = Math.ceil(Math.hypot(to.x - from.x, to.y - from.y) / STEP);
  for (let i = 1; i < count - END; i++) {
    const at = { x: from.x + ((to.x - from.x) * i) / count, y: from.y + ((to.y - from.y) * i) / count };
    const dot = around(at, 0.5);
    if (rects.some((rect) => overlaps(rect, dot))) return true;
  }
  return false;
}

/** Of the smaller of the two; for two boxes of no area, none. */
const coveredShare = (a: Rect, b: Rect): number => {
  const area = overlapArea(a, b);
  return area > 0 ? area / Math.min(areaOf(a), areaOf(b)) : 0;
};

const areaOf = ({ left, right, top, bottom }: Rect): number => (right - left) * (bottom - top);

/** The cheapest spot that covers nothing taken; null when there is none. */
function bestSpot(wanted: Wanted, others: readonly Rect[], full: readonly Rect[], frame: Rect): Label | null {
  let best: Label | null = null;
  let least = MOST_PRICE;
  for (const { rect, price } of candidates(wanted)) {
    if (price >= least) break;
    if (!inside(rect, frame) || full.some((each) => overlaps(each, rect))) continue;
    const covered = others.reduce((sum, each) => sum + coveredShare(each, rect), 0);
    const own = distance(rect, wanted.box);
    const doubtful = covered > 0 || others.some((each) => distance(rect, each) < own);
    const leader = own > NEXT_TO || doubtful ? leaderOf(rect, wanted.box) : null;
    const whole = price + ON_PART * covered;
    if (whole >= least || (leader && crosses(leader, full))) continue;
    least = whole;
    best = { id: wanted.id, text: wanted.text, x: rect.left, y: rect.top + LABEL_HEIGHT / 2, leader };
  }
  return best;
}

/** Labels in the order wanted; those that fit nowhere are left out. */
export function placeLabels(wanted: readonly Wanted[], { taken, boxes, frame }: LabelGround): Label[] {
  const full = [...taken];
  return wanted.flatMap((each) => {
    const others = boxes.filter(({ id }) => id !== each.id).map(({ box }) => box);
    const label = bestSpot(each, others, full, frame);
    if (!label) return [];
    full.push({
      left: label.x,
      right: label.x + each.width,
      top: label.y - LABEL_HEIGHT / 2,
      bottom: label.y + LABEL_HEIGHT / 2,
    });
    return [label];
  });
}

export const sameRect = (a: Rect, b: Rect): boolean =>
  a.left === b.left && a.right === b.right && a.top === b.top && a.bottom === b.bottom;
