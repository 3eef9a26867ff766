/** A few lines of text over a view, where they cover nothing the eye is on. */
import type { Extent } from '../scene/clearSpot.ts';
import type { Palette } from '../scene/palette.ts';
import type { Rect } from '../scene/rect.ts';
import { FONT, fontOf, textWidth } from './paint.ts';

const LINE = 17;
/** Edges and padding, both sides. */
const PAD_X = 20;
const PAD_Y = 14;
/** Figures of even width, and words that wrap early, take a little more than measured. */
const SLACK = 1.06;

/** How large the text will be, no wider than `most` px. */
export function bubbleExtent(title: string | null, lines: readonly string[], most: number): Extent {
  const widths = [
    ...(title ? [textWidth(title, fontOf(12, 600))] : []),
    ...lines.map((line) => textWidth(line, fontOf(12))),
  ].map((width) => width * SLACK);
  const room = most - PAD_X;
  const rows = widths.reduce((sum, width) => sum + Math.max(1, Math.ceil(width / room)), 0);
  return { width: Math.ceil(Math.min(most, Math.max(...widths) + PAD_X)), height: rows * LINE + PAD_Y };
}

export interface BubbleProps {
  readonly title: string | null;
  readonly lines: readonly string[];
  readonly rect: Rect;
  readonly palette: Palette;
}

export function Bubble({ title, lines, rect, palette }: BubbleProps) {
  return (
    <div
      style={{
        position: 'absolute',
        left: rect.left,
        top: rect.top,
        width: rect.right - rect.left,
        boxSizing: 'border-box',
        padding: '6px 9px',
        font: `12px/${LINE}px ${FONT}`,
        fontVariantNumeric: 'tabular-nums',
        color: palette.ink,
        background: palette.raised,
        border: `1px solid ${palette.line}`,
        borderRadius: 6,
        pointerEvents: 'none',
      }}
    >
      {title && <div style={{ fontWeight: 600 }}>{title}</div>}
      {lines.map((line) => (
        <div key={line}>{line}</div>
      ))}
    </div>
  );
}
