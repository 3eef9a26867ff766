/** Hardpoints as eyelets, the least lead as a ghost hung on its own, and the point that carries the heaviness. Pixels. */
import type { Context } from 'konva/lib/Context.js';
import { Shape } from 'react-konva/es/ReactKonvaCore.js';
import type { Palette } from '../scene/palette.ts';
import type { ScreenPoint } from '../scene/view.ts';
import { fontOf, traceOnScreen, writeOn } from './paint.ts';

export interface Eyelet {
  readonly id: string;
  readonly at: ScreenPoint;
  readonly selected: boolean;
}

export interface PointMarksProps {
  readonly eyelets: readonly Eyelet[];
  /** Where the least lead would hang, and its name: "148.0 g of lead". */
  readonly lead: { readonly at: ScreenPoint; readonly text: string } | null;
  readonly support: ScreenPoint | null;
  readonly palette: Palette;
}

export function PointMarks({ eyelets, lead, support, palette }: PointMarksProps) {
  return (
    <Shape
      sceneFunc={(context) => {
        if (support) foot(context, support, palette);
        if (lead) ghost(context, lead.at, lead.text, palette);
        for (const each of eyelets) eyelet(context, each, palette);
      }}
    />
  );
}

function eyelet(context: Context, { at: { x, y }, selected }: Eyelet, palette: Palette): void {
  context.beginPath();
  context.arc(x, y, 5, 0, 2 * Math.PI, false);
  context.fillStyle = selected ? palette.brass : palette.paper;
  context.fill();
  context.lineWidth = 2;
  context.strokeStyle = selected ? palette.brass : palette.lead;
  context.stroke();
  context.beginPath();
  context.arc(x, y, 1.5, 0, 2 * Math.PI, false);
  context.fillStyle = selected ? palette.onBrass : palette.lead;
  context.fill();
}

/** A weight on a short line, dashed, for it is not there. */
function ghost(context: Context, { x, y }: ScreenPoint, text: string, palette: Palette): void {
  const [top, half] = [y + 16, 11];
  context.save();
  context.strokeStyle = palette.lead;
  context.lineWidth = 1.5;
  traceOnScreen(
    context,
    [
      { x, y: y + 5 },
      { x, y: top },
    ],
    false,
  );
  context.stroke();
  context.setLineDash([3, 2.5]);
  const weight = [
    { x: x - 0.55 * half, y: top },
    { x: x + 0.55 * half, y: top },
    { x: x + half, y: top + 18 },
    { x: x - half, y: top + 18 },
  ];
  traceOnScreen(context, weight, true);
  context.fillStyle = palette.paper;
  context.fill();
  context.stroke();
  context.restore();
  context.font = fontOf(12, 600);
  context.textBaseline = 'middle';
  context.textAlign = 'center';
  if (x < -10) return;
  const middle = Math.max(x, 50);
  writeOn(context, text, { x: middle, y: top + 30 }, palette.lead, palette.paper);
}

/** The point it rests on or is tied to: a wedge under it. */
function foot(context: Context, { x, y }: ScreenPoint, palette: Palette): void {
  const wedge = [
    { x, y },
    { x: x + 8, y: y + 14 },
    { x: x - 8, y: y + 14 },
  ];
  traceOnScreen(context, wedge, true);
  context.fillStyle = palette.openSoft;
  context.fill();
  context.strokeStyle = palette.open;
  context.lineWidth = 1.5;
  context.stroke();
  context.font = fontOf(12);
  context.textAlign = 'left';
  context.textBaseline = 'middle';
  writeOn(context, 'support', { x: x + 13, y: y + 8 }, palette.open, palette.paper);
}
