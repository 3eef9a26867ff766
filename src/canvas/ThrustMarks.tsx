/** Thrust as arrows, and while one is turned the arc between its limits. Pixels. */
import type { Context } from 'konva/lib/Context.js';
import { memo } from 'react';
import { Shape } from 'react-konva/es/ReactKonvaCore.js';
import type { Craft } from '../craft/craft.ts';
import type { Palette } from '../scene/palette.ts';
import { limitArc, type ThrustMark } from '../scene/thrustArrows.ts';
import { type ScreenPoint, toScreen, type View } from '../scene/view.ts';
import type { Handle } from './HandMarks.tsx';
import type { Overlay } from './overlay.ts';
import { traceOnScreen } from './paint.ts';

export interface ThrustMarksProps {
  readonly marks: readonly ThrustMark[];
  /** Between the limits of what is being turned; null when nothing is. */
  readonly arc: readonly ScreenPoint[] | null;
  readonly view: View;
  readonly palette: Palette;
}

export const ThrustMarks = memo(({ marks, arc, view, palette }: ThrustMarksProps) => (
  <Shape
    sceneFunc={(context) => {
      context.lineJoin = 'round';
      context.lineCap = 'round';
      if (arc) limits(context, arc, palette);
      for (const { at, tip } of marks) paintArrow(context, toScreen(view, at), toScreen(view, tip), palette);
      context.lineCap = 'butt';
    }}
  />
));

const HEAD = 9;

/** Twice: first as a halo, so that lines under it do not disturb. */
export function paintArrow(context: Context, from: ScreenPoint, to: ScreenPoint, palette: Palette): void {
  const long = Math.hypot(to.x - from.x, to.y - from.y);
  const way = { x: (to.x - from.x) / long, y: (to.y - from.y) / long };
  const size = Math.min(HEAD, long);
  const back = (along: number, across: number) => ({
    x: to.x - way.x * along - way.y * across,
    y: to.y - way.y * along + way.x * across,
  });
  const head = [to, back(size, 0.5 * size), back(size, -0.5 * size)];
  for (const [ink, more] of [
    [palette.paper, 3],
    [palette.thrust, 0],
  ] as const) {
    context.strokeStyle = ink;
    context.fillStyle = ink;
    context.lineWidth = 2.6 + more;
    traceOnScreen(context, [from, back(size, 0)], false);
    context.stroke();
    context.lineWidth = 1 + more;
    traceOnScreen(context, head, true);
    context.fill();
    context.stroke();
  }
}

function limits(context: Context, arc: readonly ScreenPoint[], palette: Palette): void {
  context.strokeStyle = palette.thrust;
  context.globalAlpha = 0.45;
  context.lineWidth = 1.2;
  traceOnScreen(context, arc, false);
  context.stroke();
  context.globalAlpha = 1;
}

interface Turned {
  readonly craft: Craft;
  readonly view: View;
  readonly thrust: readonly ThrustMark[];
}

const isIt = ({ part, copy }: ThrustMark, grip: Overlay['held']): boolean =>
  grip?.kind === 'thrust' && grip.id === part && grip.copy === copy;

/** Two spokes and the way between them along which the handle goes; null when no arrow is in hand. */
export function arcShown({ craft, view, thrust }: Turned, { held }: Overlay): ScreenPoint[] | null {
  const mark = thrust.find((each) => isIt(each, held));
  const thruster = mark && craft.parts.byId[mark.part]?.thruster;
  if (!mark || !thruster) return null;
  const other = thruster[mark.way === 'yaw' ? 'pitch' : 'yaw'].set;
  const whole = thruster[mark.way].most - thruster[mark.way].least > 2 * Math.PI - 1e-6;
  const arc = limitArc(mark, thruster[mark.way], other);
  return (whole ? arc : [mark.at, ...arc, mark.at]).map((point) => toScreen(view, point));
}

/** The handles at the tips; only the one in hand while one is, none while anything else is. */
export const thrustHandles = ({ view, thrust }: Turned, { held, hover }: Overlay): Handle[] =>
  thrust.flatMap((mark) => {
    if (!mark.handle || (held && !isIt(mark, held))) return [];
    const [at, from] = [toScreen(view, mark.handle), toScreen(view, mark.at)];
    const long = Math.hypot(at.x - from.x, at.y - from.y);
    const way = { x: -(at.y - from.y) / long, y: (at.x - from.x) / long };
    return [{ at, way, lit: isIt(mark, held) || isIt(mark, hover), bead: true }];
  });
