/**
 * Monotone piecewise cubic through (xᵢ, yᵢ): between two points the curve rises or falls as they do, so measured
 * offsets get no bulge that was not measured.
 *
 *   hᵢ = xᵢ₊₁ − xᵢ, Δᵢ = (yᵢ₊₁ − yᵢ)/hᵢ; first slopes d by the three-point difference, 0 where Δ changes sign;
 *   then with α = dᵢ/Δᵢ, β = dᵢ₊₁/Δᵢ, where α² + β² > 9 both are scaled by 3/√(α² + β²).
 *
 * Source: F. N. Fritsch & R. E. Carlson, Monotone Piecewise Cubic Interpolation, SIAM J. Numer. Anal. 17 (1980),
 * region M with the circle of radius 3. The scaling is taken over both neighbours at once (the smaller factor
 * holds), so that mirrored data give the mirrored curve.
 */

export interface MonotoneCubic {
  readonly xs: readonly number[];
  readonly ys: readonly number[];
  /** dy/dx at each xᵢ. */
  readonly slopes: readonly number[];
  /** y at x. Outside the points the end value holds. */
  at(x: number): number;
  /** dy/dx at x. Outside the points it is 0. */
  slope(x: number): number;
}

/** `xs` strictly ascending, at least two; throws a RangeError otherwise, since that is a mistake in the caller. */
export function pchip(xs: readonly number[], ys: readonly number[]): MonotoneCubic {
  if (xs.length < 2 || xs.length !== ys.length) throw new RangeError('pchip needs two or more points (x, y)');
  if (xs.some((x, i) => i > 0 && !(x > xs[i - 1]!))) throw new RangeError('pchip needs ascending x');
  const slopes = limitSlopes(firstSlopes(xs, ys), secants(xs, ys));
  return {
    xs,
    ys,
    slopes,
    at: (x) => valueAt(xs, ys, slopes, x),
    slope: (x) => slopeAt(xs, ys, slopes, x),
  };
}

const secants = (xs: readonly number[], ys: readonly number[]): number[] =>
  xs.slice(1).map((x, i) => (ys[i + 1]! - ys[i]!) / (x - xs[i]!));

function firstSlopes(xs: readonly number[], ys: readonly number[]): number[] {
  const h = xs.slice(1).map((x, i) => x - xs[i]!);
  const delta = secants(xs, ys);
  const last = delta.length - 1;
  if (last === 0) return [delta[0]!, delta[0]!];
  return xs.map((_, i) => {
    if (i === 0) return endSlope(h[0]!, h[1]!, delta[0]!, delta[1]!);
    if (i > last) return endSlope(h[last]!, h[last - 1]!, delta[last]!, delta[last - 1]!);
    if (delta[i - 1]! * delta[i]! <= 0) return 0;
    return (h[i]! * delta[i - 1]! + h[i - 1]! * delta[i]!) / (h[i - 1]! + h[i]!);
  });
}

/** One-sided three-point difference, 0 where it would run against the end secant. */
function endSlope(h0: number, h1: number, delta0: number, delta1: number): number {
  const slope = ((2 * h0 + h1) * delta0 - h0 * delta1) / (h0 + h1);
  return slope * delta0 <= 0 ? 0 : slope;
}

function limitSlopes(slopes: readonly number[], delta: readonly number[]): number[] {
  const factors = delta.map((d, i) => {
    if (d === 0) return 0;
    const size = Math.hypot(slopes[i]! / d, slopes[i + 1]! / d);
    return size > 3 ? 3 / size : 1;
  });
  return slopes.map((slope, i) => slope * Math.min(factors[i - 1] ?? 1, factors[i] ?? 1));
}

/** Index of the piece that holds x: the greatest i ≤ n − 2 with xs[i] ≤ x, by bisection. */
function pieceOf(xs: readonly number[], x: number): number {
  let low = 0;
  let high = xs.length - 1;
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if (xs[middle]! <= x) low = middle;
    else high = middle;
  }
  return low;
}

function valueAt(xs: readonly number[], ys: readonly number[], d: readonly number[], x: number): number {
  if (x <= xs[0]!) return ys[0]!;
  if (x >= xs.at(-1)!) return ys.at(-1)!;
  const i = pieceOf(xs, x);
  const h = xs[i + 1]! - xs[i]!;
  const t = (x - xs[i]!) / h;
  const rise = ys[i + 1]! - ys[i]!;
  const a = h * d[i]!;
  const curve = a + h * d[i + 1]! - 2 * rise;
  return ys[i]! + t * (a + t * (rise - a - curve + t * curve));
}

function slopeAt(xs: readonly number[], ys: readonly number[], d: readonly number[], x: number): number {
  if (x < xs[0]! || x > xs.at(-1)!) return 0;
  const i = pieceOf(xs, x);
  const h = xs[i + 1]! - xs[i]!;
  const t = (x - xs[i]!) / h;
  const secant = (ys[i + 1]! - ys[i]!) / h;
  const curve = d[i]! + d[i + 1]! - 2 * secant;
  return d[i]! + t * (2 * (secant - d[i]! - curve) + 3 * t * curve);
}
