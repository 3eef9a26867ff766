/**
 * What the hand would take hold of at a point of a view. The handle of a thrust arrow or of a wire end wins on its dot, then
 * what is selected within its brackets, then nearer and smaller things.
 */
import type { Figure } from './figure.ts';
import { distanceToLine, distanceToSegment, figureAt, figuresAt, lineAt, pointAt } from './hit.ts';
import { widestStation } from './outline.ts';
import type { Geometry } from './subject.ts';
import type { ThrustMark, Way } from './thrustArrows.ts';
import type { PlanePoint } from './view.ts';
import type { WireHandle } from './wireHandle.ts';

export type Grip =
  | { readonly kind: 'part'; readonly id: string; readonly copy: number }
  | { readonly kind: 'wire'; readonly id: string }
  | { readonly kind: 'wireEnd'; readonly id: string; readonly side: 'from' | 'to' }
  | { readonly kind: 'hardpoint'; readonly id: string }
  | { readonly kind: 'support' }
  | { readonly kind: 'hull'; readonly end: 'tail' | 'waist' }
  | { readonly kind: 'thrust'; readonly id: string; readonly copy: number; readonly way: Way };

/** What can be selected; scene knows no more of a selection than this. */
export interface Selectable {
  readonly kind: 'part' | 'wire' | 'hardpoint';
  readonly id: string;
}

/** Parts, wire runs and hardpoints each have ids of their own; the key tells them apart. */
export const keyOf = (kind: 'part' | 'wire' | 'hardpoint', id: string): string => `${kind} ${id}`;

export interface Line {
  readonly id: string;
  readonly at: readonly PlanePoint[];
}

export interface Reachable {
  readonly geometry: Geometry;
  readonly figures: readonly Figure[];
  readonly lines: readonly Line[];
  readonly hardpoints: readonly { readonly id: string; readonly at: PlanePoint }[];
  /** Where the view shows the support point; null where it does not. */
  readonly support: PlanePoint | null;
  /** Ends of the wire runs selected. */
  readonly wireHandles: readonly WireHandle[];
  /** Arrows of thrust, some with a handle. */
  readonly thrust: readonly ThrustMark[];
  readonly selection: readonly Selectable[];
}

/** Where the two handles of the hull are: beyond the tail tip for the length, on top of the waist for the diameter. */
export const TAIL_HANDLE_PX = 30;

/** From the tail tip, px aft and up: the first of these that is clear of every arrow of thrust. */
const TAIL_SPOTS = [
  [TAIL_HANDLE_PX, 0],
  [TAIL_HANDLE_PX, -34],
  [TAIL_HANDLE_PX, 34],
  [TAIL_HANDLE_PX, -68],
] as const;
/** So far from the middle of a handle to an arrow or its own handle, px. */
const APART_PX = 30;

export function handlesOf(
  { hull }: Geometry,
  scale: number,
  thrust: readonly ThrustMark[],
): { tail: PlanePoint; waist: PlanePoint } {
  const u = widestStation(hull);
  const spots = TAIL_SPOTS.map(([aft, up]) => ({ u: hull.length + aft / scale, z: up / scale }));
  const clear = (spot: PlanePoint) =>
    thrust.every(({ at, tip, handle }) => distanceToSegment(spot, at, handle ?? tip) >= APART_PX / scale);
  return { tail: spots.find(clear) ?? spots[0]!, waist: { u, z: hull.radius(u, 0) } };
}

/** Half the least touch target of a handle, px. */
const HANDLE_PX = 16;

/** A handle of thrust is taken from as far as its ends reach, px. */
const THRUST_PX = 13;

/** Size of the dot at a wire end, and how far the brackets stand off what is selected, px. */
export const DOT_PX = 6;
export const BRACKET_PX = 5;

/** `slop` px is how near counts; `scale` px/m. */
export function gripAt(things: Reachable, point: PlanePoint, scale: number, slop: number): Grip | null {
  const near = slop / scale;
  return (
    thrustAt(things, point, THRUST_PX / scale) ??
    wireEndAt(things, point, DOT_PX / scale) ??
    selectedAt(things, point, scale) ??
    partAt(things, point, near) ??
    thrustAt(things, point, (slop + 4) / scale) ??
    wireEndAt(things, point, (slop + 4) / scale) ??
    hardpointAt(things, point, near) ??
    supportAt(things, point, near) ??
    handleAt(things, point, scale) ??
    wireAt(things, point, near)
  );
}

