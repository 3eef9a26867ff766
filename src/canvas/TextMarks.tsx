/** Words beside the marks of the plan and the rails, where they cover nothing that has to be seen. Pixels. */
import type { Context } from 'konva/lib/Context.js';
import { memo } from 'react';
import { Shape } from 'react-konva/es/ReactKonvaCore.js';
import { type Area, type PlacedText, placeTexts } from '../scene/clearTexts.ts';
import { fontOf, textWidth, traceOnScreen, writeOn } from './paint.ts';

export interface MarkText {
  readonly key: string;
  /** The first is bold. */
  readonly lines: readonly string[];
  readonly ink: string;
  readonly halo: string;
  readonly box: Area;
}

const LINE = 15;
const font = (line: number): string => fontOf(12, line === 0 ? 600 : 400);

export interface LaidText extends MarkText, PlacedText {
  readonly width: number;
}

export function layTexts(texts: readonly MarkText[], taken: readonly Area[], frame: Area): LaidText[] {
  const sized = texts.map((text) => ({
    ...text,
    width: Math.max(...text.lines.map((line, i) => textWidth(line, font(i)))),
    height: LINE * text.lines.length,
  }));
  return placeTexts(sized, taken, frame).map((spot, i) => ({ ...sized[i]!, ...spot }));
}

export const TextMarks = memo(({ texts }: { readonly texts: readonly LaidText[] }) => (
  <Shape
    sceneFunc={(context) => {
      context.textAlign = 'center';
      context.textBaseline = 'middle';
      for (const { leader, ink } of texts) if (leader) line(context, leader, ink);
      for (const { lines, left, top, width, ink, halo } of texts) {
        lines.forEach((line, i) => {
          context.font = font(i);
          writeOn(context, line, { x: left + width / 2, y: top + LINE * (i + 0.5) }, ink, halo);
        });
      }
    }}
  />
));

function line(context: Context, { from, to }: NonNullable<PlacedText['leader']>, ink: string): void {
  context.globalAlpha = 0.6;
  context.strokeStyle = ink;
  context.lineWidth = 1;
  traceOnScreen(context, [from, to], false);
  context.stroke();
  context.globalAlpha = 1;
}
