/** Parts as they are, in metres under the transform of the view. Each redraws only when its own figure changes. */
import { memo } from 'react';
import { Shape } from 'react-konva/es/ReactKonvaCore.js';
import type { Figure } from '../scene/figure.ts';
import type { Palette } from '../scene/palette.ts';
import { paintPaths, trace } from './paint.ts';

export interface PartMarkProps {
  readonly figure: Figure;
  readonly palette: Palette;
  /** Size of a pixel, m. */
  readonly px: number;
}

/** A figure drawn larger than it is has a dotted edge; one on the far side is faint; one that is amiss has a bad one. */
const PartMark = memo(({ figure, palette, px }: PartMarkProps) => (
  <Shape
    opacity={figure.far ? 0.5 : 1}
    sceneFunc={(context) => {
      const edge = figure.amiss ? palette.bad : palette.partEdge;
      context.strokeStyle = edge;
      context.lineWidth = px;
      for (const strut of figure.struts) {
        trace(context, strut, false);
        context.stroke();
      }
      if (figure.enlarged) context.setLineDash([1.5 * px, 1.5 * px]);
      const fill = figure.kind === 'ballast' ? palette.lead : palette.part;
      paintPaths(context, figure.paths, { fill, edge, width: (figure.amiss ? 2 : 1.2) * px });
    }}
  />
));

export interface PartMarksProps {
  readonly figures: readonly Figure[];
  readonly palette: Palette;
  readonly px: number;
}

/** Those on the far side first. */
export const PartMarks = memo(({ figures, palette, px }: PartMarksProps) => (
  <>
    {[...figures]
      .sort((a, b) => Number(b.far) - Number(a.far))
      .map((figure) => (
        <PartMark key={`${figure.part} ${figure.copy}`} figure={figure} palette={palette} px={px} />
      ))}
  </>
));
