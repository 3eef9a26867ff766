/** The hull from its true profile: gas, skin, keel line and axis, in metres under the transform of the view. */
import { memo, useMemo } from 'react';
import { Shape } from 'react-konva/es/ReactKonvaCore.js';
import { keelLine, sideOutline } from '../scene/outline.ts';
import type { Palette } from '../scene/palette.ts';
import type { Geometry } from '../scene/subject.ts';
import { trace } from './paint.ts';

export interface HullMarksProps {
  readonly hull: Geometry['hull'];
  readonly palette: Palette;
  /** Size of a pixel, m. */
  readonly px: number;
}

export const HullMarks = memo(({ hull, palette, px }: HullMarksProps) => {
  const outline = useMemo(() => sideOutline(hull), [hull]);
  const keel = useMemo(() => keelLine(hull), [hull]);
  return (
    <Shape
      sceneFunc={(context) => {
        trace(context, outline, true);
        context.fillStyle = palette.gas;
        context.fill();
        context.strokeStyle = palette.skin;
        context.lineWidth = 1.5 * px;
        context.stroke();
        trace(context, keel, false);
        context.lineWidth = 3 * px;
        context.stroke();
        context.beginPath();
        context.moveTo(0, 0);
        context.lineTo(hull.length, 0);
        context.setLineDash([14 * px, 5 * px, 3 * px, 5 * px]);
        context.lineWidth = px;
        context.globalAlpha = 0.6;
        context.stroke();
      }}
    />
  );
});
