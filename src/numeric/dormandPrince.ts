/**
 * The numbers of the Dormand–Prince pair RK5(4)7FM, and the polynomial between the ends of a step:
 *
 *   y(t + θh) = r₁ + θ(r₂ + (1 − θ)(r₃ + θ(r₄ + (1 − θ) r₅))),
 *   r₁ = y, r₂ = y₁ − y, r₃ = h k₁ − r₂, r₄ = r₂ − h k₇ − r₃, r₅ = h Σ dᵢ kᵢ
 *
 * Source: Dormand & Prince 1980, table 2; d after E. Hairer, S. P. Nørsett & G. Wanner, Solving Ordinary Differential
 * Equations I, II.6 (from memory; the tests hold both to their order).
 */

/** Share of the step at which each slope is taken. */
export const NODES = [0, 1 / 5, 3 / 10, 4 / 5, 8 / 9, 1, 1] as const;

/** How each stage is made from the slopes before it; the last is the step itself. */
export const STAGES: readonly (readonly number[])[] = [
  [],
  [1 / 5],
  [3 / 40, 9 / 40],
  [44 / 45, -56 / 15, 32 / 9],
  [19372 / 6561, -25360 / 2187, 64448 / 6561, -212 / 729],
  [9017 / 3168, -355 / 33, 46732 / 5247, 49 / 176, -5103 / 18656],
  [35 / 384, 0, 500 / 1113, 125 / 192, -2187 / 6784, 11 / 84],
];

/** Order 5 less order 4. */
export const ERROR: readonly number[] = [
  71 / 57600,
  0,
  -71 / 16695,
  71 / 1920,
  -17253 / 339200,
  22 / 525,
  -1 / 40,
];

const DENSE: readonly number[] = [
  -12715105075 / 11282082432,
  0,
  87487479700 / 32700410799,
  -10690763975 / 1880347072,
  701980252875 / 199316789632,
  -1453857185 / 822651844,
  69997945 / 29380423,
];

/** A step taken: where it began, how long it is, and r₁ … r₅ one after another. */
export interface DenseStep {
  readonly t: number;
  readonly h: number;
  readonly parts: Float64Array;
}

export function denseStep(
  t: number,
  h: number,
  y: Float64Array,
  next: Float64Array,
  k: readonly Float64Array[],
): DenseStep {
  const n = y.length;
  const parts = new Float64Array(5 * n);
  for (let i = 0; i < n; i += 1) {
    const rise = next[i]! - y[i]!;
    const bend = h * k[0]![i]! - rise;
    let sum = 0;
    for (let j = 0; j < DENSE.length; j += 1) sum += DENSE[j]! * k[j]![i]!;
    parts[i] = y[i]!;
    parts[n + i] = rise;
    parts[2 * n + i] = bend;
    parts[3 * n + i] = rise - h * k[6]![i]! - bend;
    parts[4 * n + i] = h * sum;
  }
  return { t, h, parts };
}

export function denseAt({ t, h, parts }: DenseStep, time: number): Float64Array {
  const n = parts.length / 5;
  const share = h > 0 ? (time - t) / h : 0;
  const left = 1 - share;
  const y = new Float64Array(n);
  for (let i = 0; i < n; i += 1) {
    const inner = parts[3 * n + i]! + left * parts[4 * n + i]!;
    y[i] = parts[i]! + share * (parts[n + i]! + left * (parts[2 * n + i]! + share * inner));
  }
  return y;
}
