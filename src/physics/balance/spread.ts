/**
 * How the tolerances of masses spread into results, to first order.
 *
 * Everything in `balance/` depends on the masses only through S = (Σm, Σmx, Σmy, Σmz), which is linear in each mass.
 * A mass with standard uncertainty u at p adds u² v vᵀ, v = (1, p), to the covariance C of S; then
 *   u(f)² = (∂f/∂S)ᵀ C (∂f/∂S).
 * A tolerance ± a is the half-width of a rectangular distribution: u = a/√3 (JCGM 100:2008, 4.3.7, 5.1.2, 5.2.2).
 * Gradients by central differences of one standard uncertainty each way, as JCGM 100, 5.1.3 note 2, allows.
 */
import type { Vec3 } from '../../numeric/vector.ts';
import type { MassSums } from '../mass/body.ts';

export type Four = readonly [number, number, number, number];
/** Symmetric, row by row. */
export type Covariance = readonly [Four, Four, Four, Four];

export interface UncertainMass {
  /** Standard uncertainty of the mass of one piece, kg. */
  readonly u: number;
  /** CGs of the pieces that share it, m. */
  readonly at: readonly Vec3[];
}

export const standardOf = (tolerance: number): number => tolerance / Math.sqrt(3);

export function covarianceOf(masses: readonly UncertainMass[]): Covariance {
  const sum = Array.from({ length: 16 }, () => 0);
  for (const { u, at } of masses) {
    if (u === 0) continue;
    const v = [at.length, 0, 0, 0];
    for (const [x, y, z] of at) {
      v[1]! += x;
      v[2]! += y;
      v[3]! += z;
    }
    for (let k = 0; k < 16; k++) sum[k]! += u * u * v[k >> 2]! * v[k & 3]!;
  }
  const row = (i: number): Four => [sum[4 * i]!, sum[4 * i + 1]!, sum[4 * i + 2]!, sum[4 * i + 3]!];
  return [row(0), row(1), row(2), row(3)];
}

/** Standard uncertainty of f at S; null when f has no value near S. */
export function spreadOf(
  f: (sums: MassSums) => number | null,
  sums: MassSums,
  covariance: Covariance,
): number | null {
  const steps = covariance.map((row, i) => Math.sqrt(row[i]!));
  if (steps.every((step) => step === 0)) return 0;
  const gradient: number[] = [];
  for (let i = 0; i < 4; i++) {
    const slope = steps[i]! > 0 ? slopeAlong(f, sums, i, steps[i]!) : 0;
    if (slope === null) return null;
    gradient.push(slope);
  }
  const variance = gradient.reduce(
    (total, gi, i) => total + gradient.reduce((inner, gj, j) => inner + gi * gj * covariance[i]![j]!, 0),
    0,
  );
  return Math.sqrt(Math.max(0, variance));
}

function slopeAlong(
  f: (sums: MassSums) => number | null,
  sums: MassSums,
  i: number,
  step: number,
): number | null {
  const above = f(stepped(sums, i, step));
  const below = f(stepped(sums, i, -step));
  return above === null || below === null ? null : (above - below) / (2 * step);
}

const stepped = ({ mass, moment: [x, y, z] }: MassSums, i: number, by: number): MassSums => ({
  mass: mass + (i === 0 ? by : 0),
  moment: [x + (i === 1 ? by : 0), y + (i === 2 ? by : 0), z + (i === 3 ? by : 0)],
});
