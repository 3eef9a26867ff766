/**
 * Masses and their roll-up.
 *
 *   W = Σ mᵢ,   W·G = Σ mᵢ pᵢ,   P = Σ (Pᵢ + mᵢ dᵢ dᵢᵀ), dᵢ from the point asked for.
 *
 * Source: weight and balance by moments, FAA-H-8083-1; parallel-axis theorem.
 */
import type { Vec3 } from '../../numeric/vector.ts';
import { NO_SECOND, type Second } from './inertia.ts';

/** A mass with its CG (m) and second moments about its own CG (kg·m²). */
export interface Body {
  readonly mass: number;
  readonly cg: Vec3;
  readonly second: Second;
}

export const pointMass = (mass: number, cg: Vec3): Body => ({ mass, cg, second: NO_SECOND });

/** Mass and first moments about the nose tip: what balance is reckoned from, and linear in every mass. */
export interface MassSums {
  /** kg */
  readonly mass: number;
  /** Σ m p, kg·m. */
  readonly moment: Vec3;
}

export function sumsOf(bodies: readonly Body[]): MassSums {
  let [mass, x, y, z] = [0, 0, 0, 0];
  for (const { mass: m, cg } of bodies) {
    mass += m;
    x += m * cg[0];
    y += m * cg[1];
    z += m * cg[2];
  }
  return { mass, moment: [x, y, z] };
}

export const addSums = (a: MassSums, b: MassSums): MassSums => ({
  mass: a.mass + b.mass,
  moment: [a.moment[0] + b.moment[0], a.moment[1] + b.moment[1], a.moment[2] + b.moment[2]],
});

/** Moments about another point, kg·m. */
export const momentAbout = ({ mass, moment: [x, y, z] }: MassSums, [px, py, pz]: Vec3): Vec3 => [
  x - mass * px,
  y - mass * py,
  z - mass * pz,
];

/** Moment of inertia of all bodies about the athwart (y) axis through a point: the one for pitch. kg·m² */
export function pitchInertia(bodies: readonly Body[], [px, , pz]: Vec3): number {
  let total = 0;
  for (const { mass, cg, second } of bodies) {
    total += second[0] + second[2] + mass * ((cg[0] - px) ** 2 + (cg[2] - pz) ** 2);
  }
  return total;
}

/** The same about the upright (z) axis: the one for yaw. kg·m² */
export function yawInertia(bodies: readonly Body[], [px, py]: Vec3): number {
  let total = 0;
  for (const { mass, cg, second } of bodies) {
    total += second[0] + second[1] + mass * ((cg[0] - px) ** 2 + (cg[1] - py) ** 2);
  }
  return total;
}
