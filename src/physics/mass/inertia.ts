/**
 * Second moments of mass about a point: P = ∫ p pᵀ dm, symmetric, kg·m², as [xx, yy, zz, xy, yz, zx].
 * The moment of inertia about y, for pitch, is P_zz + P_xx; likewise about x and z. Second moments add, and move from
 * the CG to another point by m d dᵀ (parallel axes): any text on statics, from memory.
 */
import type { Vec3 } from '../../numeric/vector.ts';

export type Second = readonly [number, number, number, number, number, number];

export const NO_SECOND: Second = [0, 0, 0, 0, 0, 0];

/** Second moments of a solid box of that mass about its centre: m a²/12 along each edge. */
export const boxSecond = (mass: number, length: number, width: number, height: number): Second => [
  (mass * length ** 2) / 12,
  (mass * width ** 2) / 12,
  (mass * height ** 2) / 12,
  0,
  0,
  0,
];

/** From moments of inertia about three principal axes: P_xx = (I_y + I_z − I_x)/2 and cyclic. */
export const secondOfInertia = ([ix, iy, iz]: Vec3): Second => [
  (iy + iz - ix) / 2,
  (iz + ix - iy) / 2,
  (ix + iy - iz) / 2,
  0,
  0,
  0,
];

/** The same body turned about the x axis towards greater clock angles (+y for a thing at the top). */
export function turnedSecond([xx, yy, zz, xy, yz, zx]: Second, by: number): Second {
  const [s, c] = [Math.sin(by), Math.cos(by)];
  return [
    xx,
    c * c * yy + 2 * s * c * yz + s * s * zz,
    s * s * yy - 2 * s * c * yz + c * c * zz,
    c * xy + s * zx,
    (c * c - s * s) * yz + s * c * (zz - yy),
    c * zx - s * xy,
  ];
}
