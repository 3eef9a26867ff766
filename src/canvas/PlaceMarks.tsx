/** The curves of a placement study as drawn, strip below strip. Pixels. */
import type { Context } from 'konva/lib/Context.js';
import { Shape } from 'react-konva/es/ReactKonvaCore.js';
import type { Palette } from '../scene/palette.ts';
import {
  type Band,
  CURVES,
  type Curve,
  NAME_APART,
  NAME_LINE,
  type PlacePage,
  type Strip,
} from '../scene/placePlot.ts';
import type { Rect } from '../scene/rect.ts';
import type { ScreenPoint } from '../scene/view.ts';
import { fontOf, shortened, textWidth, traceOnScreen, writeOn } from './paint.ts';
import type { Size } from './useSize.ts';

export interface PlaceMarksProps {
  readonly page: PlacePage;
  readonly size: Size;
  /** Index of the station that is read, and what each strip says there. */
  readonly read: { readonly index: number; readonly values: readonly string[] } | null;
  readonly palette: Palette;
}

/** Middle of the line of words above the strips. */
const WORDS_Y = 10;
const TEXT = fontOf(12);
const SMALL = fontOf(11);

export function PlaceMarks(props: PlaceMarksProps) {
  return (
    <Shape
      sceneFunc={(context) => {
        const { page, palette } = props;
        for (const band of page.unplanned) dim(context, band, page, palette);
        for (const band of page.struck) hatch(context, band, page, palette);
        if (page.waiting) waiting(context, page.waiting, props);
        today(context, props);
        for (const strip of page.strips) drawStrip(context, strip, props);
        reading(context, props);
      }}
    />
  );
}

/** The line above the strips: the first of the words that fits, or without any the legend. */
export function PlaceHead(props: HeadProps & { readonly words: readonly string[] }) {
  return (
    <Shape
      sceneFunc={(context) => {
        if (props.words.length > 0) line(context, props.words, props);
        else legend(context, props);
      }}
    />
  );
}

const headOf = ({ strips }: PlacePage): number => strips[0]!.top;
const footOf = ({ strips }: PlacePage): number => strips.at(-1)!.foot;

function across(context: Context, from: ScreenPoint, to: ScreenPoint): void {
  traceOnScreen(context, [from, to], false);
  context.stroke();
}

function drawStrip(context: Context, strip: Strip, props: PlaceMarksProps): void {
  const { page, palette } = props;
  const foot = Math.round(strip.foot) + 0.5;
  context.strokeStyle = palette.line;
  context.lineWidth = 1;
  across(context, { x: page.left, y: foot }, { x: page.right, y: foot });
  context.strokeStyle = palette.ring;
  context.lineWidth = 1.8;
  context.lineJoin = 'round';
  for (const run of strip.runs) {
    traceOnScreen(context, run, false);
    context.stroke();
  }
  for (const index of page.best) {
    const y = strip.heights[index];
    if (typeof y === 'number') dot(context, { x: page.stations[index]!, y }, 2.6, palette.good, palette);
  }
  scaleNumbers(context, strip, props);
  name(context, strip, props);
}

function dot(context: Context, { x, y }: ScreenPoint, radius: number, ink: string, { paper }: Palette): void {
  context.beginPath();
  context.arc(x, y, radius, 0, 2 * Math.PI, false);
  context.fillStyle = ink;
  context.fill();
  context.strokeStyle = paper;
  context.lineWidth = 1;
  context.stroke();
}

const numbersFrom = ({ right, stations, today }: PlacePage): number =>
  Math.max(right, stations.at(-1) ?? 0, today ?? 0) + 9;

/** Aft of tail and stations while they are in sight, else at the edge. */
function scaleNumbers(context: Context, { high, low, top, foot, runs }: Strip, props: PlaceMarksProps): void {
  if (runs.length === 0) return;
  const { page, size, palette } = props;
  context.font = SMALL;
  context.textBaseline = 'middle';
  context.textAlign = 'left';
  const room = Math.max(textWidth(high, SMALL), textWidth(low, SMALL)) + 4;
  const x = Math.min(numbersFrom(page), size.width - room);
  writeOn(context, high, { x, y: top + 5 }, palette.inkSoft, palette.paper);
  if (foot - top > 22) writeOn(context, low, { x, y: foot - 4 }, palette.inkSoft, palette.paper);
}

