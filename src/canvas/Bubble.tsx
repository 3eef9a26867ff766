/** A few lines of text beside the hand, kept inside the view. */
import type { Palette } from '../scene/palette.ts';
import type { ScreenPoint } from '../scene/view.ts';
import { FONT } from './paint.ts';
import type { Size } from './useSize.ts';

const LINE = 17;
/** Mean width of a letter, to guess where lines wrap. */
const LETTER = 6.6;
/** How far from the hand it stands, px. */
export const BESIDE = 22;

export interface BubbleProps {
  readonly at: ScreenPoint;
  readonly lines: readonly string[];
  readonly size: Size;
  readonly palette: Palette;
  readonly width?: number;
}

export function Bubble({ at, lines, size, palette, width = 290 }: BubbleProps) {
  const rows = lines.reduce((sum, line) => sum + Math.ceil((line.length * LETTER) / (width - 18)), 0);
  const height = rows * LINE + 12;
  const left = Math.max(4, Math.min(at.x + BESIDE, size.width - width - 4));
  const below = at.y + BESIDE + height < size.height;
  const top = Math.max(4, below ? at.y + BESIDE : at.y - BESIDE - height);
  return (
    <div
      style={{
        position: 'absolute',
        left,
        top,
        maxWidth: width,
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
      {lines.map((line) => (
        <div key={line}>{line}</div>
      ))}
    </div>
  );
}
