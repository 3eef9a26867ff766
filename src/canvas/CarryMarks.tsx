/** The curve of what can be carried where, as drawn. Pixels. */
import type { Context } from 'konva/lib/Context.js';
import { Shape } from 'react-konva/es/ReactKonvaCore.js';
import type { Band, CarryPage, SpotOnPage } from '../scene/carryPlot.ts';
import type { Palette } from '../scene/palette.ts';
import type { ScreenPoint } from '../scene/view.ts';
import { fontOf, textWidth, traceOnScreen, writeOn } from './paint.ts';

export interface CarryMarksProps {
  readonly page: CarryPage;
  /** Where the station is read, and what is read there. */
  readonly read: SpotOnPage | null;
  readonly words: string;
  readonly width: number;
  readonly palette: Palette;
}

export function CarryMarks(props: CarryMarksProps) {
  return (
    <Shape
      sceneFunc={(context) => {
        const { page, palette } = props;
        axis(context, props);
        for (const band of page.gaps) hatch(context, band, page.foot, palette);
        for (const run of page.loads) area(context, run, page.foot, palette);
        for (const run of page.ballast) line(context, run, palette);
        if (page.waiting) waiting(context, page.waiting, page.foot, palette);
        tickLabels(context, props);
        legend(context, props);
        reading(context, props);
      }}
    />
  );
}

function axis(context: Context, { page, palette }: CarryMarksProps): void {
  context.strokeStyle = palette.lineSoft;
  context.lineWidth = 1;
  for (const { y } of page.ticks) {
    const at = Math.round(y) + 0.5;
    traceOnScreen(
      context,
      [
        { x: page.left, y: at },
        { x: page.right, y: at },
      ],
      false,
    );
    context.stroke();
  }
  context.strokeStyle = palette.inkSoft;
  const foot = Math.round(page.foot) + 0.5;
  traceOnScreen(
    context,
    [
      { x: page.left, y: foot },
      { x: page.right, y: foot },
    ],
    false,
  );
  context.stroke();
}

/** Beside the nose while there is room, else on the plot itself. */
function tickLabels(context: Context, { page, palette }: CarryMarksProps): void {
  context.font = fontOf(11);
  context.textBaseline = 'middle';
  const beside = page.left > 44;
  context.textAlign = beside ? 'right' : 'left';
  const x = beside ? page.left - 6 : Math.max(page.left, 0) + 4;
  for (const { y, label } of page.ticks) writeOn(context, label, { x, y }, palette.inkSoft, palette.paper);
}

function area(context: Context, run: readonly ScreenPoint[], foot: number, palette: Palette): void {
  const [first, last] = [run[0]!, run.at(-1)!];
  traceOnScreen(context, [{ x: first.x, y: foot }, ...run, { x: last.x, y: foot }], true);
  context.fillStyle = palette.goodSoft;
  context.fill();
  context.strokeStyle = palette.good;
  context.lineWidth = 1.8;
  traceOnScreen(context, run, false);
  context.stroke();
}

function line(context: Context, run: readonly ScreenPoint[], palette: Palette): void {
  context.save();
  context.strokeStyle = palette.lead;
  context.lineWidth = 1.8;
  context.setLineDash([5, 3]);
  traceOnScreen(context, run, false);
  context.stroke();
  context.restore();
}

function hatch(context: Context, { left, right }: Band, foot: number, palette: Palette): void {
  const top = foot - 12;
  context.save();
  context.beginPath();
  context.rect(left, top, right - left, foot - top);
  context.clip();
  context.beginPath();
  context.strokeStyle = palette.bad;
  context.lineWidth = 1;
  for (let x = left - 12; x < right; x += 6) {
    context.moveTo(x, foot);
    context.lineTo(x + 12, top);
  }
  context.stroke();
  context.restore();
}

const WAITING = 'not worked out yet';

function waiting(context: Context, { left, right }: Band, foot: number, palette: Palette): void {
  if (right - left < textWidth(WAITING, fontOf(12)) + 12) return;
  context.font = fontOf(12);
  context.textAlign = 'center';
  context.textBaseline = 'middle';
  writeOn(context, WAITING, { x: (left + right) / 2, y: foot - 22 }, palette.inkSoft, palette.paper);
}

const SAMPLE = 18;

/** What area and line are, and what is read. */
function legend(context: Context, { palette, words, width, page }: CarryMarksProps): void {
  context.textBaseline = 'middle';
  context.textAlign = 'left';
  context.font = fontOf(12);
  const y = 11;
  if (words) {
    const room = Math.max(6, Math.min(page.left, width - textWidth(words, fontOf(12)) - 8));
    writeOn(context, words, { x: room, y }, palette.ink, palette.paper);
    return;
  }
  const load = 'most useful load';
  const from = Math.max(6, page.left);
  context.fillStyle = palette.goodSoft;
  context.fillRect(from, y - 5, SAMPLE, 10);
  context.strokeStyle = palette.good;
  context.lineWidth = 1.8;
  traceOnScreen(
    context,
    [
      { x: from, y: y - 5 },
      { x: from + SAMPLE, y: y - 5 },
    ],
    false,
  );
  context.stroke();
  writeOn(context, load, { x: from + SAMPLE + 5, y }, palette.good, palette.paper);
  const next = from + SAMPLE + 5 + textWidth(load, fontOf(12)) + 18;
  line(
    context,
    [
      { x: next, y },
      { x: next + SAMPLE, y },
    ],
    palette,
  );
  writeOn(context, 'dead ballast left', { x: next + SAMPLE + 5, y }, palette.lead, palette.paper);
}

function reading(context: Context, { read, page, palette }: CarryMarksProps): void {
  if (!read) return;
  context.strokeStyle = palette.brass;
  context.lineWidth = 1.5;
  traceOnScreen(
    context,
    [
      { x: read.x, y: 20 },
      { x: read.x, y: page.foot + 5 },
    ],
    false,
  );
  context.stroke();
  for (const [at, ink] of [
    [read.ballast, palette.lead],
    [read.load, palette.good],
  ] as const) {
    if (at === null) continue;
    context.beginPath();
    context.arc(read.x, at, 4, 0, 2 * Math.PI, false);
    context.fillStyle = ink;
    context.fill();
    context.strokeStyle = palette.paper;
    context.stroke();
  }
}
