/**
 * Complete elliptic integrals with parameter m = k², 0 ≤ m < 1, s = sin²β:
 *
 *   K = ∫₀^{π/2} dβ/√(1 − m s),   E = ∫₀^{π/2} √(1 − m s) dβ,   C = ∫₀^{π/2} s(1 − s)/(1 − m s)^{3/2} dβ
 *                                                                  = [(2 − m)K − 2E]/m²
 *
 * by the arithmetic-geometric mean of 1 and k′ = √(1 − m): a ← (a + g)/2, g ← √(a g), cₙ = (aₙ₋₁ − gₙ₋₁)/2;
 * K = π/(2a), and with eₙ = cₙ/m, which stays finite as m → 0: C = K Σ 2ⁿ eₙ², n ≥ 1, a sum without cancellation,
 * from which E = K − m(K + m C)/2.
 * Source: DLMF 19.8.5–19.8.6; C is that of Jahnke & Emde, Tables of Functions (from memory).
 */

export interface CompleteElliptic {
  readonly k: number;
  readonly e: number;
  readonly c: number;
}

/** a and g this close are equal to rounding after one more step. */
const CLOSE = 1e-8;

/** K, E and C from the complement 1 − m, which must be > 0 and ≤ 1 (at 0 K has no value: Infinity). */
export function completeElliptic(complement: number): CompleteElliptic {
  const m = 1 - complement;
  let a = 1;
  let g = Math.sqrt(complement);
  let share = 1 / (2 * (1 + g));
  let doubling = 2;
  let sum = doubling * share * share;
  while (Math.abs(a - g) > CLOSE * a && doubling < 1e6) {
    const mean = (a + g) / 2;
    g = Math.sqrt(a * g);
    a = mean;
    share = (m * share * share) / (2 * (a + g));
    doubling *= 2;
    sum += doubling * share * share;
  }
  const k = Math.PI / (a + g);
  const c = k * sum;
  return { k, e: k - (m * (k + m * c)) / 2, c };
}
