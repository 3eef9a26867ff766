/** The sums of both sides of the beam under its middle, and what is left of them. Pixels. */
import type { Context } from 'konva/lib/Context.js';
import { netWords, roundsToNothing } from '../scene/beam.ts';
import { momentAmount } from '../scene/words.ts';
import type { BeamMarksProps } from './BeamMarks.tsx';
import { fontOf, textWidth, writeOn } from './paint.ts';

const SUM_FONT = fontOf(12);
const RESULT_FONT = fontOf(13, 600);
/** From the middle to the sums, and between sums and result. */
const APART = 14;
const EDGE = 6;

/** In the colour of the verdict. */
export function resultInk({ beam, units, level, palette }: BeamMarksProps): string {
  if (roundsToNothing(beam.net, units)) return palette.good;
  return level ? palette.ink : palette.bad;
}

export function sums(context: Context, props: BeamMarksProps): void {
  const { beam, page, rows, size, palette, units, level } = props;
  const fore = `${momentAmount(beam.fore, units)} forward`;
  const aft = `${momentAmount(beam.aft, units)} aft`;
  const result = netWords(beam.net, units, level);
  const width = textWidth(result, RESULT_FONT);
  context.textBaseline = 'middle';
  context.textAlign = 'left';
  const write = (text: string, x: number, y: number, font: string, ink: string) => {
    context.font = font;
    writeOn(context, text, { x, y }, ink, palette.paper);
  };
  const [foreWidth, aftWidth] = [textWidth(fore, SUM_FONT), textWidth(aft, SUM_FONT)];
  const beside = rows.result === null;
  const at = beside ? besideSums(page.middle, foreWidth, aftWidth, width, size.width) : null;
  if (!beside || at) {
    write(fore, page.middle - APART - foreWidth, rows.sums, SUM_FONT, palette.ink);
    write(aft, page.middle + APART, rows.sums, SUM_FONT, palette.ink);
  }
  const middle = Math.max(EDGE, Math.min(page.middle - width / 2, size.width - EDGE - width));
  write(result, at?.x ?? middle, rows.result ?? rows.sums, RESULT_FONT, resultInk(props));
}

/** Left edge of the result aft of the sums, else forward of them; null when neither has room, and it stands alone. */
function besideSums(
  middle: number,
  fore: number,
  aft: number,
  width: number,
  whole: number,
): { x: number } | null {
  const after = middle + APART + aft + 2 * APART;
  if (after + width <= whole - EDGE) return { x: after };
  const before = middle - APART - fore - 2 * APART - width;
  return before >= EDGE ? { x: before } : null;
}
