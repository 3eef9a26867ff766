/**
 * The attitude in which a body hangs.
 *
 * A hang vector q in hull axes (x aft, y starboard, z up) is what must point straight down at rest. For a floating
 * craft q = W (G − B): the line CG→CB stands vertical. With heel φ (+ starboard down) and pitch θ (+ nose-up), turned
 * in that order from upright as in ISO 1151-1 (yaw, pitch, roll), the vertical seen from the hull is
 *   down = (sin θ, cos θ sin φ, −cos θ cos φ),
 * so  θ = atan2(q_x, √(q_y² + q_z²)),  φ = atan2(q_y, −q_z);
 * without heel this is θ = atan2(x_G − x_B, z_B − z_G), which passes 90° when the CG stands above the CB.
 */
import type { Vec3 } from '../../numeric/vector.ts';

export interface Attitude {
  /** rad, + nose-up. */
  readonly pitch: number;
  /** rad, + starboard down. */
  readonly heel: number;
}

/** A hang vector shorter than this is none: a milligram a micrometre out, kg·m. */
const NOTHING = 1e-12;
/** Side moments this much smaller than the rest are rounding. */
const ROUNDING = 1e-12;

/** Null when the vector is as good as zero: the body rests in any attitude. */
export function attitudeOf([x, y, z]: Vec3): Attitude | null {
  const size = Math.hypot(x, y, z);
  if (size < NOTHING) return null;
  if (Math.abs(y) <= ROUNDING * size) return { pitch: Math.atan2(x, -z), heel: 0 };
  return { pitch: Math.atan2(x, Math.hypot(y, z)), heel: Math.atan2(y, -z) };
}
