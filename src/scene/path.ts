/** Plain figures made of paths in metres, and how they are made. */
import type { PlanePoint } from './view.ts';

/** body: the filled outline. dark: filled darker. line: a stroke only. */
export type Tone = 'body' | 'dark' | 'line';

export interface Path {
  readonly tone: Tone;
  readonly closed: boolean;
  readonly points: readonly PlanePoint[];
}

export const p = (u: number, z: number): PlanePoint => ({ u, z });

export const polygon = (points: readonly PlanePoint[], tone: Tone = 'body'): Path => ({
  tone,
  closed: true,
  points,
});

export const stroke = (...points: PlanePoint[]): Path => ({ tone: 'line', closed: false, points });

export const box = (left: number, right: number, bottom: number, top: number, tone: Tone = 'body'): Path =>
  polygon([p(left, bottom), p(right, bottom), p(right, top), p(left, top)], tone);

export function ellipse(u: number, z: number, a: number, b: number, tone: Tone = 'body', count = 28): Path {
  const points = Array.from({ length: count }, (_, i) => {
    const angle = (2 * Math.PI * i) / count;
    return p(u + a * Math.cos(angle), z + b * Math.sin(angle));
  });
  return polygon(points, tone);
}

/** A box of full width and height about the middle, with its corners rounded. */
export function roundedBox(width: number, height: number, radius: number, tone: Tone = 'body'): Path {
  const r = Math.min(radius, width / 2, height / 2);
  const corners = [
    [width / 2 - r, height / 2 - r, 0],
    [-width / 2 + r, height / 2 - r, 1],
    [-width / 2 + r, -height / 2 + r, 2],
    [width / 2 - r, -height / 2 + r, 3],
  ] as const;
  const points = corners.flatMap(([u, z, quarter]) =>
    [0, 1, 2, 3, 4].map((i) => {
      const angle = ((quarter + i / 4) * Math.PI) / 2;
      return p(u + r * Math.cos(angle), z + r * Math.sin(angle));
    }),
  );
  return polygon(points, tone);
}

/** The same path with each point carried elsewhere. */
export const carried = (path: Path, to: (point: PlanePoint) => PlanePoint): Path => ({
  ...path,
  points: path.points.map(to),
});
