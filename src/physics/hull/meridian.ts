/**
 * A meridian: the half-outline r(x) of a body of revolution, nose tip to tail tip, as smooth stretches laid end to end.
 *
 * Each stretch runs over a parameter t from 0 to 1. Forms choose t so that r(t) and x(t) are smooth even where r(x)
 * has an upright tangent (a blunt nose): then no integral along it has a singular integrand.
 * x itself is not given but follows from dx/dt, so that forms known only by tape distance need nothing more.
 * A flat end face is a stretch with dx/dt = 0.
 */
import type { HullShape, ShapeKind } from '../../craft/hullSchema.ts';

export type ShapeOf<K extends ShapeKind> = Extract<HullShape, { kind: K }>;

/** Distance from the axis, m, and the change of station and of that distance with t, m. */
export interface MeridianPoint {
  readonly r: number;
  readonly dx: number;
  readonly dr: number;
}

export interface Stretch {
  at(t: number): MeridianPoint;
  /** Width of film round the section at t, m, where it is more than the girth 2πr because the film lies in folds. */
  film?(t: number): number;
}

export interface Meridian {
  readonly stretches: readonly Stretch[];
  /** Greatest distance from the axis, m. */
  readonly maxRadius: number;
}

/** A straight line from radius r0 to r1 over `length` of station: a cone, a cylinder, or with length 0 a flat face. */
export function straight(r0: number, r1: number, length: number): Stretch {
  const dr = r1 - r0;
  return { at: (t) => ({ r: r0 + dr * t, dx: length, dr }) };
}

/** A quarter of an ellipse, tip to widest station (`fore`) or widest station to tip. t is in proportion to the eccentric angle. */
export function quarterEllipse(length: number, radius: number, end: 'fore' | 'aft'): Stretch {
  const quarter = Math.PI / 2;
  return {
    at: (t) => {
      const sin = Math.sin(quarter * t);
      const cos = Math.cos(quarter * t);
      return end === 'fore'
        ? { r: radius * sin, dx: quarter * length * sin, dr: quarter * radius * cos }
        : { r: radius * cos, dx: quarter * length * cos, dr: -quarter * radius * sin };
    },
  };
}

/** The same stretch run from its other end, as at the tail of a symmetric form. */
export function mirrored({ at }: Stretch): Stretch {
  return {
    at: (t) => {
      const { r, dx, dr } = at(1 - t);
      return { r, dx, dr: -dr };
    },
  };
}
