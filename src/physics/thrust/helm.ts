/**
 * How a craft is steered: one throttle for all thrusters, and either a share of what each can do to yaw the craft, or one
 * vectoring angle for all.
 */
export interface Helm {
  /** Share of full thrust, 0 … 1. */
  readonly throttle: number;
  /** Share of what vectoring and thrust apart allow, −1 … 1, + to starboard; 0 is straight ahead. */
  readonly steer: number;
  /** Vectoring in yaw for every thruster that turns in yaw, rad, + thrust to starboard, held within each one's limits; null to follow `steer`. */
  readonly vector: number | null;
}
