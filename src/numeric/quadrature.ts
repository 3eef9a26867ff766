/**
 * Gauss–Legendre quadrature: ∫₋₁¹ f dt ≈ Σ wᵢ f(tᵢ), exact for polynomials up to degree 2n − 1.
 * tᵢ are the zeros of the Legendre polynomial Pₙ, wᵢ = 2 / ((1 − tᵢ²) Pₙ′(tᵢ)²).
 * Source: Abramowitz & Stegun 1964, 25.4.29; DLMF 3.5(v).
 */

export interface QuadratureRule {
  /** Ascending, inside (−1, 1). */
  readonly nodes: readonly number[];
  /** Positive, summing to 2. */
  readonly weights: readonly number[];
}

const rules = new Map<number, QuadratureRule>();

/** The n-point rule on [−1, 1], n ≥ 1; computed once and kept. */
export function gaussLegendre(n: number): QuadratureRule {
  const known = rules.get(n);
  if (known) return known;
  const rule = computeRule(n);
  rules.set(n, rule);
  return rule;
}

function computeRule(n: number): QuadratureRule {
  const nodes = new Array<number>(n).fill(0);
  const weights = new Array<number>(n).fill(0);
  for (let i = 0; i < Math.ceil(n / 2); i += 1) {
    const root = legendreRoot(n, i);
    const { derivative } = legendre(n, root);
    const weight = 2 / ((1 - root * root) * derivative * derivative);
    nodes[i] = -root;
    nodes[n - 1 - i] = root;
    weights[i] = weight;
    weights[n - 1 - i] = weight;
  }
  return { nodes, weights };
}

/** The i-th largest zero of Pₙ, by Newton from the asymptotic first guess (A&S 22.16.6). */
function legendreRoot(n: number, i: number): number {
  if (2 * i + 1 === n) return 0;
  let root = Math.cos((Math.PI * (i + 0.75)) / (n + 0.5));
  for (let pass = 0; pass < 10; pass += 1) {
    const { value, derivative } = legendre(n, root);
    const step = value / derivative;
    root -= step;
    if (Math.abs(step) < 1e-16) break;
  }
  return root;
}

/** Pₙ(t) and Pₙ′(t) by the three-term recurrence, |t| < 1. */
function legendre(n: number, t: number): { value: number; derivative: number } {
  let before = 1;
  let value = t;
  for (let k = 2; k <= n; k += 1) {
    const next = ((2 * k - 1) * t * value - (k - 1) * before) / k;
    before = value;
    value = next;
  }
  return { value, derivative: (n * (t * value - before)) / (t * t - 1) };
}

/** ∫ₐᵇ f dx with `panels` equal panels of the n-point rule. */
export function integrateFixed(f: (x: number) => number, a: number, b: number, n = 16, panels = 1): number {
  const { nodes, weights } = gaussLegendre(n);
  const half = (b - a) / (2 * panels);
  let sum = 0;
  for (let panel = 0; panel < panels; panel += 1) {
    const middle = a + (2 * panel + 1) * half;
    for (let i = 0; i < n; i += 1) sum += weights[i]! * f(middle + half * nodes[i]!);
  }
  return sum * half;
}
