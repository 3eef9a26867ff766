/** The row of the plan under the beam of today: thinner, to the same scale, both rows named. Pixels. */
import type { Context } from 'konva/lib/Context.js';
import { Shape } from 'react-konva/es/ReactKonvaCore.js';
import type { Beam, PlacedBar } from '../scene/beam.ts';
import type { BeamOnPage } from '../scene/beamLayout.ts';
import { planNetWords } from '../scene/beamPlan.ts';
import type { Palette } from '../scene/palette.ts';
import type { UnitSystem } from '../scene/subject.ts';
import { fontOf, shortened, traceOnScreen, writeOn } from './paint.ts';
import type { Size } from './useSize.ts';

export interface BeamPlanMarksProps {
  readonly beam: Beam;
  readonly page: BeamOnPage;
  /** Top of the bars of today. */
  readonly today: number;
  /** Of the whole pane; the row is at its foot. */
  readonly size: Size;
  readonly units: UnitSystem;
  readonly palette: Palette;
  isLit(bar: PlacedBar): boolean;
}

/** Room that the row takes from the beam of today, px. */
export const PLAN_ROW = 34;
const BAR = 16;
const FOOT = 10;

/** What is left of a pane for the beam of today. */
export const abovePlan = ({ width, height }: Size): Size => ({
  width,
  height: Math.max(0, height - PLAN_ROW),
});

export function BeamPlanMarks(props: BeamPlanMarksProps) {
  return (
    <Shape
      sceneFunc={(context) => {
        const top = props.size.height - FOOT - BAR;
        for (const each of props.page.bars) bar(context, each, top, props);
        gap(context, props, top);
        edge(context, props, top);
        rowNames(context, props, top);
      }}
    />
  );
}

function bar(
  context: Context,
  { bar: of, left, right }: BeamOnPage['bars'][number],
  top: number,
  { palette, isLit }: BeamPlanMarksProps,
): void {
  const seam = right - left > 3 ? 1 : 0;
  context.globalAlpha = 0.72;
  context.fillStyle = of.moment < 0 ? palette.fore : palette.aft;
  context.fillRect(left, top, right - left - seam, BAR);
  context.globalAlpha = 1;
  if (isLit(of)) {
    context.strokeStyle = palette.brass;
    context.lineWidth = 2.5;
    context.strokeRect(left - 1, top - 1.5, right - left + 1, BAR + 3);
  }
  const font = fontOf(11);
  const name = shortened(of.name, font, right - left - 8);
  if (name === null) return;
  context.font = font;
  context.textAlign = 'center';
  context.textBaseline = 'middle';
  context.fillStyle = palette.paper;
  context.fillText(name, (left + right) / 2, top + BAR / 2 + 0.5);
}

/** What is left between the sides. */
function gap(context: Context, { page, palette }: BeamPlanMarksProps, top: number): void {
  const { left, right } = page.gap;
  if (right - left < 0.5) return;
  context.strokeStyle = palette.open;
  context.lineWidth = 1;
  context.strokeRect(left, top + 0.5, right - left, BAR - 1);
}

function edge(context: Context, { page: { middle }, palette }: BeamPlanMarksProps, top: number): void {
  context.strokeStyle = palette.ring;
  context.lineWidth = 2;
  traceOnScreen(
    context,
    [
      { x: middle, y: top - 3 },
      { x: middle, y: top + BAR },
    ],
    false,
  );
  context.stroke();
  traceOnScreen(
    context,
    [
      { x: middle, y: top + BAR },
      { x: middle + 5, y: top + BAR + 7 },
      { x: middle - 5, y: top + BAR + 7 },
    ],
    true,
  );
  context.fillStyle = palette.ring;
  context.fill();
}

const EDGE = 6;
const ABOVE = 9;

/** What either row is, over its bars; the plan also how it comes out. Without room for it the upper row goes unnamed. */
function rowNames(context: Context, { beam, palette, units, today }: BeamPlanMarksProps, top: number): void {
  context.font = fontOf(12, 600);
  context.textAlign = 'left';
  context.textBaseline = 'middle';
  const words = `plan: ${planNetWords(beam, units)}`;
  writeOn(context, words, { x: EDGE, y: top - ABOVE }, palette.open, palette.paper);
  if (today < 2 * ABOVE) return;
  writeOn(context, 'today', { x: EDGE, y: today - ABOVE }, palette.ink, palette.paper);
}
