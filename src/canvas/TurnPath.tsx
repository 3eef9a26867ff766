/** The path of a turn from above at scale: where the hull has been, and where it is now with its thrust. Pixels. */
import type { Context } from 'konva/lib/Context.js';
import { memo } from 'react';
import { Layer, Shape, Stage } from 'react-konva/es/ReactKonvaCore.js';
import type { Palette } from '../scene/palette.ts';
import { placedAt, type Sailor, type Stand, type TurnPage, thrustAt } from '../scene/turnPath.ts';
import { type PlanePoint, type ScreenPoint, toScreen, type View } from '../scene/view.ts';
import { fontOf, traceOnScreen, writeOn } from './paint.ts';
import { paintArrow } from './ThrustMarks.tsx';

export interface TurnPathProps {
  readonly page: TurnPage;
  readonly sailor: Sailor;
  readonly stand: Stand;
  readonly palette: Palette;
}

export const TurnPath = ({ page, sailor, stand, palette }: TurnPathProps) => (
  <Stage width={page.view.width} height={page.view.height} listening={false}>
    <Layer listening={false}>
      <Course page={page} palette={palette} />
    </Layer>
    <Layer listening={false}>
      <Craft view={page.view} sailor={sailor} stand={stand} palette={palette} />
      <Ends page={page} palette={palette} />
    </Layer>
  </Stage>
);

const Course = memo(({ page, palette }: Pick<TurnPathProps, 'page' | 'palette'>) => (
  <Shape
    sceneFunc={(context) => {
      const { view, path, before, ghosts, bar } = page;
      const on = (points: readonly PlanePoint[]) => points.map((point) => toScreen(view, point));
      context.strokeStyle = palette.skin;
      context.lineWidth = 1;
      context.globalAlpha = 0.5;
      for (const ghost of ghosts) {
        traceOnScreen(context, on(ghost), true);
        context.stroke();
      }
      context.globalAlpha = 1;
      context.strokeStyle = palette.ring;
      context.lineWidth = 1.2;
      context.setLineDash([3, 3]);
      traceOnScreen(context, on(before), false);
      context.stroke();
      context.setLineDash([]);
      context.lineWidth = 2;
      traceOnScreen(context, on(path), false);
      context.stroke();
      scaleBar(context, view, bar, palette);
    }}
  />
));

const END = 4.5;
/** Ends nearer than this to each other share a word. */
const NEAR = 26;

/** Over the hull, which would hide them. */
const Ends = memo(({ page: { path, view }, palette }: Pick<TurnPathProps, 'page' | 'palette'>) => (
  <Shape
    sceneFunc={(context) =>
      ends(
        context,
        path.map((point) => toScreen(view, point)),
        palette,
      )
    }
  />
));

/** A ring where it starts, a square where it ends. */
function ends(context: Context, path: readonly ScreenPoint[], palette: Palette): void {
  const [start, end] = [path[0]!, path.at(-1)!];
  context.fillStyle = palette.paper;
  context.strokeStyle = palette.ring;
  context.lineWidth = 2;
  spot(context, start, END);
  context.fill();
  context.stroke();
  context.fillStyle = palette.ring;
  context.beginPath();
  context.rect(end.x - END, end.y - END, 2 * END, 2 * END);
  context.fill();
  context.font = fontOf(11);
  context.textBaseline = 'middle';
  const apart = Math.hypot(end.x - start.x, end.y - start.y) >= NEAR;
  const right = end.x >= start.x;
  write(context, apart ? 'start' : 'start, end', start, apart && right ? -1 : 1, palette);
  if (apart) write(context, 'end', end, right ? 1 : -1, palette);
}

function write(context: Context, text: string, { x, y }: ScreenPoint, side: -1 | 1, palette: Palette): void {
  context.textAlign = side > 0 ? 'left' : 'right';
  writeOn(context, text, { x: x + side * 9, y }, palette.ring, palette.paper);
}

const FOOT = 12;
const TICK = 4;

function scaleBar(
  context: Context,
  { height }: View,
  { px, words }: TurnPage['bar'],
  palette: Palette,
): void {
  const [x, y] = [FOOT, height - FOOT];
  context.strokeStyle = palette.inkSoft;
  context.lineWidth = 1.2;
  const line = [
    { x, y: y - TICK },
    { x, y },
    { x: x + px, y },
    { x: x + px, y: y - TICK },
  ];
  traceOnScreen(context, line, false);
  context.stroke();
  context.font = fontOf(11);
  context.textBaseline = 'middle';
  context.textAlign = 'left';
  writeOn(context, words, { x: x + px + 6, y: y - 1 }, palette.inkSoft, palette.paper);
}

const ARROW_PX = 30;
const RING = 4;
const NOSE = 3;

function spot(context: Context, { x, y }: ScreenPoint, radius: number): void {
  context.beginPath();
  context.arc(x, y, radius, 0, 2 * Math.PI, false);
}

/** The hull as it lies now with its nose, its thrust, and the CB. */
function Craft({ view, sailor, stand, palette }: Omit<TurnPathProps, 'page'> & { readonly view: View }) {
  return (
    <Shape
      sceneFunc={(context) => {
        const on = (point: PlanePoint) => toScreen(view, point);
        traceOnScreen(
          context,
          sailor.outline.map((point) => on(placedAt(stand, point))),
          true,
        );
        context.fillStyle = palette.gas;
        context.globalAlpha = 0.7;
        context.fill();
        context.globalAlpha = 1;
        context.strokeStyle = palette.skin;
        context.lineWidth = 1.8;
        context.stroke();
        const [cb, nose] = [on(stand.at), on(placedAt(stand, sailor.nose))];
        context.lineWidth = 1;
        traceOnScreen(context, [cb, nose], false);
        context.stroke();
        spot(context, nose, NOSE);
        context.fillStyle = palette.skin;
        context.fill();
        for (const { at, tip } of thrustAt(sailor, stand, ARROW_PX / view.scale)) {
          paintArrow(context, on(at), on(tip), palette);
        }
        spot(context, cb, RING);
        context.strokeStyle = palette.ring;
        context.lineWidth = 2.4;
        context.stroke();
      }}
    />
  );
}
