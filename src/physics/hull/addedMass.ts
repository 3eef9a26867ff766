/**
 * Air that a hull must carry along when it speeds up, as for the ellipsoid of equal length, breadth and height.
 *
 *   semi-axes a along x, b along y, c along z;  α₀ = ⅔ abc R_D(b², c², a²), β₀ and γ₀ cyclic; α₀ + β₀ + γ₀ = 2
 *   k₁ = α₀/(2 − α₀) along x, likewise β₀ along y, γ₀ along z: added mass ÷ mass of the displaced air
 *   about y:  k′ = (c² − a²)² (α₀ − γ₀) / {(c² + a²)[2(c² − a²) + (c² + a²)(γ₀ − α₀)]}
 *   about z:  the same with b for c and β₀ for γ₀: added ÷ displaced air's moment of inertia
 *
 * R_D is Carlson's symmetric integral. Source: H. Lamb, Hydrodynamics (6th ed. 1932), §§ 114–115 and 373, his
 * α₀ = abc∫₀^∞ dλ/((a² + λ)Δ) in Carlson's form by DLMF 19.16.5.
 */
import { carlsonRD } from '../../numeric/carlson.ts';
import type { Hull } from './hull.ts';

/** Shares of the displaced air's mass (surge, sway, heave) and moment of inertia (pitch, yaw), all ≥ 0. */
export interface AddedMass {
  readonly surge: number;
  readonly sway: number;
  readonly heave: number;
  readonly pitch: number;
  readonly yaw: number;
}

export const addedMassOf = ({ length, breadth, height }: Hull): AddedMass =>
  ellipsoidAddedMass(length / 2, breadth / 2, height / 2);

/** Semi-axes along x, y, z, all > 0, m. */
export function ellipsoidAddedMass(a: number, b: number, c: number): AddedMass {
  const share = (2 / 3) * a * b * c;
  const alpha = share * carlsonRD(b * b, c * c, a * a);
  const beta = share * carlsonRD(c * c, a * a, b * b);
  const gamma = share * carlsonRD(a * a, b * b, c * c);
  return {
    surge: alpha / (2 - alpha),
    sway: beta / (2 - beta),
    heave: gamma / (2 - gamma),
    pitch: turning(a, c, alpha, gamma),
    yaw: turning(a, b, alpha, beta),
  };
}

/** Semi-axes whose squares differ by less than this share are equal: k′, which goes with its square, is 0 to rounding. */
const EQUAL = 1e-9;

/** k′ in the plane of the semi-axes a and c, written with κ = (γ₀ − α₀)/(c² − a²), which stays finite as c → a. */
function turning(a: number, c: number, alpha: number, gamma: number): number {
  const difference = (c - a) * (c + a);
  const sum = a * a + c * c;
  if (Math.abs(difference) < EQUAL * sum) return 0;
  const kappa = (gamma - alpha) / difference;
  return (-kappa * difference * difference) / (sum * (2 + sum * kappa));
}
