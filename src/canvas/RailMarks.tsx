/** Slides as rails with their stops: of parts plain, of candidate loads dash-dotted. Pixels. */
import type { Context } from 'konva/lib/Context.js';
import { memo } from 'react';
import { Shape } from 'react-konva/es/ReactKonvaCore.js';
import type { Palette } from '../scene/palette.ts';
import { stationWords } from '../scene/planWords.ts';
import { type Knob, knobKey, type Rail } from '../scene/rails.ts';
import type { UnitSystem } from '../scene/subject.ts';
import { type PlanePoint, type ScreenPoint, toScreen, type View } from '../scene/view.ts';
import { fontOf, traceOnScreen, writeOn } from './paint.ts';

export interface RailMarksProps {
  readonly rails: readonly Rail[];
  /** Drawn strong, with the knobs of their stops. */
  readonly open: readonly Rail[];
  readonly knobs: readonly Knob[];
  readonly lit: string | null;
  readonly view: View;
  readonly palette: Palette;
  readonly units: UnitSystem;
}

const STOP = 5;
/** Size of a knob, and the type of the station beside it. */
export const KNOB_PX = 6;
export const KNOB_LABEL = fontOf(11, 600);

export const RailMarks = memo((props: RailMarksProps) => (
  <Shape
    sceneFunc={(context) => {
      context.lineCap = 'butt';
      for (const rail of props.rails) line(context, rail, props);
      for (const knob of props.knobs) handle(context, knob, props);
    }}
  />
));

const inkOf = ({ owner }: Rail, { palette }: RailMarksProps): string =>
  owner.kind === 'load' ? palette.good : palette.brass;

function line(context: Context, rail: Rail, props: RailMarksProps): void {
  const { view, palette, open } = props;
  const strong = open.includes(rail);
  const points = rail.line.map((point) => toScreen(view, point));
  const way = outward(view, rail);
  context.save();
  context.strokeStyle = palette.paper;
  context.lineWidth = strong ? 5 : 3.5;
  traceOnScreen(context, points, false);
  context.stroke();
  context.strokeStyle = inkOf(rail, props);
  context.lineWidth = strong ? 2.4 : 1.2;
  if (rail.owner.kind === 'load') context.setLineDash([9, 3, 2, 3]);
  traceOnScreen(context, points, false);
  context.stroke();
  context.setLineDash([]);
  for (const end of [points[0]!, points.at(-1)!]) {
    traceOnScreen(context, [along(end, way, -STOP), along(end, way, STOP)], false);
    context.stroke();
  }
  context.restore();
}

/** On the screen, off the craft. */
function outward(view: View, { out }: Rail): ScreenPoint {
  return { x: -out * Math.sin(view.tilt) || 0, y: -out * Math.cos(view.tilt) };
}

const along = ({ x, y }: ScreenPoint, way: ScreenPoint, by: number): ScreenPoint => ({
  x: x + way.x * by,
  y: y + way.y * by,
});

/** A round knob on a stem from the stop, with the station of the stop beside it. */
function handle(context: Context, knob: Knob, props: RailMarksProps): void {
  const { view, palette, units, lit } = props;
  const { rail, end } = knob;
  const [stop, at] = [knob.stop, knob.at].map((point: PlanePoint) => toScreen(view, point)) as [
    ScreenPoint,
    ScreenPoint,
  ];
  const ink = inkOf(rail, props);
  context.strokeStyle = ink;
  context.lineWidth = 1.4;
  traceOnScreen(context, [stop, at], false);
  context.stroke();
  context.beginPath();
  context.arc(at.x, at.y, KNOB_PX, 0, 2 * Math.PI, false);
  context.fillStyle = lit === knobKey(knob) ? ink : palette.paper;
  context.fill();
  context.lineWidth = 2;
  context.stroke();
  context.font = KNOB_LABEL;
  context.textAlign = end === 'from' ? 'right' : 'left';
  context.textBaseline = 'middle';
  const x = at.x + (end === 'from' ? -KNOB_PX - 5 : KNOB_PX + 5);
  writeOn(context, stationWords(rail.slide[end], units), { x, y: at.y }, ink, palette.paper);
}
