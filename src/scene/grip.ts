/** What the hand would take hold of at a point of a view. Nearer things win; what is selected shows its ends first. */
import type { Figure } from './figure.ts';
import { figureAt, lineAt, pointAt } from './hit.ts';
import { widestStation } from './outline.ts';
import type { Geometry } from './subject.ts';
import type { PlanePoint } from './view.ts';

export type Grip =
  | { readonly kind: 'part'; readonly id: string; readonly copy: number }
  | { readonly kind: 'wire'; readonly id: string }
  | { readonly kind: 'wireEnd'; readonly id: string; readonly side: 'from' | 'to' }
  | { readonly kind: 'hardpoint'; readonly id: string }
  | { readonly kind: 'support' }
  | { readonly kind: 'hull'; readonly end: 'tail' | 'waist' };

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
  /** Wire runs whose ends can be taken. */
  readonly selectedWires: readonly string[];
}

/** Where the two handles of the hull are: beyond the tail tip for the length, on top of the waist for the diameter. */
export const TAIL_HANDLE_PX = 30;

export function handlesOf({ hull }: Geometry, scale: number): { tail: PlanePoint; waist: PlanePoint } {
  const u = widestStation(hull);
  return {
    tail: { u: hull.length + TAIL_HANDLE_PX / scale, z: 0 },
    waist: { u, z: hull.radius(u, 0) },
  };
}

/** Half the least touch target of a handle, px. */
const HANDLE_PX = 16;

/** `slop` px is how near counts; `scale` px/m. */
export function gripAt(things: Reachable, point: PlanePoint, scale: number, slop: number): Grip | null {
  const near = slop / scale;
  return (
    wireEndAt(things, point, (slop + 4) / scale) ??
    partAt(things, point, near) ??
    hardpointAt(things, point, near) ??
    supportAt(things, point, near) ??
    handleAt(things, point, scale) ??
    wireAt(things, point, near)
  );
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

function wireEndAt({ lines, selectedWires }: Reachable, point: PlanePoint, near: number): Grip | null {
  const ends = selectedWires.flatMap((id) => {
    const both = wireEnds(lines, id);
    if (!both) return [];
    return [
      { id: `from ${id}`, at: both.from },
      { id: `to ${id}`, at: both.to },
    ];
  });
  const found = pointAt(ends, point, near);
  if (found === null) return null;
  const [side, id] = found.split(' ') as ['from' | 'to', string];
  return { kind: 'wireEnd', id, side };
}

function handleAt({ geometry }: Reachable, point: PlanePoint, scale: number): Grip | null {
  const { tail, waist } = handlesOf(geometry, scale);
  const handles = [
    { id: 'tail', at: tail },
    { id: 'waist', at: waist },
  ];
  const found = pointAt(handles, point, HANDLE_PX / scale);
  return found === null ? null : { kind: 'hull', end: found as 'tail' | 'waist' };
}

export const sameGrip = (a: Grip | null, b: Grip | null): boolean =>
  a === b || (a !== null && b !== null && JSON.stringify(a) === JSON.stringify(b));
