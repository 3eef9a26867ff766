/** What lies under the pointer or a fingertip. Distances in metres; the caller turns px into metres by the scale. */
import type { Figure } from './figure.ts';
import type { Box, PlanePoint } from './view.ts';

/** How near counts as a hit, px. */
export const MOUSE_SLOP = 5;
export const TOUCH_SLOP = 18;

export const distanceToBox = ({ u, z }: PlanePoint, { left, right, bottom, top }: Box): number =>
  Math.hypot(Math.max(left - u, 0, u - right), Math.max(bottom - z, 0, z - top));

export function distanceToSegment(point: PlanePoint, a: PlanePoint, b: PlanePoint): number {
  const du = b.u - a.u;
  const dz = b.z - a.z;
  const square = du * du + dz * dz;
  const along = square === 0 ? 0 : ((point.u - a.u) * du + (point.z - a.z) * dz) / square;
  const t = Math.min(1, Math.max(0, along));
  return Math.hypot(point.u - a.u - t * du, point.z - a.z - t * dz);
}

export function distanceToLine(point: PlanePoint, line: readonly PlanePoint[]): number {
  let least = Number.POSITIVE_INFINITY;
  for (let i = 1; i < line.length; i++) {
    least = Math.min(least, distanceToSegment(point, line[i - 1]!, line[i]!));
  }
  return least;
}

const areaOf = ({ left, right, bottom, top }: Box): number => (right - left) * (top - bottom);

/** The figure under the point within the slop (m): the nearest; of several it lies on, the smallest, then the last drawn. */
export function figureAt(figures: readonly Figure[], point: PlanePoint, slop: number): Figure | null {
  let best: Figure | null = null;
  let least = slop;
  for (const figure of figures) {
    const distance = distanceToBox(point, figure.box);
    if (distance > least) continue;
    if (best && distance === least && areaOf(figure.box) > areaOf(best.box)) continue;
    best = figure;
    least = distance;
  }
  return best;
}

/** All figures within the slop (m): those it lies on first, the smallest first; then the nearest. */
export const figuresAt = (figures: readonly Figure[], point: PlanePoint, slop: number): Figure[] =>
  figures
    .map((figure) => ({ figure, distance: distanceToBox(point, figure.box) }))
    .filter(({ distance }) => distance <= slop)
    .sort((a, b) => a.distance - b.distance || areaOf(a.figure.box) - areaOf(b.figure.box))
    .map(({ figure }) => figure);

export interface Named<T> {
  readonly id: string;
  readonly at: T;
}

/** The nearest of named points within the slop, m. */
export function pointAt(
  points: readonly Named<PlanePoint>[],
  point: PlanePoint,
  slop: number,
): string | null {
  let best: string | null = null;
  let least = slop;
  for (const { id, at } of points) {
    const distance = Math.hypot(at.u - point.u, at.z - point.z);
    if (distance <= least) [best, least] = [id, distance];
  }
  return best;
}

/** The nearest of named lines within the slop, m. */
export function lineAt(
  lines: readonly Named<readonly PlanePoint[]>[],
  point: PlanePoint,
  slop: number,
): string | null {
  let best: string | null = null;
  let least = slop;
  for (const { id, at } of lines) {
    const distance = distanceToLine(point, at);
    if (distance <= least) [best, least] = [id, distance];
  }
  return best;
}

/** Figures whose middle lies in a box. */
export const figuresIn = (figures: readonly Figure[], { left, right, bottom, top }: Box): Figure[] =>
  figures.filter(({ middle: { u, z } }) => u >= left && u <= right && z >= bottom && z <= top);
