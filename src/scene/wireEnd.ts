/** What the end of a wire run becomes when it is let go: joined to the part it is on, or loose on its own path. */
import type { Craft } from '../craft/craft.ts';
import type { Place } from '../craft/placeSchema.ts';
import type { WireEnd, WireRun } from '../craft/schema.ts';
import { placeAs } from '../report/placeAs.ts';
import type { Figure } from './figure.ts';
import { figureAt } from './hit.ts';
import { onHull } from './outline.ts';
import type { Geometry } from './subject.ts';
import type { PlanePoint } from './view.ts';

export type WireSide = 'from' | 'to';

/** The part the end would join: the one under it within the slop (m), unless the other end is on it already. */
export function joinedPart(
  wire: WireRun,
  side: WireSide,
  figures: readonly Figure[],
  point: PlanePoint,
  slop: number,
): string | null {
  const other = side === 'from' ? wire.to : wire.from;
  const taken = other.kind === 'part' ? other.part : null;
  return (
    figureAt(
      figures.filter(({ part }) => part !== taken),
      point,
      slop,
    )?.part ?? null
  );
}

/** The end left loose there: on the run's own meridian, or, of a straight run, where the hand is in the side view. */
export function looseEnd(wire: WireRun, side: WireSide, geometry: Geometry, { u, z }: PlanePoint): WireEnd {
  const { hull } = geometry;
  if (wire.path.kind === 'skin') {
    const place: Place = { kind: 'skin', station: onHull(hull, u), clock: wire.path.clock, standoff: 0 };
    return { kind: 'loose', place };
  }
  const end = wire[side];
  const kind = end.kind === 'loose' && end.place.kind !== 'skin' ? end.place.kind : 'free';
  return { kind: 'loose', place: placeAs(kind, [u, sideOf(geometry, wire.id, side), z], hull) };
}

/** The side (y) on which the end is now: the side view cannot show it, so it stays. m */
function sideOf({ wires }: Geometry, id: string, side: WireSide): number {
  const branch = wires.find(({ wire }) => wire === id)?.branches[0];
  return branch?.at(side === 'from' ? 0 : -1)?.[1] ?? 0;
}

/** What to say of an end that came loose; null of one that was loose before. */
export function unjoinedWords({ parts }: Craft, end: WireEnd): string | null {
  if (end.kind !== 'part') return null;
  const part = parts.byId[end.part];
  return `Unjoined from ${part?.name || part?.kind || 'its part'}; drop it on a part to join it`;
}
