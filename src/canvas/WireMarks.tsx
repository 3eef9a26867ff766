/** Wire runs along their true paths. */
import { memo } from 'react';
import { Shape } from 'react-konva/es/ReactKonvaCore.js';
import type { Line } from '../scene/grip.ts';
import { trace } from './paint.ts';

export interface WireMarksProps {
  readonly lines: readonly Line[];
  readonly ink: string;
  /** Size of a pixel, m. */
  readonly px: number;
}

export const WireMarks = memo(({ lines, ink, px }: WireMarksProps) => (
  <Shape
    sceneFunc={(context) => {
      context.strokeStyle = ink;
      context.lineWidth = 2 * px;
      context.lineJoin = 'round';
      for (const { at } of lines) {
        trace(context, at, false);
        context.stroke();
      }
    }}
  />
));