/** What is selected and lies under the point within its brackets. */
function selectedAt(
  { figures, hardpoints, selection }: Reachable,
  point: PlanePoint,
  scale: number,
): Grip | null {
  const within = BRACKET_PX / scale;
  const chosen = (kind: Selectable['kind'], id: string) =>
    selection.some((each) => each.kind === kind && each.id === id);
  const figure = figureAt(
    figures.filter(({ part }) => chosen('part', part)),
    point,
    within,
  );
  if (figure) return { kind: 'part', id: figure.part, copy: figure.copy };
  const id = pointAt(
    hardpoints.filter((each) => chosen('hardpoint', each.id)),
    point,
    within,
  );
  return id === null ? null : { kind: 'hardpoint', id };
}

/** All that can be selected there: parts from the smallest up, then hardpoints, then wire runs. */
export function stackAt(things: Reachable, point: PlanePoint, scale: number, slop: number): Selectable[] {
  const near = slop / scale;
  const parts = figuresAt(things.figures, point, near).map(({ part }) => part);
  const hardpoints = things.hardpoints.filter(({ at }) => Math.hypot(at.u - point.u, at.z - point.z) <= near);
  const wires = things.lines.filter(({ at }) => distanceToLine(point, at) <= near);
  return [
    ...[...new Set(parts)].map((id) => ({ kind: 'part' as const, id })),
    ...hardpoints.map(({ id }) => ({ kind: 'hardpoint' as const, id })),
    ...[...new Set(wires.map(({ id }) => id))].map((id) => ({ kind: 'wire' as const, id })),
  ];
}

const partAt = ({ figures }: Reachable, point: PlanePoint, near: number): Grip | null => {
  const figure = figureAt(figures, point, near);
  return figure && { kind: 'part', id: figure.part, copy: figure.copy };
};

const hardpointAt = ({ hardpoints }: Reachable, point: PlanePoint, near: number): Grip | null => {
  const id = pointAt(hardpoints, point, Math.max(near, 0));
  return id === null ? null : { kind: 'hardpoint', id };
};

const supportAt = ({ support }: Reachable, point: PlanePoint, near: number): Grip | null =>
  support && pointAt([{ id: 'support', at: support }], point, near) ? { kind: 'support' } : null;

const wireAt = ({ lines }: Reachable, point: PlanePoint, near: number): Grip | null => {
  const id = lineAt(lines, point, near);
  return id === null ? null : { kind: 'wire', id };
};

export const wireEnds = (lines: readonly Line[], id: string): { from: PlanePoint; to: PlanePoint } | null => {
  const line = lines.find((each) => each.id === id)?.at;
  return line?.length ? { from: line[0]!, to: line.at(-1)! } : null;
};

function wireEndAt({ wireHandles }: Reachable, point: PlanePoint, near: number): Grip | null {
  const found = pointAt(
    wireHandles.map(({ at }, i) => ({ id: `${i}`, at })),
    point,
    near,
  );
  if (found === null) return null;
  const { id, side } = wireHandles[Number(found)]!;
  return { kind: 'wireEnd', id, side };
}

function thrustAt({ thrust }: Reachable, point: PlanePoint, near: number): Grip | null {
  const handles = thrust.flatMap(({ handle }, i) => (handle ? [{ id: `${i}`, at: handle }] : []));
  const found = pointAt(handles, point, near);
  if (found === null) return null;
  const { part, copy, way } = thrust[Number(found)]!;
  return { kind: 'thrust', id: part, copy, way };
}

/** The arrow under the point, whether or not a hand can turn it. */
export const arrowAt = (thrust: readonly ThrustMark[], point: PlanePoint, near: number): ThrustMark | null =>
  thrust.find(({ at, tip }) => distanceToSegment(point, at, tip) <= near) ?? null;

function handleAt({ geometry, thrust }: Reachable, point: PlanePoint, scale: number): Grip | null {
  const { tail, waist } = handlesOf(geometry, scale, thrust);
  const handles = [
    { id: 'tail', at: tail },
    { id: 'waist', at: waist },
  ];
  const found = pointAt(handles, point, HANDLE_PX / scale);
  return found === null ? null : { kind: 'hull', end: found as 'tail' | 'waist' };
}

export const sameGrip = (a: Grip | null, b: Grip | null): boolean =>
  a === b || (a !== null && b !== null && JSON.stringify(a) === JSON.stringify(b));