const betterWords = ({ better }: Curve): string => `${better} is better`;

/** Of the names of the curves on two lines, px. */
export const widestName = (): number =>
  Math.max(
    ...CURVES.flatMap((curve) => [curve.name, betterWords(curve)]).map((text) => textWidth(text, SMALL)),
  );

/** What it is and which way is better, clear of the curve: fore of the nose or above the strip. */
function name(context: Context, strip: Strip, { page, size, palette }: PlaceMarksProps): void {
  const what = strip.curve.name;
  const which = strip.runs.length > 0 ? betterWords(strip.curve) : 'at no station';
  const write = (text: string, x: number, y: number, ink: string) =>
    writeOn(context, text, { x, y }, ink, palette.paper);
  context.font = SMALL;
  context.textBaseline = 'middle';
  if (page.names === 'beside') {
    const x = Math.min(page.left, page.stations[0] ?? page.left) - NAME_APART;
    const middle = (strip.top + strip.foot) / 2;
    const two = strip.foot - strip.top >= 2 * NAME_LINE - 2;
    context.textAlign = 'right';
    write(what, x, two ? middle - NAME_LINE / 2 : middle, palette.ink);
    if (two) write(which, x, middle + NAME_LINE / 2, palette.inkSoft);
    return;
  }
  const from = Math.max(page.left, 0) + 4;
  const room = Math.min(page.right, size.width) - from;
  const whole = `${what} – ${which}`;
  const text = textWidth(whole, SMALL) < room ? whole : shortened(what, SMALL, room);
  context.textAlign = 'left';
  if (text !== null) write(text, from, strip.top - NAME_LINE / 2 - 2, palette.ink);
}

/** Where there is no ballast plan: no curve, but dots. */
function dim(context: Context, { left, right }: Band, page: PlacePage, palette: Palette): void {
  dots(context, { left, top: headOf(page), right, bottom: footOf(page) }, palette);
}

function dots(context: Context, { left, top, right, bottom }: Rect, { inkSoft }: Palette): void {
  context.save();
  context.globalAlpha = 0.5;
  context.fillStyle = inkSoft;
  for (let y = top + 3; y < bottom; y += 6)
    for (let x = left + 3; x < right; x += 6) context.fillRect(x - 0.75, y - 0.75, 1.5, 1.5);
  context.restore();
}

function hatch(context: Context, { left, right }: Band, page: PlacePage, palette: Palette): void {
  const [top, foot] = [headOf(page), footOf(page)];
  context.save();
  context.beginPath();
  context.rect(left, top, right - left, foot - top);
  context.clip();
  context.beginPath();
  context.strokeStyle = palette.bad;
  context.globalAlpha = 0.45;
  context.lineWidth = 1;
  for (let x = left - (foot - top); x < right; x += 8) {
    context.moveTo(x, foot);
    context.lineTo(x + (foot - top), top);
  }
  context.stroke();
  context.restore();
}

/** A dashed line through all strips, and a ring on each curve. */
function today(context: Context, { page, palette }: PlaceMarksProps): void {
  if (page.today === null) return;
  context.save();
  context.setLineDash([3, 3]);
  context.strokeStyle = palette.inkSoft;
  context.lineWidth = 1.2;
  across(context, { x: page.today, y: headOf(page) }, { x: page.today, y: footOf(page) + 3 });
  context.restore();
  for (const strip of page.strips) {
    if (strip.today !== null) ring(context, { x: page.today, y: strip.today }, palette);
  }
}

function reading(context: Context, { page, read, palette }: PlaceMarksProps): void {
  if (!read) return;
  const x = page.stations[read.index]!;
  context.strokeStyle = palette.brass;
  context.lineWidth = 1.5;
  across(context, { x, y: headOf(page) - 2 }, { x, y: footOf(page) + 4 });
  const font = fontOf(12, 600);
  const texts = read.values;
  const widest = Math.max(...texts.map((text) => textWidth(text, font)));
  // Not over the numbers of the scales.
  const aft = x + APART_FROM_LINE + widest < numbersFrom(page) || x - APART_FROM_LINE < widest;
  page.strips.forEach(({ heights, top, foot }, i) => {
    const y = heights[read.index] ?? null;
    if (y !== null) dot(context, { x, y }, 4, palette.brass, palette);
    context.font = font;
    context.textBaseline = 'middle';
    context.textAlign = aft ? 'left' : 'right';
    const at = {
      x: aft ? x + APART_FROM_LINE : x - APART_FROM_LINE,
      // Beside the curve, not on it.
      y: Math.min(y === null ? foot : y - top > 14 ? y - 9 : y + 9, foot - 6),
    };
    writeOn(context, texts[i]!, at, palette.ink, palette.paper);
  });
}

