/**
 * The closed form for one weight at a hardpoint p, a = p_x − x_B aft, c = p_y − y_B, b = p_z − z_B:
 *
 *   exactly level:      q_x + m a = 0                                        → m = −q_x / a
 *   within tolerance τ: |q_x + m a| ≤ tan τ · √((q_y + m c)² + (q_z + m b)²), and q_z + m b < 0
 *                       → the smaller root m ≥ 0 of the quadratic with equality.
 *
 * Mass × arm on either side of the pivot: FAA-H-8083-1, permanent ballast = weight × distance to shift ÷ arm.
 */
import { infeasible, type Outcome, solved } from '../../numeric/outcome.ts';
import type { Vec3 } from '../../numeric/vector.ts';
import { say } from '../../units/sentence.ts';
import { hangOf, type Loading } from './loading.ts';

/** An arm shorter than this cannot carry a counterweight, m. */
const LEAST_ARM = 1e-6;
/** Out of level by less than this counts as level: rounding, not a fault of the craft. kg·m */
const ROUNDING = 1e-12;

/** The weight at `at` that puts the CG exactly under (or over) the CB, kg. */
export function levellingWeight(loading: Loading, at: Vec3): Outcome<number> {
  const [qx] = hangOf(loading);
  if (Math.abs(qx) <= ROUNDING) return solved(0);
  const arm = at[0] - loading.cb[0];
  if (Math.abs(arm) < LEAST_ARM) {
    return infeasible(
      `The hardpoint stands on the CB (${say(Math.abs(arm), 'smallLength')} from it), so weight there levels nothing.`,
      qx > 0 ? 'Choose a hardpoint nearer the nose.' : 'Choose a hardpoint nearer the tail.',
    );
  }
  if (qx * arm > 0) return wrongSide(qx, arm);
  return solved(-qx / arm);
}

function wrongSide(qx: number, arm: number): Outcome<number> {
  const heavy = qx > 0 ? 'tail' : 'nose';
  const [side, other] = qx > 0 ? ['aft', 'forward'] : ['forward', 'aft'];
  return infeasible(
    `The craft is ${heavy}-heavy by ${say(Math.abs(qx), 'momentMass')} and the hardpoint lies ${say(Math.abs(arm), 'smallLength')} ${side} of the CB, so weight there makes it worse.`,
    `Choose a hardpoint ${other} of the CB.`,
  );
}

/** The least weight at `at` with which the craft floats upright within a pitch of ± `tolerance` (rad, < π/2), kg. */
export function levellingWithin(loading: Loading, at: Vec3, tolerance: number): Outcome<number> {
  const q = hangOf(loading);
  const arms: Vec3 = [at[0] - loading.cb[0], at[1] - loading.cb[1], at[2] - loading.cb[2]];
  if (isLevel(q, arms, 0, tolerance)) return solved(0);
  const candidates = crossings(q, arms, Math.tan(tolerance))
    .filter((m) => m > 0 && isLevel(q, arms, m, tolerance * (1 + 1e-9) + 1e-12))
    .sort((m, n) => m - n);
  const [least] = candidates;
  if (least !== undefined) return solved(least);
  const exact = levellingWeight(loading, at);
  return exact.status === 'infeasible' ? exact : topHeavy(q, arms, exact.value);
}

function isLevel(q: Vec3, arms: Vec3, m: number, tolerance: number): boolean {
  const [x, y, z] = [q[0] + m * arms[0], q[1] + m * arms[1], q[2] + m * arms[2]];
  return z < 0 && Math.abs(x) <= Math.tan(tolerance) * Math.hypot(y, z) + ROUNDING;
}

/** Masses at which the pitch is the tolerance: roots of (q_x + m a)² = t² ((q_y + m c)² + (q_z + m b)²). */
function crossings([x, y, z]: Vec3, [a, c, b]: Vec3, t: number): number[] {
  const square = a * a - t * t * (c * c + b * b);
  const half = a * x - t * t * (c * y + b * z);
  const constant = x * x - t * t * (y * y + z * z);
  if (square === 0) return half === 0 ? [] : [-constant / (2 * half)];
  const inside = half * half - square * constant;
  if (inside < 0) return [];
  // The form that does not subtract nearly equal numbers: q = −(h + sign(h)√…), roots q/a and c/q.
  const q = -(half + Math.sign(half || 1) * Math.sqrt(inside));
  return q === 0 ? [0] : [q / square, constant / q];
}

const topHeavy = (q: Vec3, arms: Vec3, m: number): Outcome<number> =>
  infeasible(
    `With ${say(m, 'mass')} there, which levels it, the CG would still stand above the CB (by a moment of ${say(q[2] + m * arms[2], 'momentMass')}), so the craft would not stay upright.`,
    'Hang the heavy parts lower, or choose a lower hardpoint.',
  );
