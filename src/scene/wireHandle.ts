/**
 * Where the ends of a wire run can be taken: at a loose end the end itself; at a joined one a little off the part along the
 * run, so that part and end can both be taken.
 */
import type { Craft } from '../craft/craft.ts';
import type { WireEnd } from '../craft/schema.ts';
import type { Figure } from './figure.ts';
import { type Line, wireEnds } from './grip.ts';
import { distanceToBox } from './hit.ts';
import type { PlanePoint } from './view.ts';
import type { WireSide } from './wireEnd.ts';

export interface WireHandle {
  readonly id: string;
  readonly side: WireSide;
  /** Where it is drawn and taken. */
  readonly at: PlanePoint;
  /** The true end, to which a short stalk leads. */
  readonly end: PlanePoint;
}

/** From the part's box to the handle, px. */
const OFF_PX = 12;
/** A handle comes no nearer to the middle of its run than this share of it. */
const FARTHEST = 0.42;

interface Drawn {
  readonly craft: Craft;
  readonly lines: readonly Line[];
  readonly figures: readonly Figure[];
}

/** `scale` px/m. */
export const wireHandles = (drawn: Drawn, wires: readonly string[], scale: number): WireHandle[] =>
  wires.flatMap((id) => {
    const wire = drawn.craft.wires.byId[id];
    const ends = wireEnds(drawn.lines, id);
    const line = drawn.lines.find((each) => each.id === id)?.at;
    if (!wire || !ends || !line) return [];
    const at = (end: WireEnd, along: readonly PlanePoint[]) =>
      offPart(partOf(drawn, end, along[0]!), along, OFF_PX / scale);
    return [
      { id, side: 'from' as const, at: at(wire.from, line), end: ends.from },
      { id, side: 'to' as const, at: at(wire.to, [...line].reverse()), end: ends.to },
    ];
  });

/** The piece of the joined part that the run ends at; null at a loose end. */
function partOf({ figures }: Drawn, end: WireEnd, point: PlanePoint): Figure | null {
  if (end.kind !== 'part') return null;
  const pieces = figures.filter(({ part }) => part === end.part);
  const away = (figure: Figure) => distanceToBox(point, figure.box);
  return pieces.reduce<Figure | null>((best, each) => (!best || away(each) < away(best) ? each : best), null);
}

/** The first point along the line that is so far off the part. */
function offPart(figure: Figure | null, line: readonly PlanePoint[], off: number): PlanePoint {
  if (!figure) return line[0]!;
  const most = FARTHEST * lengthOf(line);
  const step = off / 4;
  for (let gone = 0; gone < most; gone += step) {
    const point = pointAlong(line, gone);
    if (distanceToBox(point, figure.box) >= off) return point;
  }
  return pointAlong(line, most);
}

const lengthOf = (line: readonly PlanePoint[]): number =>
  line.slice(1).reduce((sum, { u, z }, i) => sum + Math.hypot(u - line[i]!.u, z - line[i]!.z), 0);

function pointAlong(line: readonly PlanePoint[], distance: number): PlanePoint {
  let left = distance;
  for (let i = 1; i < line.length; i++) {
    const [a, b] = [line[i - 1]!, line[i]!];
    const run = Math.hypot(b.u - a.u, b.z - a.z);
    if (run >= left && run > 0)
      return { u: a.u + ((b.u - a.u) * left) / run, z: a.z + ((b.z - a.z) * left) / run };
    left -= run;
  }
  return line.at(-1)!;
}