const APART_FROM_LINE = 9;

/** Shaded until it is worked out. */
function waiting(context: Context, { left, right }: Band, { page, palette }: PlaceMarksProps): void {
  const [top, foot] = [headOf(page), footOf(page)];
  shade(context, { left, top, right, bottom: foot }, palette);
}

function shade(context: Context, { left, top, right, bottom }: Rect, { line: ink }: Palette): void {
  context.save();
  context.globalAlpha = 0.35;
  context.fillStyle = ink;
  context.fillRect(left, top, right - left, bottom - top);
  context.restore();
}

type HeadProps = Omit<PlaceMarksProps, 'read'>;

function line(context: Context, choices: readonly string[], { page, size, palette }: HeadProps): void {
  const room = size.width - 12;
  const words = choices.find((each) => textWidth(each, TEXT) <= room) ?? choices.at(-1)!;
  context.font = TEXT;
  context.textBaseline = 'middle';
  context.textAlign = 'left';
  const x = Math.max(6, Math.min(page.left, size.width - textWidth(words, TEXT) - 8));
  const text = shortened(words, TEXT, room) ?? '';
  writeOn(context, text, { x, y: WORDS_Y }, palette.ink, palette.paper);
}

const APART = 16;

interface Entry {
  readonly text: string;
  sample(context: Context, at: ScreenPoint, palette: Palette): void;
}

/** What dots, ring, shade and hatching stand for. */
function legend(context: Context, { page, size, palette }: HeadProps): void {
  const entries = entriesOf(page);
  context.font = TEXT;
  context.textBaseline = 'middle';
  context.textAlign = 'left';
  const widths = entries.map(({ text }) => 14 + textWidth(text, TEXT) + APART);
  const whole = widths.reduce((sum, each) => sum + each, 0);
  let x = Math.max(6, Math.min(page.left, size.width - whole));
  entries.forEach(({ text, sample }, i) => {
    sample(context, { x: x + 5, y: WORDS_Y }, palette);
    writeOn(context, text, { x: x + 14, y: WORDS_Y }, palette.inkSoft, palette.paper);
    x += widths[i]!;
  });
}

const entriesOf = ({ today: now, waiting: rest, unplanned, struck }: PlacePage): Entry[] => [
  {
    text: 'nothing beats it',
    sample: (context, at, palette) => dot(context, at, 3.2, palette.good, palette),
  },
  ...(now === null ? [] : [{ text: 'today', sample: ring }]),
  ...(rest
    ? [
        {
          text: 'not worked out yet',
          sample: (context: Context, at: ScreenPoint, palette: Palette) =>
            shade(context, about(at, 5), palette),
        },
      ]
    : []),
  ...(unplanned.length > 0
    ? [
        {
          text: 'no ballast plan',
          sample: (context: Context, at: ScreenPoint, palette: Palette) =>
            dots(context, about(at, 6), palette),
        },
      ]
    : []),
  ...(struck.length > 0 ? [{ text: 'propeller would strike', sample: strokes }] : []),
];

const about = ({ x, y }: ScreenPoint, reach: number): Rect => ({
  left: x - reach,
  top: y - reach,
  right: x + reach,
  bottom: y + reach,
});

function ring(context: Context, { x, y }: ScreenPoint, { ink }: Palette): void {
  context.beginPath();
  context.arc(x, y, 4.5, 0, 2 * Math.PI, false);
  context.strokeStyle = ink;
  context.lineWidth = 1.5;
  context.stroke();
}

function strokes(context: Context, { x, y }: ScreenPoint, { bad }: Palette): void {
  context.strokeStyle = bad;
  context.lineWidth = 1;
  for (let i = -6; i <= 2; i += 4) across(context, { x: x + i, y: y + 5 }, { x: x + i + 6, y: y - 5 });
}
