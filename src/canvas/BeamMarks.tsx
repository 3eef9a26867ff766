/** The beam as drawn: bars stacked either way of the CB, lines up to their stations, the gap hatched, lead as a ghost. Pixels. */
import type { Context } from 'konva/lib/Context.js';
import { Shape } from 'react-konva/es/ReactKonvaCore.js';
import { type Beam, netWords, type PlacedBar } from '../scene/beam.ts';
import type { BarOnPage, BeamOnPage } from '../scene/beamLayout.ts';
import type { Palette } from '../scene/palette.ts';
import type { UnitSystem } from '../scene/subject.ts';
import { leadBarWords, momentAmount } from '../scene/words.ts';
import { fontOf, shortened, textWidth, traceOnScreen, writeOn } from './paint.ts';
import type { Size } from './useSize.ts';

export interface BeamMarksProps {
  readonly beam: Beam;
  readonly page: BeamOnPage;
  readonly size: Size;
  readonly units: UnitSystem;
  readonly palette: Palette;
  isLit(bar: PlacedBar): boolean;
  /** Key of the bar under the pointer. */
  readonly hovered: string | null;
}

const BAR = 38;
/** Lines to stations are drawn for so many of the longest bars. */
const LEADERS = 14;
/** Amounts change with every move: they are measured only where one may fit, px. */
const AMOUNT_ROOM = 36;
/** Room under the beam for the sums of both sides. */
const FOOT = 46;

/** Of the bars. */
export const topOf = ({ height }: Size): number => Math.max(24, Math.min(height - FOOT - BAR, 0.42 * height));

/** Whether a point at that height lies on the bars. */
export const onBeam = (y: number, size: Size): boolean => y >= topOf(size) - 2 && y <= topOf(size) + BAR + 2;

export function BeamMarks(props: BeamMarksProps) {
  return (
    <Shape
      sceneFunc={(context) => {
        const top = topOf(props.size);
        leaders(context, props, top);
        for (const each of props.page.bars) barBody(context, each, top, props);
        gap(context, props, top);
        for (const each of props.page.bars) barText(context, each, top, props);
        balancePoint(context, props, top);
        sums(context, props, top + BAR);
      }}
    />
  );
}

const keyOfBar = ({ kind, id }: PlacedBar): string => `${kind} ${id}`;

const inkOf = ({ moment }: PlacedBar, palette: Palette): string => (moment < 0 ? palette.fore : palette.aft);

function leaders(context: Context, { page, palette, isLit, hovered }: BeamMarksProps, top: number): void {
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
  top: number,
  { palette, isLit, hovered }: BeamMarksProps,
): void {
  context.fillStyle = inkOf(bar, palette);
  const seam = right - left > 3 ? 1 : 0;
  context.fillRect(left, top, right - left - seam, BAR);
  if (!isLit(bar) && keyOfBar(bar) !== hovered) return;
  context.strokeStyle = palette.brass;
  context.lineWidth = 3;
  context.strokeRect(left - 1, top - 2, right - left + 1, BAR + 4);
}

/** Name and moment inside the bar, as far as they fit. */
function barText(
  context: Context,
  { bar, left, right }: BarOnPage,
  top: number,
  props: BeamMarksProps,
): void {
  const { palette, units } = props;
  const room = right - left - 8;
  const name = shortened(bar.name, fontOf(12, 600), room);
  if (name === null) return;
  const middle = (left + right) / 2;
  context.textAlign = 'center';
  context.textBaseline = 'middle';
  context.fillStyle = palette.paper;
  context.font = fontOf(12, 600);
  context.fillText(name, middle, top + 13);
  const amount = momentAmount(bar.moment, units);
  context.font = fontOf(11);
  if (room > AMOUNT_ROOM && textWidth(amount, fontOf(11)) <= room) context.fillText(amount, middle, top + 27);
}

/** What one side falls short of the other, hatched, with the lead that would close it. */
function gap(context: Context, { beam, page, palette, units }: BeamMarksProps, top: number): void {
  const { left, right } = page.gap;
  if (right - left < 0.5) return;
  hatch(context, left, right, top, palette);
  context.save();
  context.setLineDash(page.lead ? [5, 3] : []);
  context.strokeStyle = page.lead ? palette.lead : palette.bad;
  context.lineWidth = 1.5;
  context.strokeRect(left, top + 0.75, right - left, BAR - 1.5);
  context.restore();
  const font = fontOf(12, 600);
  const words = page.lead ? leadBarWords(page.lead.bar, units) : [netWords(beam.net, units)];
  const text = words.find((each) => textWidth(each, font) <= right - left - 10);
  if (text === undefined) return;
  context.font = font;
  context.textAlign = 'center';
  context.textBaseline = 'middle';
  const ink = page.lead ? palette.lead : palette.bad;
  writeOn(context, text, { x: (left + right) / 2, y: top + BAR / 2 }, ink, palette.paper);
}

function hatch(context: Context, left: number, right: number, top: number, palette: Palette): void {
  context.save();
  context.beginPath();
  context.rect(left, top, right - left, BAR);
  context.clip();
  context.fillStyle = palette.paper;
  context.fillRect(left, top, right - left, BAR);
  context.strokeStyle = palette.line;
  context.lineWidth = 1;
  context.beginPath();
  for (let x = left - BAR; x < right; x += 7) {
    context.moveTo(x, top + BAR);
    context.lineTo(x + BAR, top);
  }
  context.stroke();
  context.restore();
}

/** The edge on which the beam rests, hung from the CB. */
function balancePoint(context: Context, { page: { middle }, palette }: BeamMarksProps, top: number): void {
  context.strokeStyle = palette.ring;
  context.lineWidth = 2;
  traceOnScreen(
    context,
    [
      { x: middle, y: 0 },
      { x: middle, y: top + BAR },
    ],
    false,
  );
  context.stroke();
  traceOnScreen(
    context,
    [
      { x: middle, y: top + BAR },
      { x: middle + 7, y: top + BAR + 11 },
      { x: middle - 7, y: top + BAR + 11 },
    ],
    true,
  );
  context.fillStyle = palette.ring;
  context.fill();
}

/** The sums of both sides under their ends, and what is left under the middle. */
function sums(context: Context, { beam, page, size, palette, units }: BeamMarksProps, bottom: number): void {
  const y = bottom + 15;
  context.textBaseline = 'middle';
  context.font = fontOf(12);
  context.textAlign = 'right';
  const fore = `${momentAmount(beam.fore, units)} forward`;
  writeOn(context, fore, { x: page.middle - 14, y }, palette.ink, palette.paper);
  context.textAlign = 'left';
  const aft = `${momentAmount(beam.aft, units)} aft`;
  writeOn(context, aft, { x: page.middle + 14, y }, palette.ink, palette.paper);
  context.textAlign = 'center';
  context.font = fontOf(13, 600);
  const balanced = Math.abs(page.gap.right - page.gap.left) < 0.5;
  const x = Math.min(Math.max(page.middle, 90), size.width - 90);
  const ink = balanced ? palette.good : palette.bad;
  writeOn(context, netWords(beam.net, units), { x, y: bottom + 34 }, ink, palette.paper);
}
