/**
 * Running integrals F(ξ) = ∫₋₁^ξ f by Legendre series, so that a table over one panel answers any partial integral.
 *
 *   f(ξ) ≈ Σ cₖ Pₖ(ξ), k < n;  cₖ = (2k + 1)/2 · Σⱼ wⱼ f(ξⱼ) Pₖ(ξⱼ)   (Gauss–Legendre nodes ξⱼ, weights wⱼ)
 *   ∫₋₁^ξ Pₖ = (Pₖ₊₁(ξ) − Pₖ₋₁(ξ))/(2k + 1), and ξ + 1 for k = 0
 *
 * F(1) from the series is the n-point Gauss sum itself. The last coefficients tell how well n terms resolve f.
 * Source: DLMF 18.9.1 (recurrence), 18.9.7 with 18.7.9 (integral), 3.5(v) (Gauss rule).
 */
import { gaussLegendre } from '../../numeric/quadrature.ts';

export interface LegendreRule {
  readonly n: number;
  readonly nodes: readonly number[];
  readonly weights: readonly number[];
  /** n × n, row k: values at the nodes → cₖ. */
  readonly project: Float64Array;
  /** n × n, row i: values at the nodes → ∫ from −1 to node i. */
  readonly running: Float64Array;
}

const rules = new Map<number, LegendreRule>();

/** The rule with n terms, 2 ≤ n ≤ 128; computed once and kept. */
export function legendreRule(n: number): LegendreRule {
  const known = rules.get(n);
  if (known) return known;
  const rule = computeRule(n);
  rules.set(n, rule);
  return rule;
}

function computeRule(n: number): LegendreRule {
  const { nodes, weights } = gaussLegendre(n);
  const values = nodes.map((xi) => polynomials(n, xi));
  const project = new Float64Array(n * n);
  const running = new Float64Array(n * n);
  for (let k = 0; k < n; k += 1)
    for (let j = 0; j < n; j += 1) project[k * n + j] = ((2 * k + 1) / 2) * weights[j]! * values[j]![k]!;
  for (let i = 0; i < n; i += 1)
    for (let j = 0; j < n; j += 1)
      for (let k = 0; k < n; k += 1)
        running[i * n + j]! += project[k * n + j]! * integralOf(k, nodes[i]!, values[i]!);
  return { n, nodes, weights, project, running };
}

/** P₀ … Pₙ at ξ. */
function polynomials(n: number, xi: number): number[] {
  const p = [1, xi];
  for (let k = 1; k < n; k += 1) p.push(((2 * k + 1) * xi * p[k]! - k * p[k - 1]!) / (k + 1));
  return p;
}

const integralOf = (k: number, xi: number, p: readonly number[]): number =>
  k === 0 ? xi + 1 : (p[k + 1]! - p[k - 1]!) / (2 * k + 1);

/** Row `row` of an n × n table times the values. */
export function apply(table: Float64Array, row: number, values: readonly number[]): number {
  const n = values.length;
  let sum = 0;
  for (let j = 0; j < n; j += 1) sum += table[row * n + j]! * values[j]!;
  return sum;
}

/** Coefficients c₀ … cₙ₋₁ of the values at the nodes. */
export function coefficientsOf(rule: LegendreRule, values: readonly number[]): number[] {
  const c: number[] = [];
  for (let k = 0; k < rule.n; k += 1) c.push(apply(rule.project, k, values));
  return c;
}

/** Pₖ₊₁ = RISE[k] ξ Pₖ − FALL[k] Pₖ₋₁, and 1/(2k + 1): tables, because divisions would take most of the time. */
const MOST_TERMS = 128;
const RISE = Float64Array.from({ length: MOST_TERMS }, (_, k) => (2 * k + 1) / (k + 1));
const FALL = Float64Array.from({ length: MOST_TERMS }, (_, k) => k / (k + 1));
const PER_ODD = Float64Array.from({ length: MOST_TERMS }, (_, k) => 1 / (2 * k + 1));

/** ∫₋₁^ξ Σ cₖ Pₖ. */
export function integralTo(c: readonly number[], xi: number): number {
  // Exact at the ends, so that tips and joints come out as what they are.
  if (xi <= -1) return 0;
  if (xi >= 1) return 2 * c[0]!;
  let before = 1;
  let p = xi;
  let sum = c[0]! * (xi + 1);
  for (let k = 1; k < c.length; k += 1) {
    const next = RISE[k]! * xi * p - FALL[k]! * before;
    sum += c[k]! * (next - before) * PER_ODD[k]!;
    before = p;
    p = next;
  }
  return sum;
}

/** The same for several series of equal length at one ξ, added to `sums`. */
export function addIntegralsTo(series: readonly (readonly number[])[], xi: number, sums: Float64Array): void {
  if (xi <= -1) return;
  if (xi >= 1) {
    for (let j = 0; j < series.length; j += 1) sums[j]! += 2 * series[j]![0]!;
    return;
  }
  const n = series[0]!.length;
  let before = 1;
  let p = xi;
  for (let j = 0; j < series.length; j += 1) sums[j]! += series[j]![0]! * (xi + 1);
  for (let k = 1; k < n; k += 1) {
    const next = RISE[k]! * xi * p - FALL[k]! * before;
    const integral = (next - before) * PER_ODD[k]!;
    for (let j = 0; j < series.length; j += 1) sums[j]! += series[j]![k]! * integral;
    before = p;
    p = next;
  }
}

/** Σ cₖ Pₖ(ξ). */
export function valueAt(c: readonly number[], xi: number): number {
  let before = 1;
  let p = xi;
  let sum = c[0]! + c[1]! * xi;
  for (let k = 1; k + 1 < c.length; k += 1) {
    const next = RISE[k]! * xi * p - FALL[k]! * before;
    before = p;
    p = next;
    sum += c[k + 1]! * p;
  }
  return sum;
}

const MOST_STEPS = 80;

/**
 * The ξ in [−1, 1] at which the running integral of a series that is nowhere negative reaches `target`: Newton,
 * with a bisection step wherever Newton would leave the bracket. Clamped to the ends.
 */
export function invertIntegral(c: readonly number[], target: number): number {
  const whole = 2 * c[0]!;
  if (target <= 0) return -1;
  if (target >= whole) return 1;
  let lo = -1;
  let hi = 1;
  let xi = (2 * target) / whole - 1;
  for (let pass = 0; pass < MOST_STEPS; pass += 1) {
    const excess = integralTo(c, xi) - target;
    if (excess > 0) hi = xi;
    else lo = xi;
    const newton = xi - excess / valueAt(c, xi);
    const next = newton >= lo && newton <= hi ? newton : (lo + hi) / 2;
    if (Math.abs(next - xi) <= 4e-16) return next;
    xi = next;
  }
  return xi;
}
