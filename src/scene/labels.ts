/** Names beside parts, placed greedily so that none covers another. px. */
import { inside, overlaps, type Rect } from './rect.ts';

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
}

export const LABEL_HEIGHT = 15;
const GAP = 4;
/** Beyond so many, only what is selected or under the pointer is named. */
export const MOST_LABELS = 40;

/** Below, above, aft, forward of what it names; then the same a line farther off. */
function candidates({ box, width }: Wanted): Rect[] {
  const midX = (box.left + box.right) / 2;
  const midY = (box.top + box.bottom) / 2;
  const at = (left: number, top: number): Rect => ({
    left,
    top,
    right: left + width,
    bottom: top + LABEL_HEIGHT,
  });
  const near = (gap: number) => [
    at(midX - width / 2, box.bottom + gap),
    at(midX - width / 2, box.top - gap - LABEL_HEIGHT),
    at(box.right + gap, midY - LABEL_HEIGHT / 2),
    at(box.left - gap - width, midY - LABEL_HEIGHT / 2),
  ];
  return [...near(GAP), ...near(GAP + LABEL_HEIGHT)];
}

/** Labels that fit, in the order wanted; those that fit nowhere are left out. `taken` is kept clear. */
export function placeLabels(wanted: readonly Wanted[], taken: readonly Rect[], frame: Rect): Label[] {
  const full = [...taken];
  return wanted.flatMap((each) => {
    const others = wanted.filter((other) => other !== each).map((other) => other.box);
    const spot = candidates(each).find(
      (rect) =>
        inside(rect, frame) && !full.some((r) => overlaps(r, rect)) && !others.some((r) => overlaps(r, rect)),
    );
    if (!spot) return [];
    full.push(spot);
    return [{ id: each.id, text: each.text, x: spot.left, y: (spot.top + spot.bottom) / 2 }];
  });
}
