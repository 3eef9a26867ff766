/** The beam as drawn: bars stacked either way of the CB, lines up to their stations, the gap hatched, lead as a ghost. Pixels. */
import type { Context } from 'konva/lib/Context.js';
import { Shape } from 'react-konva/es/ReactKonvaCore.js';
import { type Beam, netWords, type PlacedBar } from '../scene/beam.ts';
import type { BarOnPage, BeamOnPage, BeamRows } from '../scene/beamLayout.ts';
import type { Palette } from '../scene/palette.ts';
import type { UnitSystem } from '../scene/subject.ts';
import { leadBarWords, momentAmount } from '../scene/words.ts';
import { resultInk, sums } from './beamSums.ts';
import { fontOf, shortened, textWidth, traceOnScreen, writeOn } from './paint.ts';
import type { Size } from './useSize.ts';

export interface BeamMarksProps {
  readonly beam: Beam;
  readonly page: BeamOnPage;
  readonly rows: BeamRows;
  /** Whether lines are drawn up to the stations. */
  readonly leaders: boolean;
  /** Whether the craft is level within its tolerance. */
  readonly level: boolean;
  readonly size: Size;
  readonly units: UnitSystem;
  readonly palette: Palette;
  isLit(bar: PlacedBar): boolean;
  /** Key of the bar under the pointer. */
  readonly hovered: string | null;
}

/** Lines to stations are drawn for so many of the longest bars. */
const LEADERS = 14;
/** Amounts change with every move: they are measured only where one may fit, px. */
const AMOUNT_ROOM = 36;
/** A bar lower than this holds the name alone. */
const TWO_LINES = 34;

/** Whether a point at that height lies on the bars. */
export const onBeam = (y: number, { top, bar }: BeamRows): boolean => y >= top - 2 && y <= top + bar + 2;

export function BeamMarks(props: BeamMarksProps) {
  return (
    <Shape
      sceneFunc={(context) => {
        if (props.leaders) leaders(context, props);
        for (const each of props.page.bars) barBody(context, each, props);
        gap(context, props);
        for (const each of props.page.bars) barText(context, each, props);
        balancePoint(context, props);
        sums(context, props);
      }}
    />
  );
}

export const keyOfBar = ({ kind, id }: PlacedBar): string => `${kind} ${id}`;

const inkOf = ({ moment }: PlacedBar, palette: Palette): string => (moment < 0 ? palette.fore : palette.aft);

function leaders(context: Context, { page, palette, isLit, hovered, rows: { top } }: BeamMarksProps): void {
  page.bars.forEach((each, i) => {
    const { bar, left, right, stationX } = each;
    const lit = isLit(bar) || keyOfBar(bar) === hovered;
    if (i >= LEADERS && !lit) return;
    const middle = (left + right) / 2;
    context.strokeStyle = lit ? palette.brass : inkOf(bar, palette);
    context.globalAlpha = lit ? 1 : 0.65;
    context.lineWidth = lit ? 1.8 : 1;
    traceOnScreen(
      context,
      [
        { x: stationX, y: 0 },
        { x: stationX, y: 7 },
        { x: middle, y: top - 5 },
        { x: middle, y: top },
      ],
      false,
    );
    context.stroke();
    context.beginPath();
    context.arc(stationX, 3, 2.5, 0, 2 * Math.PI, false);
    context.fillStyle = context.strokeStyle;
    context.fill();
    context.globalAlpha = 1;
  });
}

function barBody(
  context: Context,
  { bar, left, right }: BarOnPage,
  { palette, isLit, hovered, rows }: BeamMarksProps,
): void {
  const { top } = rows;
  context.fillStyle = inkOf(bar, palette);
  const seam = right - left > 3 ? 1 : 0;
  context.fillRect(left, top, right - left - seam, rows.bar);
  if (!isLit(bar) && keyOfBar(bar) !== hovered) return;
  context.strokeStyle = palette.brass;
  context.lineWidth = 3;
  context.strokeRect(left - 1, top - 2, right - left + 1, rows.bar + 4);
}

/** Name and moment inside the bar, as far as they fit. */
function barText(
  context: Context,
  { bar, left, right }: BarOnPage,
  { palette, units, rows }: BeamMarksProps,
): void {
  const room = right - left - 8;
  const name = shortened(bar.name, fontOf(12, 600), room);
  if (name === null) return;
  const middle = (left + right) / 2;
  context.textAlign = 'center';
  context.textBaseline = 'middle';
  context.fillStyle = palette.paper;
  context.font = fontOf(12, 600);
  const two = rows.bar >= TWO_LINES;
  context.fillText(name, middle, rows.top + (two ? 13 : rows.bar / 2));
  if (!two) return;
  const amount = momentAmount(bar.moment, units);
  context.font = fontOf(11);
  if (room > AMOUNT_ROOM && textWidth(amount, fontOf(11)) <= room)
    context.fillText(amount, middle, rows.top + 27);
}

/** What one side falls short of the other, hatched, with the lead that would close it. */
function gap(context: Context, props: BeamMarksProps): void {
  const { beam, page, palette, units, level, rows } = props;
  const { left, right } = page.gap;
  if (right - left < 0.5) return;
  const ink = page.lead ? palette.lead : resultInk(props);
  hatch(context, left, right, rows, palette);
  context.save();
  context.setLineDash(page.lead ? [5, 3] : []);
  context.strokeStyle = ink;
  context.lineWidth = 1.5;
  context.strokeRect(left, rows.top + 0.75, right - left, rows.bar - 1.5);
  context.restore();
  const font = fontOf(12, 600);
  const words = page.lead ? leadBarWords(page.lead.bar, units) : [netWords(beam.net, units, level)];
  const text = words.find((each) => textWidth(each, font) <= right - left - 10);
  if (text === undefined) return;
  context.font = font;
  context.textAlign = 'center';
  context.textBaseline = 'middle';
  writeOn(context, text, { x: (left + right) / 2, y: rows.top + rows.bar / 2 }, ink, palette.paper);
}

function hatch(
  context: Context,
  left: number,
  right: number,
  { top, bar }: BeamRows,
  palette: Palette,
): void {
  context.save();
  context.beginPath();
  context.rect(left, top, right - left, bar);
  context.clip();
  context.fillStyle = palette.paper;
  context.fillRect(left, top, right - left, bar);
  context.strokeStyle = palette.line;
  context.lineWidth = 1;
  context.beginPath();
  for (let x = left - bar; x < right; x += 7) {
    context.moveTo(x, top + bar);
    context.lineTo(x + bar, top);
  }
  context.stroke();
  context.restore();
}

/** The edge on which the beam rests, hung from the CB. */
function balancePoint(context: Context, { page: { middle }, palette, rows, leaders }: BeamMarksProps): void {
  const bottom = rows.top + rows.bar;
  context.strokeStyle = palette.ring;
  context.lineWidth = 2;
  traceOnScreen(
    context,
    [
      { x: middle, y: leaders ? 0 : rows.top },
      { x: middle, y: bottom },
    ],
    false,
  );
  context.stroke();
  traceOnScreen(
    context,
    [
      { x: middle, y: bottom },
      { x: middle + 7, y: bottom + 11 },
      { x: middle - 7, y: bottom + 11 },
    ],
    true,
  );
  context.fillStyle = palette.ring;
  context.fill();
}
