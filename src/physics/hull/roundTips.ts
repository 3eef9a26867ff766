/**
 * Slopes of a monotone cubic r(s) at rounded tips. There the three-point slope comes out a little over 1, which no skin
 * can follow, and taut skin would have a flat face that nobody measured. Where the rows themselves allow it the tip is
 * taken round instead, as the circle through tip and second row:
 *
 *   r = ϱ sin(s/ϱ);  sin θ/θ = r₁/s₁, θ = s₁/ϱ;  slopes 1 at the tip and cos θ at the second row
 *
 * kept within three times the next secant, so that the cubic stays monotone (Fritsch & Carlson 1980). Exact for a ball.
 */
import type { MonotoneCubic } from '../../numeric/pchip.ts';
import { findRoot } from '../../numeric/roots.ts';

export type Knots = Pick<MonotoneCubic, 'xs' | 'ys' | 'slopes'>;

export function withRoundTips({ xs, ys, slopes }: Knots): Knots {
  const whole = xs.at(-1)!;
  const nose = tipSlopes(xs, ys, slopes);
  const tail = tipSlopes(
    xs.map((x) => whole - x).reverse(),
    [...ys].reverse(),
    slopes.map((slope) => -slope).reverse(),
  );
  const rounded = [...slopes];
  if (nose) rounded.splice(0, 2, nose[0], nose[1]);
  if (tail) rounded.splice(-2, 2, -tail[1], -tail[0]);
  return { xs, ys, slopes: rounded };
}

/** Slopes at the first two rows if the cubic leaves the tip faster than the tape though the rows do not. */
function tipSlopes(
  [x0, x1, x2]: readonly number[],
  [y0, y1, y2]: readonly number[],
  [slope]: readonly number[],
): [number, number] | undefined {
  const secant = y1! / (x1! - x0!);
  const next = (y2! - y1!) / (x2! - x1!);
  if (y0! > 0 || slope! <= 1 || secant >= 1 || secant < 2 / Math.PI) return undefined;
  const theta = findRoot(
    (angle) => Math.sin(angle) - secant * angle,
    Math.sqrt(6 * (1 - secant)) / 2,
    Math.PI / 2,
    1e-15,
  );
  if (theta.status !== 'solved' || next <= 0) return undefined;
  return [1, Math.min(Math.cos(theta.value), 3 * next)];
}
