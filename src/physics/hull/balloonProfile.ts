/**
 * The profile of the balloon made of two flat discs of radius a sealed at the edge: rim to pole, half of it.
 *
 *   ϱ = R cos φ,  dζ = R cos²φ/√(1 + cos²φ) dφ,  dσ = R/√(1 + cos²φ) dφ,  φ = 0 at the rim, π/2 at the pole
 *   ϱ distance from the axis of symmetry, ζ from the plane of the rim, σ length of the profile from the rim, m
 *   a = σ(π/2) = R K(1/√2)/√2 = 1.311029 R; half thickness h = ζ(π/2) = 0.599070 R
 *   V = 2π∫ϱ² dζ = 1.218524 a³;  surface as a body of revolution π²R²;  film 2πa²
 *
 * The profile keeps its flat length and the film, too wide toward the rim, crumples there.
 * Source: W. H. Paulsen, What Is the Shape of a Mylar Balloon?, Am. Math. Monthly 101 (1994) 953–958, with
 * x′ = ϱ²/√(R⁴ − ϱ⁴) substituted by ϱ = R cos φ, which leaves nothing singular.
 */
import { integrateFixed } from '../../numeric/quadrature.ts';
import { coefficientsOf, integralTo, legendreRule } from './legendreSeries.ts';

const QUARTER = Math.PI / 2;
const TERMS = 40;

/** dζ/dφ and dσ/dφ for R = 1. */
export const unitRise = (phi: number): number => Math.cos(phi) ** 2 * unitRun(phi);
export const unitRun = (phi: number): number => 1 / Math.sqrt(1 + Math.cos(phi) ** 2);

const riseSeries = seriesOf(unitRise);
const runSeries = seriesOf(unitRun);

function seriesOf(f: (phi: number) => number): number[] {
  const rule = legendreRule(TERMS);
  const half = QUARTER / 2;
  return coefficientsOf(
    rule,
    rule.nodes.map((xi) => half * f(half * (1 + xi))),
  );
}

/** ζ(φ) and σ(φ) for R = 1. */
export const unitHeight = (phi: number): number => integralTo(riseSeries, phi / (QUARTER / 2) - 1);
export const unitTape = (phi: number): number => integralTo(runSeries, phi / (QUARTER / 2) - 1);

/** a/R and h/R. */
export const FLAT_RADIUS = unitTape(QUARTER);
export const HALF_THICKNESS = unitHeight(QUARTER);

/** ∫ f dφ from rim to pole. */
export const overProfile = (f: (phi: number) => number): number => integrateFixed(f, 0, QUARTER, TERMS);

/**
 * The φ at which a ray from the centre at angle γ from the axis of symmetry meets the profile:
 * ζ sin γ = ϱ cos γ, whose left side less right rises all the way from rim to pole. Newton, bisecting where it strays.
 */
export function profileAngle(sinGamma: number, cosGamma: number): number {
  let lo = 0;
  let hi = QUARTER;
  let phi = Math.atan2(cosGamma, sinGamma);
  for (let pass = 0; pass < 60; pass += 1) {
    const excess = unitHeight(phi) * sinGamma - Math.cos(phi) * cosGamma;
    if (excess > 0) hi = phi;
    else lo = phi;
    const newton = phi - excess / (unitRise(phi) * sinGamma + Math.sin(phi) * cosGamma);
    const next = newton >= lo && newton <= hi ? newton : (lo + hi) / 2;
    if (Math.abs(next - phi) <= 4e-16) return next;
    phi = next;
  }
  return phi;
}
