/**
 * Frictionless flow of speed 1 along x past an ellipsoid of revolution, semi-axes a along x and b across, in closed
 * form: Lamb, Hydrodynamics (1932), § 114. With λ the greater root of x²/(a²+λ) + ϱ²/(b²+λ) = 1,
 *
 *   φ = x [1 + α(λ)/(2 − α₀)],  α(λ) = ab²∫_λ^∞ du/((a²+u)^{3/2}(b²+u)) = ⅔ ab² R_D(b²+λ, b²+λ, a²+λ)
 *
 * On the skin λ = 0, so φ = (1 + k₁)x with k₁ = α₀/(2 − α₀), and the speed along it, the slope of φ along the skin, is
 * (1 + k₁) times the cosine of the angle between skin and axis. On a ball: 3/2 sin θ.
 */
import { carlsonRD } from '../../../src/numeric/carlson.ts';
import { ellipsoidAddedMass } from '../../../src/physics/hull/addedMass.ts';

/** Speed along the skin `x` aft of the middle. */
export function skinSpeed(a: number, b: number, x: number): number {
  const r = b * Math.sqrt(1 - (x / a) ** 2);
  const slope = (-b * b * x) / (a * a * r);
  return (1 + ellipsoidAddedMass(a, b, b).surge) / Math.hypot(1, slope);
}

/** Velocity at (x, ϱ) outside, x from the middle. */
export function velocityOff(a: number, b: number, x: number, rho: number) {
  const scale = (2 / 3) * a * b * b;
  const alphaAt = (lambda: number) => scale * carlsonRD(b * b + lambda, b * b + lambda, a * a + lambda);
  const weight = 1 / (2 - alphaAt(0));
  const half = (x * x + rho * rho - a * a - b * b) / 2;
  const product = a * a * b * b - x * x * b * b - rho * rho * a * a;
  const lambda = half + Math.sqrt(half * half - product);
  const [along, across] = [a * a + lambda, b * b + lambda];
  const alphaSlope = (-a * b * b) / (along ** 1.5 * across);
  const steepness = (x / along) ** 2 + (rho / across) ** 2;
  const lambdaX = (2 * x) / along / steepness;
  const lambdaRho = (2 * rho) / across / steepness;
  return {
    axial: 1 + weight * (alphaAt(lambda) + x * alphaSlope * lambdaX),
    radial: weight * x * alphaSlope * lambdaRho,
  };
}
