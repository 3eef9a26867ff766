/** The thrust of a craft as arrows: where each begins, which way it is turned, and which ways it can be turned. */
import type { Vectoring } from '../../craft/thrustSchema.ts';
import type { Vec3 } from '../../numeric/vector.ts';
import type { CraftState } from '../../physics/craftState.ts';
import { thrustersOf } from '../../physics/thrust/thrusters.ts';

/** Of one piece of a thruster. */
export interface ThrustArrow {
  readonly part: string;
  readonly copy: number;
  readonly name: string;
  /** Middle of the disc, m: station, side, height. */
  readonly at: Vec3;
  /** Angles as set, rad: + to starboard, + up. */
  readonly yaw: number;
  readonly pitch: number;
  /** N, at rest at full throttle. */
  readonly thrust: number;
  /** Of the propeller, m. */
  readonly diameter: number;
  readonly movesInYaw: boolean;
  readonly movesInPitch: boolean;
  /** Whether it is throttled apart from its fellow of a pair. */
  readonly apart: boolean;
}

export const arrowsOf = (state: CraftState): ThrustArrow[] =>
  thrustersOf(state).map(({ part, copy, name, at, staticThrust, diameter, yaw, pitch, differ }) => ({
    part,
    copy,
    name,
    at,
    yaw: yaw.set,
    pitch: pitch.set,
    thrust: staticThrust,
    diameter,
    movesInYaw: moves(yaw),
    movesInPitch: moves(pitch),
    apart: differ !== 0,
  }));

const moves = ({ least, most }: Vectoring): boolean => most > least;
