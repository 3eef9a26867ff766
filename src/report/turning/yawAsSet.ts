/**
 * What the thrust does about the vertical through the CG as the thrusters are turned now, at rest and full throttle.
 *
 *   moment  N = Σ T cos θ [(x_G − x) sin δ − (y − y_G) cos δ]
 *   arm     Σ T (x − x_G) / Σ T, of the thrusters that turn in yaw
 *   side    Σ T |y − y_G| / Σ T, of those throttled apart
 *
 * T static thrust, N; x station and y side of the thruster, x_G and y_G of the CG, m; δ its angle in yaw, + to starboard,
 * θ in pitch, rad. N in N·m, + nose to starboard; arm in m, + aft of the CG. Plain statics: each force times its lever.
 */
import type { Vec3 } from '../../numeric/vector.ts';
import type { ThrustArrow } from './arrows.ts';

export interface YawAsSet {
  readonly moment: number;
  /** All thrust together, Σ T, N. */
  readonly thrust: number;
  /** Null when none turns in yaw. */
  readonly arm: number | null;
  /** Null when none is throttled apart. */
  readonly side: number | null;
}

export function yawAsSet(arrows: readonly ThrustArrow[], cg: Vec3): YawAsSet {
  const momentOf = ({ at: [x, y], yaw, pitch, thrust }: ThrustArrow) =>
    thrust * Math.cos(pitch) * ((cg[0] - x) * Math.sin(yaw) - (y - cg[1]) * Math.cos(yaw));
  return {
    moment: arrows.reduce((sum, arrow) => sum + momentOf(arrow), 0),
    thrust: arrows.reduce((sum, { thrust }) => sum + thrust, 0),
    arm: meanLever(
      arrows.filter(({ movesInYaw }) => movesInYaw),
      ({ at }) => at[0] - cg[0],
    ),
    side: meanLever(
      arrows.filter(({ apart }) => apart),
      ({ at }) => Math.abs(at[1] - cg[1]),
    ),
  };
}

/** Weighed by thrust, m; null without thrust. */
function meanLever(arrows: readonly ThrustArrow[], lever: (arrow: ThrustArrow) => number): number | null {
  const whole = arrows.reduce((sum, { thrust }) => sum + thrust, 0);
  return whole > 0 ? arrows.reduce((sum, arrow) => sum + arrow.thrust * lever(arrow), 0) / whole : null;
}
