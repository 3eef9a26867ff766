/** Names stay where they are while nothing they depend on changed, and while a hand is at work. */
import { type Label, type LabelGround, type PartBox, placeLabels, sameRect, type Wanted } from './labels.ts';
import type { Rect } from './rect.ts';

export interface LabelsAsked {
  /** Selected parts first. */
  readonly wanted: readonly Wanted[];
  /** Asked for only when it may matter. */
  readonly ground: () => LabelGround;
  /** Whether a hand is at work. */
  readonly busy: boolean;
  /** The part under the pointer: when it has no name yet, it is named before all others. */
  readonly hovered: string | null;
}

export interface KeptLabels {
  readonly wanted: readonly Wanted[];
  readonly ground: LabelGround;
  readonly labels: readonly Label[];
}

export function nextLabels(
  kept: KeptLabels | null,
  { wanted, ground, busy, hovered }: LabelsAsked,
): KeptLabels {
  if (busy && kept && stayed(kept, wanted)) return onlyOf(kept, wanted);
  const now = ground();
  const missing = (labels: readonly Label[]) =>
    hovered !== null && wanted.some(({ id }) => id === hovered) && !labels.some(({ id }) => id === hovered);
  if (kept && sameWanted(kept.wanted, wanted) && sameGround(kept.ground, now) && !missing(kept.labels))
    return kept;
  const labels = placeLabels(wanted, now);
  if (!missing(labels)) return { wanted, ground: now, labels };
  const first = [...wanted].sort((a, b) => Number(b.id === hovered) - Number(a.id === hovered));
  return { wanted, ground: now, labels: placeLabels(first, now) };
}

/** Whether all that is still to be named is as it was. */
function stayed(kept: KeptLabels, wanted: readonly Wanted[]): boolean {
  const before = new Map(kept.wanted.map((each) => [each.id, each]));
  return wanted.every((each) => {
    const old = before.get(each.id);
    return old !== undefined && sameName(old, each);
  });
}

function onlyOf(kept: KeptLabels, wanted: readonly Wanted[]): KeptLabels {
  const ids = new Set(wanted.map(({ id }) => id));
  const labels = kept.labels.filter(({ id }) => ids.has(id));
  return { ...kept, wanted, labels: labels.length === kept.labels.length ? kept.labels : labels };
}

const sameName = (a: Wanted, b: Wanted): boolean =>
  a.id === b.id && a.text === b.text && sameRect(a.box, b.box);

const same = <T>(a: readonly T[], b: readonly T[], equal: (x: T, y: T) => boolean): boolean =>
  a.length === b.length && a.every((each, i) => equal(each, b[i]!));

const sameWanted = (a: readonly Wanted[], b: readonly Wanted[]): boolean => same(a, b, sameName);

const sameRects = (a: readonly Rect[], b: readonly Rect[]): boolean => same(a, b, sameRect);

const sameGround = (a: LabelGround, b: LabelGround): boolean =>
  sameRect(a.frame, b.frame) && sameRects(a.taken, b.taken) && same(a.boxes, b.boxes, sameBox);

const sameBox = (a: PartBox, b: PartBox): boolean => a.id === b.id && sameRect(a.box, b.box);
