/**
 * The flow of a ring of sources about the hull axis, strength per length of its girth 1, or cos θ round the ring.
 *
 *   Δ = x − x′, A² = Δ² + (ϱ + ϱ′)², B² = Δ² + (ϱ − ϱ′)², m = 4ϱϱ′/A², H = (K + mC)/2 − C;  K, E, C of m (elliptic.ts)
 *   order 0:  φ = −ϱ′K/(πA),   ∂φ/∂x = ϱ′Δ E/(πAB²),   ∂φ/∂ϱ = ϱ′(ϱE − ϱ′mH)/(πAB²)
 *   order 1:  φ = −ϱ′mC/(πA),  ∂φ/∂x = ϱ′Δ mH/(πAB²),  ∂φ/∂ϱ = ϱ′{ϱmH/B² − 2ϱ′[(A² + B²)H/(2B²) − C]/A²}/(πA)
 *
 * (x, ϱ) the point, (x′, ϱ′) the ring, m; the flow of order 1 varies round the axis as cos θ, and what is given is
 * its part at θ = 0. v = ∇φ; a source of strength σ per area adds σ/2 to the outward speed just outside the skin.
 * Derived from φ = −∫σ dS/(4πR), R² = Δ² + ϱ² + ϱ′² − 2ϱϱ′cos α, by writing α = π − 2β. The formulas of order 0 are
 * those of J. L. Hess & A. M. O. Smith, Calculation of potential flow about arbitrary bodies (1967; from memory).
 */
import { completeElliptic } from '../../numeric/elliptic.ts';

/** Round the ring the sources are even (0) or go as cos θ (1). */
export type Order = 0 | 1;

/** Written into by `ringSource`, since it is asked some ten thousand times a hull. */
export interface RingFlow {
  potential: number;
  axial: number;
  radial: number;
}

/** On the ring itself the flow has no value; nearer than this share of its size it is taken at that distance. */
const NEAREST = 1e-12;

/** Per unit of strength and of length along the meridian: what a point `dx` aft of the ring and `rho` off the axis feels. */
export function ringSource(order: Order, dx: number, rho: number, ring: number, into: RingFlow): void {
  const far = dx * dx + (rho + ring) * (rho + ring);
  const near = Math.max(dx * dx + (rho - ring) * (rho - ring), NEAREST * NEAREST * far);
  const m = (4 * rho * ring) / far;
  const { k, e, c } = completeElliptic(near / far);
  const h = (k + m * c) / 2 - c;
  const scale = ring / (Math.PI * Math.sqrt(far));
  if (order === 0) {
    into.potential = -scale * k;
    into.axial = (scale * dx * e) / near;
    into.radial = (scale * (rho * e - ring * m * h)) / near;
  } else {
    into.potential = -scale * m * c;
    into.axial = (scale * dx * m * h) / near;
    into.radial = scale * ((rho * m * h) / near - (2 * ring * (((far + near) * h) / (2 * near) - c)) / far);
  }
}
