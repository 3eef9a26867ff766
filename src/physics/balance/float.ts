/**
 * How a craft floats freely: attitude, righting moment, and how much a gram turns it.
 *
 *   righting moment for small turns  = W g h per radian, with h the pendulum depth z_B − z_G;
 *   turn per kilogram at p = dθ/dm at m = 0 of θ = atan2(q_x + m a, −(q_z + m b)), a = p_x − x_B, b = p_z − z_B:
 *     dθ/dm = (−a q_z + b q_x) / (q_x² + q_z²).
 */
import { infeasible, type Outcome, solved } from '../../numeric/outcome.ts';
import type { Vec3 } from '../../numeric/vector.ts';
import { STANDARD_GRAVITY } from '../../units/constants.ts';
import { type Attitude, attitudeOf } from './attitude.ts';
import { hangOf, type Loading, pendulumDepthOf } from './loading.ts';

export function floatOf(loading: Loading): Outcome<Attitude> {
  const attitude = attitudeOf(hangOf(loading));
  return attitude
    ? solved(attitude)
    : infeasible('CG and CB are one point, so the craft rests in any attitude.', 'Hang something lower.');
}

/** N·m/rad about the athwart axis; negative when the CG stands above the CB. */
export const rightingMoment = (loading: Loading): number =>
  loading.solid.mass * STANDARD_GRAVITY * (pendulumDepthOf(loading) ?? 0);

/** Pitch per mass added at a point, rad/kg, + nose-up. */
export function pitchPerMass(loading: Loading, at: Vec3): Outcome<number> {
  const [qx, , qz] = hangOf(loading);
  const square = qx * qx + qz * qz;
  if (square === 0) return infeasible('CG and CB are one point: any weight turns the craft all the way.');
  const a = at[0] - loading.cb[0];
  const b = at[2] - loading.cb[2];
  return solved((b * qx - a * qz) / square);
}
