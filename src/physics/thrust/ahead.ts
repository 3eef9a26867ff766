/**
 * Thrust of a craft flown straight ahead, in the vertical plane.
 *
 *   a thruster turned δ in yaw and ε in pitch pushes along  e = (cos ε cos δ forward, cos ε sin δ to starboard, sin ε up);
 *   it advances through the air at  V = u cos ε cos δ + w sin ε
 *
 * u forward and w upward speed along and square to the hull axis, m/s. Straight ahead: δ = 0, and ε as set (or as asked),
 * both held within the thruster's limits. The side force of a thruster that cannot point straight ahead is left out.
 */
import type { Vectoring } from '../../craft/thrustSchema.ts';
import type { Vec3 } from '../../numeric/vector.ts';
import { type Thruster, thrustAt } from './thrusters.ts';

export interface Push {
  readonly thruster: Thruster;
  readonly at: Vec3;
  /** N along the thruster's axis, and the speed along it, m/s. */
  readonly thrust: number;
  readonly advance: number;
  /** N along the hull axis, + forward, and square to it, + up. */
  readonly forward: number;
  readonly up: number;
}

/** How thrusters are set while the craft flies straight ahead. */
export interface AheadHelm {
  /** Share of full throttle, 0 … 1, the same for all. */
  readonly throttle: number;
  /** Vectoring in pitch for every thruster that turns in pitch, rad, + up; null for each as it is set. */
  readonly vector: number | null;
}

export const heldWithin = ({ least, most }: Vectoring, angle: number): number =>
  Math.min(Math.max(angle, least), most);

/** Angle of thrust in pitch, rad. */
export const pitchAngle = ({ pitch }: Thruster, vector: number | null): number =>
  heldWithin(pitch, vector ?? pitch.set);

export const pushOf = (thruster: Thruster, { throttle, vector }: AheadHelm, u: number, w: number): Push => {
  const angle = pitchAngle(thruster, vector);
  const ahead = Math.cos(angle) * Math.cos(heldWithin(thruster.yaw, 0));
  const up = Math.sin(angle);
  const advance = u * ahead + w * up;
  const thrust = thrustAt(thruster, throttle, advance);
  return { thruster, at: thruster.at, thrust, advance, forward: thrust * ahead, up: thrust * up };
};

/** N along the hull axis from all thrusters, at a forward speed and no other. */
export const forwardThrust = (thrusters: readonly Thruster[], helm: AheadHelm, u: number): number =>
  thrusters.reduce((sum, thruster) => sum + pushOf(thruster, helm, u, 0).forward, 0);
