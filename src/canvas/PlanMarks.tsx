/** The plan over the side view: ghosts with their way from today, weights at hardpoints, gauges, and the CG that it gives. */
import type { Context } from 'konva/lib/Context.js';
import { memo } from 'react';
import { Group, Shape } from 'react-konva/es/ReactKonvaCore.js';
import { fromSide } from '../scene/flatten.ts';
import { type BalanceMarks, bobOutline } from '../scene/marks.ts';
import type { Palette } from '../scene/palette.ts';
import type { Gauge, GhostMark, WeightMark } from '../scene/planMarks.ts';
import { type ScreenPoint, toScreen, type View } from '../scene/view.ts';
import { fontOf, trace, traceOnScreen, worldTransform, writeOn } from './paint.ts';
import { type PlanShown, WEIGHT_HALF, WEIGHT_HIGH } from './planTexts.ts';

export interface PlanMarksProps extends PlanShown {
  readonly view: View;
  readonly palette: Palette;
}

export const PlanMarks = memo((props: PlanMarksProps) => (
  <>
    <Group {...worldTransform(props.view)}>
      <Shape
        sceneFunc={(context) => {
          for (const mark of props.ghosts) ghost(context, mark, props);
        }}
      />
    </Group>
    <Shape
      sceneFunc={(context) => {
        for (const mark of props.ghosts) way(context, mark, props);
        for (const { at } of props.ashore) cross(context, toScreen(props.view, fromSide(at)), props.palette);
        for (const mark of props.weights) weight(context, mark, props.palette);
        if (props.bob) bob(context, props.bob, props.palette);
      }}
    />
  </>
));

/** The outline of the part where it would be. */
function ghost(context: Context, { figure }: GhostMark, { palette, view }: PlanMarksProps): void {
  const px = 1 / view.scale;
  context.save();
  context.lineWidth = 1.6 * px;
  context.strokeStyle = palette.open;
  context.fillStyle = palette.openSoft;
  context.setLineDash([4 * px, 3 * px]);
  for (const { points, closed, tone } of figure.paths) {
    if (tone !== 'body') continue;
    trace(context, points, closed);
    context.globalAlpha = 0.75;
    context.fill();
    context.globalAlpha = 1;
    context.stroke();
  }
  context.restore();
}

/** Shorter than this there is no room for an arrow, px. */
const LEAST_ARROW = 16;
const HEAD = 7;

/** The arrow from where it is today. */
function way(context: Context, { arrow }: GhostMark, { view, palette }: PlanMarksProps): void {
  if (arrow) arrowOf(context, toScreen(view, arrow.from), toScreen(view, arrow.to), palette);
}

function arrowOf(context: Context, from: ScreenPoint, to: ScreenPoint, palette: Palette): void {
  const run = Math.hypot(to.x - from.x, to.y - from.y);
  if (run < LEAST_ARROW) return;
  const [dx, dy] = [(to.x - from.x) / run, (to.y - from.y) / run];
  const back = (along: number, across: number) => ({
    x: to.x - dx * along - dy * across,
    y: to.y - dy * along + dx * across,
  });
  for (const [ink, width] of [
    [palette.paper, 5],
    [palette.open, 2],
  ] as const) {
    context.strokeStyle = ink;
    context.lineWidth = width;
    traceOnScreen(context, [from, back(HEAD, 0)], false);
    context.stroke();
  }
  traceOnScreen(context, [to, back(HEAD + 3, HEAD - 2), back(HEAD + 3, 2 - HEAD)], true);
  context.fillStyle = palette.open;
  context.fill();
  context.beginPath();
  context.arc(from.x, from.y, 3, 0, 2 * Math.PI, false);
  context.fill();
}

/** A load that would be left ashore. */
function cross(context: Context, { x, y }: ScreenPoint, palette: Palette): void {
  const reach = 11;
  context.strokeStyle = palette.open;
  context.lineWidth = 2.5;
  for (const slant of [1, -1]) {
    traceOnScreen(
      context,
      [
        { x: x - reach, y: y - slant * reach },
        { x: x + reach, y: y + slant * reach },
      ],
      false,
    );
    context.stroke();
  }
}

/** A weight on a line from its hardpoint, dashed, for it is not there yet. */
function weight(context: Context, { at: { x, y }, drop }: WeightMark, palette: Palette): void {
  const top = y + drop;
  const [half, foot] = [WEIGHT_HALF, top + WEIGHT_HIGH];
  context.save();
  context.strokeStyle = palette.lead;
  context.lineWidth = 1.5;
  traceOnScreen(
    context,
    [
      { x, y: y + 9 },
      { x, y: top },
    ],
    false,
  );
  context.stroke();
  context.setLineDash([3, 2.5]);
  const outline = [
    { x: x - 0.55 * half, y: top },
    { x: x + 0.55 * half, y: top },
    { x: x + half, y: foot },
    { x: x - half, y: foot },
  ];
  traceOnScreen(context, outline, true);
  context.fillStyle = palette.openSoft;
  context.fill();
  context.stroke();
  context.restore();
}

/** The bob as it would hang, dashed; the ring does not move. */
function bob(context: Context, { ring, bob: at, lean }: BalanceMarks, palette: Palette): void {
  if (!at) return;
  context.save();
  context.setLineDash([4, 3]);
  context.strokeStyle = palette.bob;
  context.lineWidth = 1.3;
  traceOnScreen(context, [ring, at], false);
  context.stroke();
  traceOnScreen(context, bobOutline(at, lean, 15), true);
  context.fillStyle = palette.paper;
  context.globalAlpha = 0.8;
  context.fill();
  context.globalAlpha = 1;
  context.lineWidth = 1.6;
  context.stroke();
  context.restore();
}

export interface GaugeMarksProps {
  readonly gauges: readonly Gauge[];
  /** Hardpoints whose figures are written out. */
  readonly told: readonly string[];
  readonly palette: Palette;
}

const RING = 9;
const TURN = 2 * Math.PI;
/** A ring for pieces is cut into so many. */
const CUTS = 8;

/** Round each eyelet a ring that fills clockwise from the top; cut up where ballast comes in pieces. */
export const GaugeMarks = memo(({ gauges, told, palette }: GaugeMarksProps) => (
  <Shape
    sceneFunc={(context) => {
      for (const gauge of gauges) ringOf(context, gauge, palette);
      for (const gauge of gauges) if (told.includes(gauge.id)) words(context, gauge, palette);
    }}
  />
));

function ringOf(context: Context, { at: { x, y }, share, pieces }: Gauge, palette: Palette): void {
  const arc = (to: number, ink: string, width: number) => {
    context.beginPath();
    context.arc(x, y, RING, -TURN / 4, -TURN / 4 + to * TURN, false);
    context.strokeStyle = ink;
    context.lineWidth = width;
    context.stroke();
  };
  context.save();
  if (pieces) context.setLineDash([(RING * TURN) / CUTS - 2, 2]);
  arc(1, palette.line, 3);
  if (share > 0) arc(share, share >= 1 ? palette.bad : palette.lead, 3.5);
  context.restore();
}

function words(context: Context, { at, words: text }: Gauge, palette: Palette): void {
  context.font = fontOf(11);
  context.textAlign = at.x < 130 ? 'left' : 'center';
  context.textBaseline = 'middle';
  const x = at.x < 130 ? Math.max(6, at.x - RING) : at.x;
  writeOn(context, text, { x, y: at.y - RING - 9 }, palette.lead, palette.paper);
}
