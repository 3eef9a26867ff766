/** What lies over the drawing while a hand is on it. */
import type { Grip } from '../scene/grip.ts';
import type { ScreenPoint } from '../scene/view.ts';

export interface Guide {
  readonly along: 'station' | 'clock';
  /** m or rad */
  readonly at: number;
  readonly label: string;
}

export interface Overlay {
  /** Under the pointer. */
  readonly hover: Grip | null;
  /** Where the pointer came upon it. */
  readonly hoverAt: ScreenPoint | null;
  /** What is in hand; `moving` has the keys (see grip.ts) of all that is drawn on the layer that moves. */
  readonly held: Grip | null;
  readonly moving: ReadonlySet<string>;
  /** What the thing in hand snapped to. */
  readonly guide: Guide | null;
  /** The part that a wire end would join. */
  readonly join: string | null;
  readonly marquee: { readonly from: ScreenPoint; readonly to: ScreenPoint } | null;
  /** Why something did not happen. */
  readonly hint: string | null;
}

const NOTHING: ReadonlySet<string> = new Set();

/** Everything but the hover as it is when no hand is at work. */
export const AT_REST = {
  held: null,
  moving: NOTHING,
  guide: null,
  join: null,
  marquee: null,
} as const satisfies Partial<Overlay>;

export const CLEAR: Overlay = { hover: null, hoverAt: null, hint: null, ...AT_REST };

/** The pointer over what it can take. */
export function cursorOf({ hover, held, marquee }: Overlay): string {
  if (marquee) return 'crosshair';
  const grip = held ?? hover;
  if (grip?.kind === 'hull') return grip.end === 'tail' ? 'ew-resize' : 'ns-resize';
  if (held) return 'grabbing';
  if (!grip) return 'default';
  return grip.kind === 'wire' ? 'pointer' : 'grab';
}
