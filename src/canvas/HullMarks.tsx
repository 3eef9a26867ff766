/** The hull from its true profile: gas, skin, keel line and axis, in metres under the transform of the view. */
import { memo, useMemo } from 'react';
import { Shape } from 'react-konva/es/ReactKonvaCore.js';
import { keelLine, sideOutline } from '../scene/outline.ts';
import type { Palette } from '../scene/palette.ts';
import type { Geometry } from '../scene/subject.ts';
import { paintAxis, paintHull, trace } from './paint.ts';

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
        paintHull(context, outline, palette, px);
        trace(context, keel, false);
        context.lineWidth = 3 * px;
        context.stroke();
        paintAxis(context, { u: 0, z: 0 }, { u: hull.length, z: 0 }, px);
      }}
    />
  );
});
