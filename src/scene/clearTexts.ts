/** Words beside marks, each as near to its own as it can stand without covering another or what has to be seen. px */
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
}

const GAPS = [4, 18, 32, 48];

/** In the order wanted. One that finds no free place stands where it covers least, for it must be read. */
export function placeTexts(wanted: readonly WantedText[], taken: readonly Area[], frame: Area): PlacedText[] {
  const full = [...taken];
  return wanted.map((text) => {
    const spot = bestOf(candidates(text, frame), full);
    full.push(spot);
    return { key: text.key, left: spot.left, top: spot.top };
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

function bestOf(areas: readonly Area[], full: readonly Area[]): Area {
  let best = areas[0]!;
  let least = Number.POSITIVE_INFINITY;
  for (const area of areas) {
    const covers = full.reduce((sum, other) => sum + shared(area, other), 0);
    if (covers < least) [best, least] = [area, covers];
    if (least === 0) break;
  }
  return best;
}

const shared = (a: Area, b: Area): number =>
  Math.max(0, Math.min(a.right, b.right) - Math.max(a.left, b.left)) *
  Math.max(0, Math.min(a.bottom, b.bottom) - Math.max(a.top, b.top));
