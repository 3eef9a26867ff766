/** What is written over a view: the hint, the readout of a drag, and what lies under the pointer. Each covers nothing of note. */
import { useRef } from 'react';
import { clearSpot, type Extent, type InSight, spotBeside } from '../scene/clearSpot.ts';
import type { Palette } from '../scene/palette.ts';
import type { Readout } from '../scene/readout.ts';
import type { Rect } from '../scene/rect.ts';
import { Bubble, bubbleExtent } from './Bubble.tsx';

export interface NotesProps {
  readonly hint: string | null;
  /** What is in hand. */
  readonly readout: Readout | null;
  /** What is under the pointer, and where. */
  readonly under: { readonly about: Readout; readonly thing: Rect } | null;
  readonly inSight: InSight;
  readonly size: Extent;
  readonly palette: Palette;
  /** Greatest width of the readout, px. */
  readonly most?: number;
}

const HINT_WIDTH = 420;

export function Notes({ hint, readout, under, inSight, size, palette, most = 290 }: NotesProps) {
  const spot = useRef<number | null>(null);
  if (!readout) spot.current = null;
  if (size.width === 0) return null;
  const widest = Math.min(most, size.width - 12);
  const hintBox = hint && bubbleExtent(null, [hint], Math.min(HINT_WIDTH, size.width - 12));
  const hintRect = hintBox && clearSpot(size, hintBox, inSight).rect;
  const clear = hintRect ? [...inSight.clear, hintRect] : inSight.clear;
  const ground = { ...inSight, clear };
  const readAt =
    readout && clearSpot(size, bubbleExtent(readout.title, readout.lines, widest), ground, spot.current);
  if (readAt) spot.current = readAt.index;
  return (
    <>
      {hint && hintRect && <Bubble title={null} lines={[hint]} rect={hintRect} palette={palette} />}
      {readout && readAt && <Bubble {...readout} rect={readAt.rect} palette={palette} />}
      {under && !readout && (
        <Bubble
          {...under.about}
          rect={spotBeside(
            size,
            bubbleExtent(under.about.title, under.about.lines, widest),
            under.thing,
            ground,
          )}
          palette={palette}
        />
      )}
    </>
  );
}
