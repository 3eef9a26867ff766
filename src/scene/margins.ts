/** Room round the craft for rulers, handles and names: less in a small pane, where the craft itself needs it. px. */
import type { Extent } from './clearSpot.ts';
import { TAIL_HANDLE_PX } from './grip.ts';
import type { Margins } from './view.ts';

/** A pane so large has the whole margins; in smaller ones they shrink in proportion, down to the least. */
const ROOMY: Extent = { width: 900, height: 460 };

const share = ({ width, height }: Extent): number => Math.min(1, width / ROOMY.width, height / ROOMY.height);

const least = (whole: number, by: number, low: number): number => Math.max(low, Math.round(whole * by));

/** What the wedge of a support point and its name need below it, over the ruler. */
const SUPPORTED = 46;

/** Beyond the tail there is the handle, above the skin the tape, below the craft the ruler of stations. */
export function sideMargins(pane: Extent, supported: boolean): Margins {
  const by = share(pane);
  return {
    left: least(46, by, 16),
    right: least(66, by, TAIL_HANDLE_PX + 15),
    top: least(46, by, 24),
    bottom: least(74, by, supported ? SUPPORTED : 36),
  };
}

export function frontMargins({ width, height }: Extent): Margins {
  const each = Math.max(16, Math.min(30, Math.round(0.1 * Math.min(width, height))));
  return { left: each, right: each, top: each, bottom: each };
}

/** At the foot there is a line of words, at the starboard edge its name; a lever stands to port. */
export function aboveMargins({ width, height }: Extent): Margins {
  const each = Math.max(16, Math.min(30, Math.round(0.08 * Math.min(width, height))));
  return { left: each + 8, right: each + 8, top: Math.max(24, each), bottom: each + (width < 190 ? 24 : 12) };
}
