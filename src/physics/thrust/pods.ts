/**
 * What hangs outside the hull, by its drag area: the area that times dynamic pressure is its drag.
 *
 * As given in the craft file; where nothing is given it is reckoned as 0.8 × width × height for gondolas, cameras, sensors
 * and loads whose middle is not inside the hull, and 0 for all else. 0.8, a box with edges a little rounded: common
 * practice, no source. What stands in another's wake or in the hull's boundary layer is counted in full.
 */
import { listed } from '../../craft/craft.ts';
import type { Part, PartKind } from '../../craft/schema.ts';
import type { Vec3 } from '../../numeric/vector.ts';
import type { CraftState } from '../craftState.ts';
import type { Hull } from '../hull/hull.ts';
import { clockOf, distanceFromAxis } from '../mass/position.ts';

export interface Pod {
  readonly part: string;
  /** Drag over dynamic pressure of all its pieces outside, m². */
  readonly area: number;
  /** Where the drag acts: the mean of those pieces' middles, m. */
  readonly at: Vec3;
  /** Whether it was reckoned from kind and size, for want of a figure. */
  readonly reckoned: boolean;
}

const RECKONED: ReadonlySet<PartKind> = new Set(['gondola', 'camera', 'sensor', 'load']);
const BOX_DRAG = 0.8;

/** Every part with a drag area above nil, in the builder's order. */
export const podAreas = ({ craft, hull, pieces }: CraftState): Pod[] =>
  listed(craft.parts).flatMap((part) => {
    const middles = pieces[part.id]!.map(({ middle }) => middle);
    const outside = part.dragArea === null ? middles.filter((middle) => !isInside(hull, middle)) : middles;
    const area = outside.length * dragAreaOf(part);
    if (area === 0) return [];
    return [{ part: part.id, area, at: meanOf(outside), reckoned: part.dragArea === null }];
  });

const dragAreaOf = (part: Part): number => part.dragArea ?? reckonedArea(part);

/** Of one piece outside the hull, m². */
export const reckonedArea = ({ kind, size }: Pick<Part, 'kind' | 'size'>): number =>
  RECKONED.has(kind) ? BOX_DRAG * size.width * size.height : 0;

export const isInside = (hull: Hull, at: Vec3): boolean =>
  distanceFromAxis(at) < hull.radius(at[0], clockOf(at));

const meanOf = (points: readonly Vec3[]): Vec3 => {
  const mean = (i: 0 | 1 | 2) => points.reduce((sum, point) => sum + point[i], 0) / points.length;
  return [mean(0), mean(1), mean(2)];
};
